// The only importer of clipper2-ts: outward and inward offsets, union and difference of areas.
// Its parts are imported one by one: its front door brings triangulation and more with it, which the Bench would have to fetch.
import { ClipType, FillRule, PathType } from "clipper2-ts/dist/Core.js";
import { Clipper64 } from "clipper2-ts/dist/Engine.js";
import { ClipperOffset, EndType, JoinType } from "clipper2-ts/dist/Offset.js";
import type { Path, Point } from "./outline";
import { CHORD_FOR_AREAS } from "./tolerance";
import { flatten } from "./path";

/** Whole numbers of the engine a millimetre: four decimals are kept. */
const SCALE = 10_000;

const ringsOf = (paths: readonly Path[]): Point[][] => paths.map((p) => flatten(p, CHORD_FOR_AREAS).map(({ x, y }) => ({ x: Math.round(x * SCALE), y: Math.round(y * SCALE) })));
const pathsOf = (rings: readonly (readonly { x: number; y: number }[])[]): Path[] =>
  rings.map((ring) => ({ closed: true, vertices: ring.map(({ x, y }) => ({ x: x / SCALE, y: y / SCALE, bulge: 0 })) }));

/** Corners sharper than this many distances out are cut off square. */
const MITER = 2;

/** Areas grown (distance > 0) or shrunk (distance < 0), mm, with sharp corners: never nearer than the distance, and few points. */
export function offsetAreas(paths: readonly Path[], distance: number): Path[] {
  const engine = new ClipperOffset(MITER, CHORD_FOR_AREAS * SCALE);
  engine.addPaths(ringsOf(paths), JoinType.Miter, EndType.Polygon);
  const rings: Point[][] = [];
  engine.execute(distance * SCALE, rings);
  return pathsOf(rings);
}

export const uniteAreas = (paths: readonly Path[]): Path[] => combined(ClipType.Union, paths, []);

export const subtractAreas = (from: readonly Path[], cut: readonly Path[]): Path[] => combined(ClipType.Difference, from, cut);

function combined(how: ClipType, subject: readonly Path[], clip: readonly Path[]): Path[] {
  const engine = new Clipper64();
  engine.addPaths(ringsOf(subject), PathType.Subject);
  engine.addPaths(ringsOf(clip), PathType.Clip);
  const rings: Point[][] = [];
  engine.execute(how, FillRule.NonZero, rings);
  return pathsOf(rings);
}
