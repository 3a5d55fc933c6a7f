// A blank as a picture without figures: for the gallery, the lever and lists. Drawn from the layers, like every other view.
import type { Carton, LayerName } from "~/cartons/types";
import type { Side } from "../bench-context";
import { Layers } from "./layers";
import { blankBox } from "./use-drawing";

const ZONES: ReadonlySet<LayerName> = new Set(["bleed", "safe"]);
const ALL_ZONES: ReadonlySet<LayerName> = new Set(["bleed", "safe", "glue"]);

export interface FlatPictureProps {
  carton: Carton;
  /** Said to a screen reader; left out where words beside it say it already. */
  title?: string;
  side?: Side;
  /** The size it is given, px: line weights and dashes suit it. */
  width: number;
  height: number;
  className?: string;
}

export function FlatPicture({ carton, title, side = "inside", width, height, className }: FlatPictureProps) {
  const box = blankBox(carton, side);
  const [w, h] = [box.maxX - box.minX, box.maxY - box.minY];
  const scale = Math.min((width - 6) / w, (height - 6) / h);
  const edge = 3 / scale;
  const isStamp = Math.min(width, height) < 90;
  return (
    <svg
      viewBox={`${box.minX - edge} ${-box.maxY - edge} ${w + 2 * edge} ${h + 2 * edge}`}
      width={width}
      height={height}
      role={title ? "img" : undefined}
      aria-label={title}
      aria-hidden={title ? undefined : true}
      className={className}
    >
      <Layers carton={carton} side={side} hidden={isStamp ? ALL_ZONES : ZONES} scale={scale} thin={isStamp ? 0.55 : 0.8} />
    </svg>
  );
}
