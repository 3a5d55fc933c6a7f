// Measuring and moving paths of lines and arcs. All in mm; nothing here rounds.
import type { Box, Path, Point, Vertex } from "./outline";

export interface Arc {
  readonly centre: Point;
  readonly radius: number;
  /** Radians, from centre to the edge's start; and the signed turn, + is CCW. */
  readonly from: number;
  readonly sweep: number;
}

/** The arc of an edge with bulge ≠ 0 from `a` to `b`. */
export function arcOf(a: Vertex, b: Point): Arc {
  const sweep = 4 * Math.atan(a.bulge);
  const chordX = b.x - a.x;
  const chordY = b.y - a.y;
  const k = (1 - a.bulge * a.bulge) / (4 * a.bulge);
  const centre = { x: (a.x + b.x) / 2 - k * chordY, y: (a.y + b.y) / 2 + k * chordX };
  return { centre, radius: Math.hypot(a.x - centre.x, a.y - centre.y), from: Math.atan2(a.y - centre.y, a.x - centre.x), sweep };
}

/** Calls `visit` for each edge of the path, the closing one included. */
export function eachEdge(path: Path, visit: (a: Vertex, b: Vertex, index: number) => void): void {
  const { vertices } = path;
  const last = path.closed ? vertices.length : vertices.length - 1;
  for (let i = 0; i < last; i++) visit(vertices[i]!, vertices[(i + 1) % vertices.length]!, i);
}

const edgeLength = (a: Vertex, b: Vertex): number => {
  const chord = Math.hypot(b.x - a.x, b.y - a.y);
  if (a.bulge === 0) return chord;
  const half = 2 * Math.atan(Math.abs(a.bulge));
  return (chord * half) / Math.sin(half);
};

export function lengthOf(path: Path): number {
  let total = 0;
  eachEdge(path, (a, b) => { total += edgeLength(a, b); });
  return total;
}

/** Signed area, mm²; positive when the closed path runs CCW. Arcs are exact. */
export function areaOf(path: Path): number {
  let twice = 0;
  eachEdge(path, (a, b) => {
    twice += a.x * b.y - b.x * a.y;
    if (a.bulge !== 0) {
      const arc = arcOf(a, b);
      twice += arc.radius * arc.radius * (arc.sweep - Math.sin(arc.sweep));
    }
  });
  return twice / 2;
}

/** Points along the path, arcs as chords that leave them by at most `tolerance`. The end of a closed path is not repeated. */
export function flatten(path: Path, tolerance: number): Point[] {
  const points: Point[] = [];
  const { vertices } = path;
  eachEdge(path, (a, b) => {
    points.push(a);
    if (a.bulge === 0) return;
    const arc = arcOf(a, b);
    const widest = arc.radius <= tolerance ? Math.PI / 2 : 2 * Math.acos(1 - tolerance / arc.radius);
    const steps = Math.ceil(Math.abs(arc.sweep) / widest);
    for (let i = 1; i < steps; i++) {
      const angle = arc.from + (arc.sweep * i) / steps;
      points.push({ x: arc.centre.x + arc.radius * Math.cos(angle), y: arc.centre.y + arc.radius * Math.sin(angle) });
    }
  });
  if (!path.closed && vertices.length > 0) points.push(vertices[vertices.length - 1]!);
  return points;
}

const QUARTERS: readonly Point[] = [{ x: 1, y: 0 }, { x: 0, y: 1 }, { x: -1, y: 0 }, { x: 0, y: -1 }];

/** Exact extents; an arc counts where it really reaches. */
export function boundsOf(paths: readonly Path[]): Box {
  let minX = Infinity, minY = Infinity, maxX = -Infinity, maxY = -Infinity;
  const take = (x: number, y: number) => {
    if (x < minX) minX = x;
    if (x > maxX) maxX = x;
    if (y < minY) minY = y;
    if (y > maxY) maxY = y;
  };
  for (const path of paths) {
    for (const v of path.vertices) take(v.x, v.y);
    eachEdge(path, (a, b) => {
      if (a.bulge === 0) return;
      const arc = arcOf(a, b);
      QUARTERS.forEach((q, k) => {
        const start = arc.sweep > 0 ? arc.from : arc.from + arc.sweep;
        const turn = ((((k * Math.PI) / 2 - start) % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);
        if (turn <= Math.abs(arc.sweep)) take(arc.centre.x + arc.radius * q.x, arc.centre.y + arc.radius * q.y);
      });
    });
  }
  return { minX, minY, maxX, maxY };
}

/** The same path walked the other way. */
export function reversed(path: Path): Path {
  const n = path.vertices.length;
  const vertices: Vertex[] = [];
  for (let i = n - 1; i >= 0; i--) {
    const v = path.vertices[i]!;
    const before = path.vertices[(i - 1 + n) % n]!;
    vertices.push({ x: v.x, y: v.y, bulge: i === 0 && !path.closed ? 0 : -before.bulge });
  }
  return { closed: path.closed, vertices };
}

/** Seen from the other side: x → −x. The walking direction turns over with it. */
export function mirrored(path: Path): Path {
  return { closed: path.closed, vertices: path.vertices.map((v) => ({ x: -v.x, y: v.y, bulge: -v.bulge })) };
}

export function shifted(path: Path, dx: number, dy: number): Path {
  return { closed: path.closed, vertices: path.vertices.map((v) => ({ x: v.x + dx, y: v.y + dy, bulge: v.bulge })) };
}

/** SVG path data with `number` as the writer's rounding. Pass a `flipY` height to turn y downwards: y → flipY − y. */
export function pathData(path: Path, number: (value: number) => string, flipY: number | null = null): string {
  const y = (value: number) => number(flipY === null ? value : flipY - value);
  const first = path.vertices[0];
  if (!first) return "";
  let text = `M${number(first.x)} ${y(first.y)}`;
  eachEdge(path, (a, b, i) => {
    if (a.bulge === 0) {
      // Does the closing edge only return to the start? "Z" draws it.
      if (!(path.closed && i === path.vertices.length - 1)) text += `L${number(b.x)} ${y(b.y)}`;
      return;
    }
    const { radius, sweep } = arcOf(a, b);
    const large = Math.abs(sweep) > Math.PI ? 1 : 0;
    const positive = flipY === null ? sweep > 0 : sweep < 0;
    text += `A${number(radius)} ${number(radius)} 0 ${large} ${positive ? 1 : 0} ${number(b.x)} ${y(b.y)}`;
  });
  return path.closed ? `${text}Z` : text;
}
