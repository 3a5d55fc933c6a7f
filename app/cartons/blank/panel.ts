// Panels joined at creases: the half-edge tree from which everything else is derived. No sizes are decided here.
import { apply, compose, type Isometry } from "../geometry/isometry";
import type { Path, Point, Vertex } from "../geometry/outline";
import { SAME_POINT } from "../geometry/tolerance";
import type { PanelRole } from "../types";

export type Compass = "up" | "down" | "left" | "right";
export type CreaseKind = "crease" | "reverseCrease" | "perforation" | "halfCut";

/** A stretch of a straight edge that another panel shares: folded along, or cut once for both (slit). */
export interface Span {
  readonly edge: number;
  /** Distances along the panel's own CCW edge, mm. */
  readonly from: number;
  readonly to: number;
  readonly kind: CreaseKind | "slit";
  readonly panel: Panel;
  /** The same stretch as the other panel has it. */
  twin: Span | null;
}

export interface Feature {
  readonly kind: "cut" | "perforation" | "halfCut" | "crease";
  readonly path: Path;
}

export interface Hinge {
  readonly parent: Panel;
  readonly child: Panel;
  readonly flat: Isometry;
  /** Radians, + folds towards the inside. */
  readonly angle: number;
  readonly height: number;
  readonly kind: CreaseKind;
  /** Ends of the crease in the child's frame: (from, 0) and (to, 0). */
  readonly from: number;
  readonly to: number;
}

export interface Panel {
  readonly index: number;
  readonly name: string;
  readonly label: string;
  readonly role: PanelRole;
  readonly part: string;
  readonly outline: readonly Vertex[];
  /** Panel frame → drawing. */
  readonly flat: Isometry;
  readonly hinge: Hinge | null;
  readonly spans: Span[];
  readonly features: Feature[];
}

export const nextVertex = (panel: Panel, edge: number): Vertex => panel.outline[(edge + 1) % panel.outline.length]!;

const COMPASS: Record<Compass, Point> = { up: { x: 0, y: 1 }, down: { x: 0, y: -1 }, left: { x: -1, y: 0 }, right: { x: 1, y: 0 } };

/** The panel's longest straight edge whose outward side looks that way on the drawing. Throws when there is none: a defect of the construction. */
export function edgeTowards(panel: Panel, compass: Compass): number {
  const want = COMPASS[compass];
  let best = -1;
  let longest = 0;
  panel.outline.forEach((a, i) => {
    const b = nextVertex(panel, i);
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    if (a.bulge !== 0 || length <= longest) return;
    const out = { x: (b.y - a.y) / length, y: -(b.x - a.x) / length };
    const looks = { x: panel.flat.c * out.x - panel.flat.s * out.y, y: panel.flat.s * out.x + panel.flat.c * out.y };
    // cos 8°: an edge with a taper is not the edge that was meant.
    if (looks.x * want.x + looks.y * want.y < 0.99) return;
    best = i;
    longest = length;
  });
  if (best < 0) throw new Error(`${panel.name} has no straight edge towards ${compass}`);
  return best;
}

/** ±1 and 0 where rounding left them a hair off. */
const clean = (value: number): number => (Math.abs(value - Math.round(value)) < SAME_POINT ? Math.round(value) : value);

/**
 * Frame of a child that stands on an edge and looks outwards: x along the edge from its end to its start, y away from
 * the parent. Its origin is the foot of the parent's own origin on the edge, or the middle of the edge.
 */
export function childFrame(parent: Panel, edge: number, origin: "foot" | "middle"): Isometry {
  const a = parent.outline[edge]!;
  const b = nextVertex(parent, edge);
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  const c = clean(-(b.x - a.x) / length);
  const s = clean(-(b.y - a.y) / length);
  if (origin === "middle") return { c, s, x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
  const along = -(a.x * c + a.y * s);
  return { c, s, x: a.x + c * along, y: a.y + s * along };
}

/** Where the parent's edge lies on the child's x axis: [low, high]. */
export function edgeOnChildAxis(parent: Panel, edge: number, frame: Isometry): [number, number] {
  const a = parent.outline[edge]!;
  const b = nextVertex(parent, edge);
  const xOf = (p: Point) => (p.x - frame.x) * frame.c + (p.y - frame.y) * frame.s;
  return [xOf(b), xOf(a)];
}

/** The child's edge that lies on y = 0 and runs in +x. */
export function baseEdge(outline: readonly Vertex[]): number {
  const index = outline.findIndex((a, i) => {
    const b = outline[(i + 1) % outline.length]!;
    return a.bulge === 0 && Math.abs(a.y) < SAME_POINT && Math.abs(b.y) < SAME_POINT && b.x > a.x;
  });
  if (index < 0) throw new Error("a child's outline needs its base edge on y = 0");
  return index;
}

/** Twins a stretch of the child's base edge, given on the child's x axis, with the same stretch of the parent's edge. */
export function twin(parent: Panel, parentEdge: number, child: Panel, frame: Isometry, from: number, to: number, kind: Span["kind"]): void {
  const edge = baseEdge(child.outline);
  const base = child.outline[edge]!.x;
  const [, high] = edgeOnChildAxis(parent, parentEdge, frame);
  const mine: Span = { panel: child, edge, from: from - base, to: to - base, kind, twin: null };
  const theirs: Span = { panel: parent, edge: parentEdge, from: high - to, to: high - from, kind, twin: mine };
  mine.twin = theirs;
  addSpan(child, mine);
  addSpan(parent, theirs);
}

/** Keeps a panel's spans in the order in which its boundary is walked. */
function addSpan(panel: Panel, span: Span): void {
  const { spans } = panel;
  if (spans.some((s) => s.edge === span.edge && s.from < span.to - SAME_POINT && s.to > span.from + SAME_POINT)) throw new Error(`two panels on one stretch of ${panel.name}`);
  let at = spans.length;
  while (at > 0 && (spans[at - 1]!.edge > span.edge || (spans[at - 1]!.edge === span.edge && spans[at - 1]!.from > span.from))) at--;
  spans.splice(at, 0, span);
}

export const toDrawing = (panel: Panel, p: Point): Point => apply(panel.flat, p);
export const childOnDrawing = (parent: Panel, frame: Isometry): Isometry => compose(parent.flat, frame);
