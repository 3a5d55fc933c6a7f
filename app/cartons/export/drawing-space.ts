// Plane questions that a drawing asks: where does a panel reach, what lies in the way, is there room for words.
import type { Box, Path, Point } from "../geometry/outline";
import { flatten, reversed } from "../geometry/path";
import type { Carton, FlatPanel } from "../types";
import { seenBox, seenPath, seenPoint, type Side } from "./sheet-view";

/** Direction in which a dimension measures: x across the sheet, y up it. */
export type Measures = "x" | "y";

export interface Shape {
  readonly panel: FlatPanel;
  readonly outline: Path;
  readonly ring: readonly Point[];
  readonly holes: readonly Path[];
  readonly bounds: Box;
  readonly labelAt: Point;
}

/** Chords stay this close to an arc, mm: finer than any line on the sheet is wide. */
const CHORD = 0.05;

export const shapesSeen = (carton: Carton, side: Side): Shape[] =>
  carton.panels.map((panel) => {
    // Turned over, a path runs clockwise: walked backwards it has its inside on the left again.
    const outline = side === "inside" ? panel.outline : reversed(seenPath(panel.outline, side));
    return {
      panel, outline, ring: flatten(outline, CHORD),
      holes: panel.holes.map((h) => seenPath(h, side)), bounds: seenBox(panel.bounds, side), labelAt: seenPoint(panel.labelAt, side),
    };
  });

export const along = (p: Point, m: Measures): number => (m === "x" ? p.x : p.y);
export const across = (p: Point, m: Measures): number => (m === "x" ? p.y : p.x);
export const pointAt = (m: Measures, alongValue: number, acrossValue: number): Point => (m === "x" ? { x: alongValue, y: acrossValue } : { x: acrossValue, y: alongValue });
export const lowOf = (b: Box, m: Measures): number => (m === "x" ? b.minX : b.minY);
export const highOf = (b: Box, m: Measures): number => (m === "x" ? b.maxX : b.maxY);
export const other = (m: Measures): Measures => (m === "x" ? "y" : "x");
export const unite = (boxes: readonly Box[]): Box => ({
  minX: Math.min(...boxes.map((b) => b.minX)), minY: Math.min(...boxes.map((b) => b.minY)),
  maxX: Math.max(...boxes.map((b) => b.maxX)), maxY: Math.max(...boxes.map((b) => b.maxY)),
});

export interface Span {
  readonly low: number;
  readonly high: number;
  /** The edge there stands square to the line: a figure that ends on it means something. */
  readonly isLowSquare: boolean;
  readonly isHighSquare: boolean;
}

/** Sine of the lean up to which an edge counts as square: a quarter of a degree. */
const SQUARE = 0.0044;

/** Where a line along `m` at the given height enters and leaves a ring; null when it misses. */
export function spanOf(ring: readonly Point[], m: Measures, at: number): Span | null {
  let low = Infinity;
  let high = -Infinity;
  let isLowSquare = false;
  let isHighSquare = false;
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    const p = ring[j]!;
    const q = ring[i]!;
    const dp = across(p, m) - at;
    const dq = across(q, m) - at;
    if (dp > 0 === dq > 0) continue;
    const value = along(p, m) + ((along(q, m) - along(p, m)) * dp) / (dp - dq);
    const isSquare = Math.abs(along(q, m) - along(p, m)) <= SQUARE * Math.abs(across(q, m) - across(p, m));
    if (value < low) [low, isLowSquare] = [value, isSquare];
    if (value > high) [high, isHighSquare] = [value, isSquare];
  }
  return low < high ? { low, high, isLowSquare, isHighSquare } : null;
}

/** How far a ring reaches across `m` inside the strip at ± half: lowest and highest; null when it is not in the strip. */
export function reachIn(ring: readonly Point[], m: Measures, at: number, half: number): { readonly low: number; readonly high: number } | null {
  let low = Infinity;
  let high = -Infinity;
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    const p = ring[j]!;
    const q = ring[i]!;
    const a = along(p, m) - at;
    const b = along(q, m) - at;
    if ((a < -half && b < -half) || (a > half && b > half)) continue;
    for (const f of [0, 1, (-half - a) / (b - a), (half - a) / (b - a)]) {
      if (!(f >= 0 && f <= 1)) continue;
      const inStrip = a + (b - a) * f;
      if (inStrip < -half - half / 100 || inStrip > half + half / 100) continue;
      const value = across(p, m) + (across(q, m) - across(p, m)) * f;
      if (value < low) low = value;
      if (value > high) high = value;
    }
  }
  return low <= high ? { low, high } : null;
}

export const boxAround = (centre: Point, width: number, height: number): Box => ({
  minX: centre.x - width / 2, maxX: centre.x + width / 2, minY: centre.y - height / 2, maxY: centre.y + height / 2,
});
export const overlap = (a: Box, b: Box): boolean => a.minX < b.maxX && b.minX < a.maxX && a.minY < b.maxY && b.minY < a.maxY;
export const isWithin = (inner: Box, outer: Box): boolean => inner.minX >= outer.minX && inner.maxX <= outer.maxX && inner.minY >= outer.minY && inner.maxY <= outer.maxY;
export const isFree = (box: Box, taken: readonly Box[]): boolean => !taken.some((t) => overlap(t, box));

/** Width of figures in Lato: its digits are 0.58 em, the point and the spaces narrower. */
export const figureWidth = (text: string, size: number): number => text.length * 0.56 * size;
/** Width of bold capitals spaced by 0.12 em: measured on Lato, a name of several letters takes 0.75 em a letter or less. */
export const capitalsWidth = (text: string, size: number): number => text.length * 0.75 * size;

/** All four corners of the box inside the ring, and no hole under it. */
export function holdsBox(shape: Shape, box: Box): boolean {
  const rows = [box.minY, (box.minY + box.maxY) / 2, box.maxY];
  return rows.every((y) => {
    const span = spanOf(shape.ring, "x", y);
    return span !== null && span.low <= box.minX && span.high >= box.maxX;
  });
}
