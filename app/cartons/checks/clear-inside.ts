// What a rigid block passes: the nominal inside less what flaps, tongues and laps take of it.
import { transform, type Vec3 } from "../geometry/space";
import { CONTACT_TOLERANCE } from "../geometry/tolerance";
import type { Axis, Finding, Size } from "../types";
import { along, type Closed } from "./closed";
import type { Plate } from "./solids";

export interface ClearReport {
  readonly clear: Size;
  readonly findings: readonly Finding[];
}

const AXES = ["L", "W", "D"] as const;
type Triple = readonly [number, number, number];

/** The extent, along each inside axis, of what a plate leaves inside the box; null when it leaves nothing. */
function within(closed: Closed, plate: Plate): { low: number[]; high: number[] } | null {
  const low = [Infinity, Infinity, Infinity];
  const high = [-Infinity, -Infinity, -Infinity];
  for (const piece of plate.pieces) {
    for (const z of [-plate.half, 0, plate.half]) {
      let points: Triple[] = piece.map((p) => {
        const w: Vec3 = transform(plate.matrix, p.x, p.y, z);
        return [along(closed.axes.L, w), along(closed.axes.W, w), along(closed.axes.D, w)];
      });
      for (let k = 0; k < 3 && points.length >= 3; k++) {
        points = clipAxis(points, k, CONTACT_TOLERANCE, 1);
        points = clipAxis(points, k, -(closed.size[AXES[k]!] - CONTACT_TOLERANCE), -1);
      }
      if (points.length < 3) continue;
      for (const p of points) for (let k = 0; k < 3; k++) {
        if (p[k]! < low[k]!) low[k] = p[k]!;
        if (p[k]! > high[k]!) high[k] = p[k]!;
      }
    }
  }
  return low[0] === Infinity ? null : { low, high };
}

function clipAxis(points: readonly Triple[], k: number, bound: number, sign: 1 | -1): Triple[] {
  const out: Triple[] = [];
  points.forEach((p, i) => {
    const q = points[(i + 1) % points.length]!;
    const dp = sign * p[k]! - bound;
    const dq = sign * q[k]! - bound;
    if (dp >= 0) out.push(p);
    if (dp >= 0 !== dq >= 0) {
      const f = dp / (dp - dq);
      out.push([p[0] + (q[0] - p[0]) * f, p[1] + (q[1] - p[1]) * f, p[2] + (q[2] - p[2]) * f]);
    }
  });
  return out;
}

export function checkClearInside(closed: Closed): ClearReport {
  const findings: Finding[] = [];
  const taken: Record<Axis, [number, number]> = { L: [0, 0], W: [0, 0], D: [0, 0] };
  const bounding = new Set(closed.blank.cavity.filter((c) => c.own === null).flatMap((c) => [c.low.panel, c.high.panel]));
  for (const plate of closed.plates) {
    const left = bounding.has(plate.name) ? null : within(closed, plate);
    if (!left) continue;
    const panel = closed.blank.byName.get(plate.name)!;
    const loss = AXES.map((axis, k) => {
      const fromLow = left.high[k]!;
      const fromHigh = closed.size[axis] - left.low[k]!;
      return fromLow <= fromHigh ? { axis, end: 0 as const, by: fromLow } : { axis, end: 1 as const, by: fromHigh };
    }).sort((p, q) => p.by - q.by)[0]!;
    // The sheets are clipped a little inside the box's faces; the board itself starts at the face.
    taken[loss.axis][loss.end] = Math.max(taken[loss.axis][loss.end], loss.by);
    if (panel.role !== "lining") {
      findings.push({ code: "in-the-inside", severity: "error", panels: [plate.name], at: null, measured: loss.by, required: 0, facts: { axis: loss.axis, panel: plate.name }, mend: null });
    }
  }
  const rest = (axis: Axis) => closed.size[axis] - taken[axis][0] - taken[axis][1];
  return { clear: { L: rest("L"), W: rest("W"), D: rest("D") }, findings };
}
