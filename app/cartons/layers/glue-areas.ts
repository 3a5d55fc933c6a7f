// Where glue goes: free of ink and varnish. Drawn on the flap whose face takes it.
import { applyToPath } from "../geometry/isometry";
import type { Path, Point } from "../geometry/outline";
import { boundsOf, flatten } from "../geometry/path";
import { clipLeftOf, hollowCorners, intersectConvex, polygonArea, withoutRepeats } from "../geometry/polygon";
import { offsetAreas } from "../geometry/offset";
import { CHORD_FOR_AREAS } from "../geometry/tolerance";
import type { Blank } from "../blank/blank";
import type { Panel } from "../blank/panel";
import type { LayerPath } from "../types";

/** A panel's own area pulled in from all its edges and cut-outs, in its own frame. Empty when nothing is left. */
export function insetOf(panel: Panel, by: number): Path[] {
  const outline: Path = { closed: true, vertices: panel.outline };
  const holes = panel.features.filter((f) => f.kind === "cut" && f.path.closed).map((f) => boxAround(f.path));
  const points = withoutRepeats(flatten(outline, CHORD_FOR_AREAS));
  const quick = holes.length === 0 ? quickInset(points, by) : null;
  if (quick) return quick.length < 3 ? [] : [{ closed: true, vertices: quick.map(({ x, y }) => ({ x, y, bulge: 0 })) }];
  return offsetAreas([outline, ...holes], -by);
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

export function glueAreas(blank: Blank, margin: number): LayerPath[] {
  const areas: LayerPath[] = [];
  for (const mate of blank.mates) {
    if (mate.kind !== "glued") continue;
    const flap = blank.byName.get(mate.a.panel)!;
    insetOf(flap, margin).forEach((path, i) => {
      areas.push({ id: `glue:${flap.name}:${i + 1}`, role: "glue", path: applyToPath(flap.flat, path), panels: [flap.name, mate.b.panel] });
    });
  }
  return areas;
}
