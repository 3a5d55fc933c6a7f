// The faces of thick board in a pose, as polygons in space with the kind of each of their edges. Nothing is sorted here.
import { arcOf } from "../../geometry/path";
import type { Path, Point, Vertex } from "../../geometry/outline";
import { transform, type Mat, type Vec3 } from "../../geometry/space";
import type { Carton, FoldPanel, Pose } from "../../types";

export type Tone = "print" | "inside" | "core";
/** outline = board ends here; fold = a crease that is bent; crease = one that lies flat. */
export type EdgeKind = "outline" | "fold" | "crease" | null;

export interface Face {
  readonly points: readonly Vec3[];
  /** Kind of the edge from each point to the next. */
  readonly edges: readonly EdgeKind[];
  readonly tone: Tone;
  readonly normal: Vec3;
  readonly panel: string;
  /** Seen from both sides (a bend has no thickness of its own). */
  readonly twoSided: boolean;
}

export interface Run { readonly a: Point; readonly b: Point; readonly kind: EdgeKind }

/** Chords a quarter turn of an arc is drawn with. */
const CHORDS = 4;
/** sin 15°: below it a crease counts as lying flat. */
const FLAT_FOLD = 0.26;
/** mm: how near an edge must lie to a crease to be on it. */
const ON_LINE = 0.01;

/** A panel's outline in its own frame cut into runs: free, or along a crease. */
function runsOf(outline: Path, drawn: Path, creases: readonly { a: Point; b: Point; bent: boolean }[]): Run[] {
  const runs: Run[] = [];
  const n = outline.vertices.length;
  outline.vertices.forEach((a, i) => {
    const b = outline.vertices[(i + 1) % n]!;
    if (a.bulge !== 0) {
      arcPoints(a, b).forEach((p, k, all) => { if (k > 0) runs.push({ a: all[k - 1]!, b: p, kind: "outline" }); });
      return;
    }
    const da = drawn.vertices[i]!;
    const db = drawn.vertices[(i + 1) % n]!;
    const length = Math.hypot(db.x - da.x, db.y - da.y);
    if (length === 0) return;
    const on = (p: Point) => ((p.x - da.x) * (db.x - da.x) + (p.y - da.y) * (db.y - da.y)) / length;
    const off = (p: Point) => Math.abs((p.x - da.x) * (db.y - da.y) - (p.y - da.y) * (db.x - da.x)) / length;
    const stretches = creases.filter((c) => off(c.a) < ON_LINE && off(c.b) < ON_LINE)
      .map((c) => ({ from: Math.max(0, Math.min(on(c.a), on(c.b))), to: Math.min(length, Math.max(on(c.a), on(c.b))), bent: c.bent }))
      .filter((s) => s.to - s.from > ON_LINE).sort((p, q) => p.from - q.from);
    const at = (s: number): Point => ({ x: a.x + ((b.x - a.x) * s) / length, y: a.y + ((b.y - a.y) * s) / length });
    let reached = 0;
    for (const s of stretches) {
      if (s.from - reached > ON_LINE) runs.push({ a: at(reached), b: at(s.from), kind: "outline" });
      runs.push({ a: at(s.from), b: at(s.to), kind: s.bent ? "fold" : "crease" });
      reached = s.to;
    }
    if (length - reached > ON_LINE) runs.push({ a: at(reached), b, kind: "outline" });
  });
  return runs;
}

function arcPoints(a: Vertex, b: Point): Point[] {
  const arc = arcOf(a, b);
  const steps = Math.max(1, Math.ceil((Math.abs(arc.sweep) / (Math.PI / 2)) * CHORDS));
  return Array.from({ length: steps + 1 }, (_, i) => {
    if (i === 0) return a;
    if (i === steps) return b;
    const angle = arc.from + (arc.sweep * i) / steps;
    return { x: arc.centre.x + arc.radius * Math.cos(angle), y: arc.centre.y + arc.radius * Math.sin(angle) };
  });
}

/** mm: pieces and runs draw the same arc by other chords, which lie this near each other. */
const SAME_ARC = 0.4;

/** Does a piece's edge from p to q follow a run? Judged at its middle, and by direction. */
function follows(p: Point, q: Point, { a, b }: Run): boolean {
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  const own = Math.hypot(q.x - p.x, q.y - p.y);
  if (own === 0) return false;
  const [ux, uy] = [(b.x - a.x) / length, (b.y - a.y) / length];
  const middle = { x: (p.x + q.x) / 2 - a.x, y: (p.y + q.y) / 2 - a.y };
  const on = middle.x * ux + middle.y * uy;
  const off = Math.abs(middle.x * uy - middle.y * ux);
  return off < SAME_ARC && on > -SAME_ARC && on < length + SAME_ARC && Math.abs((q.x - p.x) * ux + (q.y - p.y) * uy) > 0.85 * own;
}

/** Each panel's outline and holes in its own frame, cut into what is free and what is creased. Creases count as lying flat. */
export function panelRuns(carton: Carton): Run[][] {
  const creases = creaseLines(carton).map((c) => ({ ...c, bent: false }));
  return carton.fold.panels.map((panel, i) => {
    const drawn = carton.panels[i]!;
    const own = creases.filter((c) => c.panels.includes(panel.name));
    return [runsOf(panel.outline, drawn.outline, own), ...panel.holes.map((h, k) => runsOf(h, drawn.holes[k]!, []))].flat();
  });
}

