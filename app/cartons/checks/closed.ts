// The closed carton as every check sees it: plates in place and the box that was asked, as axes in space.
import type { Blank, Face, FaceOf } from "../blank/blank";
import { dot, normalOf, subtract, transform, type Mat, type Vec3 } from "../geometry/space";
import { closedPose } from "../fold/pose";
import type { Axis, FoldModel, Pose, Size } from "../types";
import { platesOf, type Plate } from "./solids";

export interface Plane { readonly at: Vec3; readonly normal: Vec3 }

export interface InsideAxis {
  /** From the low face into the box. */
  readonly direction: Vec3;
  /** Position of the low face along the direction. */
  readonly from: number;
}

export interface Closed {
  readonly blank: Blank;
  readonly fold: FoldModel;
  readonly pose: Pose;
  readonly plates: readonly Plate[];
  readonly axes: Readonly<Record<Axis, InsideAxis>>;
  readonly size: Size;
}

/** The plane of a panel's face, its normal pointing out of the board. */
export function facePlane(m: Mat, face: Face, thickness: number): Plane {
  const n = normalOf(m);
  const sign = face === "inside" ? 1 : -1;
  return { at: transform(m, 0, 0, (sign * thickness) / 2), normal: [n[0] * sign, n[1] * sign, n[2] * sign] };
}

export const planeOf = (closed: Pick<Closed, "blank" | "pose">, of: FaceOf): Plane =>
  facePlane(closed.pose[closed.blank.byName.get(of.panel)!.index]!, of.face, closed.blank.caliper);

export function closedOf(blank: Blank, fold: FoldModel): Closed {
  const pose = closedPose(fold);
  const axisOf = (axis: Axis): InsideAxis => {
    const low = blank.cavity.find((c) => c.axis === axis && c.own === null)?.low ?? (axis === "D" ? blank.openTop.find((o) => o.own === null)?.base : undefined);
    if (!low) throw new Error(`nothing bounds ${axis}`);
    const plane = planeOf({ blank, pose }, low);
    return { direction: plane.normal, from: dot(plane.at, plane.normal) };
  };
  return { blank, fold, pose, plates: platesOf(fold, pose), axes: { L: axisOf("L"), W: axisOf("W"), D: axisOf("D") }, size: blank.size };
}

/** How far a point lies along an inside axis, from its low face. */
export const along = (axis: InsideAxis, p: Vec3): number => dot(axis.direction, p) - axis.from;

export const isParallel = (a: Vec3, b: Vec3, sine: number): boolean => {
  const d = subtract(a, [b[0] * dot(a, b), b[1] * dot(a, b), b[2] * dot(a, b)]);
  return Math.hypot(d[0], d[1], d[2]) <= sine;
};
