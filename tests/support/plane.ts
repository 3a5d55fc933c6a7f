// Second methods for judging outlines: plain segment tests, written apart from the core's own geometry.
import type { Path, Point } from "~/cartons/geometry/outline";
import { flatten } from "~/cartons/geometry/path";

export interface Segment { readonly a: Point; readonly b: Point }

export function segmentsOf(path: Path, chord = 0.02): Segment[] {
  const points = flatten(path, chord);
  const last = path.closed ? points.length : points.length - 1;
  return Array.from({ length: last }, (_, i) => ({ a: points[i]!, b: points[(i + 1) % points.length]! }));
}

const side = (a: Point, b: Point, p: Point) => (b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x);

/** Do two segments cross in a point inside both? */
export function cross({ a, b }: Segment, { a: c, b: d }: Segment): boolean {
  const e = 1e-9;
  const s1 = side(a, b, c), s2 = side(a, b, d), s3 = side(c, d, a), s4 = side(c, d, b);
  return ((s1 > e && s2 < -e) || (s1 < -e && s2 > e)) && ((s3 > e && s4 < -e) || (s3 < -e && s4 > e));
}

/** Length over which two segments lie on one another, mm. */
export function overlap({ a, b }: Segment, { a: c, b: d }: Segment): number {
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  if (length < 1e-9) return 0;
  const ux = (b.x - a.x) / length, uy = (b.y - a.y) / length;
  const off = (p: Point) => Math.abs((p.x - a.x) * -uy + (p.y - a.y) * ux);
  if (off(c) > 1e-7 || off(d) > 1e-7) return 0;
  const s = (p: Point) => (p.x - a.x) * ux + (p.y - a.y) * uy;
  return Math.max(0, Math.min(length, Math.max(s(c), s(d))) - Math.max(0, Math.min(s(c), s(d))));
}

export function distanceTo(p: Point, { a, b }: Segment): number {
  const l2 = (b.x - a.x) ** 2 + (b.y - a.y) ** 2;
  const f = l2 === 0 ? 0 : Math.max(0, Math.min(1, ((p.x - a.x) * (b.x - a.x) + (p.y - a.y) * (b.y - a.y)) / l2));
  return Math.hypot(p.x - a.x - f * (b.x - a.x), p.y - a.y - f * (b.y - a.y));
}

/** Pairs of segments that could meet, by their boxes. */
export function* nearPairs(first: readonly Segment[], second: readonly Segment[], by = 0): Generator<[Segment, Segment, number, number]> {
  for (let i = 0; i < first.length; i++) for (let j = first === second ? i + 1 : 0; j < second.length; j++) {
    const p = first[i]!, q = second[j]!;
    if (Math.max(p.a.x, p.b.x) + by < Math.min(q.a.x, q.b.x) || Math.max(q.a.x, q.b.x) + by < Math.min(p.a.x, p.b.x)) continue;
    if (Math.max(p.a.y, p.b.y) + by < Math.min(q.a.y, q.b.y) || Math.max(q.a.y, q.b.y) + by < Math.min(p.a.y, p.b.y)) continue;
    yield [p, q, i, j];
  }
}
