// The drawing at the scale of the stage: figures keep their 13 px, so their places depend on the scale.
import { useMemo } from "react";
import { type Dimension, type Drawing, drawingOf } from "~/cartons/export/drawing";
import type { Box } from "~/cartons/geometry/outline";
import type { Carton } from "~/cartons/types";
import type { Side } from "../bench-context";
import { fitted, type Frame, type Insets, type View } from "../view";

/** On a phone: what was asked. The blank's own size stands in words below. */
export const isShownCompact = (d: Dimension) => d.kind === "asked";

export const FIGURE_PX = 13;
const GAP_PX = 20;
const PITCH_PX = 26;

export function drawingAt(carton: Carton, side: Side, scale: number, options: { callouts?: boolean } = {}): Drawing {
  return drawingOf(carton, { side, size: FIGURE_PX / scale, gap: GAP_PX / scale, pitch: PITCH_PX / scale, callouts: options.callouts ?? true });
}

/** A view of blank and figures together. What the figures take in pixels is known only once they are placed: two rounds. */
export function fitDrawing(carton: Carton, side: Side, frame: Frame, insets: Insets, isCompact = false): View {
  const box = blankBox(carton, side);
  let view = fitted(box, frame, insets);
  for (let round = 0; round < 2; round++) {
    const drawing = drawingAt(carton, side, view.scale, { callouts: false });
    const bounds = isCompact ? boundsOf(drawing.dimensions.filter(isShownCompact), box, 6 / view.scale) : drawing.bounds;
    const around = {
      left: insets.left + (box.minX - bounds.minX) * view.scale,
      right: insets.right + (bounds.maxX - box.maxX) * view.scale,
      top: insets.top + (bounds.maxY - box.maxY) * view.scale,
      bottom: insets.bottom + (box.minY - bounds.minY) * view.scale,
    };
    view = fitted(box, frame, around);
  }
  return view;
}

/** The blank and the lines of some figures. */
function boundsOf(dimensions: readonly Dimension[], blank: Box, edge: number): Box {
  const points = dimensions.flatMap((d) => [d.from, d.to]);
  return {
    minX: Math.min(blank.minX, ...points.map((p) => p.x)) - edge, minY: Math.min(blank.minY, ...points.map((p) => p.y)) - edge,
    maxX: Math.max(blank.maxX, ...points.map((p) => p.x)) + edge, maxY: Math.max(blank.maxY, ...points.map((p) => p.y)) + edge,
  };
}

export function blankBox(carton: Carton, side: Side): Box {
  const { bounds } = carton.blank;
  return side === "inside" ? bounds : { minX: -bounds.maxX, minY: bounds.minY, maxX: -bounds.minX, maxY: bounds.maxY };
}

export function useDrawing(carton: Carton, side: Side, scale: number): Drawing {
  return useMemo(() => drawingAt(carton, side, scale), [carton, side, scale]);
}
