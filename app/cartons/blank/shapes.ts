// Outlines of panels in their own frame: base edge on y = 0, body in y > 0, CCW. Sizes come in; none are decided here.
import type { Vertex } from "../geometry/outline";
import { SAME_POINT } from "../geometry/tolerance";

/** A corner with the radius it is to be rounded to; bulge 0 unless the edge that starts here is an arc. */
export interface Corner {
  readonly x: number;
  readonly y: number;
  readonly r?: number;
  readonly bulge?: number;
}

export const rectangle = (x0: number, x1: number, height: number): Vertex[] => rounded([{ x: x0, y: 0 }, { x: x1, y: 0 }, { x: x1, y: height }, { x: x0, y: height }]);

/** Rounds the corners that ask for it, each as far as its two edges allow without meeting the neighbour's rounding. */
export function rounded(corners: readonly Corner[]): Vertex[] {
  const n = corners.length;
  const at = (i: number) => corners[(i + n) % n]!;
  const lengths = corners.map((c, i) => Math.hypot(at(i + 1).x - c.x, at(i + 1).y - c.y));
  const turns = corners.map((c, i) => {
    const a = Math.atan2(c.y - at(i - 1).y, c.x - at(i - 1).x);
    const b = Math.atan2(at(i + 1).y - c.y, at(i + 1).x - c.x);
    let turn = b - a;
    if (turn > Math.PI) turn -= 2 * Math.PI;
    if (turn <= -Math.PI) turn += 2 * Math.PI;
    return turn;
  });
  const wanted = corners.map((c, i) => (c.r ?? 0) * Math.abs(Math.tan(turns[i]! / 2)));
  const shared = (i: number) => {
    const sum = wanted[i]! + wanted[(i + 1) % n]!;
    return sum > lengths[i]! ? lengths[i]! / sum : 1;
  };
  const cut = wanted.map((w, i) => w * Math.min(shared(i), shared((i - 1 + n) % n)));
  const out: Vertex[] = [];
  corners.forEach((c, i) => {
    const d = cut[i]!;
    if (d < SAME_POINT) {
      out.push({ x: c.x, y: c.y, bulge: c.bulge ?? 0 });
      return;
    }
    const back = lengths[(i - 1 + n) % n]!;
    const forth = lengths[i]!;
    out.push(
      { x: c.x + ((at(i - 1).x - c.x) / back) * d, y: c.y + ((at(i - 1).y - c.y) / back) * d, bulge: Math.tan(turns[i]! / 4) },
      { x: c.x + ((at(i + 1).x - c.x) / forth) * d, y: c.y + ((at(i + 1).y - c.y) / forth) * d, bulge: 0 },
    );
  });
  return withoutDoubles(out);
}

/** Two roundings may meet in one point: keep the arc that starts there. */
function withoutDoubles(vertices: readonly Vertex[]): Vertex[] {
  return vertices.filter((v, i) => {
    const next = vertices[(i + 1) % vertices.length]!;
    return Math.hypot(next.x - v.x, next.y - v.y) > SAME_POINT;
  });
}

/** Left and right exchanged: x → −x, still CCW and still with its base edge on y = 0. */
export function flipped(outline: readonly Vertex[]): Vertex[] {
  const n = outline.length;
  return outline.map((_, i) => {
    const v = outline[n - 1 - i]!;
    const before = outline[(n - 2 - i + n) % n]!;
    // Mirroring turns each arc over and walking backwards turns it back.
    return { x: -v.x === 0 ? 0 : -v.x, y: v.y, bulge: before.bulge };
  });
}

/** Moves an outline along its base edge. */
export const moved = (outline: readonly Vertex[], dx: number): Vertex[] => outline.map((v) => ({ ...v, x: v.x + dx }));
