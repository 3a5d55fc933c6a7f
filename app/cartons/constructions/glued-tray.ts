/**
 * Tray with glued corners. One piece; four flaps glued inside the end walls.
 * Inside size: L × W between the walls, D from the base to the top of the walls.
 */
import { limit, type Construction } from "./construction";
import { gluedTray as tray, trayAsks } from "./parts/glued-tray";

export const gluedTray: Construction = {
  id: "glued-tray", name: "Tray, glued corners", summary: "Open at the top; four corner flaps glued inside the ends.",
  codes: [{ system: "FEFCO", code: "0300", source: "one tray of the two, from memory" }],
  families: ["carton", "micro"], closes: "open", pieces: 1, glued: true,
  size: { L: { from: 40, to: 600 }, W: { from: 30, to: 500 }, D: { from: 10, to: 200 } },
  sample: { size: { L: 120, W: 80, D: 30 }, board: "sbb-400" },
  grain: { carton: "x", micro: "y" },
  meaning: "L and W between the walls, D from the base to the top of the walls",
  ask: trayAsks,

  cannot: (s) => {
    const { t = 0, glueFoot = 0, glueTop = 0, glueTaper = 0, glue = 0, D = 0 } = s;
    const eaten = glueFoot + glueTop + 2 * Math.tan((glueTaper * Math.PI) / 180) * glue;
    return [
      limit("L", { atLeast: Math.max(12 * t, 2 * 6.5) }, "the board is too thick for walls that short"),
      limit("W", { atLeast: Math.max(12 * t, 2 * (glue + 0.5)) }, "the glue flaps would meet"),
      limit("D", { atLeast: Math.max(8 * t, eaten + 6 - D < 0 ? 0 : eaten + 6) }, "the tapers would eat the glued edge"),
    ];
  },

  declare: (k) => {
    const { flaps } = tray(k, { L: k.asked("L"), W: k.asked("W"), D: k.asked("D") }, { part: "tray", prefix: "", words: "", at: { c: 1, s: 0, x: 0, y: 0 }, own: true });
    k.outsideBy("L", k.stack(1), k.stack(1));
    k.outsideBy("W", k.stack(1), k.stack(1));
    k.outsideBy("D", k.stack(1), k.stack(0));
    k.governs("L", "base L");
    k.governs("W", "base W");
    k.governs("D", "wall height");
    k.orderedAs("L", "base L");
    k.orderedAs("W", "base W");
    k.orderedAs("D", "wall height");
    k.stands([0, 0, 1], [0, -1, 0]);
    k.step("corners", "Corner flaps", "Fold the four corner flaps in.", flaps);
    k.step("walls", "Front and back up", "Raise the long walls.", ["front", "back"]);
    k.step("ends", "Ends up", "Raise the end walls onto the glued flaps, press and hold.", ["left", "right"]);
  },
};
