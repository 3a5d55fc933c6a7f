// Figures inside panels: L, W and D as asked, and whatever else of the ledger no chain shows.
import type { Box, Point } from "../geometry/outline";
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

/** A line on which a figure may stand: its ends along the measure, and where it lies across it. */
interface Stretch {
  readonly low: number;
  readonly high: number;
  readonly at: number;
}

interface Writing {
  readonly row: LedgerRow;
  readonly shape: Shape;
  readonly measures: Measures;
  readonly isAsked: boolean;
  readonly text: string;
  readonly size: number;
  readonly width: number;
}

function figure(row: LedgerRow, shape: Shape, side: Side, room: Room): Dimension | null {
  const a = seenPoint(row.mark!.from, side);
  const b = seenPoint(row.mark!.to, side);
  const m: Measures | null = Math.abs(a.y - b.y) < STRAIGHT ? "x" : Math.abs(a.x - b.x) < STRAIGHT ? "y" : null;
  if (!m) return null;
  const isAsked = row.group === "asked";
  const text = isAsked ? `(${shown(row.value)})` : shown(row.value);
  const size = isAsked ? room.size * 1.15 : room.size;
  const writing: Writing = { row, shape, measures: m, isAsked, text, size, width: figureWidth(text, size) };
  const marked = { low: Math.min(along(a, m), along(b, m)), high: Math.max(along(a, m), along(b, m)) };
  const lines = stretchesOf(writing, marked, across(a, m)).filter((l) => isFree(boxOf(writing, l), room.taken));
  for (const line of lines) {
    const made = inLine(writing, line, room);
    if (made) return made;
  }
  // What was asked is a field to type over: where the line is too short for it, it stands beside.
  if (!isAsked) return null;
  for (const line of lines) {
    const made = beside(writing, line, room);
    if (made) return made;
  }
  return null;
}

function stretchesOf({ row, shape, measures: m, isAsked, size }: Writing, marked: { low: number; high: number }, own: number): Stretch[] {
  const from = lowOf(shape.bounds, other(m));
  const to = highOf(shape.bounds, other(m));
  // A mark takes in tabs and ears that the figure leaves out: then the line stands where the panel itself is that wide.
  const isTrue = isAsked || Math.abs(marked.high - marked.low - row.value) < STRAIGHT;
  return [...SHARES.map((f) => from + (to - from) * f), own].flatMap((at) => {
    const span = spanOf(shape.ring, m, at);
    if (!span) return [];
    const { low, high } = isTrue ? marked : span;
    if (span.low > low + size || span.high < high - size) return [];
    return isAsked || Math.abs(high - low - row.value) < STRAIGHT ? [{ low, high, at }] : [];
  });
}

const boxOf = ({ measures: m, size }: Writing, { low, high, at }: Stretch): Box => {
  const middle = pointAt(m, (low + high) / 2, at);
  return m === "x" ? boxAround(middle, high - low, size * 0.5) : boxAround(middle, size * 0.5, high - low);
};
const wordsAt = ({ measures: m, width, size }: Writing, at: Point): Box => (m === "x" ? boxAround(at, width + size * 0.6, size * 1.6) : boxAround(at, size * 1.6, width + size * 0.6));

/** In a gap of its line: in the middle, or off it where a name is in the way. */
function inLine(writing: Writing, line: Stretch, room: Room): Dimension | null {
  const { measures: m, size, width, shape } = writing;
  for (const share of [0.5, 0.36, 0.64, 0.24, 0.76]) {
    const textAt = pointAt(m, line.low + (line.high - line.low) * share, line.at);
    if (along(textAt, m) - width / 2 - size * 0.7 < line.low || along(textAt, m) + width / 2 + size * 0.7 > line.high) continue;
    const words = wordsAt(writing, textAt);
    if (isWithin(words, shape.bounds) && isFree(words, room.taken) && isFree(words, room.lines)) return written(writing, line, textAt, true, room);
  }
  return null;
}

/** Next to its line, or past one of its ends. */
function beside(writing: Writing, line: Stretch, room: Room): Dimension | null {
  const { measures: m, size, width } = writing;
  const middle = (line.low + line.high) / 2;
  const places: Point[] = [
    pointAt(m, middle, line.at + size * 1.1), pointAt(m, middle, line.at - size * 1.1),
    pointAt(m, line.high + width / 2 + size * 0.6, line.at), pointAt(m, line.low - width / 2 - size * 0.6, line.at),
  ];
  const textAt = places.find((at) => isFree(wordsAt(writing, at), room.taken) && isFree(wordsAt(writing, at), room.lines));
  return textAt ? written(writing, line, textAt, false, room) : null;
}

function written(writing: Writing, line: Stretch, textAt: Point, fits: boolean, room: Room): Dimension {
  const { row, measures: m, isAsked, text } = writing;
  room.taken.push(wordsAt(writing, textAt));
  room.lines.push(boxOf(writing, line));
  return {
    id: `ledger:${row.id}`, kind: isAsked ? "asked" : "panel", measures: m,
    from: pointAt(m, line.low, line.at), to: pointAt(m, line.high, line.at), away: pointAt(m, 0, 1), value: row.value, text, textAt, fits,
    row: row.id, parameter: row.parameter, extensions: [],
  };
}
