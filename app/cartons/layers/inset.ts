// A panel's area drawn in from its edges: the safe area for text, the room for glue. Simple shapes are preferred to the largest.
import type { Path, Point } from "../geometry/outline";
import { boundsOf, flatten } from "../geometry/path";
import { clipLeftOf, hollowCorners, intersectConvex, polygonArea, withoutRepeats } from "../geometry/polygon";
import { offsetAreas } from "../geometry/offset";
import { CHORD_FOR_INSETS, SHORTEST_LINE } from "../geometry/tolerance";
import type { Panel } from "../blank/panel";

/** A panel's own area pulled in from all its edges and cut-outs, in its own frame. Empty when nothing is left. */
export function insetOf(panel: Panel, by: number): Path[] {
  const outline: Path = { closed: true, vertices: panel.outline };
  const holes = panel.features.filter((f) => f.kind === "cut" && f.path.closed).map((f) => boxAround(f.path));
  const points = withoutRepeats(flatten(outline, CHORD_FOR_INSETS));
  const quick = holes.length === 0 ? quickInset(points, by) : null;
  const inner = quick ?? convexWithin(points, holes.map((h) => h.vertices), by);
  if (inner) return inner.length < 3 ? [] : [{ closed: true, vertices: inner.map(({ x, y }) => ({ x, y, bulge: 0 })) }];
  return offsetAreas([outline, ...holes], -by);
}

/** mm. What stands out past an edge's line by less (a tab) is left out of the area; past that the edge is no bound of it. */
const LEFT_OUT = 3;
/** Of its own length: a short slant is no bound either. */
const LEFT_OUT_SHARE = 0.2;
/** Of what is left: behind a slot so much may be left out. */
const BEHIND_SLOT = 0.1;

/**
 * One convex area within a ring, clear of all its edges and cut-outs by `by`: without its tabs and what lies behind its slots.
 * Null when edges or cut-outs remain that it cannot leave out cheaply.
 */
function convexWithin(ring: readonly Point[], holes: readonly (readonly Point[])[], by: number): readonly Point[] | null {
  const n = ring.length;
  let rest: readonly Point[] = ring;
  for (let i = 0; i < n; i++) {
    const a = ring[i]!;
    const b = ring[(i + 1) % n]!;
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    const most = Math.min(LEFT_OUT, LEFT_OUT_SHARE * length);
    const isBound = ring.every((p) => (b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x) >= -most * length);
    if (isBound) rest = clipLeftOf(rest, a, b, by);
  }
  for (const hole of holes) {
    if (intersectConvex(rest, [...hole].reverse(), -by).length < 3) continue;
    const size = polygonArea(rest);
    const cuts = hole.map((a, i) => clipLeftOf(rest, a, hole[(i + 1) % hole.length]!, by)).filter((c) => c.length >= 3 && polygonArea(c) > size * (1 - BEHIND_SLOT));
    const [most] = cuts.sort((p, q) => polygonArea(q) - polygonArea(p));
    if (!most) return null;
    rest = most;
  }
  const isClear = ring.every((a, i) => intersectConvex(rest, thin(a, ring[(i + 1) % n]!), -by / 2).length < 3);
  return isClear ? rest : null;
}

/** An edge as a CCW area next to nothing wide, so that it can be clipped like one. */
function thin(a: Point, b: Point): Point[] {
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  const [nx, ny] = [(-(b.y - a.y) / length) * SHORTEST_LINE, ((b.x - a.x) / length) * SHORTEST_LINE];
  return [a, b, { x: b.x + nx, y: b.y + ny }, { x: a.x + nx, y: a.y + ny }];
}

/**
 * Exact for a convex ring. A ring with one hollow corner (a nick at its foot) is the union of what lies inside all edges
 * but the one before that corner and all but the one after it; the larger of the two stands for it. Null for others.
 */
function quickInset(ring: readonly Point[], by: number): readonly Point[] | null {
  const hollow = hollowCorners(ring);
  if (hollow.length === 0) return intersectConvex(ring, ring, by);
  if (hollow.length > 1) return null;
  const n = ring.length;
  const without = (edge: number): readonly Point[] => {
    let rest: readonly Point[] = ring;
    for (let i = 0; i < n && rest.length > 0; i++) if (i !== edge) rest = clipLeftOf(rest, ring[i]!, ring[(i + 1) % n]!, by);
    return rest;
  };
  const [p, q] = [without((hollow[0]! + n - 1) % n), without(hollow[0]!)];
  return polygonArea(p) > polygonArea(q) ? p : q;
}

/** A cut-out taken as the box around it, run CW so that it is taken out of the area. */
function boxAround(path: Path): Path {
  const { minX, minY, maxX, maxY } = boundsOf([path]);
  return { closed: true, vertices: [{ x: minX, y: minY, bulge: 0 }, { x: minX, y: maxY, bulge: 0 }, { x: maxX, y: maxY, bulge: 0 }, { x: maxX, y: minY, bulge: 0 }] };
}
