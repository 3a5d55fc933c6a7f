// The outside of the closed carton, by side: inner size and the boards that lie outside it there.
import type { Point } from "../geometry/outline";
import { transform } from "../geometry/space";
import { INSIDE_TOLERANCE } from "../geometry/tolerance";
import type { Axis, Finding, Size } from "../types";
import { along, type Closed, type InsideAxis } from "./closed";

export interface EnvelopeReport {
  readonly outside: Size;
  readonly findings: readonly Finding[];
}

function extent(closed: Closed, axis: InsideAxis): { low: number; high: number; lowest: string; highest: string } {
  let low = Infinity, high = -Infinity, lowest = "", highest = "";
  for (const plate of closed.plates) {
    const m = plate.matrix;
    const thick = Math.abs(axis.direction[0] * m[2] + axis.direction[1] * m[6] + axis.direction[2] * m[10]) * plate.half;
    for (const piece of plate.pieces) {
      for (const p of piece as readonly Point[]) {
        const s = along(axis, transform(m, p.x, p.y, 0));
        if (s - thick < low) [low, lowest] = [s - thick, plate.name];
        if (s + thick > high) [high, highest] = [s + thick, plate.name];
      }
    }
  }
  return { low, high, lowest, highest };
}

export function checkEnvelope(closed: Closed): EnvelopeReport {
  const findings: Finding[] = [];
  const outside: Record<Axis, number> = { L: 0, W: 0, D: 0 };
  for (const axis of ["L", "W", "D"] as const) {
    const { low, high, lowest, highest } = extent(closed, closed.axes[axis]);
    outside[axis] = high - low;
    const [below, above] = closed.blank.outside[axis];
    for (const [measured, required, panel] of [[-low, below, lowest], [high - closed.size[axis], above, highest]] as const) {
      if (Math.abs(measured - required) <= INSIDE_TOLERANCE) continue;
      findings.push({ code: "outside-stack", severity: "error", panels: [panel], at: null, measured, required, facts: { axis, panel }, mend: null });
    }
  }
  return { outside, findings };
}
