/**
 * Tuck closure: dust flaps on the sides, a lid with a tongue on one of the large panels, going in behind the other.
 * Layers along D: dust flaps 0, lid 1. Along W the tongue is a lining (−1) behind the opposite panel.
 * The slit lock: the ends of the lid crease are cut, and a shoulder on each dust flap lies over the freed edge of the tongue.
 */
import type { Kit } from "../../blank/kit";
import { flipped, moved, rounded, type Corner } from "../../blank/shapes";
import type { Vertex } from "../../geometry/outline";
import type { Asks } from "../../parameters/parameter";
import { ACROSS, type Tube } from "./four-panel-tube";

const PRACTICE = "engineering practice, no published source";

/** Options of both ends, as rules: `room` is what a tongue may take of D, `besideGlue` how far its end stays from the side it has the glue flap on. */
export const tuckAsks = (room: string, besideGlue: string): Asks => tuckOptions(room, `2.6 + shoulderShort + a + ${besideGlue}`);

const tuckOptions = (room: string, leastSlit: string): Asks => ({
  tuck: {
    label: "Tuck", kind: "length", default: `max(if(micro, 18, 11), min(if(micro, clamp(10 + W/4, 18, 35), clamp(4 + W/3, 11, 20)), 0.8*W, ${room}))`,
    atLeast: 8, atMost: `min(0.8*W, ${room})`, why: "deep enough to hold by friction, short enough to swing in", source: PRACTICE, because: "the tongue must swing in past the front edge and clear the other end's",
  },
  tuckRadius: { label: "Tuck, corner radius", kind: "length", default: "min(tuck/2, if(micro, 12, 8))", atLeast: 0, atMost: "min(tuck - 2, L/3)", why: "finds its way in", source: "4 to 10 mm at free corners, common practice" },
  tuckRoot: { label: "Tuck, straight root", kind: "length", default: 3, atLeast: 0, atMost: "tuck/2", why: "a straight root is what friction holds", source: PRACTICE },
  tuckTaper: { label: "Tuck, taper a side", kind: "angle", default: "if(micro, 3, 2)", atLeast: 0, atMost: 15, why: "leads in", source: PRACTICE },
  ease: { label: "Lid, ease a side", kind: "length", default: "if(micro, 1, 0.5)", atLeast: 0.2, atMost: "L/10", why: "the lid must not scrape the sides", source: "0.5 to 1 mm total a side, common practice" },
  lidLead: { label: "Lid, taper at its root", kind: "length", default: 3, atLeast: 1, atMost: "W/3", why: "the cuts of lid and dust flap open as a wedge from the crease corner", source: PRACTICE },
  shoulderShort: { label: "Shoulder, shorter than the slit", kind: "length", default: "if(micro, 2, 1)", atLeast: 0, atMost: 4, why: "the shoulder goes into the slit without forcing its end", source: PRACTICE },
  slit: { label: "Slit", kind: "length", default: `max(${leastSlit}, if(micro, clamp(0.08*L, 8, 12), clamp(0.1*L, 4, 8)))`, atLeast: leastSlit, atMost: `max(${leastSlit}, L/2 - 6)`, why: "engages the shoulder by 2 mm or more", source: PRACTICE, because: "the shoulders must engage by 2 mm and 12 mm of crease must be left" },
  slitLock: { label: "Slit lock", kind: "switch", default: "if(L < max(if(micro, 80, 30), 2*slit + 18), 0, 1)", why: "holds the lid shut where the crease is long enough", source: PRACTICE },
  slitDrop: { label: "Lock edge below the crease", kind: "length", default: "if(0.5 < t, max(1.5*t + if(micro, 0, 0.2), minGap), 0)", atLeast: 0, atMost: "tuck/3", why: "in thicker board the edge must lie under the dust flap", source: PRACTICE },
  hook: { label: "Slit end, hook radius", kind: "length", default: 1, atLeast: 0, atMost: 3, why: "a straight slit tears on along the crease", source: PRACTICE },
  dust: { label: "Dust flap", kind: "length", default: "min(L/2 - if(micro, 2, 1), if(micro, max(20, 0.6*W), max(12, 0.75*W)))", atLeast: "if(slitLock, slit + 2, 8)", atMost: "L/2 - 0.5", why: "holds the lid up and never meets the other", source: PRACTICE, because: "the two dust flaps must not meet, and the shoulder needs its length" },
  dustTaper: { label: "Dust flap, angle on the lock side", kind: "angle", default: 15, atLeast: 5, atMost: 30, why: "clears the tongue", source: "15 degrees first on the closure side, common practice" },
  dustHinge: { label: "Dust flap, angle on the hinge side", kind: "angle", default: "if(micro, 10, 15)", atLeast: 5, atMost: 45, why: "the lid passes; cuts open as a wedge of 5 degrees or more", source: PRACTICE },
  dustStart: { label: "Dust flap, set in on the hinge side", kind: "length", default: "a + if(micro, 1, 0.5)", atLeast: "a", atMost: "W/6", why: "clears the wall beside it", source: PRACTICE },
  shoulderGap: { label: "Shoulder to the panel it locks at", kind: "length", default: "if(micro, 0.5, 0.3)", atLeast: 0.2, atMost: 1, why: "close, but not rubbing", source: "0.2 to 0.5 mm, engineering practice" },
  shoulderStep: { label: "Step behind the shoulder", kind: "length", default: "t + slide + if(micro, 1, 0.7)", atLeast: "t + slide + 0.2", atMost: "W/4", why: "the tongue goes down past it", source: PRACTICE, because: "the tongue and its clearance must pass" },
  dustRadius: { label: "Dust flap, corner radius", kind: "length", default: 3, atLeast: 0, atMost: 10, why: "free corners catch and fray", source: "3 to 10 mm at free flap corners" },
});

