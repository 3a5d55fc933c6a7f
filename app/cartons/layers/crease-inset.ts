// For files only: a crease line stops short of the cut that it meets, so that rule does not stand on rule.
import type { Path, Point, Vertex } from "../geometry/outline";
import { eachEdge } from "../geometry/path";
import { SAME_POINT } from "../geometry/tolerance";
import type { Carton, LayerPath, Layers } from "../types";

function distanceTo(x: number, y: number, ax: number, ay: number, bx: number, by: number): number {
  const dx = bx - ax;
  const dy = by - ay;
  const squared = dx * dx + dy * dy;
  const f = squared === 0 ? 0 : Math.max(0, Math.min(1, ((x - ax) * dx + (y - ay) * dy) / squared));
  return Math.hypot(x - ax - f * dx, y - ay - f * dy);
}

/** Ends of all edges, four figures an edge: this is looked through for each end of each crease. An arc counts by its ends alone. */
function edgesOf(paths: readonly Path[]): Float64Array {
  const figures: number[] = [];
  for (const path of paths) {
    eachEdge(path, (a, b) => {
      if (a.bulge === 0) figures.push(a.x, a.y, b.x, b.y);
      else figures.push(a.x, a.y, a.x, a.y, b.x, b.y, b.x, b.y);
    });
  }
  return Float64Array.from(figures);
}

/** Does the point lie on one of the edges? Most are told apart by their boxes alone. */
function touches(p: Point, edges: Float64Array): boolean {
  const { x, y } = p;
  for (let i = 0; i < edges.length; i += 4) {
    const ax = edges[i]!;
    const bx = edges[i + 2]!;
    if ((x < ax - SAME_POINT && x < bx - SAME_POINT) || (x > ax + SAME_POINT && x > bx + SAME_POINT)) continue;
    const ay = edges[i + 1]!;
    const by = edges[i + 3]!;
    if ((y < ay - SAME_POINT && y < by - SAME_POINT) || (y > ay + SAME_POINT && y > by + SAME_POINT)) continue;
    if (distanceTo(x, y, ax, ay, bx, by) < SAME_POINT) return true;
  }
  return false;
}

/** The carton's layers as they go to a cutter: creases pulled back by the options `creaseInset` and `creaseInsetInner`, mm. */
export function layersForCutting(carton: Carton): Layers {
  const outer = Number(carton.parameters["creaseInset"] ?? 0);
  const inner = Number(carton.parameters["creaseInsetInner"] ?? 0);
  if (outer === 0 && inner === 0) return carton.layers;
  const outlines = edgesOf(carton.layers.cut.filter((c) => c.role === "outline").map((c) => c.path));
  const inside = edgesOf(carton.layers.cut.filter((c) => c.role !== "outline").map((c) => c.path));
  const pull = (p: LayerPath): LayerPath => {
    const [a, b] = p.path.vertices;
    if (p.role !== "crease" || !a || !b) return p;
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    const back = (end: Point) => (touches(end, inside) ? inner : touches(end, outlines) ? outer : 0);
    const from = back(a);
    const to = back(b);
    // Would nothing be left of it? Then the crease is drawn whole: a missing crease is worse than a blunt rule.
    if (from + to >= length / 2) return p;
    const at = (s: number): Vertex => ({ x: a.x + ((b.x - a.x) * s) / length, y: a.y + ((b.y - a.y) * s) / length, bulge: 0 });
    return { ...p, path: { closed: false, vertices: [at(from), at(length - to)] } };
  };
  return { ...carton.layers, crease: carton.layers.crease.map(pull), reverseCrease: carton.layers.reverseCrease.map(pull) };
}
