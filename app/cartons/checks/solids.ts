// Panels as plates of board in a pose, and the one test of whether two plates reach into each other.
import type { Point } from "../geometry/outline";
import { invert, multiply, transform, type Mat, type Vec3 } from "../geometry/space";
import { NO_AREA } from "../geometry/tolerance";
import type { FoldModel, Pose } from "../types";

interface Box3 { readonly low: Vec3; readonly high: Vec3 }

export interface Plate {
  readonly index: number;
  readonly name: string;
  readonly half: number;
  readonly matrix: Mat;
  readonly inverse: Mat;
  readonly pieces: readonly (readonly Point[])[];
  readonly pieceBoxes: readonly Box3[];
  readonly box: Box3;
}

function boxOf(piece: readonly Point[], half: number, m: Mat): Box3 {
  let lx = Infinity, ly = Infinity, lz = Infinity, hx = -Infinity, hy = -Infinity, hz = -Infinity;
  for (const p of piece) {
    const [x, y, z] = transform(m, p.x, p.y, 0);
    if (x < lx) lx = x;
    if (x > hx) hx = x;
    if (y < ly) ly = y;
    if (y > hy) hy = y;
    if (z < lz) lz = z;
    if (z > hz) hz = z;
  }
  const ex = Math.abs(m[2]) * half;
  const ey = Math.abs(m[6]) * half;
  const ez = Math.abs(m[10]) * half;
  return { low: [lx - ex, ly - ey, lz - ez], high: [hx + ex, hy + ey, hz + ez] };
}

export function platesOf(fold: FoldModel, pose: Pose): Plate[] {
  return fold.panels.map((p, index) => {
    const matrix = pose[index]!;
    const half = p.thickness / 2;
    const pieceBoxes = p.pieces.map((piece) => boxOf(piece, half, matrix));
    const box = pieceBoxes.reduce((a, b): Box3 => ({
      low: [Math.min(a.low[0], b.low[0]), Math.min(a.low[1], b.low[1]), Math.min(a.low[2], b.low[2])],
      high: [Math.max(a.high[0], b.high[0]), Math.max(a.high[1], b.high[1]), Math.max(a.high[2], b.high[2])],
    }));
    return { index, name: p.name, half, matrix, inverse: invert(matrix), pieces: p.pieces, pieceBoxes, box };
  });
}

const apart = (a: Box3, b: Box3, by: number): boolean =>
  a.low[0] + by >= b.high[0] || b.low[0] + by >= a.high[0] || a.low[1] + by >= b.high[1] || b.low[1] + by >= a.high[1] || a.low[2] + by >= b.high[2] || b.low[2] + by >= a.high[2];

/** Keeps the part of a polygon (x, y, z triples) where nx·x + ny·y + nz·z ≥ d. */
function clip(points: readonly number[], nx: number, ny: number, nz: number, d: number): number[] {
  const n = points.length;
  let any = false;
  let all = true;
  const side: number[] = [];
  for (let i = 0; i < n; i += 3) {
    const s = nx * points[i]! + ny * points[i + 1]! + nz * points[i + 2]! - d;
    side.push(s);
    if (s >= 0) any = true;
    else all = false;
  }
  if (all) return points as number[];
  const out: number[] = [];
  if (!any) return out;
  for (let i = 0, k = 0; i < n; i += 3, k++) {
    const j = i + 3 === n ? 0 : i + 3;
    const p = side[k]!;
    const q = side[j / 3]!;
    if (p >= 0) out.push(points[i]!, points[i + 1]!, points[i + 2]!);
    if (p >= 0 !== q >= 0) {
      const f = p / (p - q);
      out.push(points[i]! + (points[j]! - points[i]!) * f, points[i + 1]! + (points[j + 1]! - points[i + 1]!) * f, points[i + 2]! + (points[j + 2]! - points[i + 2]!) * f);
    }
  }
  return out;
}

