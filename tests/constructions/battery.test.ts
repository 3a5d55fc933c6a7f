// The battery: every construction in the registry over its whole range. A new construction gets all of this for nothing.
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { buildCarton } from "~/cartons/carton";
import { listConstructions } from "~/cartons/constructions/registry";
import { withParameter } from "~/cartons/nearest";
import { cases, SEED, share } from "../support/arbitraries";
import { ALL, panelsStayRigid } from "./invariants";

/** At least so many accepted cartons a construction. */
const ACCEPTED = 1000;
const RUNS = 1900;

describe.each(listConstructions().map((c) => c.id))("%s", (id) => {
  it(`holds every invariant over ${ACCEPTED} cartons and more`, { timeout: 900_000 }, () => {
    let accepted = 0;
    fc.assert(fc.property(cases(id), share, ({ brief, board }, u) => {
      const result = buildCarton(brief, board);
      if (!result.ok) return;
      accepted++;
      for (const [name, invariant] of ALL) expect(invariant(result.carton), `${name}: ${JSON.stringify(brief)} in ${board.caliper} mm`).toEqual([]);
      expect(panelsStayRigid(u)(result.carton)).toEqual([]);
    }), { numRuns: RUNS, seed: SEED });
    // A generator that is mostly refused would prove little.
    expect(accepted).toBeGreaterThanOrEqual(ACCEPTED);
  });

  it("refuses by name, with a limit and a value that works", { timeout: 900_000 }, () => {
    let refused = 0;
    fc.assert(fc.property(cases(id, 1.6), ({ brief, board }) => {
      const result = buildCarton(brief, board);
      if (result.ok) return;
      refused++;
      const known = new Set(["L", "W", "D", "caliper", ...Object.keys(brief.options), ...listConstructions().find((c) => c.id === id)!.parameters.map((p) => p.name)]);
      let mended = brief;
      for (const r of result.refusals) {
        expect(known, JSON.stringify(r)).toContain(r.parameter);
        expect(r.because.length).toBeGreaterThan(5);
        expect(r.nearest, JSON.stringify({ r, brief, t: board.caliper })).not.toBeNull();
        mended = withParameter(mended, r.parameter, r.nearest!);
      }
      // The limits let nothing through that does not fold: that net is for what they forgot.
      expect(result.refusals.map((r) => r.code), JSON.stringify({ brief, t: board.caliper, r: result.refusals })).not.toContain("does-not-fold");
      const again = buildCarton(mended, board);
      const others = again.ok ? [] : again.refusals.filter((r) => result.refusals.some((first) => first.parameter === r.parameter));
      expect(others, JSON.stringify({ brief, mended, t: board.caliper })).toEqual([]);
    }), { numRuns: 150, seed: SEED });
    expect(refused).toBeGreaterThan(10);
  });
});
