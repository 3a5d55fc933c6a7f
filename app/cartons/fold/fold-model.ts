// From the declared blank to what a pose needs. Panels keep their order: parents first.
import { flatten } from "../geometry/path";
import { convexPieces } from "../geometry/polygon";
import { CHORD_FOR_COLLISIONS } from "../geometry/tolerance";
import type { Blank } from "../blank/blank";
import type { FoldHinge, FoldModel, FoldPanel } from "../types";

export function foldModelOf(blank: Blank): FoldModel {
  const stepOf = new Map<string, number>();
  blank.steps.forEach((step, i) => step.panels.forEach((name) => stepOf.set(name, i)));
  const panels = blank.panels.map((p): FoldPanel => {
    const outline = { closed: true, vertices: p.outline };
    const holes = p.features.filter((f) => f.kind === "cut" && f.path.closed).map((f) => f.path);
    return {
      name: p.name, label: p.label, role: p.role, part: p.part, thickness: blank.caliper, outline, holes,
      pieces: convexPieces(flatten(outline, CHORD_FOR_COLLISIONS), holes.map((h) => flatten(h, CHORD_FOR_COLLISIONS))),
    };
  });
  const hinges: FoldHinge[] = [];
  for (const p of blank.panels) {
    if (!p.hinge) continue;
    const { parent, flat, angle, height, kind } = p.hinge;
    hinges.push({ parent: parent.index, child: p.index, flat, angle, height, kind, step: stepOf.get(p.name)! });
  }
  return {
    panels, hinges,
    parts: blank.parts.map((part) => {
      const root = blank.byName.get(part.root)!;
      const step = part.step === null ? -1 : blank.steps.findIndex((s) => s.id === part.step);
      return { name: part.name, label: part.label, root: root.index, flat: root.flat, step, turn: part.turn, shift: part.shift, lift: part.lift };
    }),
    steps: blank.steps, up: blank.up, front: blank.front,
  };
}
