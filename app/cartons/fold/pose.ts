// The one pose function: preview, fold check, pictures and motion all read it, so what is shown is what is checked.
import { lifted, multiply, translation, turnAboutX, type Mat } from "../geometry/space";
import type { FoldModel, FoldPart, Pose } from "../types";

/** How far a step has gone at `u`: 0 before it, 1 after it. `u` runs from 0 (flat) to the number of steps (closed). */
export const progressOf = (step: number, u: number): number => Math.min(1, Math.max(0, u - step));

/** Within one step, as a fraction of its way: raise and turn, carry across, set down. */
const RAISED = 0.4;
const CARRIED = 0.75;
const phase = (p: number, from: number, to: number): number => Math.min(1, Math.max(0, (p - from) / (to - from)));

function partMatrix(part: FoldPart, u: number): Mat {
  const home = lifted(part.flat);
  const p = part.step < 0 ? 0 : progressOf(part.step, u);
  if (p === 0) return home;
  const up = phase(p, 0, RAISED);
  const across = phase(p, RAISED, CARRIED);
  const down = phase(p, CARRIED, 1);
  const [x, y, z] = part.shift;
  const height = part.lift * up + (z - part.lift) * down;
  return multiply(translation(x * across, y * across, height), multiply(home, turnAboutX(part.turn * up, 0)));
}

/** Where each panel stands at `u`; matrices take the panel's own frame to the world, mm. Source of the hinge: a crease turns about a line at its height above mid-caliper. */
export function poseAt(fold: FoldModel, u: number): Pose {
  const pose: Mat[] = new Array(fold.panels.length);
  for (const part of fold.parts) pose[part.root] = partMatrix(part, u);
  for (const h of fold.hinges) {
    const angle = h.angle * progressOf(h.step, u);
    pose[h.child] = multiply(pose[h.parent]!, multiply(lifted(h.flat), turnAboutX(angle, h.angle < 0 ? -h.height : h.height)));
  }
  return pose;
}

export const closedPose = (fold: FoldModel): Pose => poseAt(fold, fold.steps.length);
