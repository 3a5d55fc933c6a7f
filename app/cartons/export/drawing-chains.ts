// Chains of dimensions outside the blank: through the row and the column of the panel from which a piece is folded.
import type { Box } from "../geometry/outline";
import type { Carton, LedgerRow } from "../types";
import type { Dimension, Line, Room } from "./drawing";
import { across, along, figureWidth, highOf, lowOf, other, overlap, pointAt, reachIn, spanOf, unite, type Measures, type Shape } from "./drawing-space";
import { shown } from "./number";
import { seenPoint, type Side } from "./sheet-view";

/** Points nearer than this are one point of a chain, mm. */
const SAME = 0.02;
/** An extension line looks for its contour this far to either side, and takes an edge this near for the one it measures, mm. */
const STRIP = 1.2;
const NEAR = 3;

interface Place {
  readonly measures: Measures;
  /** −1: below or left of the piece; +1: above or right of it. */
  readonly towards: -1 | 1;
  readonly level: number;
}

export function chainsOf(carton: Carton, shapes: readonly Shape[], side: Side, room: Room): Dimension[] {
  const byPart = carton.fold.parts.map((part) => {
    const own = carton.fold.parts.length === 1 ? shapes : shapes.filter((s) => s.panel.part === part.name);
    const rootName = carton.fold.panels[part.root]?.name;
    return { name: part.name, own, root: own.find((s) => s.panel.name === rootName) ?? own[0], bounds: own.length > 0 ? unite(own.map((s) => s.bounds)) : null };
  });
  const dimensions: Dimension[] = [];
  for (const part of byPart) {
    if (!part.root || !part.bounds) continue;
    const others = byPart.flatMap((p) => (p !== part && p.bounds ? [p.bounds] : []));
    const piece: Piece = { name: part.name, shapes: part.own, bounds: part.bounds, rows: carton.ledger, side, room };
    dimensions.push(...chainsOfPiece(piece, part.root, others));
  }
  return dimensions;
}

interface Piece {
  readonly name: string;
  readonly shapes: readonly Shape[];
  readonly bounds: Box;
  readonly rows: readonly LedgerRow[];
  readonly side: Side;
  readonly room: Room;
}

function chainsOfPiece(piece: Piece, root: Shape, others: readonly Box[]): Dimension[] {
  const isOpen = (m: Measures, towards: -1 | 1) => !others.some((b) => overlap(b, beyond(piece.bounds, m, towards)));
  const below = isOpen("x", -1) ? -1 : 1;
  const middle = (s: Shape, m: Measures) => (lowOf(s.bounds, other(m)) + highOf(s.bounds, other(m))) / 2;
  // The root's column is measured on the side where it lies nearer: left first, right where another piece or the row is in the way.
  const isLeft = middle(root, "y") - piece.bounds.minX <= piece.bounds.maxX - middle(root, "y");
  const sides: readonly (-1 | 1)[] = isLeft ? [-1, 1] : [1, -1];
  const near = sides.find((towards) => isOpen("y", towards)) ?? sides[0]!;
  const row = chain(piece, { measures: "x", towards: below, level: 0 }, middle(root, "x"));
  const column = chain(piece, { measures: "y", towards: near, level: 0 }, middle(root, "y"));
  const opposite = -below as -1 | 1;
  const width = overall(piece, isOpen("x", opposite) ? { measures: "x", towards: opposite, level: 0 } : { measures: "x", towards: below, level: 1 });
  const height = overall(piece, { measures: "y", towards: near, level: column.length > 1 ? 1 : 0 });
  const dimensions = [...row, ...column, width, height];
  // A single figure that says what the overall says already is left out.
  if (column.length === 1 && Math.abs(column[0]!.value - height.value) < SAME) dimensions.splice(dimensions.indexOf(column[0]!), 1);
  const far = -near as -1 | 1;
  if (isOpen("y", far)) dimensions.push(...farColumn(piece, row, column, far));
  return dimensions;
}

/** The outermost column on the other side whose figures are not those of the root's column. */
function farColumn(piece: Piece, row: readonly Dimension[], column: readonly Dimension[], towards: -1 | 1): Dimension[] {
  const middles = row.map((d) => (along(d.from, "x") + along(d.to, "x")) / 2).sort((a, b) => towards * (b - a));
  const known = new Set(column.map((d) => d.text));
  for (const at of middles.slice(0, 2)) {
    const far = chain(piece, { measures: "y", towards, level: 0 }, at);
    if (far.length > 0) return far.every((d) => known.has(d.text)) ? [] : far;
  }
  return [];
}

/** The half plane beyond the piece on one side, as wide as the piece. */
function beyond(b: Box, m: Measures, towards: -1 | 1): Box {
  const far = 1e5;
  if (m === "x") return towards < 0 ? { ...b, minY: -far, maxY: b.minY } : { ...b, minY: b.maxY, maxY: far };
  return towards < 0 ? { ...b, minX: -far, maxX: b.minX } : { ...b, minX: b.maxX, maxX: far };
}

function lineAt({ bounds, room }: Piece, { measures, towards, level }: Place): number {
  const away = room.bleed + room.gap + level * room.pitch;
  return towards < 0 ? lowOf(bounds, other(measures)) - away : highOf(bounds, other(measures)) + away;
}

