// A picture of the carton in a pose, as flat polygons in the order in which they are painted. Made from the pose that is checked.
import { poseAt } from "../fold/pose";
import type { Box, Point } from "../geometry/outline";
import type { Vec3 } from "../geometry/space";
import type { Carton } from "../types";
import { paintOrder } from "./picture/bsp";
import { facesOf, type EdgeKind, type Tone } from "./picture/faces";

/** Degrees: how far the viewer stands to the right of the front, and how far above it. */
export interface PictureView {
  readonly azimuth: number;
  readonly elevation: number;
}
export const THREE_QUARTER: PictureView = { azimuth: -34, elevation: 26 };

export interface PictureFace {
  readonly points: readonly Point[];
  readonly tone: Tone;
  /** 0 turned from the light, 1 full towards it. */
  readonly shade: number;
  readonly panel: string;
  readonly lines: readonly { readonly from: Point; readonly to: Point; readonly kind: Exclude<EdgeKind, null> }[];
}

export interface Picture {
  /** Furthest first. */
  readonly faces: readonly PictureFace[];
  /** What the carton casts on the floor; empty when it lies flat. */
  readonly shadow: readonly (readonly Point[])[];
  /** mm of the picture plane, y down. */
  readonly bounds: Box;
}

export interface PictureOptions {
  /** 0 flat to the number of steps, closed. */
  readonly u: number;
  readonly view?: PictureView;
  /** Leaves the board's thickness out: for pictures of stamp size. */
  readonly thin?: boolean;
  readonly withShadow?: boolean;
}

const cross = (a: Vec3, b: Vec3): Vec3 => [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const mix = (terms: readonly (readonly [number, Vec3])[]): Vec3 => terms.reduce<Vec3>((s, [k, v]) => [s[0] + k * v[0], s[1] + k * v[1], s[2] + k * v[2]], [0, 0, 0]);
const unit = (v: Vec3): Vec3 => mix([[1 / Math.hypot(...v), v]]);

/** Light from the upper left in front, as draughtsmen have it: along up, left and front. */
const LIGHT = { up: 1, left: 0.55, front: 0.7 };

export function foldedPicture(carton: Carton, options: PictureOptions): Picture {
  const { up, front } = carton.fold;
  const right = cross(up, front);
  const view = options.view ?? THREE_QUARTER;
  const az = (view.azimuth * Math.PI) / 180;
  const el = (view.elevation * Math.PI) / 180;
  const towards = mix([[Math.cos(el) * Math.cos(az), front], [Math.cos(el) * Math.sin(az), right], [Math.sin(el), up]]);
  const across = unit(cross(up, towards));
  const above = cross(towards, across);
  const light = unit(mix([[LIGHT.up, up], [-LIGHT.left, right], [LIGHT.front, front]]));
  const onPaper = (p: Vec3): Point => ({ x: dot(p, across), y: -dot(p, above) });

  const all = facesOf(carton, poseAt(carton.fold, options.u), options.thin ?? false);
  const seen = all.filter((f) => f.twoSided || dot(f.normal, towards) > 0);
  const faces = paintOrder(seen, towards).map((f): PictureFace => {
    const points = f.points.map(onPaper);
    const lines = f.edges.flatMap((kind, i) => (kind ? [{ from: points[i]!, to: points[(i + 1) % points.length]!, kind }] : []));
    return { points, tone: f.tone, shade: Math.max(0, dot(f.normal, light)), panel: f.panel, lines };
  });

  const floor = Math.min(...all.flatMap((f) => f.points.map((p) => dot(p, up))));
  const fall = dot(light, up);
  const shadow = options.withShadow && options.u > 0
    ? all.filter((f) => dot(f.normal, light) > 0 && f.tone !== "core").map((f) => f.points.map((p) => onPaper(mix([[1, p], [-(dot(p, up) - floor) / fall, light]]))))
    : [];
  const paper = [...faces.flatMap((f) => f.points), ...shadow.flat()];
  const bounds = paper.reduce<Box>((b, p) => ({ minX: Math.min(b.minX, p.x), minY: Math.min(b.minY, p.y), maxX: Math.max(b.maxX, p.x), maxY: Math.max(b.maxY, p.y) }), { minX: Infinity, minY: Infinity, maxX: -Infinity, maxY: -Infinity });
  return { faces, shadow, bounds };
}
