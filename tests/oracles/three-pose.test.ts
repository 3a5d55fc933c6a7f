// The fold, cross-checked with another library's matrices: every panel is hung in three's own scene graph (position, quaternion,
// pivot groups) and must stand where poseAt puts it. Source of the second method: three.js, an independent general library.
import { Group, Quaternion, Vector3 } from "three";
import { describe, expect, it } from "vitest";
import { findBoard } from "~/cartons/boards/catalogue";
import { buildCarton } from "~/cartons/carton";
import { listConstructions } from "~/cartons/constructions/registry";
import { poseAt } from "~/cartons/fold/pose";
import { transform } from "~/cartons/geometry/space";
import type { FoldModel } from "~/cartons/types";
import { briefOf } from "../support/arbitraries";

const X = new Vector3(1, 0, 0);
const Z = new Vector3(0, 0, 1);

/** Scene graph of a fold at `u`; one group a panel, in the fold's order. Parts that move as a whole are left where they are drawn. */
function sceneAt(fold: FoldModel, u: number): Group[] {
  const groups = fold.panels.map(() => new Group());
  for (const part of fold.parts) {
    const root = groups[part.root]!;
    root.position.set(part.flat.x, part.flat.y, 0);
    root.quaternion.setFromAxisAngle(Z, Math.atan2(part.flat.s, part.flat.c));
  }
  for (const hinge of fold.hinges) {
    const angle = hinge.angle * Math.min(1, Math.max(0, u - hinge.step));
    const height = Math.sign(hinge.angle) * hinge.height;
    const place = new Group();
    place.position.set(hinge.flat.x, hinge.flat.y, 0);
    place.quaternion.setFromAxisAngle(Z, Math.atan2(hinge.flat.s, hinge.flat.c));
    const pivot = new Group();
    pivot.position.set(0, 0, height);
    pivot.quaternion.copy(new Quaternion().setFromAxisAngle(X, angle));
    const child = groups[hinge.child]!;
    child.position.set(0, 0, -height);
    pivot.add(child);
    place.add(pivot);
    groups[hinge.parent]!.add(place);
  }
  for (const part of fold.parts) groups[part.root]!.updateMatrixWorld(true);
  return groups;
}

describe.each(listConstructions().map((c) => [c.id, c.sample] as const))("%s", (id, sample) => {
  const board = findBoard(sample.board)!;
  // Allowances that differ by direction put the hinges off mid-caliper.
  const uneven = { ...board, card: { ...board.card, a90: { alongGrain: 0.42 * board.caliper, acrossGrain: 0.61 * board.caliper } } };
  const result = buildCarton(briefOf(id, sample.size), uneven);
  if (!result.ok) throw new Error(JSON.stringify(result.refusals));
  const { fold } = result.carton;
  const moving = fold.parts.filter((p) => p.step >= 0).map((p) => p.step);
  const last = moving.length > 0 ? Math.min(...moving) : fold.steps.length;

  it("puts every corner where three puts it, to 1e-9 mm", () => {
    for (let u = 0; u <= last; u += 0.37) {
      const scene = sceneAt(fold, u);
      poseAt(fold, u).forEach((m, i) => {
        for (const v of fold.panels[i]!.outline.vertices) for (const z of [-fold.panels[i]!.thickness / 2, fold.panels[i]!.thickness / 2]) {
          const [x, y, w] = transform(m, v.x, v.y, z);
          const other = new Vector3(v.x, v.y, z).applyMatrix4(scene[i]!.matrixWorld);
          expect(Math.hypot(x - other.x, y - other.y, w - other.z), `${fold.panels[i]!.name} at ${u}`).toBeLessThan(1e-9);
        }
      });
    }
  });
});