function chain(piece: Piece, place: Place, at: number): Dimension[] {
  const { measures } = place;
  const spans = piece.shapes.flatMap((s) => {
    const span = spanOf(s.ring, measures, at);
    return span ? [{ ...span, panel: s.panel.name }] : [];
  });
  const stops: number[] = [];
  for (const value of spans.flatMap((s) => [s.low, s.high]).sort((a, b) => a - b)) {
    if (stops.length === 0 || value - stops[stops.length - 1]! > SAME) stops.push(value);
  }
  // A stop on a slanting edge says nothing: another line would give another figure.
  const isSquare = (stop: number) => spans.some((s) => (s.isLowSquare && Math.abs(s.low - stop) <= SAME) || (s.isHighSquare && Math.abs(s.high - stop) <= SAME));
  const extensions = stops.map((stop) => (isSquare(stop) ? extensionAt(piece, place, stop) : null));
  const dimensions: Dimension[] = [];
  let tier = { until: -Infinity, raised: false };
  for (let i = 0; i + 1 < stops.length; i++) {
    const [low, high] = [stops[i]!, stops[i + 1]!];
    const covering = spans.find((s) => s.low < low + SAME && s.high > high - SAME);
    // Does a panel lie here, and can both ends be seen from outside? Otherwise the figure stands inside the panel.
    if (!covering || !extensions[i] || !extensions[i + 1]) continue;
    const made = dimension(piece, place, low, high, `${piece.name}:${measures}${place.towards < 0 ? "-" : "+"}:${i}`, "chain", [extensions[i]!, extensions[i + 1]!], covering.panel, tier);
    tier = made.tier;
    dimensions.push(made.dimension);
  }
  return dimensions;
}

function overall(piece: Piece, place: Place): Dimension {
  const low = lowOf(piece.bounds, place.measures);
  const high = highOf(piece.bounds, place.measures);
  const ends = [low, high].map((stop) => extensionAt(piece, place, stop)).filter((l): l is Line => l !== null);
  return dimension(piece, place, low, high, `${piece.name}:overall:${place.measures}`, "overall", ends, null, { until: -Infinity, raised: false }).dimension;
}

/** From just short of the contour to just past the dimension line; null when another panel hides the place. */
function extensionAt(piece: Piece, place: Place, stop: number): Line | null {
  const { measures: m, towards } = place;
  let nearest = towards < 0 ? Infinity : -Infinity;
  let hit: Shape | null = null;
  for (const s of piece.shapes) {
    const reach = reachIn(s.ring, m, stop, STRIP);
    if (!reach) continue;
    const value = towards < 0 ? reach.low : reach.high;
    if (towards < 0 ? value < nearest : value > nearest) {
      nearest = value;
      hit = s;
    }
  }
  if (!hit) return null;
  const within = spanOf(hit.ring, m, nearest - towards * 0.3);
  if (within && Math.abs(within.low - stop) > NEAR && Math.abs(within.high - stop) > NEAR) return null;
  const line = lineAt(piece, place);
  const { room } = piece;
  return { from: pointAt(m, stop, nearest + towards * (room.bleed + room.size * 0.4)), to: pointAt(m, stop, line + towards * room.size * 0.6) };
}

interface Tier {
  readonly until: number;
  readonly raised: boolean;
}

function dimension(piece: Piece, place: Place, low: number, high: number, id: string, kind: Dimension["kind"], extensions: readonly Line[], panel: string | null, tier: Tier): { dimension: Dimension; tier: Tier } {
  const { measures: m, towards } = place;
  const { size } = piece.room;
  const line = lineAt(piece, place);
  const value = high - low;
  const text = shown(value);
  const width = figureWidth(text, size);
  const fits = width + size * 1.6 <= value;
  const middle = (low + high) / 2;
  // Would a figure beside the line run into the one before it? Then it stands one line further out.
  const raised = !fits && middle - width / 2 < tier.until && !tier.raised;
  const beside = fits ? 0 : towards * size * (raised ? 2.2 : 1.0);
  const tied = rowFor(piece, m, low, high, panel);
  return {
    tier: fits ? { until: -Infinity, raised: false } : { until: middle + width / 2 + size * 0.4, raised },
    dimension: {
      id, kind, measures: m, from: pointAt(m, low, line), to: pointAt(m, high, line), away: pointAt(m, 0, towards),
      value, text, textAt: pointAt(m, middle, line + beside), fits, extensions,
      row: tied?.id ?? null, parameter: tied?.parameter ?? null,
    },
  };
}

/** The ledger's row that stands for this stretch of the flat: same direction, same ends; the panel's own before another's. */
function rowFor(piece: Piece, m: Measures, low: number, high: number, panel: string | null): LedgerRow | null {
  let found: LedgerRow | null = null;
  for (const row of piece.rows) {
    if (!row.mark || row.group === "asked" || Math.abs(row.value - (high - low)) > SAME) continue;
    const a = seenPoint(row.mark.from, piece.side);
    const b = seenPoint(row.mark.to, piece.side);
    if (Math.abs(across(a, m) - across(b, m)) > SAME) continue;
    // The panel's own figure: its mark may take in tabs and ears that the figure leaves out.
    if (row.mark.panel === panel) return row;
    if (Math.abs(Math.min(along(a, m), along(b, m)) - low) > SAME || Math.abs(Math.max(along(a, m), along(b, m)) - high) > SAME) continue;
    found ??= row;
  }
  return found;
}
