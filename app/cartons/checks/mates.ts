// Faces that are meant to meet: parallel, at their gap, over enough area.
import { dot, multiply, subtract, transform } from "../geometry/space";
import type { Point } from "../geometry/outline";
import { leastWidth, overlapOf, polygonArea } from "../geometry/polygon";
import { MATE_TOLERANCE, PARALLEL } from "../geometry/tolerance";
import type { Finding, MateReport } from "../types";
import { isParallel, planeOf, type Closed } from "./closed";

/** mm. A glued patch narrower than this is the common field failure (one supplier's reading, engineering notes A16). */
const LEAST_GLUE_WIDTH = 6;

export interface MatesReport {
  readonly mates: readonly MateReport[];
  readonly findings: readonly Finding[];
}

export function checkMates(closed: Closed): MatesReport {
  const findings: Finding[] = [];
  const mates = closed.blank.mates.map((mate): MateReport => {
    const a = planeOf(closed, mate.a);
    const b = planeOf(closed, mate.b);
    const parallel = isParallel(a.normal, b.normal, PARALLEL) && dot(a.normal, b.normal) < 0;
    const measuredGap = dot(subtract(b.at, a.at), a.normal);
    const { area, width } = sharedPatch(closed, mate.a.panel, mate.b.panel, mate.kind === "glued");
    const panels = [mate.a.panel, mate.b.panel] as const;
    const finding = (code: string, measured: number, required: number) =>
      findings.push({ code, severity: "error", panels, at: null, measured, required, facts: { a: panels[0], b: panels[1], kind: mate.kind }, mend: null });
    if (!parallel) finding("mate-not-parallel", 0, 0);
    else if (Math.abs(measuredGap - mate.gap) > MATE_TOLERANCE) finding("mate-gap", measuredGap, mate.gap);
    if (area < mate.minArea) finding("mate-area", area, mate.minArea);
    else if (mate.kind === "glued" && width < LEAST_GLUE_WIDTH) {
      findings.push({ code: "glue-narrow", severity: "warning", panels, at: null, measured: width, required: LEAST_GLUE_WIDTH, facts: { a: panels[0], b: panels[1] }, mend: null });
    }
    const ok = parallel && Math.abs(measuredGap - mate.gap) <= MATE_TOLERANCE && area >= mate.minArea;
    return { kind: mate.kind, panels, askedGap: mate.gap, measuredGap, area, minArea: mate.minArea, ok };
  });
  return { mates, findings };
}

/** Where two parallel panels lie over one another, seen along their normal: area, mm², and the widest piece's least width, mm. */
function sharedPatch(closed: Closed, nameA: string, nameB: string, withWidth: boolean): { area: number; width: number } {
  const a = closed.plates[closed.blank.byName.get(nameA)!.index]!;
  const b = closed.plates[closed.blank.byName.get(nameB)!.index]!;
  const m = multiply(a.inverse, b.matrix);
  const flat = b.pieces.map((piece): Point[] => {
    const seen = piece.map((p) => {
      const [x, y] = transform(m, p.x, p.y, 0);
      return { x, y };
    });
    return polygonArea(seen) < 0 ? seen.reverse() : seen;
  });
  const { area, pieces } = overlapOf(a.pieces, flat);
  return { area, width: withWidth ? pieces.reduce((widest, p) => Math.max(widest, leastWidth(p)), 0) : 0 };
}
