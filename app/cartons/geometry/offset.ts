// The only importer of clipper2-ts: outward and inward offsets, union and difference of areas.
import { EndType, FillRule, JoinType, differenceD, inflatePathsD, unionD } from "clipper2-ts";
import type { Path, Point } from "./outline";
import { CHORD_FOR_AREAS } from "./tolerance";
import { flatten } from "./path";

/** Decimals that the integer engine keeps, of a millimetre. */
const PRECISION = 4;

const ringsOf = (paths: readonly Path[]): Point[][] => paths.map((p) => flatten(p, CHORD_FOR_AREAS).map(({ x, y }) => ({ x, y })));
const pathsOf = (rings: readonly (readonly { x: number; y: number }[])[]): Path[] =>
  rings.map((ring) => ({ closed: true, vertices: ring.map(({ x, y }) => ({ x, y, bulge: 0 })) }));

/** Corners sharper than this many distances out are cut off square. */
const MITER = 2;

/** Areas grown (distance > 0) or shrunk (distance < 0), mm, with sharp corners: never nearer than the distance, and few points. */
export const offsetAreas = (paths: readonly Path[], distance: number): Path[] =>
  pathsOf(inflatePathsD(ringsOf(paths), distance, JoinType.Miter, EndType.Polygon, MITER, PRECISION, CHORD_FOR_AREAS));

export const uniteAreas = (paths: readonly Path[]): Path[] => pathsOf(unionD(ringsOf(paths), [], FillRule.NonZero, PRECISION));

export const subtractAreas = (from: readonly Path[], cut: readonly Path[]): Path[] =>
  pathsOf(differenceD(ringsOf(from), ringsOf(cut), FillRule.NonZero, PRECISION));
