// Worked samples 1, 6 and 7 of the engineering notes, part D: figures computed there by a script and folded back by an
// independent thick-board fold. Source of every expected figure: that page. a = t/2 throughout.
import { describe, expect, it } from "vitest";
import { withCaliper } from "~/cartons/boards/allowance-card";
import { findBoard } from "~/cartons/boards/catalogue";
import { buildCarton } from "~/cartons/carton";
import type { Carton, OptionValue, Size } from "~/cartons/types";
import { briefOf } from "../support/arbitraries";

function build(construction: string, size: Size, board: string, caliper: number, slide: number, options: Record<string, OptionValue>): Carton {
  const made = withCaliper(findBoard(board)!, caliper);
  const result = buildCarton(briefOf(construction, size, { slide, ...options }), made);
  if (!result.ok) throw new Error(JSON.stringify(result.refusals));
  return result.carton;
}
const row = (carton: Carton, id: string): number => {
  const found = carton.ledger.find((r) => r.id === id);
  if (!found) throw new Error(`no ledger row ${id}; there are ${carton.ledger.map((r) => r.id).join(", ")}`);
  return found.value;
};
const gap = (carton: Carton, a: string, b: string): number => {
  const mate = carton.foldCheck.mates.find((m) => m.panels[0] === a && m.panels[1] === b);
  if (!mate) throw new Error(`no mate ${a} with ${b}`);
  return mate.measuredGap;
};
const hold = (carton: Carton, expected: Record<string, number>) => {
  for (const [id, value] of Object.entries(expected)) expect(row(carton, id), id).toBeCloseTo(value, 3);
};

describe("sample 1, straight tuck 60 × 25 × 90, t 0.4", () => {
  const carton = build("straight-tuck", { L: 60, W: 25, D: 90 }, "sbb-300", 0.4, 0.3, { tuck: 12.333, dust: 18.75, glue: 13, seam: 0.5, ease: 0.5 });
  it("draws the figures", () => {
    hold(carton, {
      "glue flap": 13, back: 60, "side 1": 25.4, front: 60.4, "side 2": 24.9, "side height": 90.4, "back height": 91.2, "front height": 91.2,
      "lid depth": 24.7, "lid width": 59, "lid tuck depth": 12.333, "lid dust 1 depth": 18.75,
    });
    expect(row(carton, "back height") - row(carton, "side height")).toBeCloseTo(2 * 0.4, 9);
    // The notes round the tuck to three places and the blank with it.
    expect(carton.blank.width).toBeCloseTo(183.7, 3);
    expect(Math.abs(carton.blank.height - 165.267)).toBeLessThanOrEqual(0.001 + 1e-9);
  });
  it("folds to the figures", () => {
    expect(carton.foldCheck.measuredInside.L).toBeCloseTo(60, 6);
    expect(carton.foldCheck.measuredInside.W).toBeCloseTo(25, 6);
    expect(carton.foldCheck.measuredInside.D).toBeCloseTo(90, 6);
    expect(gap(carton, "lid", "lid dust 1")).toBeCloseTo(0, 6);
    expect(gap(carton, "lid tuck", "front")).toBeCloseTo(0.3, 6);
    expect(gap(carton, "bottom tuck", "front")).toBeCloseTo(0.3, 6);
    expect(gap(carton, "glue flap", "side 2")).toBeCloseTo(0, 6);
    expect(carton.outside.L).toBeCloseTo(60.8, 6);
    expect(carton.outside.D).toBeCloseTo(91.6, 6);
  });
  it("locks by s − 1.5 − t/2, less the rounded corner of the shoulder", () => {
    for (const lock of carton.foldCheck.locks) {
      expect(lock.engagement).toBeGreaterThan(6 - 1.5 - 0.2 - 0.5);
      expect(lock.engagement).toBeLessThanOrEqual(6 - 1.5 - 0.2 + 1e-9);
    }
  });
  it("gives the crease-to-crease size of a carton order (row 22)", () => {
    expect(carton.crease).toEqual({ L: expect.closeTo(60.4, 6), W: expect.closeTo(25.4, 6), D: expect.closeTo(91.2, 6) });
  });
});

