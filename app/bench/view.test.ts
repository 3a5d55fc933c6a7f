import { describe, expect, it } from "vitest";
import { fitted, isTrueSize, panned, rulerStep, scaleWords, toDrawing, toStage, TRUE_SCALE, zoomedAt } from "./view";

const box = { minX: -11, minY: 7, maxX: 219, maxY: 144 };
const frame = { width: 900, height: 500 };
const insets = { left: 70, right: 50, top: 40, bottom: 60 };

describe("the view of the stage", () => {
  it("fits the whole box inside the insets", () => {
    const view = fitted(box, frame, insets);
    const low = toStage(view, { x: box.minX, y: box.maxY });
    const high = toStage(view, { x: box.maxX, y: box.minY });
    expect(low.x).toBeGreaterThanOrEqual(insets.left - 1e-9);
    expect(low.y).toBeGreaterThanOrEqual(insets.top - 1e-9);
    expect(high.x).toBeLessThanOrEqual(frame.width - insets.right + 1e-9);
    expect(high.y).toBeLessThanOrEqual(frame.height - insets.bottom + 1e-9);
    expect((high.x - low.x) / 230).toBeCloseTo(view.scale, 9);
  });

  it("is never larger than true size, which is 96 px an inch", () => {
    expect(fitted({ minX: 0, minY: 0, maxX: 10, maxY: 5 }, frame, insets).scale).toBe(TRUE_SCALE);
    expect(25.4 * TRUE_SCALE).toBeCloseTo(96, 12);
  });

  it("keeps the place under the pointer while it zooms", () => {
    const view = fitted(box, frame, insets);
    const at = { x: 313, y: 91 };
    const before = toDrawing(view, at);
    const after = toDrawing(zoomedAt(view, 1.7, at), at);
    expect(after.x).toBeCloseTo(before.x, 9);
    expect(after.y).toBeCloseTo(before.y, 9);
  });

  it("comes back from a pan and from the stage", () => {
    const view = fitted(box, frame, insets);
    expect(toStage(panned(view, 13, -5), { x: 3, y: 2 })).toEqual({ x: toStage(view, { x: 3, y: 2 }).x + 13, y: toStage(view, { x: 3, y: 2 }).y - 5 });
    const there = toDrawing(view, toStage(view, { x: 17, y: 29 }));
    expect(there.x).toBeCloseTo(17, 9);
    expect(there.y).toBeCloseTo(29, 9);
  });

  it("writes its scale", () => {
    expect(scaleWords(TRUE_SCALE)).toBe("1 : 1");
    expect(scaleWords(TRUE_SCALE / 2.34)).toBe("1 : 2.3");
    expect(scaleWords(TRUE_SCALE / 12.4)).toBe("1 : 12");
    expect(scaleWords(TRUE_SCALE * 2)).toBe("2 : 1");
    expect(isTrueSize(TRUE_SCALE * 1.001)).toBe(true);
    expect(isTrueSize(TRUE_SCALE * 1.02)).toBe(false);
  });

  it("spaces the figures of its rulers in ones, twos and fives", () => {
    expect(rulerStep(3.78, 60)).toBe(20);
    expect(rulerStep(1.3, 60)).toBe(50);
    expect(rulerStep(96, 60)).toBe(1);
    expect(rulerStep(0.2, 60)).toBe(500);
  });
});
