/** Outlines of a roll-end mailer's flaps, each in its own frame. Sizes are options or come from the declaration. */
import type { Kit } from "../../blank/kit";
import { flipped, rounded, type Corner } from "../../blank/shapes";
import type { Path, Vertex } from "../../geometry/outline";

const slope = (degrees: number, over: number): number => over * Math.tan((degrees * Math.PI) / 180);

/** From the base crease (x = 0) along the wall's end to `top`: a nick from the corner, then the taper. */
export function cornerFlap(k: Kit, top: number, footOnLeft: boolean): Vertex[] {
  const deep = k.number("cornerDeep");
  const foot = k.number("cornerFoot");
  const r = k.number("cornerRadius");
  const outline = rounded([
    { x: 0, y: 0 }, { x: top, y: 0 }, { x: top, y: deep, r }, { x: foot + slope(k.number("cornerTaper"), deep - foot), y: deep, r }, { x: foot, y: foot },
  ]);
  return footOnLeft ? outline : flipped(outline);
}

/** How far strip and inner wall stay from the base's ends: at the front more, when ears go in there. x runs along the side, front at the left or at the right. */
function ends(k: Kit, inset: number, frontIsLeft: boolean): [number, number] {
  const half = k.plus(k.asked("W")).mm / 2;
  const front = half - inset - (k.isOn("ears") ? k.number("earSet") : 0);
  const back = half - inset;
  return frontIsLeft ? [-front, back] : [-back, front];
}

export function strip(k: Kit, _length: number, width: number, frontIsLeft: boolean): Vertex[] {
  const [x0, x1] = ends(k, k.number("stripIn") - k.edge(0, { creases: "x" }).mm, frontIsLeft);
  return rounded([{ x: x0, y: 0 }, { x: x1, y: 0 }, { x: x1, y: width }, { x: x0, y: width }]);
}

/** Middles of the tabs along the side, in the inner wall's own frame. */
export function tabsOf(k: Kit, frontIsLeft: boolean): number[] {
  const [x0, x1] = ends(k, k.number("slide"), frontIsLeft);
  const n = k.number("tabs");
  return Array.from({ length: n }, (_, i) => x0 + ((x1 - x0) * (i + 0.5)) / n);
}

export function innerWall(k: Kit, height: number, frontIsLeft: boolean): Vertex[] {
  const [x0, x1] = ends(k, k.number("slide"), frontIsLeft);
  const out = k.number("tabOut");
  const half = k.number("tabLength") / 2;
  const tip = half - slope(k.number("tabTaper"), out);
  const r = Math.min(1, out / 2);
  const tabs = [...tabsOf(k, frontIsLeft)].reverse().flatMap((x): Corner[] => [
    { x: x + half, y: height }, { x: x + tip, y: height + out, r }, { x: x - tip, y: height + out, r }, { x: x - half, y: height },
  ]);
  return rounded([{ x: x0, y: 0 }, { x: x1, y: 0 }, { x: x1, y: height, r: 1 }, ...tabs, { x: x0, y: height, r: 1 }]);
}

/** A slot in the base for the tab whose middle is at (x, along) on the drawing. */
export function slot(k: Kit, x: number, along: number): Path {
  const length = k.number("tabLength") + k.number("slotLonger");
  const width = k.plus(k.stack(1), k.option("slotWider")).mm;
  const r = Math.min(0.5, width / 4);
  return {
    closed: true,
    vertices: rounded([
      { x: x - width / 2, y: along - length / 2, r }, { x: x + width / 2, y: along - length / 2, r },
      { x: x + width / 2, y: along + length / 2, r }, { x: x - width / 2, y: along + length / 2, r },
    ]),
  };
}

/** On the lid's side, x from its back crease towards the tuck or away from it. */
export function wing(k: Kit, lidDepth: number, backOnRight: boolean): Vertex[] {
  const deep = k.number("wing");
  const taper = k.number("wingTaper");
  const rear = k.number("wingRear");
  const front = lidDepth - k.number("wingFront");
  const r = k.number("cornerRadius");
  const outline = rounded([{ x: rear, y: 0 }, { x: front, y: 0 }, { x: front - slope(taper, deep), y: deep, r }, { x: rear + slope(taper, deep), y: deep, r }]);
  return backOnRight ? flipped(outline) : outline;
}

export function tuckFlap(k: Kit): Vertex[] {
  const half = (k.size.L - k.number("tuckShort")) / 2;
  const deep = k.number("tuck");
  const r = k.number("tuckRadius");
  return rounded([{ x: -half, y: 0 }, { x: half, y: 0 }, { x: half, y: deep, r }, { x: -half, y: deep, r }]);
}

/** Where the ear hangs on the tuck's end, from the lid crease: [from, to]. */
function earPlace(k: Kit): [number, number] {
  // Below the roll, whose inner face is level with the lid's.
  const from = k.edge(0, { creases: "x" }).mm + 0.3;
  return [from, from + k.number("earHigh")];
}

/** As wide as the front where the ears hang; below them as narrow as the room between the side walls. */
export function earedTuck(k: Kit, width: number): Vertex[] {
  const half = width / 2;
  const narrow = (k.size.L - k.number("tuckShort")) / 2;
  const deep = k.number("tuck");
  const r = k.number("tuckRadius");
  const [, earEnd] = earPlace(k);
  const bend = Math.min(deep - 1, earEnd + half - narrow);
  return rounded([
    { x: -half, y: 0 }, { x: half, y: 0 }, { x: half, y: earEnd }, { x: narrow, y: bend, r: 1 }, { x: narrow, y: deep, r },
    { x: -narrow, y: deep, r }, { x: -narrow, y: bend, r: 1 }, { x: -half, y: earEnd },
  ]);
}

/** The edge of an eared tuck that an ear hangs on: the outermost one on that side. */
export function earEdge(tuck: readonly Vertex[], end: "left" | "right"): number {
  const outermost = Math[end === "left" ? "min" : "max"](...tuck.map((v) => v.x));
  return tuck.findIndex((v, i) => v.x === outermost && tuck[(i + 1) % tuck.length]!.x === outermost);
}

/** On the tuck's end, x from the lid's crease; rounded like a half circle. */
export function ear(k: Kit, footOnLeft: boolean): Vertex[] {
  const long = k.number("earLong");
  const [from, to] = earPlace(k);
  const r = Math.min((to - from) / 2, long);
  const outline = rounded([{ x: from, y: 0 }, { x: to, y: 0 }, { x: to, y: long, r }, { x: from, y: long, r }]);
  return footOnLeft ? outline : flipped(outline);
}