describe("sample 6, glued-corner tray and lid 120 × 80 × 30, t 0.5", () => {
  const carton = build("lid-and-base", { L: 120, W: 80, D: 30 }, "sbb-300", 0.5, 0.3, { lidD: 20, clearance: 1.2, glue: 15 });
  const tray = build("glued-tray", { L: 120, W: 80, D: 30 }, "sbb-300", 0.5, 0.3, { glue: 15 });
  it("draws the figures", () => {
    hold(carton, {
      "base L": 120.5, "base W": 80.5, "wall height": 30.25, "front width": 119.5, "lid inside L": 122.2, "lid inside W": 82.2,
      "lid base L": 122.7, "lid base W": 82.7, "lid wall height": 20.25, "lid front width": 121.7,
    });
    const lid = carton.panels.filter((p) => p.part === "lid").map((p) => p.bounds);
    expect(Math.max(...lid.map((b) => b.maxX)) - Math.min(...lid.map((b) => b.minX))).toBeCloseTo(163.2, 3);
    expect(Math.max(...lid.map((b) => b.maxY)) - Math.min(...lid.map((b) => b.minY))).toBeCloseTo(123.2, 3);
    expect(tray.blank.width).toBeCloseTo(181, 3);
    expect(tray.blank.height).toBeCloseTo(141, 3);
  });
  it("folds to the figures", () => {
    expect(carton.foldCheck.measuredInside).toEqual({ L: expect.closeTo(120, 6), W: expect.closeTo(80, 6), D: expect.closeTo(30, 6) });
    expect(tray.outside).toEqual({ L: expect.closeTo(121, 6), W: expect.closeTo(81, 6), D: expect.closeTo(30.5, 6) });
    expect(gap(carton, "left", "lid left")).toBeCloseTo(0.6, 6);
    expect(gap(carton, "front", "lid back")).toBeCloseTo(0.6, 6);
    expect(gap(carton, "glue flap front left", "left")).toBeCloseTo(0, 6);
  });
});

describe("sample 7, roll-end tuck front 240 × 170 × 60, t 1.6", () => {
  const carton = build("roll-end-mailer", { L: 240, W: 170, D: 60 }, "e-flute", 1.6, 0.5, { rollPlay: 0.5 });
  it("draws the figures", () => {
    hold(carton, {
      "base L": 249, "base W": 171.6, "front width": 245.3, "front height": 60.8, "back height": 61.6, "outer height": 61.6, strip: 3.7,
      "inner height": 60.5, "option:tabOut": 2.1, "lid L": 237.4, "lid W": 169.5, tuck: 39, "corner flap": 66, wing: 36,
    });
    expect(carton.blank.width).toBeCloseTo(504.8, 3);
    expect(carton.blank.height).toBeCloseTo(502.5, 3);
    const slot = carton.panels.find((p) => p.name === "base")!.holes[0]!.vertices.map((v) => Math.abs(v.x));
    expect(249 / 2 - (Math.max(...slot) + Math.min(...slot)) / 2).toBeCloseTo(3.7, 3);
  });
  it("folds to the figures", () => {
    expect(carton.foldCheck.measuredInside).toEqual({ L: expect.closeTo(240, 6), W: expect.closeTo(170, 6), D: expect.closeTo(60, 6) });
    expect(gap(carton, "corner flap back left", "inner left")).toBeCloseTo(0.25, 6);
    expect(gap(carton, "tuck", "front")).toBeCloseTo(0.5, 6);
    expect(gap(carton, "wing left", "inner left")).toBeCloseTo(0.5, 6);
    expect(carton.outside.L).toBeCloseTo(250.6, 6);
  });
});
