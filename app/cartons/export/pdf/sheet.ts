// The drawing office's sheet round the blank: frame with zones, title block, legend, notes, check bar.
import type { Box } from "../../geometry/outline";
import type { Carton } from "../../types";
import { legendOf, notesOf, titleBlockOf, type Cell, type SheetFacts } from "../title-block";
import type { Drawing } from "../drawing";
import { drawSample } from "./blank";
import { oneLine, type Face, type Faces } from "./fonts";
import type { Ink } from "./ink";
import { LEGEND } from "./layer-groups";
import { NOTES_WIDTH, type PageLayout } from "./page-boxes";

const RULE = 0.35;
const HAIR = 0.13;
const LABEL = 2.1;
const BODY = 3.1;

export const CHECK_BAR = "If this bar does not measure 100 mm, print again at actual size.";
const LEGEND_ROW = 4.6;
const CHECK_HEIGHT = 14;

/** Height that the legend of this many layers takes, check bar included, mm. */
export const legendHeight = (rows: number): number => 6 + rows * LEGEND_ROW + CHECK_HEIGHT;

export function drawFrame(ink: Ink, layout: PageLayout, faces: Faces): void {
  const { frame, width, height } = layout;
  ink.layer(LEGEND.key, () => {
    ink.stroke(0.5);
    ink.box(frame, "S");
    ink.stroke(HAIR);
    const out = { minX: frame.minX - 4.5, minY: frame.minY - 4.5, maxX: frame.maxX + 4.5, maxY: frame.maxY + 4.5 };
    ink.box(out, "S");
    const across = 2 * Math.max(2, Math.round((frame.maxX - frame.minX) / 100));
    const up = 2 * Math.max(1, Math.round((frame.maxY - frame.minY) / 100));
    const style = { face: faces.regular, size: 2.2, align: "centre" as const };
    for (let i = 0; i < across; i++) {
      const [a, b] = [0, 1].map((k) => frame.minX + ((frame.maxX - frame.minX) * (i + k)) / across) as [number, number];
      for (const [edge, far] of [[frame.minY, out.minY], [frame.maxY, out.maxY]] as const) {
        if (i > 0) ink.line({ x: a, y: edge }, { x: a, y: far });
        ink.text(String(i + 1), { x: (a + b) / 2, y: (edge + far) / 2 - 0.8 }, style);
      }
    }
    for (let i = 0; i < up; i++) {
      const [a, b] = [0, 1].map((k) => frame.maxY - ((frame.maxY - frame.minY) * (i + k)) / up) as [number, number];
      for (const [edge, far] of [[frame.minX, out.minX], [frame.maxX, out.maxX]] as const) {
        if (i > 0) ink.line({ x: edge, y: a }, { x: far, y: a });
        ink.text(String.fromCharCode(65 + i), { x: (edge + far) / 2, y: (a + b) / 2 - 0.8 }, style);
      }
    }
    // Where the middle of the sheet is, for whoever copies or trims it.
    ink.stroke(RULE);
    ink.line({ x: width / 2, y: out.minY }, { x: width / 2, y: frame.minY + 2 });
    ink.line({ x: out.minX, y: height / 2 }, { x: frame.minX + 2, y: height / 2 });
  });
}

export function drawTitleBlock(ink: Ink, box: Box, carton: Carton, facts: SheetFacts, faces: Faces): void {
  ink.layer(LEGEND.key, () => {
    ink.stroke(0.5);
    ink.box(box, "S");
    const rows = titleBlockOf(carton, facts);
    const scale = (box.maxY - box.minY) / rows.reduce((sum, r) => sum + r.height, 0);
    let top = box.maxY;
    rows.forEach((row, i) => {
      const bottom = top - row.height * scale;
      ink.stroke(RULE);
      if (i > 0) ink.line({ x: box.minX, y: top }, { x: box.maxX, y: top });
      let left = box.minX;
      row.cells.forEach((cell, k) => {
        const right = left + (box.maxX - box.minX) * cell.share;
        if (k > 0) ink.line({ x: left, y: bottom }, { x: left, y: top });
        drawCell(ink, { minX: left, minY: bottom, maxX: right, maxY: top }, cell, faces);
        left = right;
      });
      top = bottom;
    });
  });
}

function drawCell(ink: Ink, box: Box, cell: Cell, faces: Faces): void {
  if (cell.weight === "wordmark") {
    wordmark(ink, { x: box.minX + 2.4, y: (box.minY + box.maxY) / 2 - 1.7 }, 3.4, faces);
    return;
  }
  ink.text(cell.label, { x: box.minX + 1.6, y: box.maxY - LABEL - 0.7 }, { face: faces.regular, size: LABEL });
  const isTitle = cell.weight === "title";
  const face = cell.weight === "regular" ? faces.regular : faces.bold;
  const { text, size } = fitted(oneLine(cell.value), face, isTitle ? 5.6 : BODY * (cell.weight === "bold" ? 1.08 : 1), box.maxX - box.minX - 3.2);
  ink.text(text, { x: box.minX + 1.6, y: box.minY + (isTitle ? 2.4 : 2) }, { face, size });
}

/** The text at the wanted size, smaller when it is long, cut with an ellipsis when even that runs over. */
function fitted(text: string, face: Face, wanted: number, width: number): { text: string; size: number } {
  for (const size of [wanted, wanted * 0.86, wanted * 0.74, wanted * 0.64]) if (face.width(text, size) <= width) return { text, size };
  const size = wanted * 0.64;
  const letters = [...text];
  while (letters.length > 1 && face.width(`${letters.join("")}…`, size) > width) letters.pop();
  return { text: `${letters.join("").trimEnd()}…`, size };
}