const creaseLines = (carton: Carton) => [...carton.layers.crease, ...carton.layers.reverseCrease].filter((c) => c.role === "crease")
  .map((c) => ({ panels: c.panels, a: c.path.vertices[0]!, b: c.path.vertices[1]! }));

/** All faces of the carton in a pose. `thin` leaves thickness out: for pictures of stamp size. */
export function facesOf(carton: Carton, pose: Pose, thin: boolean): Face[] {
  const faces: Face[] = [];
  const parentOf = new Map(carton.fold.hinges.map((h) => [h.child, h.parent]));
  const creases = creaseLines(carton).map((c) => {
    const [p, q] = c.panels.map((name) => pose[carton.fold.panels.findIndex((panel) => panel.name === name)]!) as [Mat, Mat];
    const cross = [p[6] * q[10] - p[10] * q[6], p[10] * q[2] - p[2] * q[10], p[2] * q[6] - p[6] * q[2]] as const;
    return { ...c, bent: Math.hypot(...cross) > FLAT_FOLD };
  });
  carton.fold.panels.forEach((panel, i) => {
    const m = pose[i]!;
    const drawn = carton.panels[i]!;
    const half = thin ? 0 : panel.thickness / 2;
    const own = creases.filter((c) => c.panels.includes(panel.name));
    const rings = [runsOf(panel.outline, drawn.outline, own), ...panel.holes.map((h, k) => runsOf(h, drawn.holes[k]!, []))];
    faces.push(...capsOf(panel, m, half, rings.flat()));
    if (!thin) {
      for (const ring of rings) for (const run of ring) if (run.kind === "outline") faces.push(sideOf(panel, m, half, run));
      const parent = parentOf.get(i);
      if (parent !== undefined) faces.push(...bendsOf(panel, m, pose[parent]!, carton, i, half, rings[0]!));
    }
  });
  return faces;
}

function capsOf(panel: FoldPanel, m: Mat, half: number, runs: readonly Run[]): Face[] {
  const up: Vec3 = [m[2], m[6], m[10]];
  const down: Vec3 = [-m[2], -m[6], -m[10]];
  return panel.pieces.flatMap((piece): Face[] => {
    const kinds = piece.map((p, k): EdgeKind => runs.find((run) => follows(p, piece[(k + 1) % piece.length]!, run))?.kind ?? null);
    const inside: Face = { points: piece.map((p) => transform(m, p.x, p.y, half)), edges: kinds, tone: "inside", normal: up, panel: panel.name, twoSided: false };
    const n = piece.length;
    // The print face is walked the other way round, so edge k of it is edge n − 2 − k of the piece.
    const print: Face = {
      points: piece.map((_, k) => transform(m, piece[n - 1 - k]!.x, piece[n - 1 - k]!.y, -half)),
      edges: piece.map((_, k) => kinds[(2 * n - 2 - k) % n]!), tone: "print", normal: down, panel: panel.name, twoSided: false,
    };
    return [inside, print];
  });
}

function sideOf(panel: FoldPanel, m: Mat, half: number, { a, b }: Run): Face {
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  const [nx, ny] = [(b.y - a.y) / length, -(b.x - a.x) / length];
  return {
    points: [transform(m, a.x, a.y, -half), transform(m, b.x, b.y, -half), transform(m, b.x, b.y, half), transform(m, a.x, a.y, half)],
    edges: ["outline", null, "outline", null], tone: "core", panel: panel.name, twoSided: false,
    normal: [m[0] * nx + m[1] * ny, m[4] * nx + m[5] * ny, m[8] * nx + m[9] * ny],
  };
}

/** The board's skin round a crease: from the parent's face to the child's, on both sides. */
function bendsOf(panel: FoldPanel, child: Mat, parent: Mat, carton: Carton, index: number, half: number, runs: readonly Run[]): Face[] {
  const hinge = carton.fold.hinges.find((h) => h.child === index)!;
  const { c, s, x, y } = hinge.flat;
  return runs.filter((r) => (r.kind === "fold" || r.kind === "crease") && Math.abs(r.a.y) < ON_LINE && Math.abs(r.b.y) < ON_LINE).flatMap((run): Face[] =>
    ([-1, 1] as const).map((side): Face => {
      const onParent = (p: Point): Vec3 => transform(parent, c * p.x - s * p.y + x, s * p.x + c * p.y + y, side * half);
      const onChild = (p: Point): Vec3 => transform(child, p.x, p.y, side * half);
      const points = [onParent(run.a), onParent(run.b), onChild(run.b), onChild(run.a)];
      const n: Vec3 = [parent[2] + child[2], parent[6] + child[6], parent[10] + child[10]];
      const size = Math.hypot(...n) || 1;
      return { points, edges: [null, null, null, null], tone: side < 0 ? "print" : "inside", panel: panel.name, twoSided: true, normal: [(side * n[0]) / size, (side * n[1]) / size, (side * n[2]) / size] };
    }));
}
