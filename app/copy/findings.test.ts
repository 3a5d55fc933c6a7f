import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, it } from "vitest";
import type { Finding, Refusal } from "~/cartons/types";
import { FINDING_SENTENCES, findingSentence } from "./findings";
import { refusalSentence } from "./refusals";

const CHECKS = path.resolve(import.meta.dirname, "../cartons/checks");
/** Every code that a check can return, read from the checks themselves. */
const codes = [...new Set(readdirSync(CHECKS).filter((f) => f.endsWith(".ts") && !f.endsWith(".test.ts")).flatMap((f) =>
  [...readFileSync(path.join(CHECKS, f), "utf8").matchAll(/(?:code: |finding\()"([\w-]+)"/g)].map((m) => m[1]!)))];

describe("findings", () => {
  it("have a sentence for every code a check can return, and no sentence for another", () => {
    expect(codes.length).toBeGreaterThan(10);
    expect(Object.keys(FINDING_SENTENCES).sort()).toEqual([...codes].sort());
  });
  it.each(codes)("%s reads as a sentence with its figures", (code) => {
    const finding: Finding = { code, severity: "error", panels: ["lid", "front"], at: null, measured: 3.25, required: 7.5, facts: { axis: "L", panel: "lid", a: "lid", b: "front", step: "lid", lock: "slit lock, lid" }, mend: null };
    const sentence = findingSentence(finding);
    expect(sentence).toMatch(/^[A-Z“].*\.$/s);
    expect(sentence).not.toMatch(/undefined|NaN|null/);
  });
});

describe("refusals", () => {
  const refusal = (change: Partial<Refusal>): Refusal => ({ code: "too-small", parameter: "D", given: 20, limit: { atLeast: 24.44 }, nearest: 24.5, because: "the two tucks would meet behind the front", ...change });
  it("say what was asked, the limit, why, and what to type", () => {
    expect(refusalSentence(refusal({}), "straight-tuck")).toBe("Depth is 20 mm; the least is 24.44 mm, because the two tucks would meet behind the front. Type 24.5 mm.");
    expect(refusalSentence(refusal({ code: "too-large", parameter: "tuckTaper", given: 22, limit: { atMost: 15 }, nearest: 15 }), "straight-tuck")).toBe("Tuck, taper a side is 22°; the most is 15°, because the two tucks would meet behind the front. Type 15°.");
    expect(refusalSentence(refusal({ code: "not-offered", parameter: "route", given: "axe", limit: { oneOf: ["die", "knife", "laser"] } }), "straight-tuck")).toBe("Cut by cannot be “axe”. Choose die, knife or laser.");
    expect(refusalSentence(refusal({ code: "unknown-construction", given: "bag", limit: { oneOf: ["a", "b"] }, nearest: null }), "bag")).toBe("There is no construction “bag”. There are a and b.");
    expect(refusalSentence(refusal({ code: "wrong-kind", given: "x", limit: null, because: "a size is a number of millimetres" }), "straight-tuck")).toBe("Depth cannot be x: a size is a number of millimetres. Type 24.5 mm.");
  });
});
