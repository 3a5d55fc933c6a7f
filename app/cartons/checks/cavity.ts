// Does the folded carton have the inside that was asked? Measured between the faces that bound it.
import { dot, subtract, transform } from "../geometry/space";
import { INSIDE_TOLERANCE, PARALLEL } from "../geometry/tolerance";
import type { Axis, Finding, Size } from "../types";
import { isParallel, planeOf, type Closed } from "./closed";

export interface CavityReport {
  readonly measured: Size;
  readonly findings: readonly Finding[];
}

export function checkCavity(closed: Closed): CavityReport {
  const findings: Finding[] = [];
  const measured: Record<Axis, number> = { L: Number.NaN, W: Number.NaN, D: Number.NaN };
  const take = (axis: Axis, value: number, panels: readonly string[], own: number | null) => {
    const asked = own ?? closed.size[axis];
    // The reading that is furthest off is the one that is reported; a lid's own inside is checked, not reported.
    if (own === null && (Number.isNaN(measured[axis]) || Math.abs(value - asked) > Math.abs(measured[axis] - asked))) measured[axis] = value;
    if (Math.abs(value - asked) > INSIDE_TOLERANCE) {
      findings.push({ code: "inside-size", severity: "error", panels, at: null, measured: value, required: asked, facts: { axis, panel: panels[panels.length - 1]! }, mend: null });
    }
  };
  for (const pair of closed.blank.cavity) {
    const low = planeOf(closed, pair.low);
    const high = planeOf(closed, pair.high);
    const panels = [pair.low.panel, pair.high.panel];
    if (!isParallel(low.normal, high.normal, PARALLEL) || dot(low.normal, high.normal) > 0) {
      findings.push({ code: "not-square", severity: "error", panels, at: null, measured: null, required: null, facts: { axis: pair.axis }, mend: null });
    }
    take(pair.axis, dot(subtract(high.at, low.at), low.normal), panels, pair.own);
  }
  for (const open of closed.blank.openTop) {
    for (const wall of open.walls) {
      const panel = closed.blank.byName.get(wall)!;
      const m = closed.pose[panel.index]!;
      const base = planeOf(closed, open.base);
      const top = Math.max(...panel.outline.map((v) => dot(base.normal, subtract(transform(m, v.x, v.y, 0), base.at))));
      take("D", top, [open.base.panel, wall], open.own);
    }
  }
  return { measured, findings };
}
