// One attempt: from parameters to the whole document, or the refusals that stand against it. Nothing is searched for here.
import type { Board } from "./boards/board";
import { minimumCreaseSpacing } from "./boards/crease-recipe";
import { createKit, type Kit } from "./blank/kit";
import type { Blank } from "./blank/blank";
import { checkMaking } from "./checks/making";
import { bySeverity, foldCheckOf } from "./checks/fold-check";
import type { Limit } from "./constructions/construction";
import type { Registered } from "./constructions/registry";
import { foldModelOf } from "./fold/fold-model";
import { applyToPath } from "./geometry/isometry";
import { areaOf, boundsOf } from "./geometry/path";
import { layersOf, lengthsOf } from "./layers/layers";
import { ledgerOf } from "./ledger/ledger";
import { resolve, type Resolved } from "./parameters/resolve";
import type { Axis, Brief, Carton, FlatPanel, OptionValue, Refusal, Size } from "./types";

export type Options = Readonly<Record<string, OptionValue>>;
export type Declared = { readonly ok: true; readonly blank: Blank; readonly resolved: Resolved } | { readonly ok: false; readonly refusals: readonly Refusal[] };

const AXES = ["L", "W", "D"] as const;
/** Below this many calipers a panel is a strip and the board is to blame; above it each construction has its own limits on size. */
const LEAST_CALIPERS = 6;
/** mm: thinner than any cartonboard. */
const THINNEST = 0.15;

export function grainOf({ construction }: Registered, board: Board, turned: boolean): "x" | "y" {
  const usual = construction.grain[board.family];
  return turned ? (usual === "x" ? "y" : "x") : usual;
}

/** Runs a construction's declaration on an inside size, mm; refuses what it cannot be. */
export const declare = (registered: Registered, size: Size, options: Options, board: Board): Declared => declareWith(registered, size, options, board, (kit) => kit);

/** The same with a kit that `through` may bend: how the checks are shown to fail. */
export function declareWith(registered: Registered, size: Size, options: Options, board: Board, through: (kit: Kit) => Kit): Declared {
  const { construction, asks, compiled } = registered;
  const grain = grainOf(registered, board, options["grain"] === "turned");
  const { a90, slide } = board.card;
  const base = { L: size.L, W: size.W, D: size.D, t: board.caliper, a: Math.max(a90.alongGrain, a90.acrossGrain), aLeast: Math.min(a90.alongGrain, a90.acrossGrain), micro: board.family === "micro" ? 1 : 0, cardSlide: slide, creaseSpacing: minimumCreaseSpacing(board) };
  const outOfRange = AXES.flatMap((axis) => sizeRefusal(registered, axis, size[axis]));
  if (outOfRange.length > 0) return { ok: false, refusals: outOfRange };
  const thickest = Math.min(size.L, size.W) / LEAST_CALIPERS;
  if (!(board.caliper > 0) || board.caliper > thickest) {
    const tooThick = board.caliper > thickest;
    return { ok: false, refusals: [{ code: tooThick ? "too-large" : "too-small", parameter: "caliper", given: board.caliper, limit: tooThick ? { atMost: thickest } : { atLeast: THINNEST }, nearest: tooThick ? thickest : THINNEST, because: tooThick ? "the board is too thick to fold into panels that small" : "a board has a thickness" }] };
  }
  const resolved = resolve(compiled, options, base);
  const passed = construction.cannot(resolved.scope).flatMap((l) => limitRefusal(l, resolved.scope));
  const swapped: Refusal[] = !construction.mayBeWiderThanLong && size.W > size.L
    ? [{ code: "too-large", parameter: "W", given: size.W, limit: { atMost: size.L }, nearest: size.L, because: "L is the longer side of the opening; swap length and width" }]
    : [];
  const refusals = strictest([...swapped, ...resolved.refusals, ...passed]);
  if (refusals.length > 0) return { ok: false, refusals };
  const kit = createKit({ board, size, grain, values: resolved.values, labels: (name) => asks[name]?.label ?? name, isSet: (name) => resolved.isSet.has(name) });
  construction.declare(through(kit));
  return { ok: true, blank: kit.finish(), resolved };
}

