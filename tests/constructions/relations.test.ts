// What must hold between cartons: growth, symmetry, determinism, and what a change of one figure may move.
import { describe, expect, it } from "vitest";
import { withCaliper } from "~/cartons/boards/allowance-card";
import type { Board } from "~/cartons/boards/board";
import { BOARDS, findBoard } from "~/cartons/boards/catalogue";
import { buildCarton } from "~/cartons/carton";
import { listConstructions } from "~/cartons/constructions/registry";
import { svgOf } from "~/cartons/export/svg";
import type { Brief, Carton, OptionValue, Size } from "~/cartons/types";
import { briefOf } from "../support/arbitraries";

const ids = listConstructions().map((c) => c.id);
const sampleOf = (id: string) => listConstructions().find((c) => c.id === id)!.sample;

function build(brief: Brief, board: Board): Carton {
  const result = buildCarton(brief, board);
  if (!result.ok) throw new Error(`${brief.construction}: ${JSON.stringify(result.refusals)}`);
  return result.carton;
}
const sample = (id: string, change: Partial<Size> = {}, options: Record<string, OptionValue> = {}, board = findBoard(sampleOf(id).board)!) =>
  build(briefOf(id, { ...sampleOf(id).size, ...change }, options), board);
const cutAndCrease = (c: Carton) => JSON.stringify([c.layers.cut, c.layers.crease, c.layers.reverseCrease]);

describe.each(ids)("%s", (id) => {
  it("uses more board for a larger inside (14)", () => {
    const { size } = sampleOf(id);
    for (const axis of ["L", "W", "D"] as const) {
      // W stays below L: the other way round is refused.
      const [small, large] = axis === "W" ? [size.W * 0.9, size.W] : [size[axis], size[axis] * 1.13];
      expect(sample(id, { [axis]: large }).blank.area, axis).toBeGreaterThan(sample(id, { [axis]: small }).blank.area);
    }
  });

  it("gives the same bytes for the same brief, whatever was built before (21)", () => {
    const options = { side: "inside", revision: "A" } as const;
    const first = svgOf(sample(id), options);
    sample(ids[(ids.indexOf(id) + 1) % ids.length]!);
    sample(id, { L: sampleOf(id).size.L + 7 });
    expect(svgOf(sample(id), options)).toBe(first);
  });

  it("keeps the inside when only the caliper changes, and moves the outside (23)", () => {
    const board = findBoard(sampleOf(id).board)!;
    let last = 0;
    for (const f of [0.9, 1, 1.1]) {
      const carton = sample(id, {}, {}, withCaliper(board, board.caliper * f));
      expect(carton.foldCheck.measuredInside.L).toBeCloseTo(carton.inside.L, 6);
      expect(carton.outside.L).toBeGreaterThan(last);
      last = carton.outside.L;
    }
  });

  it("moves every crease but no inside when only the allowance changes (24)", () => {
    const board = findBoard(sampleOf(id).board)!;
    const other: Board = { ...board, card: { ...board.card, a90: { alongGrain: board.caliper * 0.41, acrossGrain: board.caliper * 0.57 } } };
    const before = sample(id);
    const after = sample(id, {}, {}, other);
    expect(after.foldCheck.measuredInside.W).toBeCloseTo(before.foldCheck.measuredInside.W, 6);
    const still = before.layers.crease.filter((c, i) => JSON.stringify(c.path) === JSON.stringify(after.layers.crease[i]?.path));
    // A tube is drawn from its first crease: that one stays where the drawing begins.
    expect(still.map((c) => c.id).filter((crease) => crease !== "crease:back/glue flap")).toEqual([]);
  });

  it("leaves cut and crease alone when only the print changes (25)", () => {
    expect(cutAndCrease(sample(id, {}, { bleed: 5.5, safe: 7, glueMargin: 2 }))).toBe(cutAndCrease(sample(id)));
  });

  it("closes on the size asked in each basis", () => {
    const { size } = sampleOf(id);
    const board = findBoard(sampleOf(id).board)!;
    const asked = { L: size.L + 3, W: size.W + 1.5, D: size.D + 5 };
    for (const basis of ["inside", "crease", "outside", "product"] as const) {
      const carton = build({ ...briefOf(id, asked), basis, room: 0.75 }, board);
      const reading = { inside: carton.foldCheck.measuredInside, crease: carton.crease, outside: carton.outside, product: carton.clearInside }[basis];
      const extra = basis === "product" ? 1.5 : 0;
      for (const axis of ["L", "W", "D"] as const) expect(reading[axis], `${basis} ${axis}`).toBeCloseTo(asked[axis] + extra, 5);
    }
  });

  it("says in the ledger exactly what it draws: terms add up to the value, and a mark is as long as its figure", () => {
    const carton = sample(id);
    for (const r of carton.ledger) {
      if (r.terms.length > 0) expect(r.terms.reduce((sum, t) => sum + t.value * t.times, 0), r.id).toBeCloseTo(r.value, 9);
      if (r.group === "worked-out" && r.mark && !r.id.includes("inside")) {
        const drawn = Math.hypot(r.mark.to.x - r.mark.from.x, r.mark.to.y - r.mark.from.y);
        // Lid widths leave out the tapered root, flaps their overhang: those are dimensioned on the drawing.
        if (!/width|lid|tuck|bottom|inner|wing|corner|glue/.test(r.id)) expect(drawn, r.id).toBeCloseTo(r.value, 6);
      }
    }
  });

  it("is accepted in its sample, and in every board of its families at the sample's size or says why not", () => {
    expect(sample(id).findings.filter((f) => f.severity === "error")).toEqual([]);
    const { families } = listConstructions().find((c) => c.id === id)!;
    const accepted = BOARDS.filter((b) => families.includes(b.family)).filter((b) => buildCarton(briefOf(id, sampleOf(id).size), b).ok);
    expect(accepted.length).toBeGreaterThan(0);
  });
});

describe("trays", () => {
  it("are mirror-symmetric about both axes (15)", () => {
    const { layers } = sample("glued-tray");
    const points = layers.cut[0]!.path.vertices.map((v) => `${Math.abs(v.x).toFixed(6)},${Math.abs(v.y).toFixed(6)}`);
    const count = new Map<string, number>();
    for (const p of points) count.set(p, (count.get(p) ?? 0) + 1);
    for (const [p, n] of count) expect(n, p).toBe(4);
  });
});

describe("a board too thick for its panels", () => {
  it("is refused by its caliper, with a thickness that works", () => {
    const board = withCaliper(findBoard("sbb-300")!, 9);
    const result = buildCarton(briefOf("straight-tuck", { L: 60, W: 25, D: 90 }), board);
    expect(result.ok).toBe(false);
    if (result.ok) return;
    const [refusal] = result.refusals;
    expect(refusal).toMatchObject({ code: "too-large", parameter: "caliper", given: 9 });
    expect(buildCarton(briefOf("straight-tuck", { L: 60, W: 25, D: 90 }), withCaliper(board, Number(refusal!.nearest))).ok).toBe(true);
  });
});
