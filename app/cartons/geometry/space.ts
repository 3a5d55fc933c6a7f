// Rigid motions of space as 3 × 4 matrices. Row-major: [r00 r01 r02 tx, r10 r11 r12 ty, r20 r21 r22 tz].
import type { Isometry } from "./isometry";

export type Mat = readonly [number, number, number, number, number, number, number, number, number, number, number, number];
export type Vec3 = readonly [number, number, number];

export const IDENTITY: Mat = [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0];

/** a after b: applies b first. */
export function multiply(a: Mat, b: Mat): Mat {
  return [
    a[0] * b[0] + a[1] * b[4] + a[2] * b[8], a[0] * b[1] + a[1] * b[5] + a[2] * b[9], a[0] * b[2] + a[1] * b[6] + a[2] * b[10],
    a[0] * b[3] + a[1] * b[7] + a[2] * b[11] + a[3],
    a[4] * b[0] + a[5] * b[4] + a[6] * b[8], a[4] * b[1] + a[5] * b[5] + a[6] * b[9], a[4] * b[2] + a[5] * b[6] + a[6] * b[10],
    a[4] * b[3] + a[5] * b[7] + a[6] * b[11] + a[7],
    a[8] * b[0] + a[9] * b[4] + a[10] * b[8], a[8] * b[1] + a[9] * b[5] + a[10] * b[9], a[8] * b[2] + a[9] * b[6] + a[10] * b[10],
    a[8] * b[3] + a[9] * b[7] + a[10] * b[11] + a[11],
  ];
}

export function transform(m: Mat, x: number, y: number, z: number): Vec3 {
  return [
    m[0] * x + m[1] * y + m[2] * z + m[3],
    m[4] * x + m[5] * y + m[6] * z + m[7],
    m[8] * x + m[9] * y + m[10] * z + m[11],
  ];
}

/** The inverse of a rigid motion (its rotation transposed). */
export function invert(m: Mat): Mat {
  return [
    m[0], m[4], m[8], -(m[0] * m[3] + m[4] * m[7] + m[8] * m[11]),
    m[1], m[5], m[9], -(m[1] * m[3] + m[5] * m[7] + m[9] * m[11]),
    m[2], m[6], m[10], -(m[2] * m[3] + m[6] * m[7] + m[10] * m[11]),
  ];
}

export const translation = (x: number, y: number, z: number): Mat => [1, 0, 0, x, 0, 1, 0, y, 0, 0, 1, z];

/** A plane isometry lifted into space, z unchanged. */
export const lifted = (i: Isometry): Mat => [i.c, -i.s, 0, i.x, i.s, i.c, 0, i.y, 0, 0, 1, 0];

/** Cosine and sine, exact at the quarter turns, so that a closed carton stands exactly square. */
export function exactCosSin(angle: number): { cos: number; sin: number } {
  const quarters = angle / (Math.PI / 2);
  if (Number.isInteger(quarters)) {
    const q = ((quarters % 4) + 4) % 4;
    return { cos: q === 0 ? 1 : q === 2 ? -1 : 0, sin: q === 1 ? 1 : q === 3 ? -1 : 0 };
  }
  return { cos: Math.cos(angle), sin: Math.sin(angle) };
}

/** Turn by `angle` radians about the line y = 0, z = height (along x). Positive lifts +y towards +z. */
export function turnAboutX(angle: number, height: number): Mat {
  const { cos, sin } = exactCosSin(angle);
  return [1, 0, 0, 0, 0, cos, -sin, height * sin, 0, sin, cos, height - height * cos];
}

export const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const subtract = (a: Vec3, b: Vec3): Vec3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];

/** World direction of the panel's +z, the inside face's normal. */
export const normalOf = (m: Mat): Vec3 => [m[2], m[6], m[10]];
