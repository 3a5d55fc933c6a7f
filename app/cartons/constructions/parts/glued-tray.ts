/**
 * A tray with glued corners: base, four walls, and a flap at each end of front and back glued inside the end walls.
 * Layers: walls 0; the glue flaps (−1) lie in the inside. Drawn round its own middle.
 */
import type { Figure } from "../../blank/figure";
import type { Kit, LayerUse } from "../../blank/kit";
import { flipped, rectangle, rounded, type Corner } from "../../blank/shapes";
import type { Isometry } from "../../geometry/isometry";
import type { Asks } from "../../parameters/parameter";

const ALONG_Y: LayerUse = { creases: "y" };
const ALONG_X: LayerUse = { creases: "x" };
const PRACTICE = "engineering practice, no published source";

export const trayAsks: Asks = {
  glue: { label: "Glue flap", kind: "length", default: "max(6.5, min(15, W/2 - 1, 1.2*D))", atLeast: 6.5, atMost: "W/2 - 0.5", why: "room for a bead of glue", source: PRACTICE, because: "the two flaps on one end wall would meet" },
  glueFoot: { label: "Glue flap, foot above the base", kind: "length", default: "a + t/2 + 1", atLeast: "a + 0.2", atMost: "D/4", why: "the foot must not bind in the base crease", source: PRACTICE },
  glueTop: { label: "Glue flap, set down at the top", kind: "length", default: "if(micro, 2, 1)", atLeast: 0, atMost: "D/4", why: "must not show above the wall", source: PRACTICE },
  glueTaper: { label: "Glue flap, taper", kind: "angle", default: 8, atLeast: 5, atMost: 20, why: "the cuts open as a wedge and the flap does not catch the base", source: PRACTICE },
  corner: { label: "Wall corners, radius", kind: "length", default: "min(1, D/4)", atLeast: 0, atMost: "D/3", why: "sharp corners cut hands and fray", source: "1 mm or more at outer corners, engineering practice" },
};

export interface TraySize { readonly L: Figure; readonly W: Figure; readonly D: Figure }
export interface TrayNames { readonly base: string; readonly front: string; readonly back: string; readonly left: string; readonly right: string; readonly flaps: readonly string[] }
interface TrayPlace { readonly part: string; readonly prefix: string; readonly words: string; readonly at: Isometry; /** The carton's own inside, or a size of its own (a lid's). */ readonly own: boolean }

/** Panels of a tray and what closes; steps are the caller's. Front is towards the bottom of the drawing. */
export function gluedTray(k: Kit, size: TraySize, place: TrayPlace): TrayNames {
  const name = (n: string) => `${place.prefix}${n}`;
  const baseL = k.cc(size.L, 0, 0, ALONG_Y);
  const baseW = k.cc(size.W, 0, 0, ALONG_X);
  const long = k.cc(size.L, -1, -1, ALONG_Y);
  const heightX = k.reach(size.D, 0, 0, "in", ALONG_X);
  const heightY = k.reach(size.D, 0, 0, "in", ALONG_Y);
  const r = k.number("corner");
  const wall = (width: number, height: number) => rounded([{ x: -width / 2, y: 0 }, { x: width / 2, y: 0 }, { x: width / 2, y: height, r }, { x: -width / 2, y: height, r }]);

  k.base(name("base"), rectangle(-baseL.mm / 2, baseL.mm / 2, baseW.mm).map((v) => ({ ...v, y: v.y - baseW.mm / 2 })), { label: `${place.words}base`, part: place.part, flat: place.at });
  // A glue flap hangs on the ends of front and back, so their corners stay square.
  const side = { label: "", role: "wall" as const };
  k.attach(name("base"), "down", name("front"), rectangle(-long.mm / 2, long.mm / 2, heightX.mm), { ...side, label: `${place.words}front` });
  k.attach(name("base"), "up", name("back"), rectangle(-long.mm / 2, long.mm / 2, heightX.mm), { ...side, label: `${place.words}back` });
  k.attach(name("base"), "left", name("left"), wall(baseW.mm, heightY.mm), { ...side, label: `${place.words}left end` });
  k.attach(name("base"), "right", name("right"), wall(baseW.mm, heightY.mm), { ...side, label: `${place.words}right end` });

  const flaps: string[] = [];
  for (const from of ["front", "back"] as const) for (const end of ["left", "right"] as const) {
    const flap = name(`glue flap ${from} ${end}`);
    // Looking outwards from the wall's end, its foot is on the left or on the right.
    const footOnLeft = (from === "front") === (end === "right");
    k.attach(name(from), end, flap, glueFlap(k, heightX.mm, footOnLeft), { label: "Glue", role: "lining", origin: "foot" });
    k.glued(k.face(flap, "print"), k.face(name(end), "inside"), Math.max(60, 0.15 * k.number("glue") * size.D.mm));
    flaps.push(flap);
  }

  const own = place.own ? null : size;
  k.inside("L", k.face(name("left"), "inside"), k.face(name("right"), "inside"), own?.L ?? null);
  k.inside("W", k.face(name("front"), "inside"), k.face(name("back"), "inside"), own?.W ?? null);
  k.openTop(k.face(name("base"), "inside"), ["front", "back", "left", "right"].map(name), own?.D ?? null);

  const w = place.words;
  k.row(name("base L"), `${w}base, long way`.trim(), baseL, { panel: name("base"), along: "x", reason: "" });
  k.row(name("base W"), `${w}base, short way`.trim(), baseW, { panel: name("base"), along: "y", reason: "" });
  k.row(name("front width"), `${w}front and back, width`, long, { panel: name("front"), along: "x", reason: "one caliper shorter at each end: the glue flaps lie inside the end walls" });
  k.row(name("wall height"), `${w}walls, height`, heightX, { panel: name("front"), along: "y", reason: "from the base crease to the free edge" });
  k.row(name("end height"), `${w}end walls, height`, heightY, { panel: name("right"), along: "y", reason: "from the base crease to the free edge" });
  k.row(name("glue"), `${w}glue flap`, k.option("glue"), { panel: flaps[0]!, along: "y", reason: "" });
  return { base: name("base"), front: name("front"), back: name("back"), left: name("left"), right: name("right"), flaps };
}

/** In its own frame the flap's x runs up or down its wall; `height` is the wall's. */
function glueFlap(k: Kit, height: number, footOnLeft: boolean) {
  const deep = k.number("glue");
  const foot = k.number("glueFoot");
  const top = height - k.number("glueTop");
  const slope = Math.tan((k.number("glueTaper") * Math.PI) / 180);
  // Distances from the base crease: a 45° nick from the corner up to the foot, then the taper.
  const shape: Corner[] = [
    { x: 0, y: 0 }, { x: top, y: 0 }, { x: top - slope * deep, y: deep, r: 1 }, { x: foot + slope * (deep - foot), y: deep, r: 1 }, { x: foot, y: foot },
  ];
  const outline = rounded(shape);
  return footOnLeft ? outline : flipped(outline);
}
