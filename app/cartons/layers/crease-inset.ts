// For files only: a crease line stops short of the cut that it meets, so that rule does not stand on rule.
import type { Path, Point, Vertex } from "../geometry/outline";
import { eachEdge } from "../geometry/path";
import { SAME_POINT } from "../geometry/tolerance";
import type { Carton, LayerPath, Layers } from "../types";

function distanceTo(p: Point, a: Point, b: Point): number {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const f = Math.max(0, Math.min(1, ((p.x - a.x) * dx + (p.y - a.y) * dy) / (dx * dx + dy * dy)));
  return Math.hypot(p.x - a.x - f * dx, p.y - a.y - f * dy);
}

function touches(p: Point, paths: readonly Path[]): boolean {
  return paths.some((path) => {
    let meets = false;
    eachEdge(path, (a, b) => { meets ||= a.bulge === 0 ? distanceTo(p, a, b) < SAME_POINT : Math.hypot(p.x - a.x, p.y - a.y) < SAME_POINT; });
    return meets;
  });
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
