// How the fold view looks at the carton: from straight above the drawing when it is flat, from three quarters when it stands.
// Pure: directions, centres and scales; the 3-D code only applies them.
import { transform, type Vec3 } from "~/cartons/geometry/space";
import type { FoldModel, Pose } from "~/cartons/types";
import { toDrawing, type Frame, type View } from "./view";

/** What the user has turned and zoomed: degrees and a factor. */
export interface Turn {
  readonly azimuth: number;
  readonly elevation: number;
  readonly zoom: number;
}
export const AT_REST: Turn = { azimuth: 0, elevation: 0, zoom: 1 };

export interface Look {
  /** Columns of the camera's turn: to the right, up, and towards the viewer. */
  readonly right: Vec3;
  readonly up: Vec3;
  readonly towards: Vec3;
  /** World point in the middle of the view, and px a mm there. */
  readonly centre: Vec3;
  readonly scale: number;
}

/** Degrees right of the front and above it, as in the pictures. */
const AZIMUTH = -34;
const ELEVATION = 26;
/** Of the frame: what the standing carton fills. */
const FILL = 0.74;

const cross = (a: Vec3, b: Vec3): Vec3 => [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const sum = (...terms: readonly (readonly [number, Vec3])[]): Vec3 => terms.reduce<Vec3>((s, [k, v]) => [s[0] + k * v[0], s[1] + k * v[1], s[2] + k * v[2]], [0, 0, 0]);
const unit = (v: Vec3): Vec3 => sum([1 / Math.hypot(...v), v]);
const lerp = (a: Vec3, b: Vec3, t: number): Vec3 => sum([1 - t, a], [t, b]);

/** Slow at both ends. */
const eased = (t: number): number => t * t * (3 - 2 * t);

/** How far the view has gone from drawing to three quarters; a turn of the user's own goes there at once. */
export const viewProgress = (u: number, turn: Turn): number => (turn.azimuth !== 0 || turn.elevation !== 0 ? 1 : eased(Math.min(1, Math.max(0, u))));

export function lookAt(fold: FoldModel, pose: Pose, u: number, turn: Turn, drawing: View, frame: Frame): Look {
  const t = viewProgress(u, turn);
  const az = ((AZIMUTH + turn.azimuth) * Math.PI) / 180;
  const el = (Math.min(89, Math.max(-89, ELEVATION + turn.elevation)) * Math.PI) / 180;
  const side = cross(fold.up, fold.front);
  const standing = sum([Math.cos(el) * Math.cos(az), fold.front], [Math.cos(el) * Math.sin(az), side], [Math.sin(el), fold.up]);
  const towards = unit(lerp([0, 0, 1], standing, t));
  const upright = unit(lerp([0, 1, 0], fold.up, t));
  // Where up and the view's direction nearly meet, the drawing's own up decides.
  const right = unit(Math.abs(dot(upright, towards)) > 0.999 ? cross([0, 1, 0], towards) : cross(upright, towards));
  const up = cross(towards, right);

  const points = corners(fold, pose);
  const seen = points.map((p) => [dot(p, right), dot(p, up), dot(p, towards)] as const);
  const [low, high] = [0, 1, 2].map((k) => [Math.min(...seen.map((s) => s[k]!)), Math.max(...seen.map((s) => s[k]!))] as const).reduce<[number[], number[]]>((acc, [a, b]) => [[...acc[0], a], [...acc[1], b]], [[], []]);
  const middle = sum([(low[0]! + high[0]!) / 2, right], [(low[1]! + high[1]!) / 2, up], [(low[2]! + high[2]!) / 2, towards]);
  const fit = FILL * Math.min(frame.width / Math.max(1, high[0]! - low[0]!), frame.height / Math.max(1, high[1]! - low[1]!));
  const drawn = toDrawing(drawing, { x: frame.width / 2, y: frame.height / 2 });
  return { right, up, towards, centre: lerp([drawn.x, drawn.y, 0], middle, t), scale: (drawing.scale * (1 - t) + fit * t) * turn.zoom };
}

function corners(fold: FoldModel, pose: Pose): Vec3[] {
  return fold.panels.flatMap((panel, i) => panel.outline.vertices.map((v) => transform(pose[i]!, v.x, v.y, 0)));
}
