// The boundary walk: outlines, creases and slits from the half-edges of the panels. One pass, no booleans.
import { apply } from "../geometry/isometry";
import type { Path, Point, Vertex } from "../geometry/outline";
import { areaOf } from "../geometry/path";
import { SAME_POINT, SHORTEST_LINE } from "../geometry/tolerance";
import type { Blank } from "../blank/blank";
import type { CreaseKind, Panel, Span } from "../blank/panel";

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
  const bySpan = new Map<Span, number>();
  for (const panel of panels) {
    const first = edges.length;
    const { outline, flat, spans } = panel;
    const n = outline.length;
    const start0 = apply(flat, outline[0]!);
    let start = start0;
    let nextSpan = 0;
    for (let i = 0; i < n; i++) {
      const end = i + 1 === n ? start0 : apply(flat, outline[i + 1]!);
      const { bulge } = outline[i]!;
      let reached: Point = start;
      let length = 0;
      let at = 0;
      for (; nextSpan < spans.length && spans[nextSpan]!.edge === i; nextSpan++) {
        const span = spans[nextSpan]!;
        length ||= Math.hypot(end.x - start.x, end.y - start.y);
        const from = pointAt(start, end, span.from / length);
        const to = pointAt(start, end, span.to / length);
        if (span.from - at > SAME_POINT) edges.push({ panel, from: reached, to: from, bulge: 0, span: null, next: edges.length + 1, twin: -1 });
        bySpan.set(span, edges.length);
        edges.push({ panel, from, to, bulge: 0, span, next: edges.length + 1, twin: -1 });
        reached = to;
        at = span.to;
      }
      if (length === 0 || length - at > SAME_POINT) edges.push({ panel, from: reached, to: end, bulge, span: null, next: edges.length + 1, twin: -1 });
      start = end;
    }
    edges[edges.length - 1]!.next = first;
  }
  for (const [span, index] of bySpan) edges[index]!.twin = (span.twin && bySpan.get(span.twin)) ?? -1;
  return edges;
}

const pointAt = (a: Point, b: Point, f: number): Point => ({ x: a.x + (b.x - a.x) * f, y: a.y + (b.y - a.y) * f });

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
export function tidied(vertices: readonly Vertex[]): Vertex[] {
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
