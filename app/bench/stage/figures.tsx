// The figures themselves: what was asked is a field, what was worked out points at its row of the Ledger.
import type { CSSProperties } from "react";
import { classNames } from "~/components/class-names";
import type { Dimension, Drawing } from "~/cartons/export/drawing";
import type { Point } from "~/cartons/geometry/outline";
import { useBench } from "../bench-context";
import { Figure } from "../figure";
import { showLength } from "../lengths";
import { isAxis } from "../session";
import { toStage, type View } from "../view";
import { centred } from "./dimensions";
import { isShownCompact } from "./use-drawing";

const AXIS_WORDS: Readonly<Record<string, string>> = { L: "Length", W: "Width", D: "Depth" };

export function Figures({ drawing, view, isCompact, textOf }: { drawing: Drawing; view: View; isCompact: boolean; textOf: (d: Dimension) => string }) {
  const { lit, light, session } = useBench();
  const inside = (d: Dimension) => session.carton.brief.basis === "inside" || !isAxis(d.parameter ?? "");
  return (
    <>
      {drawing.dimensions.filter((d) => !isCompact || isShownCompact(d)).map((d) => {
        const isVertical = d.measures === "y";
        const isLit = d.row !== null && lit?.row === d.row;
        const place = placeOf(toStage(view, (isCompact ? centred(d) : d).textAt));
        // On a phone figures are typed in the strip and the Ledger, where a thumb can reach them.
        if (d.kind === "asked" && d.parameter && !isCompact && inside(d)) {
          return (
            <span key={d.id} data-figure={d.row ?? undefined} style={place} className="absolute z-10 flex size-0 items-center justify-center focus-within:z-20">
              <Figure parameter={d.parameter} label={AXIS_WORDS[d.parameter] ?? d.parameter} kind="length" look="drawing" row={d.row ?? undefined} vertical={isVertical} className={isLit ? "bg-wash text-live" : undefined} />
            </span>
          );
        }
        return (
          <span key={d.id} data-figure={d.row ?? undefined} style={place} className="absolute flex size-0 items-center justify-center">
            <span
              aria-hidden
              onPointerEnter={() => d.row && light({ row: d.row, from: "stage" })}
              onPointerLeave={() => d.row && light(null)}
              className={classNames(
                "flex min-h-6 min-w-6 items-center justify-center whitespace-nowrap px-1",
                d.kind === "asked" ? "text-figure font-bold" : "text-small text-ink-2",
                isVertical && "-rotate-90",
                isCompact && "min-h-0! bg-board px-0.5! leading-[18px]",
                d.row && "cursor-default",
                isLit && "bg-wash font-bold text-live",
              )}
            >
              {textOf(d)}
            </span>
          </span>
        );
      })}
    </>
  );
}

const placeOf = (at: Point): CSSProperties => ({ transform: `translate(${at.x.toFixed(1)}px, ${at.y.toFixed(1)}px)`, left: 0, top: 0 });

/** Panel names, radii and angles: text that is read, not pressed. */
export function Words({ drawing, view }: { drawing: Drawing; view: View }) {
  const { units } = useBench();
  return (
    <g fill="var(--ink-3)" textAnchor="middle" dominantBaseline="central" fontSize={11}>
      {drawing.labels.map((label) => {
        const at = toStage(view, label.at);
        const size = Math.min(11, label.size * view.scale);
        return (
          <text key={label.panel} transform={`translate(${at.x.toFixed(1)} ${at.y.toFixed(1)})${label.angle === 90 ? " rotate(-90)" : ""}`} fontSize={size} fontWeight={700} letterSpacing={size * 0.12}>
            {label.text}
          </text>
        );
      })}
      {drawing.callouts.map((callout) => {
        const at = toStage(view, callout.at);
        return <text key={callout.id} x={at.x} y={at.y}>{inUnits(callout.text, units)}</text>;
      })}
      {drawing.grain.map((grain, i) => {
        const at = toStage(view, grain.at);
        const [dx, dy] = grain.angle === 90 ? [-9, 0] : [0, -9];
        return <text key={i} transform={`translate(${(at.x + dx).toFixed(1)} ${(at.y + dy).toFixed(1)})${grain.angle === 90 ? " rotate(-90)" : ""}`} fontSize={12} fill="var(--ink-2)">{grain.text}</text>;
      })}
    </g>
  );
}

/** "R 3" and "2.2 × 29.8" are lengths, "15°" is none. */
function inUnits(text: string, units: "mm" | "in"): string {
  if (units === "mm" || text.includes("°")) return text;
  return text.replace(/\d+(?:\.\d+)?(?!\s*×\s*\()/g, (figure) => showLength(Number(figure), units));
}
