// Outward offset of one ring and the ring less convex areas, by walking the outermost line. Quick for outlines of a few
// hundred points; where the walk does not come home the caller takes the general engine (offset.ts).
import type { Point } from "./outline";
import { polygonArea } from "./polygon";
import { SAME_POINT, SHORTEST_LINE } from "./tolerance";

interface Segment { readonly a: Point; readonly b: Point; readonly next: number }
interface Crossing { readonly at: number; readonly other: number; readonly otherAt: number; readonly fromLeft: boolean }

/** Corners that turn more sharply than this are cut off: 2 distances out (the cosine of half the turn). */
const SHARPEST = 0.5;
/** Sine of a turn below which two edges' lines are not cut with one another. */
const NEARLY_STRAIGHT = 0.01;

/**
 * Each edge's own distance: a hair over the one asked, and never the same for two edges in one line, so that lines which
 * would lie on one another cross instead.
 */
const distanceOf = (edge: number, by: number): number => by + (SHORTEST_LINE * ((edge * 7) % 11)) / 11;

/** A CCW ring grown by `by` mm, its holes filled; null when the walk fails. */
export function grownRing(ring: readonly Point[], by: number): Point[] | null {
  const n = ring.length;
  const raw: Point[] = [];
  let start = 0;
  let leftmost = Infinity;
  for (let i = 0; i < n; i++) {
    const p = ring[(i + n - 1) % n]!;
    const q = ring[i]!;
    const r = ring[(i + 1) % n]!;
    const before = Math.hypot(q.x - p.x, q.y - p.y);
    const after = Math.hypot(r.x - q.x, r.y - q.y);
    const [ax, ay] = [(q.y - p.y) / before, (p.x - q.x) / before];
    const [bx, by2] = [(r.y - q.y) / after, (q.x - r.x) / after];
    const da = distanceOf((i + n - 1) % n, by);
    const db = distanceOf(i, by);
    const turn = ax * by2 - ay * bx;
    const cosine = ax * bx + ay * by2;
    if (q.x < leftmost) [leftmost, start] = [q.x, raw.length];
    if (turn < -SAME_POINT) {
      // A hollow corner: the two edges cross; the loop behind the crossing is never walked.
      raw.push({ x: q.x + ax * da, y: q.y + ay * da }, { x: q.x + bx * db, y: q.y + by2 * db });
    } else if (cosine < 2 * SHARPEST * SHARPEST - 1) {
      // Cut off at two distances from the corner, square to the bisector.
      const [mx, my] = [ax - ay, ay + ax];
      const [kx, ky] = [bx + by2, by2 - bx];
      raw.push({ x: q.x + mx * da, y: q.y + my * da }, { x: q.x + kx * db, y: q.y + ky * db });
    } else if (turn > NEARLY_STRAIGHT) {
      // Where the two edges' lines, each moved out by its own distance, meet.
      const sine2 = turn * turn;
      const [ka, kb] = [(da - db * cosine) / sine2, (db - da * cosine) / sine2];
      raw.push({ x: q.x + ax * ka + bx * kb, y: q.y + ay * ka + by2 * kb });
    } else {
      raw.push({ x: q.x + ax * da, y: q.y + ay * da }, { x: q.x + bx * db, y: q.y + by2 * db });
    }
  }
  const grown = walk([raw], start, true);
  return grown && polygonArea(grown) > polygonArea(ring) ? grown : null;
}

/** A CCW ring less convex CCW areas that may stick out of it; null when the walk fails or finds nothing to start from. */
export function ringLess(ring: readonly Point[], areas: readonly (readonly Point[])[]): Point[] | null {
  const rings = [ring, ...areas.map((a) => [...a].reverse())];
  const start = ring.findIndex((p) => areas.every((a) => isClear(p, a)));
  return start < 0 ? null : walk(rings, start, false);
}

/** Outside a convex CCW area. */
const isClear = (p: Point, area: readonly Point[]): boolean =>
  area.some((a, i) => {
    const b = area[(i + 1) % area.length]!;
    return (b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x) < 0;
  });

/**
 * Follows a line from a corner that is surely on the result's boundary. `outermost`: at a crossing it leaves for the line that
 * goes off to the outside (union); otherwise for the line that goes off to the inside (difference).
 */
function walk(rings: readonly (readonly Point[])[], start: number, outermost: boolean): Point[] | null {
  const segments: Segment[] = [];
  for (const ring of rings) {
    const first = segments.length;
    ring.forEach((a, i) => segments.push({ a, b: ring[(i + 1) % ring.length]!, next: i + 1 === ring.length ? first : first + i + 1 }));
  }
  const crossings = crossingsOf(segments);
  const out: Point[] = [];
  let current = start;
  let from = 0;
  for (let guard = 0; guard < 4 * segments.length; guard++) {
    const s = segments[current]!;
    const found = crossings[current]?.find((c) => c.at > from + SAME_POINT && c.fromLeft === outermost);
    if (!found) {
      out.push(s.b);
      [current, from] = [s.next, 0];
      if (current === start) return out;
      continue;
    }
    out.push({ x: s.a.x + (s.b.x - s.a.x) * found.at, y: s.a.y + (s.b.y - s.a.y) * found.at });
    [current, from] = [found.other, found.otherAt];
  }
  return null;
}

/** For each segment the places where others cross it, in order. `fromLeft`: the other comes from its left side. */
function crossingsOf(segments: readonly Segment[]): (Crossing[] | undefined)[] {
  const found: (Crossing[] | undefined)[] = new Array(segments.length);
  const n = segments.length;
  const low = new Float64Array(n), high = new Float64Array(n), bottom = new Float64Array(n), top = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const { a, b } = segments[i]!;
    [low[i], high[i]] = a.x < b.x ? [a.x, b.x] : [b.x, a.x];
    [bottom[i], top[i]] = a.y < b.y ? [a.y, b.y] : [b.y, a.y];
  }
  // From left to right, so that each segment meets only those that begin before it ends.
  const order = Array.from({ length: n }, (_, i) => i).sort((i, j) => low[i]! - low[j]!);
  for (let k = 0; k < n; k++) for (let m = k + 1; m < n && low[order[m]!]! <= high[order[k]!]!; m++) {
    const i = order[k]!;
    const j = order[m]!;
    if (bottom[j]! > top[i]! || top[j]! < bottom[i]!) continue;
    const p = segments[i]!;
    const q = segments[j]!;
    const [px, py, qx, qy] = [p.b.x - p.a.x, p.b.y - p.a.y, q.b.x - q.a.x, q.b.y - q.a.y];
    const cross = px * qy - py * qx;
    if (cross === 0) continue;
    const at = ((q.a.x - p.a.x) * qy - (q.a.y - p.a.y) * qx) / cross;
    const otherAt = ((q.a.x - p.a.x) * py - (q.a.y - p.a.y) * px) / cross;
    if (at <= 0 || at >= 1 || otherAt <= 0 || otherAt >= 1) continue;
    (found[i] ??= []).push({ at, other: j, otherAt, fromLeft: cross < 0 });
    (found[j] ??= []).push({ at: otherAt, other: i, otherAt: at, fromLeft: cross > 0 });
  }
  for (const list of found) list?.sort((a, b) => a.at - b.at);
  return found;
}
