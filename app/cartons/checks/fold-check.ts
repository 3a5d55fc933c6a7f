// The folding proof: the blank is folded as thick board and judged. Checks never throw and change nothing.
import type { Board } from "../boards/board";
import type { Blank } from "../blank/blank";
import { SAME_POINT } from "../geometry/tolerance";
import type { Finding, FoldCheck, FoldModel, Severity } from "../types";
import { checkCavity } from "./cavity";
import { checkClearInside } from "./clear-inside";
import { closedOf } from "./closed";
import { checkCollisions } from "./collisions";
import { checkEnvelope } from "./envelope";
import { checkLocks } from "./locks";
import { checkMates } from "./mates";
import { toleranceStacks } from "./tolerance-stack";

/** mm. A seam this much out of register between flat and erect is taken up by the board (derived, engineering notes A12). */
const SEAM_RESIDUAL = 0.6;

const ORDER: Record<Severity, number> = { error: 0, warning: 1, note: 2 };
export const bySeverity = (a: Finding, b: Finding): number => ORDER[a.severity] - ORDER[b.severity];

export function foldCheckOf(blank: Blank, fold: FoldModel, board: Board): FoldCheck {
  const closed = closedOf(blank, fold);
  const cavity = checkCavity(closed);
  const clear = checkClearInside(closed);
  const envelope = checkEnvelope(closed);
  const mates = checkMates(closed);
  const locks = checkLocks(closed);
  const collisions = checkCollisions(closed);
  const seam: Finding[] = blank.flatResidual !== null && blank.flatResidual > SEAM_RESIDUAL + SAME_POINT
    ? [{ code: "flat-seam", severity: "warning", panels: ["glue flap"], at: null, measured: blank.flatResidual, required: SEAM_RESIDUAL, facts: {}, mend: null }]
    : [];
  const findings = [...cavity.findings, ...clear.findings, ...envelope.findings, ...mates.findings, ...locks.findings, ...collisions.findings, ...seam].sort(bySeverity);
  return {
    closes: !findings.some((f) => f.severity === "error"),
    measuredInside: cavity.measured, clearInside: clear.clear, outside: envelope.outside,
    mates: mates.mates, locks: locks.locks, collisions: collisions.collisions,
    tolerance: toleranceStacks(blank, board), findings,
  };
}
