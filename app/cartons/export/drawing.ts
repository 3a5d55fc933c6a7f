// Dimensions, names and marks of a drawing as plain data: the sheet on paper and the stage on screen draw the very same.
// Nothing is decided here about a carton: figures are distances on the blank, or the ledger's own.
import type { Box, Point } from "../geometry/outline";
import type { Carton } from "../types";
import { calloutsOf } from "./drawing-callouts";
import { chainsOf } from "./drawing-chains";
import { figuresOf } from "./drawing-figures";
import { labelsOf, grainOf, type GrainArrow, type PanelLabel } from "./drawing-labels";
import { shapesSeen, unite, type Measures } from "./drawing-space";
import { seenBox, type Side } from "./sheet-view";

export interface Line {
  readonly from: Point;
  readonly to: Point;
}

/** One dimension. All points on the drawing, mm, y up. */
export interface Dimension {
  readonly id: string;
  /** chain: side by side outside the blank. overall: the blank's own extent. asked: L, W or D, inside a panel. panel: any other figure of the ledger, inside a panel. hole: from an edge to a hole's middle. */
  readonly kind: "chain" | "overall" | "asked" | "panel" | "hole";
  readonly measures: Measures;
  /** Ends of the dimension line, where its ticks stand. */
  readonly from: Point;
  readonly to: Point;
  /** Unit vector from the blank outwards: on this side a figure stands that does not fit into the line. */
  readonly away: Point;
  readonly value: number;
  readonly text: string;
  readonly textAt: Point;
  /** The figure stands in a gap of the line; otherwise beside it. */
  readonly fits: boolean;
  readonly row: string | null;
  readonly parameter: string | null;
  readonly extensions: readonly Line[];
}

/** A radius, an angle or a hole's size, with a short leader to the place. */
export interface Callout {
  readonly id: string;
  readonly panel: string;
  readonly text: string;
  readonly at: Point;
  readonly leader: Line | null;
}

export interface DrawingOptions {
  readonly side: Side;
  /** Size of figures, mm on the drawing. On a screen at scale s: 13 px / s. */
  readonly size?: number;
  /** Distance of the first chain from the bleed, and from chain to chain, mm on the drawing. */
  readonly gap?: number;
  readonly pitch?: number;
  /** Radii, angles and holes; left out on a crowded screen. */
  readonly callouts?: boolean;
}

export interface Drawing {
  readonly side: Side;
  readonly size: number;
  readonly dimensions: readonly Dimension[];
  readonly labels: readonly PanelLabel[];
  readonly callouts: readonly Callout[];
  readonly grain: readonly GrainArrow[];
  /** Radii, angles and holes for which there was no room: they are cut from the file. */
  readonly leftToFile: number;
  /** All of it, the blank and its bleed included. */
  readonly bounds: Box;
}

export interface Room {
  readonly size: number;
  readonly gap: number;
  readonly pitch: number;
  /** How far the bleed stands out of the blank, mm. */
  readonly bleed: number;
  /** Taken up already by names, arrows and figures; and by dimension lines, which may cross one another but no words. */
  readonly taken: Box[];
  readonly lines: Box[];
}

/** Figures at 9 pt and chains at 9 mm: a drawing office's paper sheet. */
const PAPER = { size: 3.2, gap: 8, pitch: 9 } as const;

export function drawingOf(carton: Carton, options: DrawingOptions): Drawing {
  const { side } = options;
  const size = options.size ?? PAPER.size;
  const shapes = shapesSeen(carton, side);
  const room: Room = { size, gap: options.gap ?? PAPER.gap, pitch: options.pitch ?? PAPER.pitch, bleed: bleedOut(carton), taken: [], lines: [] };
  const labels = labelsOf(shapes, room);
  const grain = grainOf(carton, shapes, room);
  const chains = chainsOf(carton, shapes, side, room);
  const figures = figuresOf(carton, shapes, side, room, chains);
  const callouts = options.callouts === false ? { callouts: [], dimensions: [], leftOut: 0 } : calloutsOf(shapes, room);
  const dimensions = [...chains, ...figures.dimensions, ...callouts.dimensions];
  const blank = seenBox(carton.blank.bounds, side);
  return {
    side, size, dimensions, labels, grain, callouts: callouts.callouts,
    leftToFile: figures.leftOut + callouts.leftOut,
    bounds: unite([grown(blank, room.bleed), ...dimensions.flatMap((d) => [extentOf(d, size), ...d.extensions.map(boxOfLine)])]),
  };
}

function bleedOut(carton: Carton): number {
  const { bounds } = carton.blank;
  let out = 0;
  for (const { path } of carton.layers.bleed) {
    for (const v of path.vertices) out = Math.max(out, bounds.minX - v.x, v.x - bounds.maxX, bounds.minY - v.y, v.y - bounds.maxY);
  }
  return out;
}

const grown = (b: Box, by: number): Box => ({ minX: b.minX - by, minY: b.minY - by, maxX: b.maxX + by, maxY: b.maxY + by });
const boxOfLine = (l: Line): Box => ({ minX: Math.min(l.from.x, l.to.x), minY: Math.min(l.from.y, l.to.y), maxX: Math.max(l.from.x, l.to.x), maxY: Math.max(l.from.y, l.to.y) });
const extentOf = (d: Dimension, size: number): Box => unite([boxOfLine(d), grown({ minX: d.textAt.x, maxX: d.textAt.x, minY: d.textAt.y, maxY: d.textAt.y }, size)]);
