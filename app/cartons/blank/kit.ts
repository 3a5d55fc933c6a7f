// What a construction sees. It declares panels, layers and what closes; only here is a layer turned into millimetres.
import type { Board } from "../boards/board";
import { allowanceFor } from "../boards/allowance-card";
import { IDENTITY, type Isometry } from "../geometry/isometry";
import type { Path, Point, Vertex } from "../geometry/outline";
import type { Axis, OptionValue, PanelRole, Size } from "../types";
import type { Blank, Face, FaceOf, Interlock, Lock, Mate, OpenTop, CavityPair, Part, Row, Step, Transient } from "./blank";
import { figure, minus, plus, term, times, type Figure } from "./figure";
import { childFrame, childOnDrawing, edgeOnChildAxis, edgeTowards, baseEdge, twin, type Compass, type CreaseKind, type Feature, type Panel } from "./panel";

export type Direction = "x" | "y";
export interface LayerUse {
  /** Which way the creases that bound this size run on the drawing. */
  readonly creases: Direction;
  /** Play between one layer and the next, mm. */
  readonly play?: Figure;
}
export interface Attach {
  readonly label: string;
  readonly role?: PanelRole;
  /** Final fold in degrees, + towards the inside. */
  readonly angle?: number;
  readonly kind?: CreaseKind;
  readonly origin?: "foot" | "middle";
  /** The crease's ends on the child's x axis; the rest of the shared stretch is cut once (slit). */
  readonly crease?: readonly [number, number];
  /** An edge of the parent by number when its compass word would not find it. */
  readonly edge?: number;
}
export type Kit = ReturnType<typeof createKit>;

export interface KitInput {
  readonly board: Board;
  readonly size: Size;
  readonly grain: Direction;
  readonly values: Readonly<Record<string, OptionValue>>;
  readonly labels: (name: string) => string;
  readonly isSet: (name: string) => boolean;
}

const RADIANS = Math.PI / 180;

