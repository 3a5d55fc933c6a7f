/**
 * Lid and base: two glued-corner trays of one declaration; the lid's inside is the base's outside and a clearance.
 * Inside size: the base's.
 */
import { limit, type Construction } from "./construction";
import { gluedTray as tray, trayAsks } from "./parts/glued-tray";

/** Between the two pieces on the drawing, mm: room for the widest bleed round both. */
const APART = 24;

export const lidAndBase: Construction = {
  id: "lid-and-base", name: "Lid and base", summary: "Two trays with glued corners; the lid goes over the base.",
  codes: [{ system: "FEFCO", code: "0301", source: "web guide to FEFCO codes (full telescope); with a shallow lid 0306, from memory" }],
  families: ["carton", "micro"], closes: "lid", pieces: 2, glued: true,
  size: { L: { from: 40, to: 500 }, W: { from: 30, to: 400 }, D: { from: 12, to: 200 } },
  sample: { size: { L: 120, W: 80, D: 30 }, board: "sbb-400" },
  grain: { carton: "x", micro: "y" },
  meaning: "L, W and D inside the base; the lid rests on its rim",
  ask: {
    ...trayAsks,
    lidD: { label: "Lid, depth inside", kind: "length", default: "min(D, max(if(micro, 20, 12), 0.4*D, glueFoot + glueTop + 2*tan(glueTaper)*glue + 6.5))", atLeast: "max(8*t, 12)", atMost: "D", why: "a lid of 0.3 to 0.5 of the depth is a shoe-box lid; equal to D it covers the base", source: "engineering practice, no published source", because: "a lid deeper than the base would stand on the table and not on the rim" },
    clearance: { label: "Lid over base, clearance in all", kind: "length", default: "if(micro, if(t < 1.3, 2, 2.5), 1 + if(60 < D, 0.4, 0) + 2*max(0, t - 0.5))", atLeast: 0.4, atMost: 8, why: "half of it on each side: below it binds, above it rattles; try a sample", source: "1 to 1.5 mm in all for cartonboard, 2 to 3 mm E flute; common practice, no source" },
    lidLining: { label: "Room for the lid's own glue flaps, in all", kind: "length", default: "max(0, 2*t + 0.2 - clearance)", atLeast: "max(0, 2*t + 0.2 - clearance)", atMost: 8, why: "they lie inside the lid's ends and would rub on the base", source: "derived: two boards less the clearance", because: "the lid's glue flaps would stand in the base's ends" },
  },

  cannot: (s) => [
    ...gluedLimits(s),
    limit("D", { atLeast: Math.max(12, 8 * (s["t"] ?? 0)) }, "the lid would have nothing to hold by"),
  ],

  declare: (k) => {
    const inside = { L: k.asked("L"), W: k.asked("W"), D: k.asked("D") };
    const lidL = k.plus(inside.L, k.stack(2), k.option("clearance"), k.option("lidLining"));
    const lidW = k.plus(inside.W, k.stack(2), k.option("clearance"));
    const lidD = k.option("lidD");
    const base = tray(k, inside, { part: "base", prefix: "", words: "Base: ", at: { c: 1, s: 0, x: 0, y: 0 }, own: true });
    const up = inside.W.mm / 2 + inside.D.mm + lidW.mm / 2 + lidD.mm + APART;
    const lid = tray(k, { L: lidL, W: lidW, D: lidD }, { part: "lid", prefix: "lid ", words: "Lid: ", at: { c: 1, s: 0, x: 0, y: up }, own: false });

    const half = k.option("clearance", 0.5);
    const halfL = k.plus(half, k.option("lidLining", 0.5));
    for (const side of ["left", "right"] as const) k.slides(k.face(base[side], "print"), k.face(lid[side], "inside"), halfL, 20);
    // Turned over, the lid's front stands at the base's back.
    k.slides(k.face(base.front, "print"), k.face(lid.back, "inside"), half, 20);
    k.slides(k.face(base.back, "print"), k.face(lid.front, "inside"), half, 20);
    k.outsideBy("L", k.plus(k.stack(2), halfL), k.plus(k.stack(2), halfL));
    k.outsideBy("W", k.plus(k.stack(2), half), k.plus(k.stack(2), half));
    k.outsideBy("D", k.stack(1), k.stack(1));
    k.row("lid inside L", "Lid, inside length", lidL, { panel: lid.base, along: "x", reason: "the base's outside and the clearance" });
    k.row("lid inside W", "Lid, inside width", lidW, { panel: lid.base, along: "y", reason: "the base's outside and the clearance" });
    k.governs("L", "base L");
    k.governs("W", "base W");
    k.governs("D", "wall height");
    k.orderedAs("L", "base L");
    k.orderedAs("W", "base W");
    k.orderedAs("D", "wall height");
    k.stands([0, 0, 1], [0, -1, 0]);

    k.step("corners", "Base, corner flaps", "Base: fold the four corner flaps in.", base.flaps);
    k.step("walls", "Base, front and back", "Base: raise the long walls.", [base.front, base.back]);
    k.step("ends", "Base, ends", "Base: raise the ends onto the glued flaps, press and hold.", [base.left, base.right]);
    k.step("lid corners", "Lid, corner flaps", "Lid: fold the four corner flaps in.", lid.flaps);
    k.step("lid walls", "Lid, front and back", "Lid: raise the long walls.", [lid.front, lid.back]);
    k.step("lid ends", "Lid, ends", "Lid: raise the ends onto the glued flaps, press and hold.", [lid.left, lid.right]);
    k.step("on", "Lid on", "Fill the base; turn the lid over and lower it on.", [lid.base]);
    const lift = k.plus(inside.D, lidD, k.stack(2)).mm + lidW.mm;
    k.part({ name: "base", label: "Base", root: base.base, step: null, turn: 0, shift: [0, 0, 0], lift: 0 });
    k.part({ name: "lid", label: "Lid", root: lid.base, step: "on", turn: Math.PI, shift: [0, -up, k.plus(inside.D, k.stack(1)).mm], lift });
  },
};

function gluedLimits({ t = 0, glueFoot = 0, glueTop = 0, glueTaper = 0, glue = 0, lidD = 0 }: Record<string, number>) {
  const eaten = glueFoot + glueTop + 2 * Math.tan((glueTaper * Math.PI) / 180) * glue;
  return [
    limit("L", { atLeast: 12 * t }, "the board is too thick for walls that short"),
    limit("W", { atLeast: Math.max(12 * t, 2 * (glue + 0.5)) }, "the glue flaps would meet"),
    limit("lidD", { atLeast: eaten + 6 }, "the tapers would eat the lid's glued edge"),
    ...(lidD < eaten + 6 ? [limit("D", { atLeast: eaten + 6 }, "the tapers would eat the lid's glued edge")] : []),
  ];
}
