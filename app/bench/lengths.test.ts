import { describe, expect, it } from "vitest";
import { expressionToKeep, readFigure, showLength, showSize, stepOf, withUnit } from "./lengths";

describe("figures of the Bench", () => {
  it("shows hundredths of a millimetre and thousandths of an inch", () => {
    expect(showLength(82.4812, "mm")).toBe("82.48");
    expect(showLength(82, "mm")).toBe("82");
    expect(showLength(25.4 * 3.2284, "in")).toBe("3.228");
    expect(showSize({ L: 82, W: 27.5, D: 56.123 }, "mm")).toBe("82 × 27.5 × 56.12 mm");
    expect(withUnit(12.5, "angle", "in")).toBe("12.5°");
  });

  it("reads in the units of the field, and any unit that is typed", () => {
    expect(readFigure("80+2*1", "length", "mm")).toEqual({ ok: true, value: 82 });
    // 4.75 × 25.4 mm, the inch being 25.4 mm exactly (international inch, 1959).
    const inches = readFigure("4 3/4", "length", "in");
    expect(inches.ok && inches.value).toBeCloseTo(120.65, 9);
    expect(readFigure("43mm", "length", "in")).toEqual({ ok: true, value: 43 });
    expect(readFigure("12,5", "angle", "mm")).toEqual({ ok: true, value: 12.5 });
  });

  it("says what to type", () => {
    expect(readFigure("43 mn", "length", "mm")).toEqual({ ok: false, sentence: "“mn” is not a unit. Type 43, 43mm or 1.69in." });
    expect(readFigure("2.5", "count", "mm")).toEqual({ ok: false, sentence: "“2.5” is not a whole number. Type a whole number such as 3." });
  });

  it("keeps an expression with the unit it was meant in, and no bare number", () => {
    expect(expressionToKeep(" 80+2*1 ", "length", "mm")).toBe("80+2*1");
    expect(expressionToKeep("2+1/4", "length", "in")).toBe("(2+1/4) in");
    expect(expressionToKeep("4 3/4in", "length", "mm")).toBe("4 3/4in");
    expect(expressionToKeep("12,5", "length", "mm")).toBeUndefined();
    const kept = expressionToKeep("2+1/4", "length", "in")!;
    expect(readFigure(kept, "length", "mm")).toEqual(readFigure("2+1/4", "length", "in"));
  });

  it("steps a millimetre, a sixteenth of an inch, a degree or one", () => {
    expect(stepOf(82.5, 1, "length", "mm", 1)).toBe(83.5);
    expect(stepOf(82.5, -3, "length", "mm", 0.1)).toBe(82.2);
    expect(stepOf(25.4, 1, "length", "in", 1)).toBeCloseTo(26.9875, 4);
    expect(stepOf(3, 1, "count", "mm", 0.1)).toBe(4);
    expect(stepOf(15, -1, "angle", "mm", 10)).toBe(5);
  });
});
