// What must hold of every carton, as functions that return what is wrong: an empty list means sound. Numbers are those of
// the design's list of invariants (geometry notes, section 6).
import type { Carton } from "~/cartons/types";
import type { Path } from "~/cartons/geometry/outline";
import { areaOf, lengthOf } from "~/cartons/geometry/path";
import { isInside } from "~/cartons/geometry/polygon";
import { transform } from "~/cartons/geometry/space";
import { flatten } from "~/cartons/geometry/path";
import { SHORTEST_LINE } from "~/cartons/geometry/tolerance";
import { poseAt } from "~/cartons/fold/pose";
import { cross, distanceTo, nearPairs, overlap, segmentsOf, type Segment } from "../support/plane";

type Invariant = (carton: Carton) => string[];

const byRole = (carton: Carton, role: string): Path[] => carton.layers.cut.filter((c) => c.role === role).map((c) => c.path);
const creasesOf = (carton: Carton): Path[] => [...carton.layers.crease, ...carton.layers.reverseCrease].filter((c) => c.role === "crease").map((c) => c.path);
const near = (a: number, b: number, by: number): boolean => Math.abs(a - b) <= by;

/** 1, 2: one closed simple outline a piece, run CCW, no cut twice on one line. */
export const outlineIsSimple: Invariant = (carton) => {
  const wrong: string[] = [];
  const outlines = byRole(carton, "outline");
  if (outlines.length !== carton.construction.pieces) wrong.push(`${outlines.length} outlines for ${carton.construction.pieces} pieces`);
  for (const outline of outlines) {
    if (!outline.closed || areaOf(outline) <= 0) wrong.push("outline not closed and CCW");
    const segments = segmentsOf(outline);
    for (const [p, q, i, j] of nearPairs(segments, segments)) {
      if (cross(p, q)) wrong.push(`outline crosses itself at segments ${i} and ${j}`);
      if (overlap(p, q) > 1e-6) wrong.push(`two outline cuts on one line at segments ${i} and ${j}`);
    }
  }
  return wrong;
};

/** 3, 4: cuts and creases share no line; both ends of every crease meet a cut or another crease. */
export const creasesMeetCuts: Invariant = (carton) => {
  const wrong: string[] = [];
  const cuts = carton.layers.cut.flatMap((c) => segmentsOf(c.path));
  const creases = creasesOf(carton).flatMap((c) => segmentsOf(c));
  for (const [p, q] of nearPairs(cuts, creases, 1e-6)) if (overlap(p, q) > 1e-6) wrong.push("a cut lies on a crease");
  creases.forEach((crease, i) => {
    for (const end of [crease.a, crease.b]) {
      // A run too short to cut is merged into its neighbour: no end is further off than that.
      const meets = (s: Segment) => distanceTo(end, s) < SHORTEST_LINE;
      if (!cuts.some(meets) && !creases.some((c, j) => i !== j && meets(c))) wrong.push(`a crease ends in the air at ${end.x}, ${end.y}`);
    }
  });
  return wrong;
};

/** 5, 6, 7: area, perimeter and count come out the same from panels and from layers. */
export const panelsAndLayersAgree: Invariant = (carton) => {
  const wrong: string[] = [];
  const outlines = byRole(carton, "outline"), holes = byRole(carton, "hole"), slits = byRole(carton, "slit"), creases = creasesOf(carton);
  const sum = (paths: readonly Path[], of: (p: Path) => number) => paths.reduce((total, p) => total + of(p), 0);
  const panels = carton.panels.map((p) => p.outline);
  const area = sum(outlines, areaOf) - sum(holes, (h) => Math.abs(areaOf(h)));
  if (!near(area, sum(panels, areaOf), 1e-6 * area)) wrong.push(`area ${area} against panels ${sum(panels, areaOf)}`);
  const around = sum(outlines, lengthOf) + sum(holes, lengthOf) + 2 * (sum(creases, lengthOf) + sum(slits, lengthOf));
  if (!near(around, sum(panels, lengthOf), 1e-6 * around)) wrong.push(`lengths ${around} against panels ${sum(panels, lengthOf)}`);
  if (carton.panels.length !== creases.length + carton.construction.pieces) wrong.push(`${carton.panels.length} panels, ${creases.length} creases`);
  return wrong;
};

/** 8, 11, 12, 13, 19: folded, it closes on the inside asked; no check finds an error. */
export const closes: Invariant = (carton) => {
  const wrong = carton.foldCheck.findings.filter((f) => f.severity === "error").map((f) => `${f.code} ${f.panels.join(" ")} ${f.measured} ${f.required}`);
  for (const axis of ["L", "W", "D"] as const) {
    if (!near(carton.foldCheck.measuredInside[axis], carton.inside[axis], 1e-6)) wrong.push(`inside ${axis} ${carton.foldCheck.measuredInside[axis]}`);
    if (!(carton.clearInside[axis] > 0 && carton.clearInside[axis] <= carton.inside[axis] + 1e-9)) wrong.push(`clear inside ${axis} ${carton.clearInside[axis]}`);
    if (!(carton.outside[axis] > carton.inside[axis])) wrong.push(`outside ${axis} ${carton.outside[axis]}`);
  }
  if (!carton.foldCheck.closes) wrong.push("does not close");
  return wrong;
};

