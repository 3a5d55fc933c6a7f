// The quick walk against the general engine (clipper2-ts, an independent polygon library), on the outlines of real blanks.
import { describe, expect, it } from "vitest";
import { findBoard } from "../boards/catalogue";
import { buildCarton } from "../carton";
import { listConstructions } from "../constructions/registry";
import { offsetAreas, subtractAreas } from "./offset";
import { grownRing, ringLess } from "./outward";
import { areaOf, flatten } from "./path";
import { polygonArea, withoutRepeats } from "./polygon";

const L = [{ x: 0, y: 0 }, { x: 30, y: 0 }, { x: 30, y: 10 }, { x: 10, y: 10 }, { x: 10, y: 40 }, { x: 0, y: 40 }];

describe("an L grown by 3", () => {
  it("has sharp outer corners and one hollow one", () => {
    // 36 × 16 and 16 × 30 by hand.
    expect(polygonArea(grownRing(L, 3)!)).toBeCloseTo(36 * 16 + 16 * 30, 1);
  });
});

describe("a slot narrower than twice the distance", () => {
  it("is closed", () => {
    const slotted = [{ x: 0, y: 0 }, { x: 40, y: 0 }, { x: 40, y: 20 }, { x: 22, y: 20 }, { x: 22, y: 5 }, { x: 18, y: 5 }, { x: 18, y: 20 }, { x: 0, y: 20 }];
    expect(polygonArea(grownRing(slotted, 3)!)).toBeCloseTo(46 * 26, 1);
  });
});

describe("a ring less an area across its edge", () => {
  it("goes round it", () => {
    const square = [{ x: 0, y: 0 }, { x: 10, y: 0 }, { x: 10, y: 10 }, { x: 0, y: 10 }];
    const bite = [{ x: 8, y: 3 }, { x: 14, y: 3 }, { x: 14, y: 7 }, { x: 8, y: 7 }];
    expect(polygonArea(ringLess(square, [bite])!)).toBeCloseTo(92, 9);
    expect(ringLess(square, [])).toHaveLength(4);
  });
});

describe.each(listConstructions().map((c) => [c.id, c.sample] as const))("%s", (id, sample) => {
  it("grows to the same area as the general engine gives it", () => {
    for (let i = 0; i < 12; i++) {
      const size = { L: sample.size.L * (1 + i / 9), W: sample.size.W * (1 + i / 31), D: sample.size.D * (1 + i / 13) };
      const result = buildCarton({ construction: id, size, basis: "inside", room: 1, board: sample.board, options: {}, typed: {} }, findBoard(sample.board)!);
      if (!result.ok) throw new Error(JSON.stringify(result.refusals));
      for (const outline of result.carton.layers.cut.filter((c) => c.role === "outline")) for (const by of [1.3, 3, 5.5]) {
        const ring = withoutRepeats(flatten(outline.path, 0.03));
        const general = offsetAreas([outline.path], by).filter((p) => areaOf(p) > 0).reduce((sum, p) => sum + areaOf(p), 0);
        const quick = grownRing(ring, by);
        expect(quick, `${id} ${i} ${by}`).not.toBeNull();
        // The engine keeps four decimals and the walk adds up to as much: along three metres of outline that is 0.5 mm².
        expect(Math.abs(polygonArea(quick!) - general), `${id} ${i} ${by}`).toBeLessThan(0.5);
        const glue = result.carton.layers.glue.map((g) => flatten(g.path, 0.03));
        if (glue.length > 0) {
          const less = ringLess(ring, glue);
          const engine = subtractAreas([outline.path], result.carton.layers.glue.map((g) => g.path)).reduce((sum, p) => sum + areaOf(p), 0);
          // Glue lies wholly inside the outline: the walk cannot leave for an island, the engine makes a hole of it.
          expect(polygonArea(less!) - polygonArea(ring)).toBeCloseTo(0, 6);
          expect(engine).toBeLessThan(polygonArea(ring));
        }
      }
    }
  });
});
