// Panel names and the grain arrow.
import type { Box, Point } from "../geometry/outline";
import type { Carton } from "../types";
import type { Line, Room } from "./drawing";
import { boxAround, capitalsWidth, holdsBox, isFree, type Shape } from "./drawing-space";

export interface PanelLabel {
  readonly panel: string;
  readonly text: string;
  readonly at: Point;
  /** Degrees, 0 or 90 (reads from the right). */
  readonly angle: 0 | 90;
  readonly size: number;
}

export interface GrainArrow extends Line {
  readonly text: string;
  readonly at: Point;
  readonly angle: 0 | 90;
}

/** A strip is narrow when a name of ten letters would take most of it: times the size of the letters. */
const NARROW = 14;

/** A name in capitals: the wanted size, or as small as still reads; null where even that has no room. */
function fitted(text: string, width: number, height: number, wanted: number): { size: number; angle: 0 | 90 } | null {
  for (const size of [wanted, wanted * 0.8, wanted * 0.65]) {
    // In a tall strip names are turned, whatever their length, so that figures find room beside them.
    if (height > 2.2 * width && width < NARROW * size && capitalsWidth(text, size) <= height && size * 1.3 <= width) return { size, angle: 90 };
    if (capitalsWidth(text, size) <= width && size * 1.3 <= height) return { size, angle: 0 };
    if (capitalsWidth(text, size) <= height && size * 1.3 <= width) return { size, angle: 90 };
  }
  return null;
}

export function labelsOf(shapes: readonly Shape[], room: Room): PanelLabel[] {
  const labels: PanelLabel[] = [];
  for (const { panel, labelAt } of shapes) {
    const text = panel.label.toUpperCase();
    const fit = fitted(text, panel.room.width - 2, panel.room.height - 1, room.size * 0.8);
    // No room for the name? The strip stays without: its neighbour's name and the fold order say what it is.
    if (!fit) continue;
    labels.push({ panel: panel.name, text, at: labelAt, ...fit });
    room.taken.push(labelBox(text, labelAt, fit.size, fit.angle));
  }
  return labels;
}

function labelBox(text: string, at: Point, size: number, angle: 0 | 90): Box {
  const width = capitalsWidth(text, size) + size * 0.4;
  return angle === 0 ? boxAround(at, width, size * 1.8) : boxAround(at, size * 1.8, width);
}

/** One arrow a piece, on the panel from which it is folded; beside the name, along the grain. */
export function grainOf(carton: Carton, shapes: readonly Shape[], room: Room): GrainArrow[] {
  const arrows: GrainArrow[] = [];
  for (const part of carton.fold.parts) {
    const root = shapes.find((s) => s.panel.name === carton.fold.panels[part.root]?.name);
    if (!root) continue;
    const angle = carton.grain === "x" ? 0 : 90;
    const extent = angle === 0 ? root.bounds.maxX - root.bounds.minX : root.bounds.maxY - root.bounds.minY;
    const length = Math.min(10 * room.size, extent * 0.5);
    const wide = room.size * 2.4;
    const step = room.size * 2.6;
    const places = [1, -1, 2, -2, 3, -3].map((k): Point => (angle === 0 ? { x: root.labelAt.x, y: root.labelAt.y - k * step } : { x: root.labelAt.x + k * step, y: root.labelAt.y }));
    const boxOf = (at: Point) => (angle === 0 ? boxAround(at, length, wide) : boxAround(at, wide, length));
    const at = places.find((p) => holdsBox(root, boxOf(p)) && isFree(boxOf(p), room.taken)) ?? places[0]!;
    room.taken.push(boxOf(at));
    const half = length / 2;
    const line = angle === 0 ? { from: { x: at.x - half, y: at.y }, to: { x: at.x + half, y: at.y } } : { from: { x: at.x, y: at.y - half }, to: { x: at.x, y: at.y + half } };
    arrows.push({ ...line, text: carton.board.flute ? "flutes" : "grain", at, angle });
  }
  return arrows;
}