export function createKit({ board, size, grain, values, labels, isSet }: KitInput) {
  const t = board.caliper;
  const panels: Panel[] = [];
  const byName = new Map<string, Panel>();
  const cavity: CavityPair[] = [];
  const openTop: OpenTop[] = [];
  const mates: Mate[] = [];
  const locks: Lock[] = [];
  const interlocks: Interlock[] = [];
  const transients: Transient[] = [];
  const steps: Step[] = [];
  const parts: Part[] = [];
  const rows: Row[] = [];
  const outside: Record<Axis, readonly [number, number]> = { L: [0, 0], W: [0, 0], D: [0, 0] };
  const governs: Record<Axis, string> = { L: "", W: "", D: "" };
  const creaseSize: Record<Axis, string> = { L: "", W: "", D: "" };
  let flatResidual: number | null = null;
  let up: readonly [number, number, number] = [0, 1, 0];
  let front: readonly [number, number, number] = [0, 0, 1];

  const allowance = (creases: Direction): number => allowanceFor(board.card, creases === grain ? "alongGrain" : "acrossGrain").a90;
  const crease = (use: LayerUse, count: number): Figure => figure([term("crease allowance", allowance(use.creases), count, "allowance")]);
  const boards = (count: number): Figure => figure([term("caliper", t, count, "board")]);
  const asked = (x: Axis | Figure): Figure => (typeof x === "string" ? figure([term(x, size[x], 1, "asked")]) : x);
  const option = (name: string, count = 1): Figure => figure([term(labels(name), number(name), count, isSet(name) ? "asked" : "rule")]);

  function number(name: string): number {
    const value = values[name];
    if (typeof value === "boolean") return value ? 1 : 0;
    if (typeof value !== "number") throw new Error(`${name} is not a figure of this construction`);
    return value;
  }
  const isOn = (name: string): boolean => number(name) !== 0;
  const choice = (name: string): string => String(values[name]);

  /** From the cavity face out to layer `i`'s inner face. */
  const position = (i: number, use: LayerUse): Figure => plus(boards(i), use.play ? times(use.play, i) : figure([]));

  /** Crease to cavity face, for a crease whose folded neighbour lies at layer `i`. */
  const edge = (i: number, use: LayerUse): Figure => plus(position(i, use), crease(use, 1));

  /** Crease to crease, between neighbours at layers i and j. */
  const cc = (x: Axis | Figure, i: number, j: number, use: LayerUse): Figure => plus(asked(x), position(i, use), position(j, use), crease(use, 2));

  /** Crease at layer i to a free edge level with the inner, middle or outer face of layer j. */
  const reach = (x: Axis | Figure, i: number, j: number, face: "in" | "middle" | "out", use: LayerUse): Figure =>
    plus(asked(x), edge(i, use), position(j, use), boards(face === "in" ? 0 : face === "middle" ? 0.5 : 1));

  /** Thickness of `count` boards with play between them, from the cavity face outwards. */
  const stack = (count: number, play?: Figure, plays = 0): Figure => plus(boards(count), play ? times(play, plays) : figure([]));

  /** The strip of a roll-over wall that traps `layers` boards and `play`: its two creases stand that far apart. */
  const strip = (layers: number, play: Figure, use: LayerUse): Figure => plus(boards(layers), play, crease(use, 2));

  function panel(name: string): Panel {
    const found = byName.get(name);
    if (!found) throw new Error(`no panel is called ${name}`);
    return found;
  }
  function add(made: Panel): string {
    if (byName.has(made.name)) throw new Error(`two panels are called ${made.name}`);
    panels.push(made);
    byName.set(made.name, made);
    return made.name;
  }

  /** The panel that stays where it is drawn. */
  function base(name: string, outline: readonly Vertex[], opts: { label: string; part?: string; flat?: Isometry; role?: PanelRole }): string {
    return add({ index: panels.length, name, label: opts.label, role: opts.role ?? "wall", part: opts.part ?? "blank", outline, flat: opts.flat ?? IDENTITY, hinge: null, spans: [], features: [] });
  }

  function attach(parentName: string, towards: Compass, name: string, outline: readonly Vertex[], opts: Attach): string {
    const parent = panel(parentName);
    const edgeIndex = opts.edge ?? edgeTowards(parent, towards);
    const frame = childFrame(parent, edgeIndex, opts.origin ?? "middle");
    const own = outline[baseEdge(outline)]!.x;
    const end = outline[(baseEdge(outline) + 1) % outline.length]!.x;
    const [low, high] = edgeOnChildAxis(parent, edgeIndex, frame);
    const from = Math.max(low, own);
    const to = Math.min(high, end);
    const [c0, c1] = opts.crease ?? [from, to];
    const direction: Direction = Math.abs(childOnDrawing(parent, frame).c) > 0.5 ? "x" : "y";
    const angle = (opts.angle ?? 90) * RADIANS;
    const hinge = { parent, child: null as unknown as Panel, flat: frame, angle, height: t / 2 - allowance(direction), kind: opts.kind ?? ("crease" as const), from: c0, to: c1 };
    const child: Panel = {
      index: panels.length, name, label: opts.label, role: opts.role ?? "flap", part: parent.part, outline,
      flat: childOnDrawing(parent, frame), hinge, spans: [], features: [],
    };
    hinge.child = child;
    if (c0 - from > 0) twin(parent, edgeIndex, child, frame, from, c0, "slit");
    twin(parent, edgeIndex, child, frame, c0, c1, hinge.kind);
    if (to - c1 > 0) twin(parent, edgeIndex, child, frame, c1, to, "slit");
    return add(child);
  }

  const feature = (name: string, kind: Feature["kind"], path: Path): void => { panel(name).features.push({ kind, path }); };
  const face = (name: string, which: Face): FaceOf => ({ panel: panel(name).name, face: which });
  const row = (id: string, name: string, value: Figure, at: { panel?: string; along?: "x" | "y"; reason: string }): void => {
    rows.push({ id, name, value: value.mm, terms: value.terms, reason: at.reason, panel: at.panel ?? null, along: at.along ?? null });
  };

  return {
    number, isOn, choice, option, asked, cc, reach, edge, stack, strip, position, plus, minus, times,
    size: size as Readonly<Size>, panel, base, attach, feature, face, row,
    inside: (axis: Axis, low: FaceOf, high: FaceOf, own: Figure | null = null) => { cavity.push({ axis, low, high, own: own?.mm ?? null }); },
    openTop: (baseFace: FaceOf, walls: readonly string[], own: Figure | null = null) => { openTop.push({ base: baseFace, walls, own: own?.mm ?? null }); },
    seamResidual: (residual: Figure) => { flatResidual = residual.mm; },
    outsideBy: (axis: Axis, low: Figure, high: Figure) => { outside[axis] = [low.mm, high.mm]; },
    glued: (a: FaceOf, b: FaceOf, minArea: number) => { mates.push({ kind: "glued", a, b, gap: 0, minArea }); },
    slides: (a: FaceOf, b: FaceOf, gap: Figure, minArea = 1) => { mates.push({ kind: "slides", a, b, gap: gap.mm, minArea }); },
    touches: (a: FaceOf, b: FaceOf, minArea = 1) => { mates.push({ kind: "touches", a, b, gap: 0, minArea }); },
    lock: (name: string, edgeOf: string, ends: readonly [Point, Point], heldBy: string, minimum: number) => { locks.push({ name, edgeOf, edge: ends, heldBy, minimum }); },
    /** Depth in boards. */
    interlock: (a: string, b: string, layers: number, because: string) => { interlocks.push({ panels: [a, b], depth: layers * t, because }); },
    transient: (a: string, b: string, during: readonly string[], because: string) => { transients.push({ panels: [a, b], steps: during, because }); },
    step: (id: string, label: string, words: string, of: readonly string[]) => { steps.push({ id, label, words, panels: of }); },
    part: (made: Part) => { parts.push(made); },
    governs: (axis: Axis, rowId: string) => { governs[axis] = rowId; },
    orderedAs: (axis: Axis, rowId: string) => { creaseSize[axis] = rowId; },
    stands: (upwards: readonly [number, number, number], towards: readonly [number, number, number]) => { up = upwards; front = towards; },
    finish(): Blank {
      for (const p of panels) {
        if (p.hinge && !steps.some((s) => s.panels.includes(p.name))) throw new Error(`${p.name} is in no fold step`);
      }
      const roots = panels.filter((p) => !p.hinge);
      const all = parts.length > 0 ? parts : [{ name: "blank", label: "Blank", root: roots[0]!.name, step: null, turn: 0, shift: [0, 0, 0] as const, lift: 0 }];
      return { caliper: t, size, grain, panels, byName, parts: all, steps, cavity, openTop, outside, mates, locks, interlocks, transients, rows, governs, creaseSize, flatResidual, up, front };
    },
  };
}
