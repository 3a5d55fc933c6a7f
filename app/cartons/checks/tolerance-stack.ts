// How far the inside can be off: crease, cut and board tolerances along each axis. The fold check itself is nominal.
import type { Board } from "../boards/board";
import type { Blank } from "../blank/blank";
import type { Axis, ToleranceStack } from "../types";

/** Of the caliper: how well a handbook allowance is known until it is measured (engineering notes A46). */
const HANDBOOK_ALLOWANCE = 0.15;

export function toleranceStacks(blank: Blank, board: Board): ToleranceStack[] {
  const { crease, cut, caliper } = board.card.tolerance;
  return (["L", "W", "D"] as const).map((axis: Axis): ToleranceStack => {
    const row = blank.rows.find((r) => r.id === blank.governs[axis]);
    if (!row) throw new Error(`no ledger row governs ${axis}`);
    const count = (name: string) => row.terms.filter((t) => t.name === name).reduce((sum, t) => sum + t.times, 0);
    const creases = Math.abs(count("crease allowance"));
    const boards = Math.abs(count("caliper"));
    const free = Math.max(0, 2 - creases);
    const allowance = board.card.origin === "measured" ? crease / 2 : HANDBOOK_ALLOWANCE * board.caliper;
    const terms = [
      // Each crease is placed on its own.
      ...Array.from({ length: creases }, (_, i) => ({ name: `place of crease ${i + 1}`, value: crease, times: 1 })),
      ...Array.from({ length: free }, () => ({ name: "place of the cut edge", value: cut, times: 1 })),
      // The same card serves both ends, so its error counts at both at once.
      { name: "crease allowance", value: allowance, times: creases },
      ...(boards > 0 ? [{ name: "caliper", value: caliper, times: boards }] : []),
    ];
    return {
      axis, terms,
      worstCase: terms.reduce((sum, t) => sum + Math.abs(t.value * t.times), 0),
      rootSumSquare: Math.sqrt(terms.reduce((sum, t) => sum + (t.value * t.times) ** 2, 0)),
    };
  });
}
