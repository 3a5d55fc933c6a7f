// The only importer of earcut.
import earcut from "earcut";
import type { Point } from "./outline";

/** Triangles as index triples, CCW. `holeStarts` are the indices where each hole's points begin. */
export function triangulate(points: readonly Point[], holeStarts: readonly number[]): [number, number, number][] {
  const flat: number[] = [];
  for (const p of points) flat.push(p.x, p.y);
  const indices = earcut(flat, holeStarts.length > 0 ? [...holeStarts] : undefined);
  const triangles: [number, number, number][] = [];
  for (let i = 0; i < indices.length; i += 3) {
    const [a, b, c] = [indices[i]!, indices[i + 1]!, indices[i + 2]!];
    const [p, q, r] = [points[a]!, points[b]!, points[c]!];
    const twice = (q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x);
    triangles.push(twice < 0 ? [a, c, b] : [a, b, c]);
  }
  return triangles;
}
