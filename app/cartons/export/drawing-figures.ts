// Figures inside panels: L, W and D as asked, and whatever else of the ledger no chain shows.
import type { Carton, LedgerRow } from "../types";
import type { Dimension, Room } from "./drawing";
import { across, along, boxAround, figureWidth, highOf, isFree, isWithin, lowOf, other, pointAt, spanOf, type Measures, type Shape } from "./drawing-space";
import { shown } from "./number";
import { seenPoint, type Side } from "./sheet-view";

/** A mark lies along an axis when it leaves it by no more than this, mm. */
const STRAIGHT = 0.02;
/** Where a line may cross its panel, as a share of the way across: off the middle first, where the name stands. */
const SHARES = [0.24, 0.76, 0.14, 0.86, 0.36, 0.64, 0.07, 0.93, 0.5];

export interface Figures {
  readonly dimensions: readonly Dimension[];
  readonly leftOut: number;
}

export function figuresOf(carton: Carton, shapes: readonly Shape[], side: Side, room: Room, chains: readonly Dimension[]): Figures {
  const dimensions: Dimension[] = [];
  const said = new Set(chains.flatMap((d) => (d.row ? [d.row] : [])));
  // The same figure on the same kind of panel is written once, as drawings do.
  const alike = new Set(carton.ledger.flatMap((row) => (said.has(row.id) && row.mark ? [likeness(row, shapes)] : [])));
  let leftOut = 0;
  const rows = carton.ledger.filter((row) => row.mark && row.unit === "mm" && !said.has(row.id));
  const asked = rows.filter((row) => row.group === "asked");
  for (const row of [...asked, ...rows.filter((r) => r.group !== "asked")]) {
    const shape = shapes.find((s) => s.panel.name === row.mark!.panel);
    if (!shape) continue;
    const like = likeness(row, shapes);
    if (row.group !== "asked" && alike.has(like)) continue;
    alike.add(like);
    const made = figure(row, shape, side, room);
    if (made) dimensions.push(made);
    else leftOut++;
  }
  return { dimensions, leftOut };
}

const likeness = (row: LedgerRow, shapes: readonly Shape[]): string =>
  `${shapes.find((s) => s.panel.name === row.mark!.panel)?.panel.label ?? row.mark!.panel}/${row.mark!.from.x === row.mark!.to.x ? "y" : "x"}/${shown(row.value)}`;

function figure(row: LedgerRow, shape: Shape, side: Side, room: Room): Dimension | null {
  const a = seenPoint(row.mark!.from, side);
  const b = seenPoint(row.mark!.to, side);
  const m: Measures | null = Math.abs(a.y - b.y) < STRAIGHT ? "x" : Math.abs(a.x - b.x) < STRAIGHT ? "y" : null;
  if (!m) return null;
  const marked = { low: Math.min(along(a, m), along(b, m)), high: Math.max(along(a, m), along(b, m)) };
  const isAsked = row.group === "asked";
  const text = isAsked ? `(${shown(row.value)})` : shown(row.value);
  const size = isAsked ? room.size * 1.15 : room.size;
  const width = figureWidth(text, size);
  if (row.value < width + size * 1.4) return null;
  const c = other(m);
  const from = lowOf(shape.bounds, c);
  const to = highOf(shape.bounds, c);
  for (const at of [...SHARES.map((f) => from + (to - from) * f), across(a, m)]) {
    const span = spanOf(shape.ring, m, at);
    // A mark takes in tabs and ears that the figure leaves out: then the line stands where the panel itself is that wide.
    const isTrue = isAsked || Math.abs(marked.high - marked.low - row.value) < STRAIGHT;
    const { low, high } = isTrue || !span ? marked : span;
    if (!span || span.low > low + size || span.high < high - size) continue;
    if (!isAsked && Math.abs(high - low - row.value) >= STRAIGHT) continue;
    const middle = pointAt(m, (low + high) / 2, at);
    const line = m === "x" ? boxAround(middle, high - low, size * 0.5) : boxAround(middle, size * 0.5, high - low);
    if (!isFree(line, room.taken)) continue;
    // The figure stands in the middle of its line, or off it where a name is in the way.
    for (const share of [0.5, 0.36, 0.64, 0.24, 0.76]) {
      const textAt = pointAt(m, low + (high - low) * share, at);
      const words = m === "x" ? boxAround(textAt, width + size * 0.6, size * 1.6) : boxAround(textAt, size * 1.6, width + size * 0.6);
      if (!isWithin(words, shape.bounds) || along(textAt, m) - width / 2 - size < low || along(textAt, m) + width / 2 + size > high) continue;
      if (!isFree(words, room.taken) || !isFree(words, room.lines)) continue;
      room.taken.push(words);
      room.lines.push(line);
      return {
        id: `ledger:${row.id}`, kind: isAsked ? "asked" : "panel", measures: m,
        from: pointAt(m, low, at), to: pointAt(m, high, at), away: pointAt(m, 0, 1), value: row.value, text, textAt, fits: true,
        row: row.id, parameter: row.parameter, extensions: [],
      };
    }
  }
  return null;
}
