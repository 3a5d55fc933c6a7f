/**
 * Body of a tube: glue flap | back | side 1 | front | side 2, glued to a tube by the flap inside side 2.
 * Panel frames: on the back x runs across and y up from the floor of the inside; on the panels right of it x runs
 * down the drawing. Layers: 0 bounds the inside, −1 (the glue flap) lies in it.
 */
import type { Kit, LayerUse } from "../../blank/kit";
import type { Figure } from "../../blank/figure";
import { rectangle, rounded } from "../../blank/shapes";
import type { Vertex } from "../../geometry/outline";
import type { Asks } from "../../parameters/parameter";

const PRACTICE = "engineering practice, no published source";

export const UPRIGHT: LayerUse = { creases: "y" };
export const ACROSS: LayerUse = { creases: "x" };

/** `seamMost`: a further limit, as a rule, on how far the last panel may be pulled back. */
export const tubeAsks = (seamMost: string): Asks => ({
  glue: {
    label: "Glue flap", kind: "length", default: "min(if(micro, if(D < 150, 20, if(D < 300, 25, 30)), if(D < 60, 10, if(D < 150, 13, if(D < 250, 15, 18)))), L - 5, W - 5)",
    atLeast: 6, atMost: "min(L, W) - 2", why: "a bead of 6 to 8 mm and its tolerance", source: PRACTICE, because: "it must lie on one side panel and hold a bead of glue",
  },
  glueFoot: { label: "Glue flap, set back at its ends", kind: "length", default: "if(micro, t + 1, 1)", atLeast: 0, atMost: "D/4", why: "clears the dust flaps", source: PRACTICE },
  glueTaper: { label: "Glue flap, angle of its ends", kind: "angle", default: "if(micro, 20, 15)", atLeast: 0, atMost: 45, why: "leads the flap in and keeps glue from the ends", source: "10 to 20 degrees, common practice, no source" },
  seam: {
    label: "Last panel, pulled back", kind: "length", default: `if(micro, 1, min(0.5, ${seamMost}))`, atLeast: 0, atMost: `min(W/8, 0.3*glue, ${seamMost})`,
    why: "the raw edge must not stand proud after gluing", source: PRACTICE, because: "the seam must stay covered, and the dust flap beside it must reach its lock",
  },
});

/** Of flap depth times D: the least glued area of a side seam (engineering practice, no published source). */
const SEAM_SHARE = 0.6;

/** mm. D below which set-backs and tapers leave less than that share of the seam glued. */
export function leastGluedDepth({ glue = 0, glueFoot = 0, glueTaper = 0, seam = 0 }: Readonly<Record<string, number>>): number {
  const covered = glue - seam;
  const tapers = (glue * glue - seam * seam) * Math.tan((glueTaper * Math.PI) / 180);
  const roundedOff = 1;
  return (2 * glueFoot * covered + tapers + roundedOff) / (covered - SEAM_SHARE * glue);
}

/** Where a panel ends, at top or bottom: creased to a closure at a layer, or free, level with the middle of a layer. */
export type End = { readonly crease: number } | { readonly free: number };
export interface Ends { readonly back: End; readonly side: End; readonly front: End }

export interface Notch { readonly width: number; readonly depth: number }

export interface Tube {
  readonly width: Readonly<Record<"back" | "side 1" | "front" | "side 2", number>>;
  /** Where the inside begins on the panel, from its left crease as seen standing up. */
  readonly start: Readonly<Record<"back" | "side 1" | "front" | "side 2", number>>;
}

