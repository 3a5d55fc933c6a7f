// A made-up blank with something on each of the eight layers, so that exporters are tried on all of them whatever the
// constructions use. It is not a carton that folds: only its flat is true.
import type { Board } from "~/cartons/boards/board";
import type { Path, Point, Vertex } from "~/cartons/geometry/outline";
import { areaOf, boundsOf, lengthOf } from "~/cartons/geometry/path";
import type { Carton, FlatPanel, LayerName, LayerPath, Layers, LedgerRow } from "~/cartons/types";

export const closed = (...vertices: (readonly [number, number, number?])[]): Path => ({ closed: true, vertices: vertices.map(([x, y, bulge]): Vertex => ({ x, y, bulge: bulge ?? 0 })) });
export const open = (...vertices: (readonly [number, number, number?])[]): Path => ({ closed: false, vertices: vertices.map(([x, y, bulge]): Vertex => ({ x, y, bulge: bulge ?? 0 })) });
const line = (id: string, role: LayerPath["role"], a: Point, b: Point, panels: readonly string[]): LayerPath => ({ id, role, path: open([a.x, a.y], [b.x, b.y]), panels });

/** Bulge of a quarter circle. */
export const QUARTER = Math.tan(Math.PI / 8);

// base 0..120 × 0..80; wall right 120..150.5; flap up 80..110 with 8 mm corners; glue flap left, tapered.
const hole = closed([52, 40, 1], [68, 40, 1]);
const base = closed([0, 0], [120, 0], [120, 80], [0, 80]);
const wall = closed([120, 0.4], [150.5, 0.4], [150.5, 79.6], [120, 79.6]);
const flap = closed([0.5, 80], [119.5, 80], [119.5, 102, QUARTER], [111.5, 110], [8.5, 110, QUARTER], [0.5, 102]);
const glueFlap = closed([0, 1], [0, 79], [-13, 75.517], [-13, 4.483]);

const panel = (name: string, label: string, role: FlatPanel["role"], outline: Path, holes: readonly Path[] = []): FlatPanel => {
  const bounds = boundsOf([outline]);
  return { name, label, role, part: "body", outline, holes, bounds, labelAt: { x: (bounds.minX + bounds.maxX) / 2, y: (bounds.minY + bounds.maxY) / 2 }, room: { width: bounds.maxX - bounds.minX - 2, height: bounds.maxY - bounds.minY - 2 } };
};

const outline = closed(
  [0, 0], [120, 0], [120, 0.4], [150.5, 0.4], [150.5, 79.6], [120, 79.6], [120, 80], [119.5, 80], [119.5, 102, QUARTER], [111.5, 110], [8.5, 110, QUARTER],
  [0.5, 102], [0.5, 80], [0, 80], [0, 79], [-13, 75.517], [-13, 4.483], [0, 1],
);

const layers: Layers = {
  cut: [
    { id: "outline:1", role: "outline", path: outline, panels: [] },
    { id: "feature:base:1", role: "feature", path: hole, panels: ["base"] },
    line("slit:base/flap", "slit", { x: 0.5, y: 80 }, { x: 8.5, y: 80 }, ["base", "flap"]),
    { id: "feature:wall:1", role: "feature", path: open([130, 20], [140, 20, QUARTER], [143, 23], [143, 40]), panels: ["wall"] },
    { id: "feature:wall:2", role: "feature", path: open([130, 60, -1], [140, 60]), panels: ["wall"] },
  ],
  crease: [line("crease:base/flap", "crease", { x: 8.5, y: 80 }, { x: 119.5, y: 80 }, ["base", "flap"]), line("crease:base/glue", "crease", { x: 0, y: 1 }, { x: 0, y: 79 }, ["base", "glue"])],
  reverseCrease: [line("crease:base/wall", "crease", { x: 120, y: 0.4 }, { x: 120, y: 79.6 }, ["base", "wall"])],
  perforation: [line("feature:flap:1", "feature", { x: 20, y: 95 }, { x: 100, y: 95 }, ["flap"])],
  halfCut: [{ id: "feature:base:2", role: "feature", path: open([10, 10], [40, 10, -QUARTER], [50, 20]), panels: ["base"] }],
  bleed: [{ id: "bleed:1", role: "bleed", path: closed([-3, -3], [153.5, -3], [153.5, 82.6], [122.5, 82.6], [122.5, 113], [-3, 113]), panels: [] }],
  safe: [{ id: "safe:base:1", role: "safe", path: closed([3, 3], [117, 3], [117, 77], [3, 77]), panels: ["base"] }],
  glue: [{ id: "glue:glue:1", role: "glue", path: closed([-1.5, 3], [-1.5, 77], [-11.5, 74.2], [-11.5, 5.8]), panels: ["glue", "wall"] }],
};

