import { describe, expect, it } from "vitest";
import type { FoldModel } from "~/cartons/types";
import { createLever, degreesOf, leverWords, nudged, stationAfter } from "./lever";

const step = (id: string) => ({ id, label: `Step ${id}`, words: "", panels: [] });
const hinge = (at: number, degrees: number) => ({ step: at, angle: (degrees * Math.PI) / 180 });
// Asymmetric on purpose: 90° and 45° in the first step, none in the second, −180° in the third.
const fold = { steps: [step("a"), step("b"), step("c")], hinges: [hinge(0, 45), hinge(0, 90), hinge(2, -180)] } as unknown as FoldModel;

describe("the fold lever", () => {
  it("knows the turn of each step", () => {
    expect([0, 1, 2].map((s) => degreesOf(fold, s))).toEqual([90, null, 180]);
  });

  it("says where it stands", () => {
    expect(leverWords(fold, 0)).toEqual({ station: "Flat", detail: "" });
    expect(leverWords(fold, 67 / 90)).toEqual({ station: "Step a", detail: "67° of 90°" });
    expect(leverWords(fold, 1)).toEqual({ station: "Step a", detail: "90° of 90°" });
    expect(leverWords(fold, 1.25)).toEqual({ station: "Step b", detail: "25 % of the way" });
    expect(leverWords(fold, 3)).toEqual({ station: "Step c", detail: "closed" });
  });

  it("goes degree by degree and lands on its stations", () => {
    let u = 0;
    for (let i = 0; i < 90; i++) u = nudged(fold, u, 1);
    expect(u).toBe(1);
    for (let i = 0; i < 90; i++) u = nudged(fold, u, -1);
    expect(u).toBe(0);
    expect(nudged(fold, 0, -1)).toBe(0);
    expect(nudged(fold, 3, 1)).toBe(3);
    expect(nudged(fold, 2, 1)).toBeCloseTo(2 + 1 / 180, 12);
    expect(nudged(fold, 2, -1)).toBeCloseTo(2 - 1 / 100, 12);
  });

  it("goes from station to station", () => {
    expect(stationAfter(fold, 0.4, 1)).toBe(1);
    expect(stationAfter(fold, 1, 1)).toBe(2);
    expect(stationAfter(fold, 1.4, -1)).toBe(1);
    expect(stationAfter(fold, 1, -1)).toBe(0);
    expect(stationAfter(fold, 3, 1)).toBe(3);
    expect(stationAfter(fold, 0, -1)).toBe(0);
  });

  it("tells those who listen, once a change", () => {
    const lever = createLever();
    const heard: number[] = [];
    const stop = lever.subscribe(() => heard.push(lever.get()));
    lever.set(1);
    lever.set(1);
    lever.set(2.5);
    stop();
    lever.set(0);
    expect(heard).toEqual([1, 2.5]);
  });
});