/** `notch`: a thumb notch in the middle of the front's free upper edge. */
export function fourPanelTube(k: Kit, bottom: Ends, top: Ends, notch: Notch | null): Tube {
  const beyond = (end: End): Figure => ("crease" in end ? k.edge(end.crease, ACROSS) : k.plus(k.position(end.free, ACROSS), k.stack(0.5)));
  const height = (panel: keyof Ends): Figure => k.plus(k.asked("D"), beyond(bottom[panel]), beyond(top[panel]));
  const low = (panel: keyof Ends) => -beyond(bottom[panel]).mm;
  const high = (panel: keyof Ends) => k.size.D + beyond(top[panel]).mm;

  const back = k.cc("L", 0, -1, UPRIGHT);
  const side = k.cc("W", 0, 0, UPRIGHT);
  const front = k.cc("L", 0, 0, UPRIGHT);
  const last = k.minus(side, k.option("seam"));

  k.base("back", [{ x: 0, y: low("back"), bulge: 0 }, { x: back.mm, y: low("back"), bulge: 0 }, { x: back.mm, y: high("back"), bulge: 0 }, { x: 0, y: high("back"), bulge: 0 }], { label: "Back" });
  const standing = (panel: keyof Ends, width: number) => rectangle(-high(panel), -low(panel), width);
  k.attach("back", "right", "side 1", standing("side", side.mm), { label: "Right side", role: "wall", origin: "foot" });
  k.attach("side 1", "right", "front", notch ? notched(standing("front", front.mm), k.edge(0, UPRIGHT).mm + k.size.L / 2, notch) : standing("front", front.mm), { label: "Front", role: "wall", origin: "foot" });
  k.attach("front", "right", "side 2", standing("side", last.mm), { label: "Left side", role: "wall", origin: "foot" });

  const glue = k.number("glue");
  const foot = k.number("glueFoot");
  const slope = glue * Math.tan((k.number("glueTaper") * Math.PI) / 180);
  k.attach("back", "left", "glue flap", rounded([{ x: foot, y: 0 }, { x: k.size.D - foot, y: 0 }, { x: k.size.D - foot - slope, y: glue, r: 1 }, { x: foot + slope, y: glue, r: 1 }]), { label: "Glue flap", role: "lining", origin: "foot" });

  k.inside("L", k.face("side 2", "inside"), k.face("side 1", "inside"));
  k.inside("W", k.face("back", "inside"), k.face("front", "inside"));
  k.glued(k.face("glue flap", "print"), k.face("side 2", "inside"), SEAM_SHARE * glue * k.size.D);
  k.outsideBy("L", k.stack(1), k.stack(1));
  k.outsideBy("W", k.stack(1), k.stack(1));

  k.row("glue flap", "Glue flap", k.option("glue"), { panel: "glue flap", along: "y", reason: "" });
  k.row("back", "Back, glue flap inside", back, { panel: "back", along: "x", reason: "one caliper shorter than the front: the glue flap lies inside the left side" });
  k.row("side 1", "Right side", side, { panel: "side 1", along: "y", reason: "" });
  k.row("front", "Front", front, { panel: "front", along: "y", reason: "" });
  k.row("side 2", "Left side, free edge", last, { panel: "side 2", along: "y", reason: "pulled back so that the raw edge does not stand proud" });
  k.row("side height", "Sides, crease to crease", height("side"), { panel: "side 1", along: "x", reason: "" });
  k.row("back height", "Back, crease to crease", height("back"), { panel: "back", along: "y", reason: "the lid lies over the dust flaps" });
  k.row("front height", "Front, edge to edge", height("front"), { panel: "front", along: "x", reason: "level with the lid" });
  // Flat: back + … the seam is P2 + P3 − P1 from its crease; erect it is W and one board.
  k.seamResidual(k.minus(k.minus(k.plus(side, front), back), k.plus(k.asked("W"), k.stack(1))));
  k.governs("L", "front");
  k.governs("W", "side 1");
  k.orderedAs("L", "front");
  k.orderedAs("W", "side 1");
  k.stands([0, 1, 0], [0, 0, 1]);
  return {
    width: { back: back.mm, "side 1": side.mm, front: front.mm, "side 2": last.mm },
    start: { back: k.edge(-1, UPRIGHT).mm, "side 1": k.edge(0, UPRIGHT).mm, front: k.edge(0, UPRIGHT).mm, "side 2": k.edge(0, UPRIGHT).mm },
  };
}

/** The rectangle's left edge is the top of a standing panel: an arc goes into it, its middle at `y`. */
function notched(rect: readonly Vertex[], y: number, { width, depth }: Notch): Vertex[] {
  const x = rect[0]!.x;
  return [...rect, { x, y: y + width / 2, bulge: (-2 * depth) / width }, { x, y: y - width / 2, bulge: 0 }];
}