/** The C is a tuck flap: cut on three sides, creased on the fourth. In one colour and this small the crease is dropped. */
function wordmark(ink: Ink, at: { x: number; y: number }, height: number, faces: Faces): void {
  const s = height / 100;
  const x = (v: number) => at.x + v * s;
  const y = (v: number) => at.y + (100 - v) * s;
  const p = (a: number, b: number) => `${x(a).toFixed(3)} ${y(b).toFixed(3)}`;
  // Quarter circles as cubics, 0.5523 of the radius to the handles.
  const k = 0.5523;
  ink.raw(
    `${p(38, 0)} m ${p(88, 0)} l ${p(88, 27)} l ${p(46, 27)} l ${p(46 - 19 * k, 27)} ${p(27, 46 - 19 * k)} ${p(27, 46)} c ${p(27, 54)} l ` +
    `${p(27, 54 + 19 * k)} ${p(46 - 19 * k, 73)} ${p(46, 73)} c ${p(88, 73)} l ${p(88, 100)} l ${p(38, 100)} l ` +
    `${p(38 - 38 * k, 100)} ${p(0, 62 + 38 * k)} ${p(0, 62)} c ${p(0, 38)} l ${p(0, 38 - 38 * k)} ${p(38 - 38 * k, 0)} ${p(38, 0)} c f`,
  );
  ink.text("ARTONWRIGHT", { x: x(98), y: y(100) }, { face: faces.black, size: height * 1.396, tracking: height * 0.04 });
}

export function drawLegend(ink: Ink, box: Box, carton: Carton, facts: SheetFacts, faces: Faces): void {
  const rows = legendOf(carton, facts.side);
  const top = box.maxY - 6;
  const left = box.minX;
  const placeOf = (i: number) => top - i * LEGEND_ROW - LEGEND_ROW / 2;
  ink.layer(LEGEND.key, () => {
    ink.text("Lines", { x: box.minX, y: box.maxY - 3 }, { face: faces.bold, size: BODY * 1.1 });
    rows.forEach((row, i) => {
      const y = placeOf(i);
      ink.text(row.label, { x: left + 20, y: y - 1.1 }, { face: faces.regular, size: BODY });
      ink.text(row.figure, { x: left + 100, y: y - 1.1 }, { face: faces.regular, size: BODY, align: "right" });
    });
    drawCheckBar(ink, { x: box.minX, y: top - rows.length * LEGEND_ROW - 6 }, faces, true);
    // Samples stand off the bleed in process colours: in a layer's own separation they would be cut with it.
    rows.forEach((row, i) => {
      const y = placeOf(i);
      drawSample(ink, row.layer, { minX: left, minY: y - 1.5, maxX: left + 16, maxY: y + 1.5 });
    });
  });
}

export function drawCheckBar(ink: Ink, at: { x: number; y: number }, faces: Faces, isBeneath: boolean): void {
  ink.stroke(RULE);
  ink.line(at, { x: at.x + 100, y: at.y });
  for (let mm = 0; mm <= 100; mm += 10) {
    const tall = mm % 50 === 0 ? 1.8 : 0.9;
    ink.line({ x: at.x + mm, y: at.y - tall }, { x: at.x + mm, y: at.y + tall });
  }
  const words = isBeneath ? { x: at.x, y: at.y - 5.4 } : { x: at.x + 103, y: at.y - 1 };
  ink.text(isBeneath ? `100 mm. ${CHECK_BAR}` : CHECK_BAR, words, { face: faces.regular, size: isBeneath ? BODY * 0.92 : 2.5 });
}

export function drawNotes(ink: Ink, box: Box, carton: Carton, drawing: Drawing, faces: Faces): void {
  ink.layer(LEGEND.key, () => {
    ink.text("Notes", { x: box.minX, y: box.maxY - 3 }, { face: faces.bold, size: BODY * 1.1 });
    let y = box.maxY - 8.5;
    notesOf(carton, drawing, faces.missing).forEach((note, i) => {
      const lines = wrapped(note, faces.regular, BODY * 0.95, box.maxX - box.minX - 5);
      ink.text(String(i + 1), { x: box.minX, y }, { face: faces.regular, size: BODY * 0.95 });
      for (const line of lines) {
        ink.text(line, { x: box.minX + 5, y }, { face: faces.regular, size: BODY * 0.95 });
        y -= NOTE_LINE;
      }
      y -= NOTE_GAP;
    });
  });
}

const NOTE_LINE = 4.1;
const NOTE_GAP = 0.6;

/** Height that the notes take in the narrowest column they get, mm. */
export const notesHeight = (carton: Carton, drawing: Drawing, faces: Faces): number =>
  notesOf(carton, drawing, faces.missing).reduce((sum, note) => sum + wrapped(note, faces.regular, BODY * 0.95, NOTES_WIDTH - 5).length * NOTE_LINE + NOTE_GAP, 10);

function wrapped(text: string, face: Face, size: number, width: number): string[] {
  const lines: string[] = [];
  let line = "";
  for (const word of text.split(" ")) {
    const longer = line === "" ? word : `${line} ${word}`;
    if (line !== "" && face.width(longer, size) > width) {
      lines.push(line);
      line = word;
    } else line = longer;
  }
  return line === "" ? lines : [...lines, line];
}

