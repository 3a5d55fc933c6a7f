// Dimension lines on the stage: the lines as SVG in pixels; their figures stand above them as text that can be pressed.
import { memo } from "react";
import type { Dimension, Drawing } from "~/cartons/export/drawing";
import type { Point } from "~/cartons/geometry/outline";
import { toStage, type View } from "../view";
import { isShownCompact } from "./use-drawing";

const TICK = 4;
const GAP = 5;
/** Width of a figure in Lato's tabular digits, px. */
const widthOf = (text: string, size: number) => text.length * 0.57 * size;

export const DimensionLines = memo(function DimensionLines({ drawing, view, litRow, textOf, isCompact }: { drawing: Drawing; view: View; litRow: string | null; textOf: (d: Dimension) => string; isCompact: boolean }) {
  return (
    <g fill="none" stroke="var(--ink-3)" strokeWidth={1}>
      {drawing.dimensions.filter((d) => !isCompact || isShownCompact(d)).map((d) => {
        const isLit = litRow !== null && d.row === litRow;
        return (
          <g key={d.id} stroke={isLit ? "var(--live-line)" : undefined} strokeWidth={isLit ? 1.75 : undefined}>
            {!isLit && d.extensions.map((line, i) => <Segment key={i} from={toStage(view, line.from)} to={toStage(view, line.to)} width={0.75} />)}
            <DimensionLine dimension={isCompact ? centred(d) : d} view={view} text={textOf(d)} />
          </g>
        );
      })}
      {!isCompact && drawing.callouts.map((c) => c.leader && <Segment key={c.id} from={toStage(view, c.leader.from)} to={toStage(view, c.leader.to)} width={0.75} />)}
      {!isCompact && drawing.grain.map((g, i) => <GrainArrow key={i} from={toStage(view, g.from)} to={toStage(view, g.to)} />)}
    </g>
  );
});

/** Where names and other figures are left out, a figure stands in the middle of its line. */
export const centred = (d: Dimension): Dimension => ({ ...d, textAt: { x: (d.from.x + d.to.x) / 2, y: (d.from.y + d.to.y) / 2 } });

function DimensionLine({ dimension, view, text }: { dimension: Dimension; view: View; text: string }) {
  const [a, b] = [toStage(view, dimension.from), toStage(view, dimension.to)];
  const at = toStage(view, dimension.textAt);
  const length = Math.hypot(b.x - a.x, b.y - a.y) || 1;
  const along = { x: (b.x - a.x) / length, y: (b.y - a.y) / length };
  const half = widthOf(text, dimension.kind === "asked" ? 16 : 13) / 2 + GAP;
  const t = (at.x - a.x) * along.x + (at.y - a.y) * along.y;
  const point = (s: number): Point => ({ x: a.x + along.x * s, y: a.y + along.y * s });
  return (
    <>
      {dimension.fits && t - half > 0 && t + half < length ? (
        <>
          <Segment from={a} to={point(t - half)} />
          <Segment from={point(t + half)} to={b} />
        </>
      ) : (
        <Segment from={a} to={b} />
      )}
      <Tick at={a} />
      <Tick at={b} />
    </>
  );
}

const p = (n: number) => Math.round(n * 10) / 10;

export function Segment({ from, to, width }: { from: Point; to: Point; width?: number }) {
  return <path d={`M${p(from.x)} ${p(from.y)}L${p(to.x)} ${p(to.y)}`} strokeWidth={width} />;
}

export function Tick({ at }: { at: Point }) {
  return <path d={`M${p(at.x - TICK)} ${p(at.y + TICK)}L${p(at.x + TICK)} ${p(at.y - TICK)}`} strokeWidth={1.25} />;
}

/** Half an arrow head at each end: the board's fibres run this way. */
function GrainArrow({ from, to }: { from: Point; to: Point }) {
  const isAcross = Math.abs(to.x - from.x) > Math.abs(to.y - from.y);
  const heads = isAcross ? `M${p(from.x + 9)} ${p(from.y - 3)}L${p(from.x)} ${p(from.y)}M${p(to.x - 9)} ${p(to.y + 3)}L${p(to.x)} ${p(to.y)}` : `M${p(from.x - 3)} ${p(from.y - 9)}L${p(from.x)} ${p(from.y)}M${p(to.x + 3)} ${p(to.y + 9)}L${p(to.x)} ${p(to.y)}`;
  return (
    <>
      <Segment from={from} to={to} />
      <path d={heads} />
    </>
  );
}

/** A row of the Ledger whose figure does not stand on the drawing is shown while it is lit. */
export function LitMark({ from, to, view, text }: { from: Point; to: Point; view: View; text: string }) {
  const [a, b] = [toStage(view, from), toStage(view, to)];
  const isAcross = Math.abs(b.x - a.x) >= Math.abs(b.y - a.y);
  const middle = { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
  const width = widthOf(text, 13) + 10;
  return (
    <g stroke="var(--live-line)" fill="none" strokeWidth={1.75}>
      <Segment from={a} to={b} />
      <Tick at={a} />
      <Tick at={b} />
      <g transform={`translate(${p(middle.x)} ${p(middle.y)})${isAcross ? "" : " rotate(-90)"}`}>
        <rect x={-width / 2} y={-11} width={width} height={22} fill="var(--wash)" stroke="none" />
        <text textAnchor="middle" dominantBaseline="central" fontSize={13} fontWeight={700} fill="var(--live)" stroke="none">{text}</text>
      </g>
    </g>
  );
}