/** What is left of a sheet within a plate's piece shrunk by `by` on all sides; in the plate's own frame, as x, y, z triples. */
function sheetWithin(sheet: readonly number[], piece: readonly Point[], half: number, by: number): number[] {
  let rest = clip(sheet, 0, 0, 1, -half + by);
  if (rest.length < 9) return [];
  rest = clip(rest, 0, 0, -1, -half + by);
  for (let i = 0; i < piece.length && rest.length >= 9; i++) {
    const a = piece[i]!;
    const b = piece[i + 1 === piece.length ? 0 : i + 1]!;
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    const nx = -(b.y - a.y) / length;
    const ny = (b.x - a.x) / length;
    rest = clip(rest, nx, ny, 0, nx * a.x + ny * a.y + by);
  }
  return rest.length >= 9 && spread(rest) > NO_AREA ? rest : [];
}

/** Twice the greatest triangle from the first corner, mm²: 0 for a polygon that is only a line. */
function spread(p: readonly number[]): number {
  let most = 0;
  for (let i = 3; i + 5 < p.length; i += 3) {
    const ax = p[i]! - p[0]!, ay = p[i + 1]! - p[1]!, az = p[i + 2]! - p[2]!;
    const bx = p[i + 3]! - p[0]!, by = p[i + 4]! - p[1]!, bz = p[i + 5]! - p[2]!;
    most = Math.max(most, Math.hypot(ay * bz - az * by, az * bx - ax * bz, ax * by - ay * bx));
  }
  return most;
}

/** Calls `hit` with each polygon (world) in which sheets of `b` lie deeper than `by` in `a`; stops when it returns true. */
function sheetsInPlate(a: Plate, b: Plate, by: number, hit: (world: Vec3[]) => boolean): boolean {
  const m = multiply(a.inverse, b.matrix);
  for (let j = 0; j < b.pieces.length; j++) {
    if (apart(a.box, b.pieceBoxes[j]!, by)) continue;
    for (const z of [0, -b.half, b.half]) {
      let sheet: number[] | null = null;
      for (let i = 0; i < a.pieces.length; i++) {
        if (apart(a.pieceBoxes[i]!, b.pieceBoxes[j]!, by)) continue;
        if (!sheet) {
          sheet = [];
          for (const p of b.pieces[j]!) {
            sheet.push(m[0] * p.x + m[1] * p.y + m[2] * z + m[3], m[4] * p.x + m[5] * p.y + m[6] * z + m[7], m[8] * p.x + m[9] * p.y + m[10] * z + m[11]);
          }
        }
        const left = sheetWithin(sheet, a.pieces[i]!, a.half, by);
        if (left.length === 0) continue;
        const world: Vec3[] = [];
        for (let k = 0; k < left.length; k += 3) world.push(transform(a.matrix, left[k]!, left[k + 1]!, left[k + 2]!));
        if (hit(world)) return true;
      }
    }
  }
  return false;
}

/**
 * Do two plates reach into each other by more than `by` mm, other than close to the points in `forgiven` (within `reach` mm)?
 * Blind to plates narrower than their own thickness.
 */
export function interpenetrate(a: Plate, b: Plate, by: number, forgiven: readonly Vec3[], reach: number): boolean {
  if (apart(a.box, b.box, by)) return false;
  const counts = (world: Vec3[]) => !world.every((p) => forgiven.some((f) => Math.hypot(p[0] - f[0], p[1] - f[1], p[2] - f[2]) <= reach));
  return sheetsInPlate(a, b, by, counts) || sheetsInPlate(b, a, by, counts);
}

/** How deep they reach into each other, mm, to a hundredth of the thickness; 0 when not deeper than `from`. */
export function depthOf(a: Plate, b: Plate, from: number, forgiven: readonly Vec3[], reach: number): number {
  if (!interpenetrate(a, b, from, forgiven, reach)) return 0;
  let low = from;
  let high = Math.min(a.half, b.half);
  for (let i = 0; i < 7; i++) {
    const middle = (low + high) / 2;
    if (interpenetrate(a, b, middle, forgiven, reach)) low = middle;
    else high = middle;
  }
  return low;
}
