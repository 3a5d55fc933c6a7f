// For files only: a crease line stops short of the cut that it meets, so that rule does not stand on rule.
import type { Path, Point, Vertex } from "../geometry/outline";
import { SAME_POINT } from "../geometry/tolerance";
import type { Carton, LayerPath, Layers } from "../types";

function distanceTo(p: Point, a: Point, b: Point): number {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const f = Math.max(0, Math.min(1, ((p.x - a.x) * dx + (p.y - a.y) * dy) / (dx * dx + dy * dy)));
  return Math.hypot(p.x - a.x - f * dx, p.y - a.y - f * dy);
}

/** Does the point lie on one of the paths? Most edges are told apart by their boxes alone: this runs for each end of each crease. */
function touches(p: Point, paths: readonly Path[]): boolean {
  for (const { closed, vertices } of paths) {
    const edges = closed ? vertices.length : vertices.length - 1;
    for (let i = 0; i < edges; i++) {
      const a = vertices[i]!;
      if (Math.abs(p.x - a.x) < SAME_POINT && Math.abs(p.y - a.y) < SAME_POINT) return true;
      if (a.bulge !== 0) continue;
      const b = vertices[i + 1 === vertices.length ? 0 : i + 1]!;
      if ((p.x < a.x - SAME_POINT && p.x < b.x - SAME_POINT) || (p.x > a.x + SAME_POINT && p.x > b.x + SAME_POINT)) continue;
      if ((p.y < a.y - SAME_POINT && p.y < b.y - SAME_POINT) || (p.y > a.y + SAME_POINT && p.y > b.y + SAME_POINT)) continue;
      if (distanceTo(p, a, b) < SAME_POINT) return true;
    }
    const last = vertices[vertices.length - 1];
    if (!closed && last && Math.abs(p.x - last.x) < SAME_POINT && Math.abs(p.y - last.y) < SAME_POINT) return true;
  }
  return false;
}

/** The carton's layers as they go to a cutter: creases pulled back by the options `creaseInset` and `creaseInsetInner`, mm. */
export function layersForCutting(carton: Carton): Layers {
  const outer = Number(carton.parameters["creaseInset"] ?? 0);
  const inner = Number(carton.parameters["creaseInsetInner"] ?? 0);
  if (outer === 0 && inner === 0) return carton.layers;
  const outlines = carton.layers.cut.filter((c) => c.role === "outline").map((c) => c.path);
  const inside = carton.layers.cut.filter((c) => c.role !== "outline").map((c) => c.path);
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
