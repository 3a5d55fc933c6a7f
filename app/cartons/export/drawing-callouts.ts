// Radii, angles and holes: written beside the place where there is room, once for panels that are alike.
import type { Box, Path, Point } from "../geometry/outline";
import { arcOf, boundsOf, eachEdge } from "../geometry/path";
import type { Callout, Dimension, Room } from "./drawing";
import { boxAround, figureWidth, holdsBox, isFree, pointAt, spanOf, type Shape } from "./drawing-space";
import { shown } from "./number";

/** Smaller radii are reliefs and hooks of the die: cut from the file. */
const LEAST_RADIUS = 2;
const LEAST_EDGE = 5;

interface Place {
  readonly text: string;
  readonly on: Point;
  /** Unit vector into the panel. */
  readonly inward: Point;
}

export function calloutsOf(shapes: readonly Shape[], room: Room): { callouts: Callout[]; dimensions: Dimension[]; leftOut: number } {
  const callouts: Callout[] = [];
  const dimensions: Dimension[] = [];
  const said = new Set<string>();
  const missing = new Set<string>();
  for (const shape of shapes) {
    for (const place of [...cornersOf(shape.outline), ...slantsOf(shape.outline)]) {
      const like = `${shape.panel.label}/${place.text}`;
      if (said.has(like)) continue;
      const made = placed(shape, place, room, callouts.length);
      if (made) {
        said.add(like);
        missing.delete(like);
        callouts.push(made);
      } else missing.add(like);
    }
    // Holes that are alike are measured once, as "4 × 2.2 × 29.8"; where the others stand is cut from the file.
    const alike = new Map<string, Path[]>();
    for (const hole of shape.holes) alike.set(sizeOf(hole), [...(alike.get(sizeOf(hole)) ?? []), hole]);
    room.taken.push(...shape.holes.map((hole) => boundsOf([hole])));
    for (const [text, holes] of alike) {
      const own = holeOf(shape, holes, text, room);
      if (own.callout) callouts.push(own.callout);
      dimensions.push(...own.dimensions);
      if (!own.callout || own.dimensions.length < 2 || holes.length > 1) missing.add(`${shape.panel.name}/${text}`);
    }
  }
  return { callouts, dimensions, leftOut: missing.size };
}

function cornersOf(outline: Path): Place[] {
  const places: Place[] = [];
  eachEdge(outline, (a, b) => {
    if (a.bulge === 0) return;
    const arc = arcOf(a, b);
    if (arc.radius < LEAST_RADIUS) return;
    const angle = arc.from + arc.sweep / 2;
    const out = { x: Math.cos(angle), y: Math.sin(angle) };
    const sign = arc.sweep > 0 ? -1 : 1;
    places.push({ text: `R ${shown(arc.radius)}`, on: { x: arc.centre.x + arc.radius * out.x, y: arc.centre.y + arc.radius * out.y }, inward: { x: sign * out.x, y: sign * out.y } });
  });
  return places;
}

/** Straight edges that run along neither axis: their angle to the nearer one. */
function slantsOf(outline: Path): Place[] {
  const places: Place[] = [];
  eachEdge(outline, (a, b) => {
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    if (a.bulge !== 0 || length < LEAST_EDGE) return;
    const steep = (Math.atan2(Math.abs(b.y - a.y), Math.abs(b.x - a.x)) * 180) / Math.PI;
    const lean = Math.min(steep, 90 - steep);
    if (lean < 0.5) return;
    const left = { x: -(b.y - a.y) / length, y: (b.x - a.x) / length };
    places.push({ text: `${String(Math.round(lean * 10) / 10)}°`, on: { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 }, inward: left });
  });
  return places;
}

