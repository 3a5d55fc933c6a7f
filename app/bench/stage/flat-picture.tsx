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
  /** Pixels a millimetre, where several pictures share one scale; otherwise it fills its size. */
  scale?: number;
}

const EDGE = 3;

/** Pixels a millimetre at which the blank fills a picture. */
export function flatScale(carton: Carton, width: number, height: number): number {
  return Math.min((width - 2 * EDGE) / carton.blank.width, (height - 2 * EDGE) / carton.blank.height);
}

export function FlatPicture({ carton, title, side = "inside", width, height, className, scale = flatScale(carton, width, height) }: FlatPictureProps) {
  const box = blankBox(carton, side);
  const [w, h] = [width / scale, height / scale];
  const [left, top] = [(box.minX + box.maxX - w) / 2, -(box.minY + box.maxY + h) / 2];
  const isStamp = Math.min(width, height) < 90;
  return (
    <svg
      viewBox={`${left} ${top} ${w} ${h}`}
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
