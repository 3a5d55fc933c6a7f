// The same carton over several sheets of office paper at 100 %, to be taped together.
import { PDFDocument } from "pdf-lib";
import type { Box, Point } from "../../geometry/outline";
import type { Carton, Layers } from "../../types";
import { drawingOf, type Drawing } from "../drawing";
import { layersSeen, sideWords } from "../sheet-view";
import { drawLayers } from "./blank";
import { addPage, finished, typedTexts, type PdfOptions } from "./document";
import { drawFigures } from "./figures";
import { embedFaces, oneLine, type Faces } from "./fonts";
import { createInk, type Ink } from "./ink";
import { groupsFor, LEGEND, registerGroups } from "./layer-groups";
import { capitalsWidth, unite } from "../drawing-space";
import { boundsOf } from "../../geometry/path";
import { drawCheckBar } from "./sheet";

export type Paper = "A4" | "Letter";

export interface TileOptions extends PdfOptions {
  readonly paper: Paper;
}

const PAPERS: Record<Paper, { readonly short: number; readonly long: number }> = { A4: { short: 210, long: 297 }, Letter: { short: 215.9, long: 279.4 } };
/** Printers leave this much of the edge blank, mm. */
const EDGE = 8;
const FOOT = 16;
export const OVERLAP = 10;

interface Tiling {
  readonly width: number;
  readonly height: number;
  readonly rows: number;
  readonly columns: number;
  /** Part of the drawing on one sheet, overlap included. */
  readonly tile: { readonly width: number; readonly height: number };
}

function tilingOf(width: number, height: number, needs: { width: number; height: number }): Tiling {
  const tile = { width: width - 2 * EDGE, height: height - 2 * EDGE - FOOT };
  const count = (need: number, size: number) => Math.max(1, Math.ceil((need - OVERLAP) / (size - OVERLAP)));
  return { width, height, tile, columns: count(needs.width, tile.width), rows: count(needs.height, tile.height) };
}

/** The blank, its names and grain over as few sheets as hold it, upright or lying. Neighbours overlap by 10 mm. */
export async function tiledPdfOf(carton: Carton, options: TileOptions): Promise<Uint8Array> {
  const document = await PDFDocument.create({ updateMetadata: false });
  const faces = await embedFaces(document, options.fonts, typedTexts(carton, options));
  const layers = layersSeen(carton, options.side);
  const drawing: Drawing = { ...drawingOf(carton, { side: options.side, callouts: false }), dimensions: [], callouts: [] };
  const bounds = unite([boundsOf([...layers.cut, ...layers.bleed].map((p) => p.path))].map((b) => ({ minX: b.minX - 1, minY: b.minY - 1, maxX: b.maxX + 1, maxY: b.maxY + 1 })));
  const needs = { width: bounds.maxX - bounds.minX, height: bounds.maxY - bounds.minY };
  const { short, long } = PAPERS[options.paper];
  const [upright, lying] = [tilingOf(short, long, needs), tilingOf(long, short, needs)];
  const tiling = lying.rows * lying.columns < upright.rows * upright.columns ? lying : upright;
  const groups = registerGroups(document, groupsFor((name) => layers[name].length > 0));
  let written = "";
  for (let row = 0; row < tiling.rows; row++) {
    for (let column = 0; column < tiling.columns; column++) {
      const ink = createInk();
      drawTile(ink, { tiling, row, column, bounds }, layers, drawing, options, faces);
      addPage(document, tiling.width, tiling.height, ink, faces, groups, () => {});
      written += ink.content();
    }
  }
  return finished(document, options, written);
}

interface Place {
  readonly tiling: Tiling;
  readonly row: number;
  readonly column: number;
  readonly bounds: Box;
}