/** 9: at rest the pose is the drawing. */
export const flatPoseIsTheDrawing: Invariant = (carton) => {
  const wrong: string[] = [];
  poseAt(carton.fold, 0).forEach((m, i) => {
    carton.fold.panels[i]!.outline.vertices.forEach((v, k) => {
      const [x, y, z] = transform(m, v.x, v.y, 0);
      const drawn = carton.panels[i]!.outline.vertices[k]!;
      if (!near(x, drawn.x, 1e-9) || !near(y, drawn.y, 1e-9) || !near(z, 0, 1e-9)) wrong.push(`${carton.panels[i]!.name} is not where it is drawn`);
    });
  });
  return wrong;
};

/** 10, 30: rigid panels at any moment; each step moves its own panels and leaves those of later steps. */
export const panelsStayRigid = (u: number): Invariant => (carton) => {
  const wrong: string[] = [];
  for (const [i, m] of poseAt(carton.fold, u * carton.fold.steps.length).entries()) {
    const rows = [[m[0], m[1], m[2]], [m[4], m[5], m[6]], [m[8], m[9], m[10]]] as const;
    for (let p = 0; p < 3; p++) for (let q = 0; q < 3; q++) {
      const dot = rows[p]![0] * rows[q]![0] + rows[p]![1] * rows[q]![1] + rows[p]![2] * rows[q]![2];
      if (!near(dot, p === q ? 1 : 0, 1e-12)) wrong.push(`${carton.panels[i]!.name} is stretched`);
    }
  }
  return wrong;
};

/** 22: every crease has two different panels; every panel but the roots hangs on exactly one. */
export const creasesMakeATree: Invariant = (carton) => {
  const wrong: string[] = [];
  const children = carton.fold.hinges.map((h) => h.child);
  if (new Set(children).size !== children.length) wrong.push("a panel hangs on two creases");
  if (carton.fold.hinges.some((h) => h.parent === h.child || h.parent > h.child)) wrong.push("a crease joins a panel to itself or to a later one");
  for (const c of carton.layers.crease) if (c.role === "crease" && (c.panels.length !== 2 || c.panels[0] === c.panels[1])) wrong.push(`${c.id} has not two panels`);
  return wrong;
};

/** 26: the bleed stands at least its width outside what is printed, glued flaps apart. */
export const bleedSurrounds: Invariant = (carton) => {
  const wide = Number(carton.parameters["bleed"]);
  if (wide === 0) return carton.layers.bleed.length === 0 ? [] : ["bleed where none is asked"];
  const glued = new Set(carton.foldCheck.mates.filter((m) => m.kind === "glued").map((m) => m.panels[0]));
  const bleeds = carton.layers.bleed.map((b) => flatten(b.path, 0.01));
  const edges = carton.layers.bleed.flatMap((b) => segmentsOf(b.path));
  const wrong: string[] = [];
  for (const panel of carton.panels) {
    if (glued.has(panel.name)) continue;
    for (const v of panel.outline.vertices) {
      const isIn = bleeds.filter((b) => isInside(v, b)).length % 2 === 1;
      if (!isIn) wrong.push(`${panel.name} reaches out of the bleed`);
      // Beside a glued flap the bleed ends at the glue.
      const besideGlue = carton.layers.glue.some((g) => segmentsOf(g.path).some((s) => distanceTo(v, s) <= wide + 3));
      if (isIn && !besideGlue && edges.some((s) => distanceTo(v, s) < wide - 0.04)) wrong.push(`bleed nearer than ${wide} to ${panel.name}`);
    }
  }
  return wrong;
};

/** 27: glue areas lie within their flap. */
export const glueStaysOnItsFlap: Invariant = (carton) => carton.layers.glue.flatMap((g) => {
  const flap = carton.panels.find((p) => p.name === g.panels[0])!;
  const ring = flatten(flap.outline, 0.001);
  return g.path.vertices.every((v) => isInside(v, ring)) ? [] : [`glue runs off ${flap.name}`];
});

export const ALL: readonly (readonly [string, Invariant])[] = [
  ["one simple outline a piece", outlineIsSimple], ["creases meet cuts", creasesMeetCuts], ["panels and layers agree", panelsAndLayersAgree],
  ["closes on the inside asked", closes], ["flat pose is the drawing", flatPoseIsTheDrawing], ["creases make a tree", creasesMakeATree],
  ["bleed surrounds the print", bleedSurrounds], ["glue stays on its flap", glueStaysOnItsFlap],
];
