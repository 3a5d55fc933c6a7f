// Polygons of straight edges: convex pieces, clipping, area. CCW throughout.
import type { Point } from "./outline";
import { NO_AREA, SAME_POINT } from "./tolerance";
import { triangulate } from "./triangulate";

/** Signed area, mm²; positive CCW. */
export function polygonArea(points: readonly Point[]): number {
  let twice = 0;
  for (let i = 0, j = points.length - 1; i < points.length; j = i++) {
    twice += points[j]!.x * points[i]!.y - points[i]!.x * points[j]!.y;
  }
  return twice / 2;
}

const turn = (a: Point, b: Point, c: Point): number => (b.x - a.x) * (c.y - b.y) - (b.y - a.y) * (c.x - b.x);

export function isConvex(points: readonly Point[]): boolean {
  const n = points.length;
  for (let i = 0; i < n; i++) {
    if (turn(points[i]!, points[(i + 1) % n]!, points[(i + 2) % n]!) < -SAME_POINT) return false;
  }
  return true;
}

/** Indices of the corners at which a CCW ring turns right. */
export function hollowCorners(points: readonly Point[]): number[] {
  const n = points.length;
  const found: number[] = [];
  for (let i = 0; i < n; i++) if (turn(points[(i + n - 1) % n]!, points[i]!, points[(i + 1) % n]!) < -SAME_POINT) found.push(i);
  return found;
}

/** Leaves out repeated points. */
export function withoutRepeats(points: readonly Point[]): Point[] {
  const kept: Point[] = [];
  for (const p of points) {
    const last = kept[kept.length - 1];
    if (!last || Math.abs(last.x - p.x) > SAME_POINT || Math.abs(last.y - p.y) > SAME_POINT) kept.push(p);
  }
  const first = kept[0];
  const last = kept[kept.length - 1];
  if (kept.length > 1 && first && last && Math.abs(last.x - first.x) <= SAME_POINT && Math.abs(last.y - first.y) <= SAME_POINT) kept.pop();
  return kept;
}

/**
 * A polygon with holes as convex pieces that tile it. Without holes it is split along the edges at its hollow corners;
 * with holes: triangles, merged across shared edges while the union stays convex (Hertel and Mehlhorn, 1983: at most
 * four times the least number).
 */
export function convexPieces(outer: readonly Point[], holes: readonly (readonly Point[])[]): Point[][] {
  const ring = withoutRepeats(outer);
  if (holes.length === 0) {
    const split = splitAtHollows(ring, ring.length);
    if (split) return split;
  }
  const all: Point[] = [...ring];
  const starts: number[] = [];
  for (const hole of holes) {
    starts.push(all.length);
    all.push(...withoutRepeats(hole));
  }
  const pieces: (number[] | null)[] = triangulate(all, starts).map((t) => [...t]);
  mergeAcrossEdges(pieces, all);
  return pieces.filter((p): p is number[] => p !== null).map((p) => p.map((i) => all[i]!));
}

/** Cuts a ring at its first hollow corner by going straight on along the edge that enters it; null when a cut finds no far side. */
function splitAtHollows(ring: Point[], budget: number): Point[][] | null {
  const n = ring.length;
  let hollow = -1;
  for (let i = 0; i < n && hollow < 0; i++) if (turn(ring[(i + n - 1) % n]!, ring[i]!, ring[(i + 1) % n]!) < -SAME_POINT) hollow = i;
  if (hollow < 0) return [ring];
  if (budget <= 0) return null;
  const before = ring[(hollow + n - 1) % n]!;
  const corner = ring[hollow]!;
  const dx = corner.x - before.x;
  const dy = corner.y - before.y;
  let best = Infinity;
  let at = -1;
  for (let k = 1; k < n - 1; k++) {
    const a = ring[(hollow + k) % n]!;
    const b = ring[(hollow + k + 1) % n]!;
    const sa = dx * (a.y - corner.y) - dy * (a.x - corner.x);
    const sb = dx * (b.y - corner.y) - dy * (b.x - corner.x);
    // The far side crosses the line of the cut from its right to its left.
    if (sa > 0 || sb <= 0) continue;
    const f = sa / (sa - sb);
    const s = (a.x + (b.x - a.x) * f - corner.x) * dx + (a.y + (b.y - a.y) * f - corner.y) * dy;
    if (s > 0 && s < best) [best, at] = [s, k];
  }
  if (at < 0) return null;
  const a = ring[(hollow + at) % n]!;
  const b = ring[(hollow + at + 1) % n]!;
  const sa = dx * (a.y - corner.y) - dy * (a.x - corner.x);
  const sb = dx * (b.y - corner.y) - dy * (b.x - corner.x);
  const f = sa / (sa - sb);
  const hit = { x: a.x + (b.x - a.x) * f, y: a.y + (b.y - a.y) * f };
  const right: Point[] = [];
  for (let k = 0; k <= at; k++) right.push(ring[(hollow + k) % n]!);
  right.push(hit);
  const left: Point[] = [hit];
  for (let k = at + 1; k < n; k++) left.push(ring[(hollow + k) % n]!);
  const p = splitAtHollows(withoutRepeats(right), budget - 1);
  const q = splitAtHollows(withoutRepeats(left), budget - 1);
  return p && q ? [...p, ...q] : null;
}

