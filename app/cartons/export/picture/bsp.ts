// Painter's order by a binary space partition: polygons are split where they cross, so that the order is exact.
import type { Vec3 } from "../../geometry/space";
import type { EdgeKind, Face } from "./faces";

/** mm: nearer than this to a plane is on it. */
const ON_PLANE = 0.02;

interface Node {
  readonly normal: Vec3;
  readonly offset: number;
  readonly on: Face[];
  front: Node | null;
  back: Node | null;
}

const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];

/** The polygon's own plane; null when it has no area worth painting. */
function planeOf(face: Face): { normal: Vec3; offset: number } | null {
  const [nx, ny, nz] = face.points.reduce<[number, number, number]>((n, p, i) => {
    const q = face.points[(i + 1) % face.points.length]!;
    return [n[0] + (p[1] - q[1]) * (p[2] + q[2]), n[1] + (p[2] - q[2]) * (p[0] + q[0]), n[2] + (p[0] - q[0]) * (p[1] + q[1])];
  }, [0, 0, 0]);
  const size = Math.hypot(nx, ny, nz);
  if (size < ON_PLANE) return null;
  const normal: Vec3 = [nx / size, ny / size, nz / size];
  return { normal, offset: face.points.reduce((sum, p) => sum + dot(p, normal), 0) / face.points.length };
}

/** The parts of a face in front of and behind a plane; a cut makes an edge of no kind. */
function split(face: Face, distances: readonly number[]): { front: Face | null; back: Face | null } {
  const sides = { front: { points: [] as Vec3[], edges: [] as EdgeKind[] }, back: { points: [] as Vec3[], edges: [] as EdgeKind[] } };
  const n = face.points.length;
  for (let i = 0; i < n; i++) {
    const p = face.points[i]!;
    const q = face.points[(i + 1) % n]!;
    const dp = distances[i]!;
    const dq = distances[(i + 1) % n]!;
    const kind = face.edges[i]!;
    const crosses = (dp > ON_PLANE && dq < -ON_PLANE) || (dp < -ON_PLANE && dq > ON_PLANE);
    const add = (side: "front" | "back", point: Vec3, edge: EdgeKind) => { sides[side].points.push(point); sides[side].edges.push(edge); };
    const isFront = dp >= -ON_PLANE;
    const isBack = dp <= ON_PLANE;
    // A corner on the plane starts an edge of a side only when the edge goes on into that side.
    if (isFront) add("front", p, dp <= ON_PLANE && dq < -ON_PLANE ? null : kind);
    if (isBack) add("back", p, dp >= -ON_PLANE && dq > ON_PLANE ? null : kind);
    if (!crosses) continue;
    const f = dp / (dp - dq);
    const hit: Vec3 = [p[0] + (q[0] - p[0]) * f, p[1] + (q[1] - p[1]) * f, p[2] + (q[2] - p[2]) * f];
    add("front", hit, dp > 0 ? null : kind);
    add("back", hit, dp > 0 ? kind : null);
  }
  const made = ({ points, edges }: { points: Vec3[]; edges: EdgeKind[] }): Face | null => (points.length < 3 ? null : { ...face, points, edges });
  return { front: made(sides.front), back: made(sides.back) };
}

function build(faces: readonly Face[]): Node | null {
  let root: Node | null = null;
  for (const face of faces) root = insert(root, face);
  return root;
}

function insert(node: Node | null, face: Face): Node | null {
  if (!node) {
    const plane = planeOf(face);
    return plane ? { ...plane, on: [face], front: null, back: null } : null;
  }
  const distances = face.points.map((p) => dot(p, node.normal) - node.offset);
  const front = distances.some((d) => d > ON_PLANE);
  const back = distances.some((d) => d < -ON_PLANE);
  if (!front && !back) node.on.push(face);
  else if (!back) node.front = insert(node.front, face);
  else if (!front) node.back = insert(node.back, face);
  else {
    const parts = split(face, distances);
    if (parts.front) node.front = insert(node.front, parts.front);
    if (parts.back) node.back = insert(node.back, parts.back);
  }
  return node;
}

/** Furthest first, for a viewer infinitely far off in direction `towards`. */
export function paintOrder(faces: readonly Face[], towards: Vec3): Face[] {
  // Large faces make the better partitions.
  const order = [...faces].sort((a, b) => extent(b) - extent(a));
  const out: Face[] = [];
  const walk = (node: Node | null): void => {
    if (!node) return;
    const faces = dot(node.normal, towards) > 0;
    walk(faces ? node.back : node.front);
    out.push(...node.on);
    walk(faces ? node.front : node.back);
  };
  walk(build(order));
  return out;
}

const extent = (face: Face): number => {
  const [a] = face.points;
  return a ? Math.max(...face.points.map((p) => Math.hypot(p[0] - a[0], p[1] - a[1], p[2] - a[2]))) : 0;
};
