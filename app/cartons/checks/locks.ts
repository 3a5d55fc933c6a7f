// Slit locks and their like: a free edge must lie under the panel that holds it, far enough.
import type { Point } from "../geometry/outline";
import { multiply, transform } from "../geometry/space";
import type { Finding, LockReport } from "../types";
import type { Closed } from "./closed";

export interface LocksReport {
  readonly locks: readonly LockReport[];
  readonly findings: readonly Finding[];
}

export function checkLocks(closed: Closed): LocksReport {
  const findings: Finding[] = [];
  const locks = closed.blank.locks.map((lock): LockReport => {
    const holder = closed.plates[closed.blank.byName.get(lock.heldBy)!.index]!;
    const owner = closed.plates[closed.blank.byName.get(lock.edgeOf)!.index]!;
    const m = multiply(holder.inverse, owner.matrix);
    const [p, q] = lock.edge.map((e) => transform(m, e.x, e.y, 0)) as [readonly [number, number, number], readonly [number, number, number]];
    const engagement = holder.pieces.reduce((sum, piece) => sum + lengthWithin({ x: p[0], y: p[1] }, { x: q[0], y: q[1] }, piece), 0);
    const ok = engagement >= lock.minimum;
    if (!ok) {
      findings.push({ code: "lock-short", severity: "error", panels: [lock.edgeOf, lock.heldBy], at: null, measured: engagement, required: lock.minimum, facts: { lock: lock.name }, mend: null });
    }
    return { name: lock.name, panels: [lock.edgeOf, lock.heldBy], engagement, minimum: lock.minimum, ok };
  });
  return { locks, findings };
}

/** Length of a segment inside a convex polygon, mm. */
function lengthWithin(p: Point, q: Point, polygon: readonly Point[]): number {
  let low = 0;
  let high = 1;
  for (let i = 0; i < polygon.length; i++) {
    const a = polygon[i]!;
    const b = polygon[(i + 1) % polygon.length]!;
    const side = (r: Point) => (b.x - a.x) * (r.y - a.y) - (b.y - a.y) * (r.x - a.x);
    const sp = side(p);
    const sq = side(q);
    if (sp < 0 && sq < 0) return 0;
    if (sp < 0) low = Math.max(low, sp / (sp - sq));
    else if (sq < 0) high = Math.min(high, sp / (sp - sq));
  }
  return Math.max(0, high - low) * Math.hypot(q.x - p.x, q.y - p.y);
}
