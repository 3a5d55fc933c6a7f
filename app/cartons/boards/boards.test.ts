// Expected figures are the trade's; the source stands beside each.
import { describe, expect, it } from "vitest";
import { allowanceFor, handbookCard, withCaliper } from "./allowance-card";
import { boardSchema } from "./board-schema";
import { BOARDS, findBoard } from "./catalogue";
import { cartonChannelWidth, channelDepth, corrugatedChannelWidth, creaseRuleHeight, CUTTING_HEIGHT, minimumCreaseSpacing, RULE_THICKNESS } from "./crease-recipe";
import { classifyFlute, density, specificVolume, weightOf } from "./measures";

const board = (caliper: number) => withCaliper(findBoard("sbb-300")!, caliper);

describe("crease recipe", () => {
  it("matches a matrix maker's table: width 1.5 t + d", () => {
    expect(cartonChannelWidth(0.5, 0.71)).toBeCloseTo(1.46, 2);
    expect(cartonChannelWidth(0.3, 0.71)).toBeCloseTo(1.16, 2);
    expect(cartonChannelWidth(0.4, 0.71)).toBeCloseTo(1.31, 2);
    expect(channelDepth(board(0.5))).toBe(0.5);
  });
  it("matches rule heights of two makers", () => {
    expect(creaseRuleHeight(board(0.5))).toBeCloseTo(23.3, 9); // matrix maker: 23.80 − t
    expect(creaseRuleHeight(board(0.018 * 25.4))).toBeCloseTo(23.34, 2); // 0.919 in, second matrix maker, without shim
    expect(creaseRuleHeight(board(0.4), true)).toBeCloseTo(23.25, 9); // die maker, tape under the rule
    expect(CUTTING_HEIGHT).toBeCloseTo(0.937 * 25.4, 2);
  });
  it("matches the corrugated channel of a matrix maker, t_c 0.8 and 3 pt rule", () => {
    expect(corrugatedChannelWidth(0.8, RULE_THICKNESS[3], "alongGrain")).toBeCloseTo(2.51, 2);
    expect(corrugatedChannelWidth(0.8, RULE_THICKNESS[3], "acrossGrain")).toBeCloseTo(2.67, 2);
  });
  it("keeps two creases a channel and 0.8 mm apart: 2.26 mm at t 0.5 (engineering notes A7)", () => {
    expect(minimumCreaseSpacing(board(0.5))).toBeCloseTo(2.26, 2);
  });
  it("has the steel makers' rule thicknesses", () => expect(RULE_THICKNESS).toEqual({ 2: 0.71, 3: 1.07, 4: 1.42 }));
});

describe("measures", () => {
  it("agrees with the identities of grammage and thickness (arithmetic)", () => {
    expect(density(300, 0.4)).toBeCloseTo(750, 9);
    expect(specificVolume(300, 0.4)).toBeCloseTo(1.333, 3);
    expect(weightOf(120_000, 300)).toBeCloseTo(36, 9);
  });
  it("classifies flutes by DIN 55468-1, height and pitch both", () => {
    expect(classifyFlute(1, 3)).toBe("E");
    expect(classifyFlute(3.1, 7)).toBe("C");
    expect(classifyFlute(3.09, 6.5)).toBe("B");
    expect(classifyFlute(1, 7)).toBeNull();
  });
});

describe("the stock", () => {
  it("has a dozen boards and more, each sound by the schema, ids apart", () => {
    expect(BOARDS.length).toBeGreaterThanOrEqual(12);
    expect(new Set(BOARDS.map((b) => b.id)).size).toBe(BOARDS.length);
    for (const b of BOARDS) expect(boardSchema.safeParse(b).error?.issues ?? [], b.id).toEqual([]);
  });
  it("keeps GD2 within its bulk class, 1.30 to 1.45 cm³/g (DIN 19303)", () => {
    for (const b of BOARDS.filter((x) => x.grade === "GD2")) {
      expect(specificVolume(b.grammage, b.caliper)).toBeGreaterThanOrEqual(1.3);
      expect(specificVolume(b.grammage, b.caliper)).toBeLessThanOrEqual(1.45);
    }
    // GD2 of 350 g/m² is 455 to 508 µm thick (the same standard).
    expect(findBoard("gd2-350")!.caliper).toBeGreaterThanOrEqual(0.455);
    expect(findBoard("gd2-350")!.caliper).toBeLessThanOrEqual(0.508);
  });
  it("has flutes of the class they are called", () => {
    for (const b of BOARDS) if (b.flute) expect(classifyFlute(b.flute.height, b.flute.pitch)).toBe(b.flute.letter);
  });
});

describe("the handbook card", () => {
  it("hinges at mid-caliper and slides at the usual clearances", () => {
    expect(allowanceFor(handbookCard("carton", 0.4), "acrossGrain").a90).toBe(0.2);
    expect(handbookCard("carton", 0.4).slide).toBe(0.3);
    expect(handbookCard("carton", 0.6).slide).toBeCloseTo(0.36, 9);
    expect(handbookCard("micro", 1.6, "E").slide).toBe(0.5);
    expect(handbookCard("micro", 1, "F").slide).toBe(0.4);
  });
});
