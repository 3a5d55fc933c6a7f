// A folded carton as a vector picture: true pose, true caliper, colours of the theme.
import { useMemo } from "react";
import { foldedPicture, type Picture, type PictureView } from "~/cartons/export/folded-picture";
import type { Carton } from "~/cartons/types";

export interface FoldedPictureProps {
  readonly carton: Carton;
  /** 0 flat to the number of steps; closed when left out. */
  readonly u?: number;
  readonly view?: PictureView;
  readonly width: number;
  readonly height: number;
  /** What a screen reader says; without it the picture is decoration. */
  readonly title?: string;
  readonly className?: string;
}

const n = (value: number): string => String(Math.round(value * 100) / 100);
const TONES = { print: "var(--board-print)", inside: "var(--board-inside)", core: "var(--board-core)" } as const;
/** Per cent of ink mixed into a face that looks away from the light. */
const DARKEST = 14;

/** Pictures of stamp size leave thickness and shadow out. */
const STAMP = 110;

export function FoldedPicture({ carton, u, view, width, height, title, className }: FoldedPictureProps) {
  const small = width < STAMP;
  const at = u ?? carton.fold.steps.length;
  const picture = useMemo(() => foldedPicture(carton, { u: at, thin: small, withShadow: !small, ...(view ? { view } : {}) }), [carton, at, small, view]);
  const { minX, minY, maxX, maxY } = picture.bounds;
  const scale = Math.min((width - 4) / (maxX - minX), (height - 4) / (maxY - minY));
  const place = { scale, x: (width - (maxX - minX) * scale) / 2 - minX * scale, y: (height - (maxY - minY) * scale) / 2 - minY * scale };
  return (
    <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} className={className} role={title ? "img" : undefined} aria-label={title} aria-hidden={title ? undefined : true}>
      <FoldedFaces picture={picture} place={place} small={small} />
    </svg>
  );
}

interface Place { readonly scale: number; readonly x: number; readonly y: number }

function FoldedFaces({ picture, place, small }: { picture: Picture; place: Place; small: boolean }) {
  const path = (points: readonly { x: number; y: number }[]) => `M${points.map((p) => `${n(p.x * place.scale + place.x)} ${n(p.y * place.scale + place.y)}`).join("L")}Z`;
  const line = (l: { from: { x: number; y: number }; to: { x: number; y: number } }) =>
    `M${n(l.from.x * place.scale + place.x)} ${n(l.from.y * place.scale + place.y)}L${n(l.to.x * place.scale + place.x)} ${n(l.to.y * place.scale + place.y)}`;
  return (
    <>
      {picture.shadow.length > 0 && <path d={picture.shadow.map(path).join("")} fill="var(--cast)" />}
      {picture.faces.map((face, i) => {
        const fill = `color-mix(in srgb, black ${Math.round((1 - face.shade) * DARKEST)}%, ${TONES[face.tone]})`;
        const ink = face.lines.filter((l) => l.kind !== "crease").map(line).join("");
        const creases = face.lines.filter((l) => l.kind === "crease").map(line).join("");
        return (
          <g key={i}>
            {/* The same colour on the edge closes the hairline between two parts of one face. */}
            <path d={path(face.points)} style={{ fill, stroke: fill }} strokeWidth={0.4} strokeLinejoin="round" />
            {creases && <path d={creases} fill="none" stroke="var(--layer-crease)" strokeWidth={small ? 0.6 : 1} strokeDasharray={small ? undefined : "5 2.5"} />}
            {ink && <path d={ink} fill="none" stroke="var(--ink)" strokeWidth={small ? 0.8 : 1.4} strokeLinecap="round" />}
          </g>
        );
      })}
    </>
  );
}