/** Of several limits on one side of one parameter only the one that asks most: mending it mends the others. */
function strictest(refusals: readonly Refusal[]): Refusal[] {
  const kept = new Map<string, Refusal>();
  for (const r of refusals) {
    const key = `${r.parameter}:${r.code}`;
    const known = kept.get(key);
    const asksMore = known && typeof r.nearest === "number" && typeof known.nearest === "number" && (r.code === "too-small" ? r.nearest > known.nearest : r.nearest < known.nearest);
    if (!known || asksMore) kept.set(key, r);
  }
  return [...kept.values()];
}

function sizeRefusal({ construction }: Registered, axis: Axis, given: number): Refusal[] {
  const { from, to } = construction.size[axis];
  if (!Number.isFinite(given)) return [{ code: "wrong-kind", parameter: axis, given, limit: null, nearest: construction.sample.size[axis], because: "a size is a number of millimetres" }];
  if (given < from) return [{ code: "too-small", parameter: axis, given, limit: { atLeast: from }, nearest: from, because: "smaller ones cannot be folded and closed in this construction" }];
  if (given > to) return [{ code: "too-large", parameter: axis, given, limit: { atMost: to }, nearest: to, because: "larger ones are past what this construction carries" }];
  return [];
}

function limitRefusal(l: Limit, scope: Readonly<Record<string, number>>): Refusal[] {
  const given = scope[l.parameter];
  if (given === undefined) throw new Error(`a limit speaks of ${l.parameter}, which nobody asks`);
  if (l.atLeast !== undefined && given < l.atLeast) return [{ code: "too-small", parameter: l.parameter, given, limit: { atLeast: l.atLeast }, nearest: l.atLeast, because: l.because }];
  if (l.atMost !== undefined && given > l.atMost) return [{ code: "too-large", parameter: l.parameter, given, limit: { atMost: l.atMost }, nearest: l.atMost, because: l.because }];
  return [];
}

/** Derives the whole document from a declared blank. */
export function document(registered: Registered, brief: Brief, board: Board, blank: Blank, resolved: Resolved): Carton {
  const number = (name: string) => Number(resolved.values[name]);
  const layers = layersOf(blank, { bleed: number("bleed"), safe: number("safe"), glueMargin: number("glueMargin") });
  const fold = foldModelOf(blank);
  const foldCheck = foldCheckOf(blank, fold, board);
  const making = checkMaking(layers, { minGap: number("minGap"), creaseSpacing: minimumCreaseSpacing(board) });
  const outlines = layers.cut.filter((c) => c.role === "outline").map((c) => c.path);
  const holes = layers.cut.filter((c) => c.role === "hole" || (c.role === "feature" && c.path.closed)).map((c) => c.path);
  const bounds = boundsOf(outlines);
  const sum = (paths: typeof outlines) => paths.reduce((total, p) => total + Math.abs(areaOf(p)), 0);
  const orderedAs = (axis: Axis) => blank.rows.find((r) => r.id === blank.creaseSize[axis])?.value ?? Number.NaN;
  return {
    brief, board, construction: registered.info, inside: blank.size,
    clearInside: foldCheck.clearInside, outside: foldCheck.outside,
    crease: { L: orderedAs("L"), W: orderedAs("W"), D: orderedAs("D") },
    blank: { width: bounds.maxX - bounds.minX, height: bounds.maxY - bounds.minY, area: sum(outlines) - sum(holes), bounds },
    parameters: resolved.values, grain: blank.grain,
    panels: blank.panels.map(flatPanel), layers, lengths: lengthsOf(layers), fold,
    ledger: ledgerOf({ blank, board, size: blank.size, asks: registered.asks, resolved }),
    foldCheck, findings: [...foldCheck.findings, ...making].sort(bySeverity),
  };
}

function flatPanel(panel: Blank["panels"][number]): FlatPanel {
  const outline = applyToPath(panel.flat, { closed: true, vertices: panel.outline });
  const bounds = boundsOf([outline]);
  return {
    name: panel.name, label: panel.label, role: panel.role, part: panel.part, outline,
    holes: panel.features.filter((f) => f.kind === "cut" && f.path.closed).map((f) => applyToPath(panel.flat, f.path)),
    labelAt: { x: (bounds.minX + bounds.maxX) / 2, y: (bounds.minY + bounds.maxY) / 2 },
    room: { width: bounds.maxX - bounds.minX, height: bounds.maxY - bounds.minY }, bounds,
  };
}
