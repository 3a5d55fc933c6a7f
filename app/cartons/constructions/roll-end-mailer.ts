/**
 * Roll-end tuck-front mailer (FEFCO 0427). One piece, no glue: the sides roll over the corner flaps and lock into the base.
 * Inside size: L between the inner walls, W between front and back, D between base and lid.
 * Layers along L: inner wall 0, corner flap 1, outer wall 2, with half the roll play between each; the lid's wings are −1.
 */
import type { LayerUse } from "../blank/kit";
import { limit, type Construction } from "./construction";
import { mailerAsks } from "./parts/mailer-asks";
import { cornerFlap, earedTuck, innerWall, ear, earEdge, slot, strip, tabsOf, tuckFlap, wing } from "./parts/mailer-shapes";
import { rectangle, rounded } from "../blank/shapes";

const ACROSS: LayerUse = { creases: "x" };

export const rollEndMailer: Construction = {
  id: "roll-end-mailer", name: "Mailer, roll-over sides", summary: "No glue: double sides roll over and lock into the base, the lid tucks in at the front.",
  codes: [{ system: "FEFCO", code: "0427", source: "web guides to FEFCO codes, two agree" }],
  families: ["micro", "carton"], closes: "tuck", pieces: 1, glued: false,
  size: { L: { from: 80, to: 600 }, W: { from: 60, to: 500 }, D: { from: 15, to: 200 } },
  sample: { size: { L: 240, W: 170, D: 60 }, board: "e-flute" },
  grain: { carton: "x", micro: "x" },
  meaning: "L between the rolled side walls, W between front and back, D between base and lid",
  ask: mailerAsks,
  mayBeWiderThanLong: true,

  cannot: ({ t = 0, micro = 0, tabLength = 0, tabs = 0, W = 0, earLong = 0, ears = 0, cornerDeep = 0 }) => [
    limit("D", { atLeast: micro ? (t > 1.25 ? 20 : 15) : 6 * t + 12 }, "an inner wall that low has no room for tabs and a grip"),
    limit("W", { atLeast: Math.max(8 * t + 40, tabs * tabLength + (tabs + 1) * 8 + 6 * t) }, "the tabs need that much of the base"),
    limit("W", { atLeast: 2 * cornerDeep + 3 * t > W ? 2 * cornerDeep + 3 * t : 0 }, "the corner flaps of front and back would meet"),
    limit("L", { atLeast: Math.max(24 * t, ears ? 3 * earLong : 0, 60) }, "the tuck and its rounded corners need that length"),
  ],

  declare: (k) => {
    const half = k.option("rollPlay", 0.5);
    const slide = k.option("slide");
    const ACROSS_L: LayerUse = { creases: "y", play: half };
    const UP_Y: LayerUse = { creases: "y" };
    const ears = k.isOn("ears");

    const baseL = k.cc("L", 2, 2, ACROSS_L);
    const baseW = k.cc("W", 0, 0, ACROSS);
    const endL = k.cc("L", 1, 1, ACROSS_L);
    const frontH = k.reach("D", 0, 0, "in", ACROSS);
    const backH = k.cc("D", 0, 0, ACROSS);
    const outerH = k.cc("D", 0, 0, UP_Y);
    const stripW = k.strip(1, k.option("rollPlay"), UP_Y);
    const innerH = k.minus(k.reach("D", 0, 0, "in", UP_Y), k.option("innerShort"));
    const lidL = k.minus(k.cc("L", -1, -1, UP_Y), k.times(slide, 2));
    const lidW = k.minus(k.cc("W", 0, -1, ACROSS), slide);
    const box = (width: number, height: number) => rectangle(-width / 2, width / 2, height);

    k.base("base", box(baseL.mm, baseW.mm).map((v) => ({ ...v, y: v.y - baseW.mm / 2 })), { label: "Base" });
    k.attach("base", "down", "front", rounded([{ x: -endL.mm / 2, y: 0 }, { x: endL.mm / 2, y: 0 }, { x: endL.mm / 2, y: frontH.mm, r: k.number("cornerRadius") }, { x: -endL.mm / 2, y: frontH.mm, r: k.number("cornerRadius") }]), { label: "Front", role: "wall" });
    k.attach("base", "up", "back", box(endL.mm, backH.mm), { label: "Back", role: "wall" });

    // Corner flaps stand between inner and outer walls, under the roll; those of the front leave room for the ears.
    const under = k.plus(k.edge(0, ACROSS), k.asked("D")).mm - k.number("cornerDown");
    for (const from of ["front", "back"] as const) for (const end of ["left", "right"] as const) {
      const top = from === "front" && ears ? Math.min(under, k.plus(k.edge(0, ACROSS), k.asked("D")).mm - k.number("earHigh") - 2) : under;
      k.attach(from, end, `corner flap ${from} ${end}`, cornerFlap(k, top, (from === "front") === (end === "right")), { label: "Corner flap", origin: "foot" });
    }

    for (const end of ["left", "right"] as const) {
      const frontIsLeft = end === "left";
      const outer = `outer ${end}`;
      k.attach("base", end, outer, box(baseW.mm, outerH.mm), { label: "Outer side", role: "wall" });
      k.attach(outer, end, `roll ${end}`, strip(k, baseW.mm, stripW.mm, frontIsLeft), { label: "", role: "flap", origin: "foot" });
      k.attach(`roll ${end}`, end, `inner ${end}`, innerWall(k, innerH.mm, frontIsLeft), { label: "Inner side", role: "wall", origin: "foot" });
      // The slots lie where the folded inner wall's tabs come down: from the base crease to the middle of the inner wall's board.
      const fromCrease = k.minus(k.edge(2, ACROSS_L), k.stack(0.5)).mm;
      const x = (baseL.mm / 2 - fromCrease) * (end === "left" ? -1 : 1);
      for (const y of tabsOf(k, frontIsLeft)) k.feature("base", "cut", slot(k, x, frontIsLeft ? y : -y));
    }

    k.attach("back", "up", "lid", box(lidL.mm, lidW.mm), { label: "Lid", role: "wall" });
    for (const end of ["left", "right"] as const) k.attach("lid", end, `wing ${end}`, wing(k, lidW.mm, end === "right"), { label: "Wing", role: "lining", origin: "foot" });
    if (ears) {
      const tuck = earedTuck(k, endL.mm);
      k.attach("lid", "up", "tuck", tuck, { label: "Tuck", role: "lining" });
      for (const end of ["left", "right"] as const) k.attach("tuck", end, `ear ${end}`, ear(k, end === "left"), { label: "Ear", origin: "foot", edge: earEdge(tuck, end) });
    } else k.attach("lid", "up", "tuck", tuckFlap(k), { label: "Tuck", role: "lining" });

    k.inside("L", k.face("inner left", "print"), k.face("inner right", "print"));
    k.inside("W", k.face("front", "inside"), k.face("back", "inside"));
    k.inside("D", k.face("base", "inside"), k.face("lid", "inside"));
    const around = k.plus(k.stack(3), k.times(half, 2));
    k.outsideBy("L", around, around);
    k.outsideBy("W", k.stack(1), k.stack(1));
    // The tabs go through the base and stand out of it by what they are longer.
    const tab = k.minus(k.option("tabOut"), k.option("innerShort"));
    k.outsideBy("D", tab.mm > k.stack(1).mm ? tab : k.stack(1), k.stack(1));
    k.slides(k.face("tuck", "print"), k.face("front", "inside"), slide, 60);
    for (const end of ["left", "right"] as const) {
      k.slides(k.face(`wing ${end}`, "print"), k.face(`inner ${end}`, "print"), slide, 60);
      for (const from of ["front", "back"] as const) {
        k.slides(k.face(`corner flap ${from} ${end}`, "inside"), k.face(`inner ${end}`, "inside"), half, 30);
        k.slides(k.face(`corner flap ${from} ${end}`, "print"), k.face(`outer ${end}`, "inside"), half, 30);
      }
    }

    k.row("base L", "Base, long way", baseL, { panel: "base", along: "x", reason: "inner wall, corner flap and outer wall on each side, and the roll's play" });
    k.row("base W", "Base, short way", baseW, { panel: "base", along: "y", reason: "" });
    k.row("front width", "Front and back, width", endL, { panel: "front", along: "x", reason: "their corner flaps lie between inner and outer wall" });
    k.row("front height", "Front, height", frontH, { panel: "front", along: "y", reason: "" });
    k.row("back height", "Back, crease to crease", backH, { panel: "back", along: "y", reason: "" });
    k.row("outer height", "Outer side, crease to crease", outerH, { panel: "outer right", along: "y", reason: "the roll ends level with the lid" });
    k.row("strip", "Roll, crease to crease", stripW, { panel: "roll right", along: "y", reason: "two creases round one corner flap and the roll's play" });
    k.row("inner height", "Inner side, to its free edge", innerH, { panel: "inner right", along: "y", reason: "stops short of the base; the tabs go on" });
    k.row("lid L", "Lid, width", lidL, { panel: "lid", along: "x", reason: "the wings go down inside the side walls" });
    k.row("lid W", "Lid, to the tuck crease", lidW, { panel: "lid", along: "y", reason: "short by the clearance, so that the tuck slides behind the front" });
    k.row("tuck", "Tuck", k.option("tuck"), { panel: "tuck", along: "y", reason: "" });
    k.row("wing", "Wing", k.option("wing"), { panel: "wing right", along: "y", reason: "" });
    k.row("corner flap", "Corner flap", k.option("cornerDeep"), { panel: "corner flap back right", along: "y", reason: "" });
    k.governs("L", "base L");
    k.governs("W", "base W");
    k.governs("D", "back height");
    k.orderedAs("L", "base L");
    k.orderedAs("W", "base W");
    k.orderedAs("D", "back height");
    k.stands([0, 0, 1], [0, -1, 0]);

    const flaps = ["front left", "front right", "back left", "back right"].map((c) => `corner flap ${c}`);
    k.step("ends", "Front and back up", "Raise front and back.", ["front", "back"]);
    k.step("corners", "Corner flaps", "Fold in the four corner flaps.", flaps);
    k.step("sides", "Sides up", "Raise the sides against the corner flaps.", ["outer left", "outer right"]);
    k.step("roll", "Roll over", "Roll the sides over the corner flaps and press the tabs into the slots of the base.", ["roll left", "roll right", "inner left", "inner right"]);
    k.step("wings", "Wings", "Fill; bend the lid's wings.", ["wing left", "wing right"]);
    k.step("tuck", "Tuck", ears ? "Bend the tuck and its ears." : "Bend the tuck.", ears ? ["tuck", "ear left", "ear right"] : ["tuck"]);
    k.step("lid", "Lid shut", ears ? "Close the lid: wings inside the walls, tuck behind the front, ears into the side gaps." : "Close the lid: wings inside the walls, tuck behind the front.", ["lid"]);
    for (const end of ["left", "right"] as const) {
      k.transient(`inner ${end}`, "base", ["roll"], "the tabs bend into their slots");
      for (const from of ["front", "back"] as const) {
        for (const wall of [`inner ${end}`, `roll ${end}`, `outer ${end}`]) k.transient(`corner flap ${from} ${end}`, wall, ["roll", "sides"], "the corner flap springs as the side rolls over it");
        k.transient(from, `inner ${end}`, ["roll"], "front and back give as the side rolls in between them");
      }
      k.transient(`wing ${end}`, `inner ${end}`, ["lid"], "the wing bends as it goes in");
      k.transient(`wing ${end}`, `roll ${end}`, ["lid"], "the wing bends as it goes in");
      k.transient("tuck", `inner ${end}`, ["lid"], "the tuck bends as it goes in");
      k.transient("tuck", `roll ${end}`, ["lid"], "the tuck bends as it goes in");
      if (ears) for (const wall of [`inner ${end}`, `outer ${end}`, `roll ${end}`, "front", `corner flap front ${end}`]) k.transient(`ear ${end}`, wall, ["lid"], "the ear bends as it is pushed into the gap under the roll");
    }
    k.transient("tuck", "front", ["lid"], "the tuck bends as it slips in past the edge");
  },
};
