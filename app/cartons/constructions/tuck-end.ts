/**
 * Tuck-end cartons, straight and reverse: a glued tube with a tuck at both ends. One declaration; they differ in the
 * panel on which the bottom hinges, and so in what D must leave room for.
 * Inside size: L between the sides, W between back and front, D between the dust flaps.
 */
import type { Kit } from "../blank/kit";
import type { Asks } from "../parameters/parameter";
import type { Scope } from "../parameters/resolve";
import { limit, type Construction, type Limit } from "./construction";
import { fourPanelTube, leastGluedDepth, tubeAsks } from "./parts/four-panel-tube";
import { tuckAsks, tuckClosure } from "./parts/tuck-closure";

const notchAsks: Asks = {
  notchWidth: { label: "Thumb notch, width", kind: "length", default: "if(micro, 22, 18)", atLeast: 10, atMost: "L - 16", why: "a thumb goes in", source: "15 to 25 mm, common practice" },
  notchDepth: { label: "Thumb notch, depth", kind: "length", default: "if(micro, 7, 6)", atLeast: 3, atMost: "min(notchWidth/2, max(3, tuck - 5))", why: "the tuck must cover the hole", source: "5 to 8 mm, common practice", because: "the tuck must cover it by 5 mm and it is at most a half circle" },
  notch: { label: "Thumb notch", kind: "switch", default: "if(L < 40, 0, if(tuck < notchDepth + 7, 0, 1))", why: "opens the lid; only where the tuck covers it", source: "engineering practice, no published source" },
};

function tuckEnd(reverse: boolean): Pick<Construction, "ask" | "cannot" | "declare"> {
  const room = reverse ? "D - 2*t - 2" : "0.45*D";
  return {
    ask: { ...tubeAsks(reverse ? "a + slide" : "W"), ...tuckAsks(room, reverse ? "max(ease, t + slide)" : "ease"), ...notchAsks },

    cannot: (s: Scope): Limit[] => {
      const least = s["micro"] ? 18 : 11;
      const { t = 0, glue = 0, slitLock = 0, slit = 0, dust = 0, tuck = 0, notch = 0, notchDepth = 0 } = s;
      return [
        limit("D", { atLeast: reverse ? least + 2 * t + 2 : least / 0.45 }, reverse ? "the tuck would meet the other end" : "the two tucks would meet behind the front"),
        limit("W", { atLeast: Math.max(least / 0.8, 12 * t) }, "a tuck that holds would not swing in"),
        limit("L", { atLeast: Math.max(12 * t, slitLock ? 2 * slit + 18 : 0, 2 * (dust + 0.5)) }, "crease and dust flaps need that length"),
        limit("D", { atLeast: leastGluedDepth(s) }, "the ends of the glue flap would eat its glued edge"),
        limit("L", { atLeast: glue + 2 }, "the glue flap would be wider than the back"),
        ...(notch ? [limit("notchDepth", { atMost: tuck - 2 }, "the tuck must cover the notch")] : []),
        ...(notch && notchDepth > 0 ? [limit("L", { atLeast: 40 }, "a notch leaves too little of the front edge")] : []),
      ];
    },

    declare: (k: Kit) => {
      const free = { free: 1 };
      const onBack = { back: { crease: 1 }, side: { crease: 0 }, front: free };
      const onFront = { back: free, side: { crease: 0 }, front: { crease: 1 } };
      const tube = fourPanelTube(k, reverse ? onFront : onBack, onBack, k.isOn("notch") ? { width: k.number("notchWidth"), depth: k.number("notchDepth") } : null);
      tuckClosure(k, tube, { dir: "down", hinge: reverse ? "front" : "back", name: "bottom", label: "Bottom" });
      tuckClosure(k, tube, { dir: "up", hinge: "back", name: "lid", label: "Lid" });

      k.inside("D", k.face("bottom dust 1", "inside"), k.face("lid dust 1", "inside"));
      k.inside("D", k.face("bottom dust 2", "inside"), k.face("lid dust 2", "inside"));
      k.outsideBy("D", k.stack(2), k.stack(2));
      k.governs("D", "side height");
      k.orderedAs("D", "back height");

      k.step("tube", "Body, glue flap in", "Square the tube; the glue flap lies inside the left side.", ["side 1", "front", "side 2", "glue flap"]);
      k.step("bottom dust", "Bottom dust flaps", "Fold in the two dust flaps of the bottom.", ["bottom dust 1", "bottom dust 2"]);
      k.step("bottom tuck", "Bottom tuck", "Bend the tuck of the bottom.", ["bottom tuck"]);
      k.step("bottom", "Bottom shut", "Close the bottom and push the tuck in until it clicks.", ["bottom"]);
      k.step("lid dust", "Lid dust flaps", "Fill; then fold in the two dust flaps of the lid.", ["lid dust 1", "lid dust 2"]);
      k.step("lid tuck", "Lid tuck", "Bend the tuck of the lid.", ["lid tuck"]);
      k.step("lid", "Lid shut", "Close the lid and push the tuck in until it clicks.", ["lid"]);
      for (const end of ["bottom", "lid"]) {
        const opposite = end === "bottom" && reverse ? "back" : "front";
        k.transient(`${end} tuck`, opposite, [end], "the tuck bends as it slips in past the edge");
        for (const side of [1, 2]) {
          k.transient(`${end} tuck`, `${end} dust ${side}`, [end], "the shoulder springs aside as the tuck goes down");
          k.transient(end, `${end} dust ${side}`, [end], "the lid presses the dust flap down");
        }
        if (opposite === "back") k.transient(`${end} tuck`, "glue flap", [end], "the tuck bends as it slips in beside the glue flap");
        k.transient(`${end} tuck`, "side 1", [end], "the tuck bends as it slips in between the sides");
        k.transient(`${end} tuck`, "side 2", [end], "the tuck bends as it slips in between the sides");
      }
    },
  };
}

const SIZE = { L: { from: 25, to: 400 }, W: { from: 13.75, to: 250 }, D: { from: 15, to: 500 } };
const COMMON = {
  families: ["carton", "micro"], closes: "tuck", pieces: 1, glued: true, size: SIZE,
  grain: { carton: "x", micro: "y" },
  meaning: "L between the sides, W between back and front, D between the dust flaps of the two ends",
} as const;

export const straightTuck: Construction = {
  id: "straight-tuck", name: "Straight tuck", summary: "Both ends hinge on the back: four clean edges at the front.",
  codes: [{ system: "ECMA", code: "A20.20", source: "family only; panel digits not confirmed, from memory" }, { system: "FEFCO", code: "0210", source: "from memory" }],
  sample: { size: { L: 60, W: 25, D: 90 }, board: "sbb-300" },
  ...COMMON, ...tuckEnd(false),
};

export const reverseTuck: Construction = {
  id: "reverse-tuck", name: "Reverse tuck", summary: "The ends hinge on opposite panels: blanks nest closer on the sheet.",
  codes: [{ system: "ECMA", code: "A20.20", source: "family only; panel digits not confirmed, from memory" }, { system: "FEFCO", code: "0211", source: "a web guide to FEFCO codes" }],
  sample: { size: { L: 60, W: 25, D: 90 }, board: "sbb-300" },
  ...COMMON, ...tuckEnd(true),
};
