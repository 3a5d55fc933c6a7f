// Plane isometries without reflection: turn by (c, s), then shift by (x, y).
import type { Path, Point, Vertex } from "./outline";

export interface Isometry {
  readonly c: number;
  readonly s: number;
  readonly x: number;
  readonly y: number;
}

export const IDENTITY: Isometry = { c: 1, s: 0, x: 0, y: 0 };

export const apply = (i: Isometry, p: Point): Point => ({ x: i.c * p.x - i.s * p.y + i.x, y: i.s * p.x + i.c * p.y + i.y });

/** a after b: applies b first. */
export function compose(a: Isometry, b: Isometry): Isometry {
  return {
    c: a.c * b.c - a.s * b.s,
    s: a.s * b.c + a.c * b.s,
    x: a.c * b.x - a.s * b.y + a.x,
    y: a.s * b.x + a.c * b.y + a.y,
  };
}

export function applyToPath(i: Isometry, path: Path): Path {
  const vertices: Vertex[] = new Array(path.vertices.length);
  for (let k = 0; k < vertices.length; k++) {
    const v = path.vertices[k]!;
    vertices[k] = { x: i.c * v.x - i.s * v.y + i.x, y: i.s * v.x + i.c * v.y + i.y, bulge: v.bulge };
  }
  return { closed: path.closed, vertices };
}