function drawTile(ink: Ink, place: Place, layers: Layers, drawing: Drawing, options: TileOptions, faces: Faces): void {
  const { tiling, row, column, bounds } = place;
  const { tile } = tiling;
  const window: Box = { minX: EDGE, minY: EDGE + FOOT, maxX: EDGE + tile.width, maxY: EDGE + FOOT + tile.height };
  // The tiles together are a little larger than the drawing: it stands in their middle.
  const spareX = tiling.columns * (tile.width - OVERLAP) + OVERLAP - (bounds.maxX - bounds.minX);
  const spareY = tiling.rows * (tile.height - OVERLAP) + OVERLAP - (bounds.maxY - bounds.minY);
  const left = bounds.minX - spareX / 2 + column * (tile.width - OVERLAP);
  const top = bounds.maxY + spareY / 2 - row * (tile.height - OVERLAP);
  ink.apart(() => {
    ink.box(window, "W n");
    ink.moved(window.minX - left, window.maxY - top, () => {
      drawLayers(ink, layers);
      drawFigures(ink, shownOn(drawing, { minX: left, maxX: left + tile.width, minY: top - tile.height, maxY: top }), faces);
    });
  });
  ink.layer(LEGEND.key, () => {
    ink.stroke(0.13, [1, 1]);
    ink.box(window, "S");
    drawCrosses(ink, place, window);
    drawMap(ink, place, { x: tiling.width - EDGE, y: EDGE });
    drawCheckBar(ink, { x: EDGE, y: EDGE + 10 }, faces, true);
    const label = tiling.rows * tiling.columns === 1 ? "One sheet" : `Row ${row + 1} of ${tiling.rows}, column ${column + 1} of ${tiling.columns}`;
    const right = tiling.width - EDGE - 20;
    ink.text(label, { x: right, y: EDGE + 9 }, { face: faces.bold, size: 3.2, align: "right" });
    const about = `${oneLine(options.title).slice(0, 40)}, revision ${oneLine(options.revision)}, ${sideWords(options.side)}`;
    ink.text(about, { x: EDGE, y: EDGE + 0.6 }, { face: faces.regular, size: 2.6 });
  });
}

/** Only the names and arrows that reach into this part of the drawing: words cut off by the window would still be read aloud. */
function shownOn(drawing: Drawing, part: Box): Drawing {
  const reaches = (at: Point, half: number) => at.x + half > part.minX && at.x - half < part.maxX && at.y + half > part.minY && at.y - half < part.maxY;
  return {
    ...drawing,
    labels: drawing.labels.filter((l) => reaches(l.at, capitalsWidth(l.text, l.size) / 2)),
    grain: drawing.grain.filter((g) => reaches(g.at, Math.hypot(g.to.x - g.from.x, g.to.y - g.from.y) / 2)),
  };
}

/** Crosses on the middle of each overlap: lay one sheet's on the other's. */
function drawCrosses(ink: Ink, { tiling, row, column }: Place, window: Box): void {
  const half = OVERLAP / 2;
  const xs = [...(column > 0 ? [window.minX + half] : []), ...(column < tiling.columns - 1 ? [window.maxX - half] : [])];
  const ys = [...(row > 0 ? [window.maxY - half] : []), ...(row < tiling.rows - 1 ? [window.minY + half] : [])];
  const alongX = [window.minX + half, (window.minX + window.maxX) / 2, window.maxX - half];
  const alongY = [window.minY + half, (window.minY + window.maxY) / 2, window.maxY - half];
  const places = new Map<string, { x: number; y: number }>();
  for (const x of xs) for (const y of alongY) places.set(`${x}/${y}`, { x, y });
  for (const y of ys) for (const x of alongX) places.set(`${x}/${y}`, { x, y });
  ink.stroke(0.15);
  for (const { x, y } of places.values()) {
    ink.line({ x: x - 4, y }, { x: x + 4, y });
    ink.line({ x, y: y - 4 }, { x, y: y + 4 });
    ink.paths([{ closed: true, vertices: [{ x: x - 2, y, bulge: 1 }, { x: x + 2, y, bulge: 1 }] }], "S");
  }
}

/** A small map of the sheets with this one filled. */
function drawMap(ink: Ink, { tiling, row, column }: Place, corner: { x: number; y: number }): void {
  const cell = Math.min(16 / tiling.columns, 12 / tiling.rows, 5);
  ink.stroke(0.13);
  for (let r = 0; r < tiling.rows; r++) {
    for (let c = 0; c < tiling.columns; c++) {
      const x = corner.x - (tiling.columns - c) * cell;
      const y = corner.y + (tiling.rows - 1 - r) * cell;
      const box = { minX: x, minY: y, maxX: x + cell, maxY: y + cell };
      if (r === row && c === column) ink.box({ minX: x + 0.4, minY: y + 0.4, maxX: x + cell - 0.4, maxY: y + cell - 0.4 }, "f");
      ink.box(box, "S");
    }
  }
}
