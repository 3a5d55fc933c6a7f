// No two boards in one place. Direct neighbours at a crease are left out; two creases apart is where the faults are.
import { transform, type Vec3 } from "../geometry/space";
import { CONTACT_TOLERANCE } from "../geometry/tolerance";
import type { Blank, Panel } from "../blank/blank";
import type { CollisionReport, Finding, Pose } from "../types";
import type { Closed } from "./closed";
import { depthOf, interpenetrate, type Plate } from "./solids";

/** Boards share their bead close to the end of a crease that both have: within so many calipers it is not a collision. */
const CORNER_CALIPERS = 1.5;

/** The ends of a panel's own creases, towards its parent and its children, in the world. */
function creaseEnds(panel: Panel, blank: Blank, pose: Pose): Vec3[] {
  const ends: Vec3[] = [];
  const take = (p: Panel) => {
    if (!p.hinge) return;
    const m = pose[p.index]!;
    ends.push(transform(m, p.hinge.from, 0, 0), transform(m, p.hinge.to, 0, 0));
  };
  take(panel);
  for (const other of blank.panels) if (other.hinge?.parent === panel) take(other);
  return ends;
}

const isNear = (a: Vec3, b: Vec3, reach: number): boolean => Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]) <= reach;

export interface Meeting extends CollisionReport { readonly declared: boolean }

/** Every pair that reaches into each other in a pose, deeper than its class allows. */
export function meetingsIn(blank: Blank, pose: Pose, plates: readonly Plate[], withDepth: boolean): Meeting[] {
  const reach = CORNER_CALIPERS * blank.caliper;
  const ends = new Map<string, Vec3[]>();
  const endsOf = (p: Panel) => {
    const known = ends.get(p.name) ?? creaseEnds(p, blank, pose);
    ends.set(p.name, known);
    return known;
  };
  const found: Meeting[] = [];
  for (let i = 0; i < plates.length; i++) for (let j = i + 1; j < plates.length; j++) {
    const a = blank.panels[i]!;
    const b = blank.panels[j]!;
    if (a.hinge?.parent === b || b.hinge?.parent === a) continue;
    const lock = blank.interlocks.find((l) => l.panels.includes(a.name) && l.panels.includes(b.name));
    const allowed = Math.max(CONTACT_TOLERANCE, lock?.depth ?? 0);
    if (!interpenetrate(plates[i]!, plates[j]!, allowed, [], reach)) continue;
    const shared = endsOf(a).filter((p) => endsOf(b).some((q) => isNear(p, q, reach)));
    if (shared.length > 0 && !interpenetrate(plates[i]!, plates[j]!, allowed, shared, reach)) continue;
    const depth = withDepth ? depthOf(plates[i]!, plates[j]!, allowed, shared, reach) : Number.NaN;
    found.push({ panels: [a.name, b.name], depth, allowed, declared: lock !== undefined });
  }
  return found;
}

export function checkCollisions(closed: Closed): { collisions: readonly CollisionReport[]; findings: readonly Finding[] } {
  const collisions = meetingsIn(closed.blank, closed.pose, closed.plates, true);
  const findings = collisions.map((c): Finding => ({
    code: "collision", severity: "error", panels: c.panels, at: null, measured: c.depth, required: c.allowed,
    facts: { a: c.panels[0], b: c.panels[1] }, mend: null,
  }));
  return { collisions, findings };
}
