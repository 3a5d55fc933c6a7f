// Which sheet of paper, and where on it the blank, the legend and the title block stand. All mm, origin at the lower left.
import type { PDFPage } from "pdf-lib";
import type { Box } from "../../geometry/outline";
import { POINTS } from "./ink";

/** ISO 216 sheets, lying. */
const SHEETS: readonly { readonly name: string; readonly width: number; readonly height: number }[] = [
  { name: "A4", width: 297, height: 210 },
  { name: "A3", width: 420, height: 297 },
  { name: "A2", width: 594, height: 420 },
  { name: "A1", width: 841, height: 594 },
  { name: "A0", width: 1189, height: 841 },
];

export const MARGIN = 10;
const AIR = 5;
export const BLOCK = { width: 176, height: 62 } as const;
/** The check bar is 100 mm long. */
const LEGEND_WIDTH = 104;
export const NOTES_WIDTH = 88;

export interface PageLayout {
  readonly name: string;
  readonly width: number;
  readonly height: number;
  readonly frame: Box;
  /** Where the drawing may stand. */
  readonly stage: Box;
  readonly titleBlock: Box;
  readonly legend: Box;
  readonly notes: Box;
}

interface Needs {
  readonly width: number;
  readonly height: number;
  readonly legendHeight: number;
  readonly notesHeight: number;
}

/** Legend, notes and title block in a band below the drawing. */
function band(name: string, width: number, height: number, needs: Needs): PageLayout {
  const frame = { minX: MARGIN, minY: MARGIN, maxX: width - MARGIN, maxY: height - MARGIN };
  const titleBlock = { minX: frame.maxX - BLOCK.width, minY: frame.minY, maxX: frame.maxX, maxY: frame.minY + BLOCK.height };
  const top = frame.minY + Math.max(BLOCK.height, needs.legendHeight + 2 * AIR);
  const legend = { minX: frame.minX + AIR, minY: frame.minY + AIR, maxX: frame.minX + AIR + LEGEND_WIDTH, maxY: top - AIR };
  const roomy = titleBlock.minX - legend.maxX >= NOTES_WIDTH + 2 * AIR;
  const notes = roomy
    ? { minX: legend.maxX + AIR, minY: frame.minY + AIR, maxX: titleBlock.minX - AIR, maxY: top - AIR }
    : { minX: titleBlock.minX + 4, minY: titleBlock.maxY + AIR, maxX: titleBlock.maxX - AIR, maxY: titleBlock.maxY + AIR + needs.notesHeight };
  return { name, width, height, frame, titleBlock, legend, notes, stage: { minX: frame.minX + AIR, minY: roomy ? top + AIR : notes.maxY + AIR, maxX: frame.maxX - AIR, maxY: frame.maxY - AIR } };
}

/** The same in a column on the right. */
function column(name: string, width: number, height: number, needs: Needs): PageLayout {
  const frame = { minX: MARGIN, minY: MARGIN, maxX: width - MARGIN, maxY: height - MARGIN };
  const left = frame.maxX - BLOCK.width;
  const titleBlock = { minX: left, minY: frame.minY, maxX: frame.maxX, maxY: frame.minY + BLOCK.height };
  const legend = { minX: left + 4, minY: titleBlock.maxY + AIR, maxX: frame.maxX - AIR, maxY: titleBlock.maxY + AIR + needs.legendHeight };
  const notes = { minX: left + 4, minY: legend.maxY + AIR, maxX: frame.maxX - AIR, maxY: frame.maxY - AIR };
  return { name, width, height, frame, titleBlock, legend, notes, stage: { minX: frame.minX + AIR, minY: frame.minY + AIR, maxX: left - AIR, maxY: frame.maxY - AIR } };
}

const holds = (layout: PageLayout, needs: Needs): boolean =>
  layout.stage.maxX - layout.stage.minX >= needs.width && layout.stage.maxY - layout.stage.minY >= needs.height &&
  layout.titleBlock.minX >= layout.frame.minX && layout.notes.maxY - layout.notes.minY >= needs.notesHeight &&
  (layout.legend.maxX <= layout.titleBlock.minX || layout.legend.minY >= layout.titleBlock.maxY);

/** The smallest lying sheet on which the drawing stands at 1 : 1; past A0 a sheet of its own. */
export function pageFor(needs: Needs): PageLayout {
  for (const sheet of SHEETS) {
    for (const arrange of [band, column]) {
      const layout = arrange(sheet.name, sheet.width, sheet.height, needs);
      if (holds(layout, needs)) return layout;
    }
  }
  const trial = band("own size", 2000, 2000, needs);
  const up = (mm: number) => Math.ceil(mm / 10) * 10;
  const width = Math.max(1189, up(needs.width + 2000 - (trial.stage.maxX - trial.stage.minX)));
  return band("own size", width, Math.max(841, up(needs.height + 2000 - (trial.stage.maxY - trial.stage.minY))), needs);
}

/** TrimBox and BleedBox in points; the blank stands moved by dx, dy. */
export function setBoxes(page: PDFPage, trim: Box, bleed: Box, dx: number, dy: number): void {
  page.setTrimBox((trim.minX + dx) * POINTS, (trim.minY + dy) * POINTS, (trim.maxX - trim.minX) * POINTS, (trim.maxY - trim.minY) * POINTS);
  page.setBleedBox((bleed.minX + dx) * POINTS, (bleed.minY + dy) * POINTS, (bleed.maxX - bleed.minX) * POINTS, (bleed.maxY - bleed.minY) * POINTS);
}