export interface TuckEnd {
  readonly dir: "up" | "down";
  readonly hinge: "back" | "front";
  /** "bottom" or "lid": goes before the panels' names. */
  readonly name: string;
  readonly label: string;
}

/** Least engagement of a slit lock along L, mm. */
const LEAST_LOCK = 2;

export function tuckClosure(k: Kit, tube: Tube, end: TuckEnd): void {
  const { dir, hinge, name } = end;
  const opposite = hinge === "back" ? "front" : "back";
  const turned = (outline: readonly Vertex[]) => (dir === "up" ? outline : flipped(outline));
  const sign = dir === "up" ? 1 : -1;
  const locked = k.isOn("slitLock");
  const slit = k.number("slit");
  const drop = k.number("slitDrop");

  // The side at the low end of the lid's own axis, and the one at the high end.
  const [lowSide, highSide] = hinge === "back" ? (["side 2", "side 1"] as const) : (["side 1", "side 2"] as const);
  for (const side of ["side 1", "side 2"] as const) {
    const lockIsFar = (side === "side 1") === (opposite === "front");
    const outline = dustFlap(k, tube.width[side], tube.start[side], lockIsFar);
    k.attach(side, dir, `${name} dust ${side === "side 1" ? 1 : 2}`, turned(outline), { label: "Dust flap", origin: "foot" });
  }
  const dustOf = (side: "side 1" | "side 2") => `${name} dust ${side === "side 1" ? 1 : 2}`;

  const start = tube.start[hinge];
  const ease = k.number("ease");
  const depth = k.minus(k.cc("W", 0, -1, ACROSS), k.option("slide"));
  const [x0, x1] = [start + ease, start + k.size.L - ease];
  const lead = k.number("lidLead");
  k.attach(hinge, dir, name, turned(rounded([{ x: 0, y: 0 }, { x: tube.width[hinge], y: 0 }, { x: x1, y: lead }, { x: x1, y: depth.mm }, { x: x0, y: depth.mm }, { x: x0, y: lead }])), { label: end.label, role: "wall", origin: "foot" });

  // Where the tongue goes in beside the glue flap it needs that board's thickness and clearance as well.
  const besideGlue = opposite === "back" ? Math.max(ease, k.plus(k.stack(1), k.option("slide")).mm) : ease;
  const [t0, t1] = [lowSide === "side 2" ? start + besideGlue : x0, highSide === "side 2" ? start + k.size.L - besideGlue : x1];
  const tongue = `${name} tuck`;
  const crease: [number, number] | undefined = locked && drop === 0 ? (dir === "up" ? [t0 + slit, t1 - slit] : [-t1 + slit, -t0 - slit]) : undefined;
  k.attach(name, dir, tongue, turned(tongueOutline(k, t0, t1, locked)), { label: "Tuck", role: "lining", origin: "foot", ...(crease ? { crease } : {}) });
  if (locked) {
    const hook = k.number("hook");
    if (drop === 0 && hook > 0) {
      for (const [x, away] of [[t0 + slit, 1], [t1 - slit, -1]] as const) {
        // A quarter turn from the slit's end into the tongue.
        k.feature(tongue, "cut", { closed: false, vertices: [{ x: sign * x, y: 0, bulge: sign * away * Math.tan(Math.PI / 8) }, { x: sign * (x + away * hook), y: hook, bulge: 0 }] });
      }
    }
    for (const [side, from, to] of [[lowSide, t0, t0 + slit], [highSide, t1 - slit, t1]] as const) {
      k.lock(`slit lock, ${end.label.toLowerCase()}`, tongue, [{ x: sign * from, y: drop }, { x: sign * to, y: drop }], dustOf(side), LEAST_LOCK);
      k.interlock(tongue, dustOf(side), 1, "the shoulder of the dust flap lies in the thickness of the tongue's end");
    }
  }

  k.slides(k.face(tongue, "print"), k.face(opposite, "inside"), k.option("slide"), 20);
  for (const side of ["side 1", "side 2"] as const) k.touches(k.face(name, "inside"), k.face(dustOf(side), "print"), 20);
  k.row(`${name} depth`, `${end.label}, to the tuck crease`, depth, { panel: name, along: "y", reason: "short by the clearance, so that the tongue slides behind the panel" });
  k.row(`${name} width`, `${end.label}, width`, k.minus(k.asked("L"), k.option("ease", 2)), { panel: name, along: "x", reason: "" });
  k.row(`${tongue} depth`, "Tuck", k.option("tuck"), { panel: tongue, along: "y", reason: "" });
  k.row(`${dustOf("side 1")} depth`, "Dust flap", k.option("dust"), { panel: dustOf("side 1"), along: "y", reason: "" });
}

