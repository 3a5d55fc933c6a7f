// What every construction must say of itself.
import { describe, expect, it } from "vitest";
import { findBoard } from "~/cartons/boards/catalogue";
import { buildCarton, motionOf } from "~/cartons/carton";
import { findConstruction, listConstructions } from "~/cartons/constructions/registry";
import { formulaOf } from "~/cartons/ledger/formula";
import { briefOf } from "../support/arbitraries";

describe.each(listConstructions().map((c) => [c.id, c] as const))("%s", (id, info) => {
  const result = buildCarton(briefOf(id, info.sample.size), findBoard(info.sample.board)!);
  if (!result.ok) throw new Error(JSON.stringify(result.refusals));
  const { carton } = result;

  it("gives every option a label, a reason and a source", () => {
    for (const [name, ask] of Object.entries(findConstruction(id)!.asks)) {
      expect(ask.label.length, name).toBeGreaterThan(2);
      expect(ask.why.length, name).toBeGreaterThan(7);
      expect(ask.source.length, name).toBeGreaterThan(5);
    }
  });

  it("has defaults within their own limits, for the sample and for a doll and a giant", () => {
    const { size } = info;
    const giant = { L: size.L.to, W: Math.min(size.W.to, size.L.to), D: size.D.to };
    const built = buildCarton(briefOf(id, giant), findBoard(info.sample.board)!);
    expect(built.ok ? [] : built.refusals).toEqual([]);
  });

  it("names a source beside every code", () => {
    for (const code of info.codes) expect(code.source.length).toBeGreaterThan(5);
  });

  it("tells a packer each step, and moves each panel in exactly one", () => {
    const moved = carton.fold.steps.flatMap((s) => s.panels);
    expect(new Set(moved).size).toBe(moved.length);
    for (const step of carton.fold.steps) {
      expect(step.words).toMatch(/^[A-Z].*\.$/);
      expect(step.label.length).toBeLessThan(26);
    }
  });

  it("lists every meeting on the way to the closed pose", () => {
    expect(motionOf(carton, 24).findings).toEqual([]);
  });

  it("writes out the arithmetic of every worked-out figure and every rule", () => {
    for (const row of carton.ledger) {
      const text = formulaOf(row, String);
      if (row.group === "worked-out" && row.terms.length > 1) expect(text, row.id).toMatch(/[+−×]/);
      expect(text, row.id).not.toMatch(/NaN|undefined/);
    }
  });
});