function placed(shape: Shape, { text, on, inward }: Place, room: Room, n: number): Callout | null {
  const size = room.size * 0.85;
  const width = figureWidth(text, size) + size * 0.4;
  const from = { x: on.x + inward.x * size * 0.2, y: on.y + inward.y * size * 0.2 };
  for (const reach of [1, 1.6, 2.4]) {
    const d = Math.abs(inward.x) * (width / 2) + Math.abs(inward.y) * (size / 2) + size * reach;
    const at = { x: on.x + inward.x * d, y: on.y + inward.y * d };
    const box = boxAround(at, width, size * 1.2);
    if (!holdsBox(shape, box) || !isFree(box, room.taken) || !isFree(box, room.lines)) continue;
    room.taken.push(box);
    const end = Math.abs(inward.x) * (width / 2) + Math.abs(inward.y) * (size / 2) + size * 0.15;
    return { id: `callout:${shape.panel.name}:${n}`, panel: shape.panel.name, text, at, leader: { from, to: { x: at.x - inward.x * end, y: at.y - inward.y * end } } };
  }
  return null;
}

const isSameBox = (a: Box, b: Box): boolean => a.minX === b.minX && a.minY === b.minY && a.maxX === b.maxX && a.maxY === b.maxY;
const isRound = (hole: Path): boolean => hole.vertices.length > 0 && hole.vertices.every((v) => Math.abs(v.bulge) > 0.1);

function sizeOf(hole: Path): string {
  const box = boundsOf([hole]);
  const [width, height] = [box.maxX - box.minX, box.maxY - box.minY];
  return isRound(hole) && Math.abs(width - height) < 0.02 ? `Ø ${shown(width)}` : `${shown(width)} × ${shown(height)}`;
}

/** The size of holes that are alike beside the first, and where its middle stands, measured from the panel's left and lower edges. */
function holeOf(shape: Shape, holes: readonly Path[], like: string, room: Room): { callout: Callout | null; dimensions: Dimension[] } {
  const box = boundsOf(holes.slice(0, 1));
  const centre = { x: (box.minX + box.maxX) / 2, y: (box.minY + box.maxY) / 2 };
  const id = `${shape.panel.name}:${like}`;
  const text = holes.length === 1 ? like : `${holes.length} × ${like.startsWith("Ø") ? like : `(${like})`}`;
  const others = room.taken.filter((b) => !isSameBox(b, box));
  const size = room.size * 0.85;
  const half = figureWidth(text, size) / 2;
  let callout: Callout | null = null;
  for (const at of [
    { x: centre.x, y: box.maxY + size }, { x: centre.x, y: box.minY - size },
    { x: box.maxX + half + size * 0.5, y: centre.y }, { x: box.minX - half - size * 0.5, y: centre.y },
  ]) {
    const words = boxAround(at, half * 2 + size * 0.4, size * 1.2);
    if (callout || !holdsBox(shape, words) || !isFree(words, room.taken) || !isFree(words, room.lines)) continue;
    room.taken.push(words);
    callout = { id: `hole:${id}`, panel: shape.panel.name, text, at, leader: null };
  }
  const dimensions: Dimension[] = [];
  // Its own centre lines may run into the hole; nothing else may.
  for (const m of ["x", "y"] as const) {
    const at = m === "x" ? centre.y : centre.x;
    const middle = m === "x" ? centre.x : centre.y;
    const span = spanOf(shape.ring, m, at);
    if (!span) continue;
    const value = middle - span.low;
    const figure = shown(value);
    const wide = figureWidth(figure, room.size);
    const textAt = pointAt(m, (span.low + middle) / 2, at);
    const words = m === "x" ? boxAround(textAt, wide + room.size, room.size * 1.4) : boxAround(textAt, room.size * 1.4, wide + room.size);
    const line = m === "x" ? boxAround(textAt, value, room.size * 0.5) : boxAround(textAt, room.size * 0.5, value);
    if (value < wide + room.size * 1.4 || !isFree(words, room.taken) || !isFree(words, room.lines) || !isFree(line, others)) continue;
    room.taken.push(words);
    room.lines.push(line);
    dimensions.push({
      id: `hole:${id}:${m}`, kind: "hole", measures: m, from: pointAt(m, span.low, at), to: pointAt(m, middle, at),
      away: pointAt(m, 0, 1), value, text: figure, textAt, fits: true, row: null, parameter: null, extensions: [],
    });
  }
  return { callout, dimensions };
}
