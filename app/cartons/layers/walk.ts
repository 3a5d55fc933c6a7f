// The boundary walk: outlines, creases and slits from the half-edges of the panels. One pass, no booleans.
import { apply } from "../geometry/isometry";
import type { Path, Point, Vertex } from "../geometry/outline";
import { areaOf } from "../geometry/path";
import { SAME_POINT, SHORTEST_LINE } from "../geometry/tolerance";
import type { Blank } from "../blank/blank";
import { nextVertex, type CreaseKind, type Panel, type Span } from "../blank/panel";

interface HalfEdge {
  readonly panel: Panel;
  readonly from: Point;
  readonly to: Point;
  readonly bulge: number;
  readonly span: Span | null;
  /** Index of the half-edge after it in the same panel. */
  next: number;
  /** Index of the half-edge on the other side of the crease or slit; −1 = nothing there: it is cut. */
  twin: number;
}

export interface SharedLine {
  readonly kind: CreaseKind | "slit";
  readonly panels: readonly [string, string];
  readonly from: Point;
  readonly to: Point;
}

export interface Walked {
  /** One a part, CCW. */
  readonly outlines: readonly Path[];
  /** Holes between panels, CW; cut-outs within a panel are features, not walked. */
  readonly holes: readonly Path[];
  readonly lines: readonly SharedLine[];
}

/** Walks the boundary of the panels that `takes` lets in; creases towards the others count as cut. */
export function walkBoundary(blank: Blank, takes: (panel: Panel) => boolean = () => true): Walked {
  const edges = halfEdges(blank.panels.filter(takes));
  const seen = new Uint8Array(edges.length);
  const outlines: Path[] = [];
  const holes: Path[] = [];
  for (let start = 0; start < edges.length; start++) {
    if (seen[start] || edges[start]!.twin >= 0) continue;
    const vertices: Vertex[] = [];
    let at = start;
    do {
      const e = edges[at]!;
      seen[at] = 1;
      vertices.push({ x: e.from.x, y: e.from.y, bulge: e.bulge });
      at = e.next;
      while (edges[at]!.twin >= 0) at = edges[edges[at]!.twin]!.next;
    } while (at !== start);
    const path: Path = { closed: true, vertices: tidied(vertices) };
    if (areaOf(path) > 0) outlines.push(path);
    else holes.push(path);
  }
  return { outlines, holes, lines: sharedLines(edges) };
}

function halfEdges(panels: readonly Panel[]): HalfEdge[] {
  const edges: HalfEdge[] = [];
  const bySpan = new Map<string, number>();
  const key = (panel: Panel, edge: number, from: number) => `${panel.index}/${edge}/${from}`;
  for (const panel of panels) {
    const first = edges.length;
    panel.outline.forEach((a, i) => {
      const b = nextVertex(panel, i);
      const start = apply(panel.flat, a);
      const end = apply(panel.flat, b);
      const spans = panel.spans.filter((s) => s.edge === i).sort((p, q) => p.from - q.from);
      const length = Math.hypot(b.x - a.x, b.y - a.y);
      const at = (s: number): Point => ({ x: start.x + ((end.x - start.x) * s) / length, y: start.y + ((end.y - start.y) * s) / length });
      const push = (from: Point, to: Point, bulge: number, span: Span | null) => {
        if (span) bySpan.set(key(panel, i, span.from), edges.length);
        edges.push({ panel, from, to, bulge, span, next: edges.length + 1, twin: -1 });
      };
      if (spans.length === 0) {
        push(start, end, a.bulge, null);
        return;
      }
      let reached = 0;
      for (const span of spans) {
        if (span.from - reached > SAME_POINT) push(at(reached), at(span.from), 0, null);
        push(at(span.from), at(span.to), 0, span);
        reached = span.to;
      }
      if (length - reached > SAME_POINT) push(at(reached), end, 0, null);
    });
    edges[edges.length - 1]!.next = first;
  }
  for (const e of edges) {
    if (e.span) e.twin = bySpan.get(key(e.span.twin.panel, e.span.twin.edge, e.span.twin.from)) ?? -1;
  }
  return edges;
}

function sharedLines(edges: readonly HalfEdge[]): SharedLine[] {
  const lines: SharedLine[] = [];
  edges.forEach((e, i) => {
    if (e.twin < 0 || !e.span) return;
    const other = edges[e.twin]!;
    // Each pair once, from the child's side, so that the line runs left to right as one looks outwards.
    const child = e.panel.hinge?.parent === other.panel ? e : other.panel.hinge?.parent === e.panel ? other : i < e.twin ? e : null;
    if (child !== e) return;
    lines.push({ kind: e.span.kind, panels: [other.panel.name, e.panel.name], from: e.from, to: e.to });
  });
  return lines;
}

/** Leaves out points that repeat and points in the middle of a straight run: one line, one stroke. */
function tidied(vertices: readonly Vertex[]): Vertex[] {
  const apart = vertices.filter((v, i) => {
    const n = vertices[(i + 1) % vertices.length]!;
    return Math.hypot(n.x - v.x, n.y - v.y) > SHORTEST_LINE;
  });
  return apart.filter((v, i) => {
    const before = apart[(i - 1 + apart.length) % apart.length]!;
    const after = apart[(i + 1) % apart.length]!;
    if (v.bulge !== 0 || before.bulge !== 0) return true;
    const cross = (v.x - before.x) * (after.y - v.y) - (v.y - before.y) * (after.x - v.x);
    const forward = (v.x - before.x) * (after.x - v.x) + (v.y - before.y) * (after.y - v.y);
    const longer = Math.hypot(v.x - before.x, v.y - before.y) + Math.hypot(after.x - v.x, after.y - v.y);
    return forward <= 0 || Math.abs(cross) > SAME_POINT * longer;
  });
}
