// Where the drawing lies on the stage: millimetres to pixels and back. Pure.
import type { Box, Point } from "~/cartons/geometry/outline";

/** CSS pixels a millimetre at true size: 96 px an inch. */
export const TRUE_SCALE = 96 / 25.4;
const LEAST = 0.05;
const MOST = 40;

/** Pixels a millimetre, and where the drawing's origin lies on the stage, px. y runs up on the drawing and down on the stage. */
export interface View {
  readonly scale: number;
  readonly x: number;
  readonly y: number;
}

export interface Frame {
  readonly width: number;
  readonly height: number;
}

export interface Insets {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export const toStage = (view: View, p: Point): Point => ({ x: view.x + p.x * view.scale, y: view.y - p.y * view.scale });
export const toDrawing = (view: View, p: Point): Point => ({ x: (p.x - view.x) / view.scale, y: (view.y - p.y) / view.scale });

/** The whole box in the frame, never larger than true size; its chains of figures stand in the insets, px. */
export function fitted(box: Box, frame: Frame, insets: Insets): View {
  const width = Math.max(1, box.maxX - box.minX);
  const height = Math.max(1, box.maxY - box.minY);
  const roomX = Math.max(40, frame.width - insets.left - insets.right);
  const roomY = Math.max(40, frame.height - insets.top - insets.bottom);
  const scale = clamp(Math.min(roomX / width, roomY / height, TRUE_SCALE));
  return placed(box, frame, insets, scale);
}

/** The box in the middle of what the insets leave, at a scale. */
export function placed(box: Box, frame: Frame, insets: Insets, scale: number): View {
  const middleX = insets.left + (frame.width - insets.left - insets.right) / 2;
  const middleY = insets.top + (frame.height - insets.top - insets.bottom) / 2;
  return { scale, x: middleX - ((box.minX + box.maxX) / 2) * scale, y: middleY + ((box.minY + box.maxY) / 2) * scale };
}

/** Zooms so that the place under the pointer stays there. */
export function zoomedAt(view: View, factor: number, at: Point): View {
  const scale = clamp(view.scale * factor);
  const f = scale / view.scale;
  return { scale, x: at.x - (at.x - view.x) * f, y: at.y - (at.y - view.y) * f };
}

export const panned = (view: View, dx: number, dy: number): View => ({ ...view, x: view.x + dx, y: view.y + dy });

const clamp = (scale: number) => Math.min(MOST, Math.max(LEAST, scale));

/** "1 : 2.3", "1 : 1", "2 : 1". */
export function scaleWords(scale: number): string {
  const ratio = TRUE_SCALE / scale;
  const rounded = (n: number) => String(n >= 10 ? Math.round(n) : Math.round(n * 10) / 10);
  return ratio >= 1 ? `1 : ${rounded(ratio)}` : `${rounded(1 / ratio)} : 1`;
}

export const isTrueSize = (scale: number): boolean => Math.abs(scale / TRUE_SCALE - 1) < 0.005;

/** Distance between the figures of a ruler, in units, so that they stand at least `apart` px from one another. */
export function rulerStep(pixelsAUnit: number, apart: number): number {
  for (let decade = 0.01; decade < 1e6; decade *= 10) {
    for (const step of [1, 2, 5]) if (decade * step * pixelsAUnit >= apart) return decade * step;
  }
  return 1e6;
}