/** Dust flap from its panel's crease at x = 0 over `width`; the inside begins at `start`. Drawn with its lock side far, turned if it is near. */
function dustFlap(k: Kit, width: number, start: number, lockIsFar: boolean): Vertex[] {
  const depth = k.number("dust");
  const set = k.number("dustStart");
  const shoulder = k.number("shoulderGap");
  const radius = k.number("dustRadius");
  const slope = (degrees: number, over: number) => over * Math.tan((degrees * Math.PI) / 180);
  // Drawn from a hinge side at x = 0: where its own wall and the opposite wall stand depends on which way round the panel lies.
  const wall = lockIsFar ? start + k.size.W : width - start;
  const hingeFace = lockIsFar ? start : Math.max(0, width - start - k.size.W);
  const hinge = Math.max(set - start + hingeFace, 0);
  const lock = Math.min(wall - shoulder, width);
  const step = lock - k.number("shoulderStep");
  const held = k.isOn("slitLock") ? k.number("slit") - k.number("shoulderShort") : 0;
  const far = width - lock;
  // Without a shoulder the edge is clear of the tongue before the tongue's end begins.
  const clear = start + k.number("ease") / 2;
  const corners: Corner[] = [{ x: 0, y: 0 }, { x: width, y: 0 }];
  if (held > 0) corners.push({ x: lock, y: far }, { x: lock, y: held, r: 0.5 }, { x: step, y: held, r: 0.5 });
  else corners.push({ x: step, y: clear });
  const from = held > 0 ? held : clear;
  corners.push({ x: step - slope(k.number("dustTaper"), depth - from), y: depth, r: radius }, { x: hinge + slope(k.number("dustHinge"), depth - hinge), y: depth, r: radius }, { x: hinge, y: hinge });
  const outline = rounded(hinge > 0 ? corners : corners.slice(0, -1));
  return lockIsFar ? outline : moved(flipped(outline), width);
}

function tongueOutline(k: Kit, x0: number, x1: number, locked: boolean): Vertex[] {
  const depth = k.number("tuck");
  const root = k.number("tuckRoot");
  const drop = locked ? k.number("slitDrop") : 0;
  const slit = k.number("slit");
  const radius = k.number("tuckRadius");
  const start = Math.max(root, drop + 1);
  const inwards = (depth - start) * Math.tan((k.number("tuckTaper") * Math.PI) / 180);
  const right: Corner[] = drop > 0 ? [{ x: x1 - slit, y: 0 }, { x: x1 - slit, y: drop, r: 0.5 }, { x: x1, y: drop, r: 0.5 }] : [{ x: x1, y: 0 }];
  const left: Corner[] = drop > 0 ? [{ x: x0, y: drop, r: 0.5 }, { x: x0 + slit, y: drop, r: 0.5 }, { x: x0 + slit, y: 0 }] : [{ x: x0, y: 0 }];
  const first = left[left.length - 1]!;
  return rounded([first, ...right, { x: x1, y: start }, { x: x1 - inwards, y: depth, r: radius }, { x: x0 + inwards, y: depth, r: radius }, { x: x0, y: start }, ...left.slice(0, -1)]);
}
