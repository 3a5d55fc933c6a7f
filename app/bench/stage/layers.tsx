// The layers of a blank as lines and zones, in the drawing's own millimetres; the line code is in pixels at any scale.
import { memo, useId, useMemo } from "react";
import { plain } from "~/cartons/export/number";
import { layersSeen } from "~/cartons/export/sheet-view";
import { pathData } from "~/cartons/geometry/path";
import type { Carton, LayerName, LayerPath } from "~/cartons/types";
import type { Side } from "../bench-context";
import { lineCode } from "./line-code";

export interface LayersProps {
  carton: Carton;
  side: Side;
  hidden?: ReadonlySet<LayerName>;
  /** Pixels a millimetre: hatching keeps its pixels. */
  scale: number;
  /** Thinner lines, for pictures the size of a stamp. */
  thin?: number;
}

/** y runs up on the drawing: path data is turned over here, once. */
export const dataOf = (path: LayerPath["path"]) => pathData(path, plain, 0);

/** Draws into an SVG whose user unit is a millimetre, y downwards (y → −y). */
export const Layers = memo(function Layers({ carton, side, hidden, scale, thin = 1 }: LayersProps) {
  const id = useId();
  const layers = useMemo(() => layersSeen(carton, side), [carton, side]);
  const joined = useMemo(() => {
    const all = (paths: readonly LayerPath[]) => paths.map((p) => dataOf(p.path)).join("");
    return {
      board: all(layers.cut.filter((p) => p.role === "outline" || p.role === "hole")),
      bleed: all(layers.bleed), safe: all(layers.safe), glue: all(layers.glue),
      halfCut: all(layers.halfCut), perforation: all(layers.perforation), crease: all(layers.crease), reverseCrease: all(layers.reverseCrease), cut: all(layers.cut),
    };
  }, [layers]);
  const isShown = (name: LayerName) => !hidden?.has(name);
  const px = 1 / scale;
  return (
    <g fill="none" strokeLinejoin="round">
      <defs>
        <Hatch id={`${id}-glue`} px={px} turn={45} colour="var(--layer-glue)" />
        <Hatch id={`${id}-safe`} px={px} turn={-45} colour="var(--layer-safe)" />
      </defs>
      {isShown("bleed") && <path d={joined.bleed} fill="var(--layer-bleed-tint)" stroke="var(--layer-bleed)" strokeWidth={0.75} vectorEffect="non-scaling-stroke" />}
      <path d={joined.board} fill="var(--board)" fillRule="evenodd" />
      {isShown("safe") && <path d={joined.safe} fill={`url(#${id}-safe)`} stroke="var(--layer-safe-edge)" strokeWidth={0.75} vectorEffect="non-scaling-stroke" />}
      {isShown("glue") && <path d={joined.glue} fill={`url(#${id}-glue)`} stroke="var(--layer-glue)" strokeWidth={0.75} vectorEffect="non-scaling-stroke" />}
      {(["halfCut", "perforation", "reverseCrease", "crease", "cut"] as const).map((name) => isShown(name) && joined[name] && <CodedLine key={name} name={name} d={joined[name]} thin={thin} />)}
    </g>
  );
});

export function CodedLine({ name, d, thin = 1 }: { name: keyof typeof lineCode; d: string; thin?: number }) {
  const { colour, width, dash, isCased } = lineCode[name];
  const dashes = dash.length > 0 ? dash.map((n) => n * thin).join(" ") : undefined;
  return (
    <>
      {isCased && <path d={d} stroke="var(--layer-case)" strokeWidth={width * thin + 0.9} strokeDasharray={dashes} vectorEffect="non-scaling-stroke" />}
      <path d={d} stroke={colour} strokeWidth={width * thin} strokeDasharray={dashes} vectorEffect="non-scaling-stroke" />
    </>
  );
}

function Hatch({ id, px, turn, colour }: { id: string; px: number; turn: number; colour: string }) {
  const apart = 6 * px;
  return (
    <pattern id={id} width={apart} height={apart} patternUnits="userSpaceOnUse" patternTransform={`rotate(${turn})`}>
      <path d={`M0 0V${apart}`} stroke={colour} strokeWidth={px} />
    </pattern>
  );
}
