import { describe, expect, it } from "vitest";
import { findBoard } from "~/cartons/boards/catalogue";
import { buildCarton } from "~/cartons/carton";
import { poseAt } from "~/cartons/fold/pose";
import { AT_REST, lookAt, viewProgress } from "./camera";
import { fitted, toStage } from "./view";

const result = buildCarton({ construction: "glued-tray", size: { L: 130, W: 80, D: 35 }, basis: "inside", room: 1, board: "sbb-400", options: {}, typed: {} }, findBoard("sbb-400")!);
if (!result.ok) throw new Error("the tray is accepted");
const { carton } = result;
const frame = { width: 900, height: 600 };
const drawing = fitted(carton.blank.bounds, frame, { left: 60, right: 40, top: 50, bottom: 30 });

/** Where a world point lies on the screen, px. */
const onScreen = (u: number, p: readonly [number, number, number], turn = AT_REST) => {
  const look = lookAt(carton.fold, poseAt(carton.fold, u), u, turn, drawing, frame);
  const d = [p[0] - look.centre[0], p[1] - look.centre[1], p[2] - look.centre[2]] as const;
  const along = (v: readonly [number, number, number]) => d[0] * v[0] + d[1] * v[1] + d[2] * v[2];
  return { x: frame.width / 2 + along(look.right) * look.scale, y: frame.height / 2 - along(look.up) * look.scale };
};

describe("the fold view's camera", () => {
  it("shows the flat blank exactly where the drawing lies", () => {
    for (const [x, y] of [[0, 0], [60, 11], [-37, 29]] as const) {
      const drawn = toStage(drawing, { x, y });
      const seen = onScreen(0, [x, y, 0]);
      expect(seen.x).toBeCloseTo(drawn.x, 6);
      expect(seen.y).toBeCloseTo(drawn.y, 6);
    }
  });

  it("keeps its axes square and the standing carton inside the frame", () => {
    for (const u of [0, 0.3, 1, 2.5, carton.fold.steps.length]) {
      const pose = poseAt(carton.fold, u);
      const { right, up, towards } = lookAt(carton.fold, pose, u, AT_REST, drawing, frame);
      const dot = (a: readonly number[], b: readonly number[]) => a.reduce((s, v, i) => s + v * b[i]!, 0);
      for (const [a, b] of [[right, up], [up, towards], [right, towards]] as const) expect(dot(a, b)).toBeCloseTo(0, 9);
      for (const a of [right, up, towards]) expect(dot(a, a)).toBeCloseTo(1, 9);
    }
    for (const x of [-65, 65]) for (const y of [-40, 40]) for (const z of [0, 35]) {
      const seen = onScreen(carton.fold.steps.length, [x, y, z]);
      expect(seen.x).toBeGreaterThan(0);
      expect(seen.x).toBeLessThan(frame.width);
      expect(seen.y).toBeGreaterThan(0);
      expect(seen.y).toBeLessThan(frame.height);
    }
  });

  it("goes to three quarters at once when it is turned by hand", () => {
    expect(viewProgress(0.1, AT_REST)).toBeLessThan(0.1);
    expect(viewProgress(0.1, { azimuth: 10, elevation: 0, zoom: 1 })).toBe(1);
  });
});
