// What every file is made from: the layers as they go to a cutter, seen from the side that was asked for.
import { layersForCutting } from "../layers/crease-inset";
import { mirrored } from "../geometry/path";
import type { Box, Path, Point } from "../geometry/outline";
import type { Carton, LayerName, LayerPath, Layers } from "../types";
import { LAYER_ORDER } from "./processing-steps";

/** `inside` is the blank as it is stored; `print` is the same blank turned over, x → −x. */
export type Side = "inside" | "print";

export const sideWords = (side: Side): string => (side === "inside" ? "seen from the inside" : "seen from the print side");

export const mirroredBox = (box: Box): Box => ({ minX: -box.maxX, minY: box.minY, maxX: -box.minX, maxY: box.maxY });
export const seenPoint = (p: Point, side: Side): Point => (side === "inside" ? { x: p.x, y: p.y } : { x: 0 - p.x, y: p.y });
export const seenBox = (box: Box, side: Side): Box => (side === "inside" ? box : mirroredBox(box));
export const seenPath = (path: Path, side: Side): Path => (side === "inside" ? path : mirrored(path));

/** Layers as the files hold them. Creases are pulled back from cuts as the carton's options say. */
export function layersSeen(carton: Carton, side: Side): Layers {
  const layers = layersForCutting(carton);
  if (side === "inside") return layers;
  const turned: Partial<Record<LayerName, readonly LayerPath[]>> = {};
  for (const name of LAYER_ORDER) turned[name] = layers[name].map((p) => ({ ...p, path: mirrored(p.path) }));
  return turned as Layers;
}
