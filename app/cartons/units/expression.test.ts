import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { describeExpressionError } from "./expression-words";
import { parseAngle, parseCount, parseLength, parseNumber } from "./expression";
import { formatExact, formatInchFraction, formatLength } from "./format";
import { compileRule } from "./rule";

const mm = (text: string, unit: "mm" | "in" = "mm"): number | string => {
  const parsed = parseLength(text, { unit });
  return parsed.ok ? parsed.mm : parsed.error.code;
};

describe("a length that is typed", () => {
  // 1 in = 25.4 mm exactly: international inch.
  it.each([
    ["82", 82], ["12.5 mm", 12.5], ["12,5", 12.5], [",5", 0.5], ["4 3/4in", 120.65], ["4 3/4 in", 120.65], ["1/2 in", 12.7], ["3\"", 76.2], ["2,5cm", 25],
    ["120+2*1.5", 123], ["120 + 2 × 1,5", 123], ["80+2*1", 82], ["(30+2)*2mm", 64], ["(1+1)in", 50.8], ["2 × 40 mm − 3", 77], ["10mm/4", 2.5],
    ["1in + 1", 26.4], ["-3+5", 2], ["90 mm / 30 mm * 2", 6], ["1 1/2", 1.5], ["7 - -2", 9],
  ] as const)("%s is %d mm", (text, value) => expect(mm(text)).toBeCloseTo(value, 9));

  it("takes a bare number in the field's unit", () => {
    expect(mm("2", "in")).toBeCloseTo(50.8, 9);
    expect(mm("2+1mm", "in")).toBeCloseTo(51.8, 9);
    expect(mm("3 1/8", "in")).toBeCloseTo(79.375, 9);
  });

  it.each([
    ["", "empty"], ["  ", "empty"], ["43 mn", "unknown-unit"], ["abc", "unknown-word"], ["3+", "syntax"], ["(3", "syntax"], ["3)", "syntax"], ["1e3", "unknown-unit"],
    ["5/0", "divide-by-zero"], ["1 3/0", "divide-by-zero"], ["2mm*3mm", "not-a-length"], ["3in mm", "syntax"], ["8mm/2mm*1mm*1mm", "not-a-length"], ["1..2", "syntax"], ["1,2,3", "syntax"], ["$5", "syntax"],
    ["9".repeat(199), "ok-or-large"], ["1+".repeat(200), "too-long"],
  ] as const)("%s is refused", (text, code) => {
    if (code === "ok-or-large") expect(mm(text)).toBe(Number("9".repeat(199)));
    else expect(mm(text)).toBe(code);
  });

  it("says what to type", () => {
    const parsed = parseLength("43 mn", { unit: "mm" });
    if (parsed.ok) throw new Error("43 mn is no length");
    expect(parsed.error.at).toBe(3);
    expect(describeExpressionError(parsed.error, { example: "43, 43mm or 1.69in" })).toBe("“mn” is not a unit. Type 43, 43mm or 1.69in.");
  });

  it("never throws and never hangs on nonsense", () => {
    fc.assert(fc.property(fc.string({ maxLength: 5000, unit: "grapheme" }), (text) => { parseLength(text, { unit: "mm" }); }), { numRuns: 500 });
    fc.assert(fc.property(fc.array(fc.constantFrom("1", "2.5", "3,4", "+", "-", "*", "/", "(", ")", "mm", "in", " ", "3/4"), { maxLength: 40 }), (parts) => {
      const parsed = parseLength(parts.join(""), { unit: "mm" });
      if (parsed.ok) expect(Number.isFinite(parsed.mm)).toBe(true);
    }), { numRuns: 2000 });
  });

  it("reads back what it writes, and a comma as a point", () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 99_999_999 }), (n) => {
      const length = n / 1000;
      expect(mm(formatExact(length))).toBeCloseTo(length, 9);
      expect(mm(formatExact(length).replace(".", ","))).toBeCloseTo(length, 9);
      expect(mm(formatLength(length, { unit: "in", withUnit: true }))).toBeCloseTo(length, 1);
    }));
  });
});

describe("other figures", () => {
  it("reads angles, counts and numbers", () => {
    expect(parseAngle("15°")).toEqual({ ok: true, value: 15 });
    expect(parseAngle("7,5 deg")).toEqual({ ok: true, value: 7.5 });
    expect(parseCount("3")).toEqual({ ok: true, value: 3 });
    expect(parseCount("2.5")).toMatchObject({ ok: false, error: { code: "not-whole" } });
    expect(parseNumber("3 mm")).toMatchObject({ ok: false, error: { code: "unknown-unit" } });
  });

  it("writes figures without noise", () => {
    expect(formatLength(27.4800001, { unit: "mm" })).toBe("27.48");
    expect(formatLength(0.225, { unit: "mm" })).toBe("0.225");
    expect(formatLength(-0.0001, { unit: "mm" })).toBe("0");
    expect(formatLength(100, { unit: "mm", withUnit: true })).toBe("100 mm");
    expect(formatLength(120.65, { unit: "in" })).toBe("4.75");
    expect(formatInchFraction(120.65)).toBe("4 3/4");
    expect(formatInchFraction(76.2)).toBe("3");
    expect(formatInchFraction(12.7)).toBe("1/2");
    expect(formatInchFraction(100)).toBeNull();
  });
});

describe("a rule of thumb", () => {
  const scope = { L: 60, W: 25, t: 0.4, on: 1 };
  const rule = (text: string) => compileRule(text, Object.keys(scope));
  it("is worked out and shown", () => {
    const dust = rule("min(L/2 - 1, max(12, 0.75*W))");
    expect(dust.evaluate(scope)).toBe(18.75);
    expect(dust.show(scope, String)).toBe("min(60/2 − 1, max(12, 0.75 × 25))");
    expect(dust.variables).toEqual(["L", "W"]);
    expect(rule("if(0.5 < t, 3, 2*L)").evaluate(scope)).toBe(120);
    expect(rule("if(on, L - (W - 1), 0)").show(scope, String)).toBe("(60 − (25 − 1))");
    expect(rule("clamp(L, 1, 8)").evaluate(scope)).toBe(8);
    expect(rule("10*tan(45)").evaluate(scope)).toBeCloseTo(10, 12);
    expect(rule("-2 + 3 - 4").evaluate(scope)).toBe(-3);
    expect(rule("12/3/2").evaluate(scope)).toBe(2);
  });
  it("stops the program at once when it is written wrongly", () => {
    for (const text of ["X + 1", "min(1)", "1 +", "sin(", "2 3", "foo(2)", "if(1, 2)"]) expect(() => rule(text), text).toThrow(/rule/);
  });
});
