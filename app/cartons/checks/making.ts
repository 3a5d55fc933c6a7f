// Can it be cut and creased? Gaps between cuts, lengths and spacing of creases, by the route that cuts it.
import type { Point, Vertex } from "../geometry/outline";
import { SAME_POINT } from "../geometry/tolerance";
import type { Finding, LayerPath, Layers } from "../types";

export interface MakingLimits {
  /** Least gap between neighbouring cuts, mm: shared, a wedge, or this. */
  readonly minGap: number;
  /** Least distance between two parallel creases, mm: their channels lie side by side. */
  readonly creaseSpacing: number;
}

/** mm. A crease shorter than this between two cuts does not fold true (die-making practice, no published source). */
const SHORTEST_CREASE = 8;
/** sin 2.5°, doubled: a gap that opens by 5° or more from where its sides meet. */
const WEDGE = 2 * Math.sin((2.5 * Math.PI) / 180);
/** Radians: two cuts this close to parallel face each other like a slot. */
const SLOT = (5 * Math.PI) / 180;
/** mm. Two parallel cuts side by side for less than this are a step, not a slot. */
const STEP = 1.5;

export function checkMaking(layers: Layers, limits: MakingLimits): Finding[] {
  return [...narrowGaps(layers.cut, limits.minGap), ...creaseFindings(layers, limits.creaseSpacing)];
}

interface Edge { readonly a: Vertex; readonly b: Vertex; readonly length: number; readonly at: number; readonly minX: number; readonly maxX: number; readonly minY: number; readonly maxY: number }

function edgesOf(path: LayerPath): { edges: Edge[]; total: number } {
  const edges: Edge[] = [];
  const { vertices } = path.path;
  let at = 0;
  vertices.forEach((a, i) => {
    const b = vertices[(i + 1) % vertices.length]!;
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    edges.push({ a, b, length, at, minX: Math.min(a.x, b.x), maxX: Math.max(a.x, b.x), minY: Math.min(a.y, b.y), maxY: Math.max(a.y, b.y) });
    at += length;
  });
  return { edges, total: at };
}

/** Waste between two stretches of one outline that is neither wide enough nor a wedge. Arcs are taken by their chords. */
function narrowGaps(cuts: readonly LayerPath[], least: number): Finding[] {
  const findings: Finding[] = [];
  for (const outline of cuts.filter((c) => c.role === "outline")) {
    const { edges, total } = edgesOf(outline);
    for (let i = 0; i < edges.length; i++) for (let j = i + 2; j < edges.length; j++) {
      const p = edges[i]!;
      const q = edges[j]!;
      if ((i === 0 && j === edges.length - 1) || p.minX - least > q.maxX || q.minX - least > p.maxX || p.minY - least > q.maxY || q.minY - least > p.maxY) continue;
      const gap = gapBetween(p, q, least);
      if (!gap) continue;
      const way = Math.abs(gap.alongQ + q.at - gap.alongP - p.at);
      if (!gap.isSlot && gap.distance >= WEDGE * Math.min(way, total - way)) continue;
      findings.push({ code: "narrow-gap", severity: "warning", panels: [], at: gap.place, measured: gap.distance, required: least, facts: {}, mend: null });
    }
  }
  return findings;
}

interface Gap { readonly distance: number; readonly isSlot: boolean; readonly place: Point; readonly alongP: number; readonly alongQ: number }

/** The waste side of a CCW outline is on the right of its edges: both must have the other there. */
function gapBetween(p: Edge, q: Edge, least: number): Gap | null {
  const ends: { distance: number; place: Point; alongP: number; alongQ: number }[] = [];
  for (const [edge, other, flip] of [[p, q, false], [q, p, true]] as const) for (const [end, along] of [[edge.a, 0], [edge.b, edge.length]] as const) {
    const f = Math.max(0, Math.min(1, ((end.x - other.a.x) * (other.b.x - other.a.x) + (end.y - other.a.y) * (other.b.y - other.a.y)) / (other.length * other.length)));
    const foot = { x: other.a.x + f * (other.b.x - other.a.x), y: other.a.y + f * (other.b.y - other.a.y) };
    const distance = Math.hypot(end.x - foot.x, end.y - foot.y);
    const place = { x: (end.x + foot.x) / 2, y: (end.y + foot.y) / 2 };
    ends.push(flip ? { distance, place, alongP: f * other.length, alongQ: along } : { distance, place, alongP: along, alongQ: f * other.length });
  }
  const nearest = ends.reduce((a, b) => (b.distance < a.distance ? b : a));
  if (nearest.distance >= least - SAME_POINT || !isOutside(p, q)) return null;
  const dx = ((p.b.x - p.a.x) * (q.b.x - q.a.x) + (p.b.y - p.a.y) * (q.b.y - q.a.y)) / (p.length * q.length);
  const turn = Math.acos(Math.max(-1, Math.min(1, -dx)));
  return { ...nearest, isSlot: turn < SLOT && overlapAlong(p, q) > STEP };
}

/** Do they run in opposite directions with waste between them? */
function isOutside(p: Edge, q: Edge): boolean {
  const right = (e: Edge, x: Point) => (e.b.x - e.a.x) * (x.y - e.a.y) - (e.b.y - e.a.y) * (x.x - e.a.x) <= SAME_POINT * e.length;
  const middle = (e: Edge): Point => ({ x: (e.a.x + e.b.x) / 2, y: (e.a.y + e.b.y) / 2 });
  const against = (p.b.x - p.a.x) * (q.b.x - q.a.x) + (p.b.y - p.a.y) * (q.b.y - q.a.y) < 0;
  return against && right(p, middle(q)) && right(q, middle(p));
}

function overlapAlong(p: Edge, q: Edge): number {
  const ux = (p.b.x - p.a.x) / p.length;
  const uy = (p.b.y - p.a.y) / p.length;
  const s = [q.a, q.b].map((e) => (e.x - p.a.x) * ux + (e.y - p.a.y) * uy);
  return Math.min(p.length, Math.max(...s)) - Math.max(0, Math.min(...s));
}

function creaseFindings(layers: Layers, spacing: number): Finding[] {
  const findings: Finding[] = [];
  const creases = [...layers.crease, ...layers.reverseCrease];
  creases.forEach((c, i) => {
    const [a, b] = c.path.vertices as [Vertex, Vertex];
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    if (length < SHORTEST_CREASE) findings.push({ code: "crease-short", severity: "warning", panels: c.panels, at: a, measured: length, required: SHORTEST_CREASE, facts: { panel: c.panels[1] ?? "" }, mend: null });
    for (const other of creases.slice(i + 1)) {
      const [p, q] = other.path.vertices as [Vertex, Vertex];
      const ux = (b.x - a.x) / length;
      const uy = (b.y - a.y) / length;
      const off = (e: Point) => (e.x - a.x) * -uy + (e.y - a.y) * ux;
      const on = (e: Point) => (e.x - a.x) * ux + (e.y - a.y) * uy;
      const parallel = Math.abs(off(p) - off(q)) < SAME_POINT;
      const apart = Math.abs(off(p));
      const shared = Math.min(length, Math.max(on(p), on(q))) - Math.max(0, Math.min(on(p), on(q)));
      if (!parallel || apart < SAME_POINT || apart >= spacing - SAME_POINT || shared <= STEP) continue;
      findings.push({ code: "creases-close", severity: "warning", panels: [...c.panels, ...other.panels], at: { x: (p.x + q.x) / 2, y: (p.y + q.y) / 2 }, measured: apart, required: spacing, facts: {}, mend: null });
    }
  });
  return findings;
}