function mergeAcrossEdges(pieces: (number[] | null)[], points: readonly Point[]): void {
  const owner = new Map<number, number>();
  const key = (a: number, b: number) => a * points.length + b;
  pieces.forEach((piece, i) => piece!.forEach((v, k) => owner.set(key(v, piece![(k + 1) % piece!.length]!), i)));
  for (const [edge, first] of [...owner]) {
    const a = Math.floor(edge / points.length);
    const b = edge % points.length;
    const i = owner.get(edge);
    const j = owner.get(key(b, a));
    if (i === undefined || j === undefined || i === j || (first !== i && pieces[i] === null)) continue;
    const merged = joinAt(pieces[i]!, pieces[j]!, a, b);
    if (!isConvex(merged.map((v) => points[v]!))) continue;
    owner.delete(edge);
    owner.delete(key(b, a));
    pieces[j] = null;
    pieces[i] = merged;
    merged.forEach((v, k) => owner.set(key(v, merged[(k + 1) % merged.length]!), i));
  }
}

/** Piece `p` has the edge a→b, piece `q` has b→a: the ring round both. */
function joinAt(p: readonly number[], q: readonly number[], a: number, b: number): number[] {
  const fromB = rotate(p, p.indexOf(b));
  const fromA = rotate(q, q.indexOf(a));
  return [...fromB, ...fromA.slice(1, -1)];
}

const rotate = (ring: readonly number[], by: number): number[] => [...ring.slice(by), ...ring.slice(0, by)];

/** The part of a convex polygon on the left of the line a→b moved inwards by `inset` mm; the polygon itself when all of it is. */
export function clipLeftOf(polygon: readonly Point[], a: Point, b: Point, inset: number): readonly Point[] {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const length = Math.sqrt(dx * dx + dy * dy);
  const nx = -dy / length;
  const ny = dx / length;
  const offset = nx * a.x + ny * a.y + inset;
  const n = polygon.length;
  let out = 0;
  for (let i = 0; i < n; i++) if (nx * polygon[i]!.x + ny * polygon[i]!.y < offset) out++;
  if (out === 0) return polygon;
  const kept: Point[] = [];
  if (out === n) return kept;
  for (let i = 0; i < n; i++) {
    const p = polygon[i]!;
    const q = polygon[i + 1 === n ? 0 : i + 1]!;
    const dp = nx * p.x + ny * p.y - offset;
    const dq = nx * q.x + ny * q.y - offset;
    if (dp >= 0) kept.push(p);
    if (dp >= 0 !== dq >= 0) {
      const f = dp / (dp - dq);
      kept.push({ x: p.x + (q.x - p.x) * f, y: p.y + (q.y - p.y) * f });
    }
  }
  return kept;
}

/** Intersection of two convex polygons, the second shrunk by `inset`. Empty when they do not meet. */
export function intersectConvex(subject: readonly Point[], clip: readonly Point[], inset = 0): readonly Point[] {
  let rest = subject;
  for (let i = 0; i < clip.length && rest.length > 0; i++) rest = clipLeftOf(rest, clip[i]!, clip[i + 1 === clip.length ? 0 : i + 1]!, inset);
  return rest;
}

export function isInside(point: Point, polygon: readonly Point[]): boolean {
  let inside = false;
  for (let i = 0, j = polygon.length - 1; i < polygon.length; j = i++) {
    const a = polygon[i]!;
    const b = polygon[j]!;
    if (a.y > point.y !== b.y > point.y && point.x < ((b.x - a.x) * (point.y - a.y)) / (b.y - a.y) + a.x) inside = !inside;
  }
  return inside;
}

/** What two sets of convex pieces share: its area, mm², and the pieces. */
export function overlapOf(a: readonly (readonly Point[])[], b: readonly (readonly Point[])[]): { area: number; pieces: (readonly Point[])[] } {
  let area = 0;
  const pieces: (readonly Point[])[] = [];
  for (const p of a) for (const q of b) {
    const both = intersectConvex(p, q);
    const size = both.length >= 3 ? polygonArea(both) : 0;
    if (size <= NO_AREA) continue;
    area += size;
    pieces.push(both);
  }
  return { area, pieces };
}

/** Least width of a convex polygon: between two parallel lines, one along an edge. */
export function leastWidth(points: readonly Point[]): number {
  let least = Infinity;
  points.forEach((a, i) => {
    const b = points[(i + 1) % points.length]!;
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    if (length < SAME_POINT) return;
    least = Math.min(least, Math.max(...points.map((p) => turn(a, b, p) / length)));
  });
  return least;
}