const row = (id: string, group: LedgerRow["group"], value: number, parameter: string | null, mark: LedgerRow["mark"]): LedgerRow => ({
  id, name: id, group, value, unit: "mm", source: group === "asked" ? "asked" : "allowance", terms: [], rule: null, reason: "", parameter, isSet: group === "asked", mark,
});
const mark = (panelName: string, from: readonly [number, number], to: readonly [number, number]) => ({ panel: panelName, from: { x: from[0], y: from[1] }, to: { x: to[0], y: to[1] } });

const lengths = Object.fromEntries(Object.entries(layers).map(([name, paths]) => [name, paths.reduce((sum, p) => sum + lengthOf(p.path), 0)])) as Record<LayerName, number>;
const bounds = boundsOf([outline]);

export const everyLayer: Carton = {
  brief: { construction: "made-up", size: { L: 119.6, W: 79.6, D: 30 }, basis: "inside", room: 0, board: "test", options: {}, typed: {} },
  board: { id: "test", name: "Test board", caliper: 0.4, caliperTolerance: 0.02 } as unknown as Board,
  construction: {
    id: "made-up", name: "Made-up blank", summary: "", codes: [], families: ["carton"], closes: "", pieces: 1, glued: true,
    size: { L: { from: 1, to: 999 }, W: { from: 1, to: 999 }, D: { from: 1, to: 999 } }, sample: { size: { L: 119.6, W: 79.6, D: 30 }, board: "test" }, parameters: [], meaning: "",
  },
  inside: { L: 119.6, W: 79.6, D: 30 }, clearInside: { L: 119.2, W: 79.2, D: 30 }, crease: { L: 120, W: 80, D: 30.5 }, outside: { L: 120.4, W: 80.4, D: 30.8 },
  blank: { width: bounds.maxX - bounds.minX, height: bounds.maxY - bounds.minY, area: areaOf(outline), bounds },
  parameters: { bleed: 3, safe: 3 }, grain: "x",
  panels: [panel("base", "Base", "wall", base, [hole]), panel("wall", "Wall", "wall", wall), panel("flap", "Flap", "flap", flap), panel("glue", "Glue flap", "flap", glueFlap)],
  layers, lengths,
  fold: {
    panels: [{ name: "base", label: "Base", role: "wall", part: "body", thickness: 0.4, outline: base, holes: [], pieces: [] }],
    hinges: [], parts: [{ name: "body", label: "Body", root: 0, flat: { c: 1, s: 0, x: 0, y: 0 }, step: -1, turn: 0, shift: [0, 0, 0], lift: 0 }],
    steps: [], up: [0, 0, 1], front: [0, -1, 0],
  },
  ledger: [
    row("L", "asked", 119.6, "L", mark("base", [0, 40], [120, 40])),
    row("W", "asked", 79.6, "W", mark("base", [60, 0], [60, 80])),
    row("base.width", "worked-out", 120, null, mark("base", [0, 0], [120, 0])),
    row("flap.depth", "option", 30, "flap", mark("flap", [60, 80], [60, 110])),
    row("wall.height", "worked-out", 79.2, null, mark("wall", [135, 0.4], [135, 79.6])),
  ],
  foldCheck: { closes: true, measuredInside: { L: 119.6, W: 79.6, D: 30 }, clearInside: { L: 119.2, W: 79.2, D: 30 }, outside: { L: 120.4, W: 80.4, D: 30.8 }, mates: [], locks: [], collisions: [], tolerance: [{ axis: "L", terms: [], worstCase: 0.6, rootSumSquare: 0.42 }], findings: [] },
  findings: [],
};
