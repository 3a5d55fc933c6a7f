import { describe, expect, it } from "vitest";
import { findBoard } from "../boards/catalogue";
import { buildCarton } from "../carton";
import { listConstructions } from "../constructions/registry";
import { isInside } from "../geometry/polygon";
import { foldedPicture } from "./folded-picture";

const cartonOf = (id: string) => {
  const info = listConstructions().find((c) => c.id === id)!;
  const result = buildCarton({ construction: id, size: info.sample.size, basis: "inside", room: 1, board: info.sample.board, options: {}, typed: {} }, findBoard(info.sample.board)!);
  if (!result.ok) throw new Error(JSON.stringify(result.refusals));
  return result.carton;
};
/** The panel that is painted last over a point of the picture: the one that is seen. */
const seenAt = (picture: ReturnType<typeof foldedPicture>, x: number, y: number) => [...picture.faces].reverse().find((f) => isInside({ x, y }, f.points));

describe.each(listConstructions().map((c) => c.id))("%s", (id) => {
  const carton = cartonOf(id);
  it("paints every pose within its bounds, with finite points", () => {
    for (let u = 0; u <= carton.fold.steps.length; u += 0.5) {
      const { faces, bounds } = foldedPicture(carton, { u, withShadow: true });
      expect(faces.length).toBeGreaterThan(5);
      for (const p of faces.flatMap((f) => f.points)) {
        expect(Number.isFinite(p.x) && Number.isFinite(p.y)).toBe(true);
        expect(p.x).toBeGreaterThanOrEqual(bounds.minX);
        expect(p.y).toBeLessThanOrEqual(bounds.maxY);
      }
    }
  });
  it("is the same picture every time", () => {
    const at = { u: carton.fold.steps.length - 0.5 };
    expect(foldedPicture(carton, at)).toEqual(foldedPicture(carton, at));
  });
});

describe("a closed tuck carton", () => {
  const carton = cartonOf("straight-tuck");
  const closed = foldedPicture(carton, { u: carton.fold.steps.length, view: { azimuth: 0, elevation: 0 } });
  it("shows its front from the front and nothing of its inside", () => {
    const middle = seenAt(closed, (closed.bounds.minX + closed.bounds.maxX) / 2, (closed.bounds.minY + closed.bounds.maxY) / 2);
    expect(middle?.panel).toBe("front");
    expect(middle?.tone).toBe("print");
    // As wide and as high as the outside, by the picture's own scale of 1 : 1.
    expect(closed.bounds.maxX - closed.bounds.minX).toBeCloseTo(carton.outside.L, 1);
    expect(closed.bounds.maxY - closed.bounds.minY).toBeCloseTo(carton.outside.D, 1);
  });
  it("shows its lid from above", () => {
    const above = foldedPicture(carton, { u: carton.fold.steps.length, view: { azimuth: 0, elevation: 89.9 } });
    expect(seenAt(above, (above.bounds.minX + above.bounds.maxX) / 2, (above.bounds.minY + above.bounds.maxY) / 2)?.panel).toBe("lid");
  });
});

describe("an open tray", () => {
  it("shows its base over its far wall and hides what is under it", () => {
    const carton = cartonOf("glued-tray");
    const above = foldedPicture(carton, { u: carton.fold.steps.length, view: { azimuth: 0, elevation: 89.9 } });
    const middle = seenAt(above, (above.bounds.minX + above.bounds.maxX) / 2, (above.bounds.minY + above.bounds.maxY) / 2);
    expect(middle?.panel).toBe("base");
    expect(middle?.tone).toBe("inside");
  });
});
