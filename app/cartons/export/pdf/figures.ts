// Dimensions, names and marks of a drawing on a page.
import type { Point } from "../../geometry/outline";
import type { Dimension, Drawing } from "../drawing";
import { figureWidth } from "../drawing-space";
import { DIMENSIONS, LEGEND } from "./layer-groups";
import type { Faces } from "./fonts";
import type { Ink } from "./ink";

const LINE = 0.18;
const EXTENSION = 0.13;

export function drawFigures(ink: Ink, drawing: Drawing, faces: Faces): void {
  ink.layer(DIMENSIONS.key, () => {
    for (const dimension of drawing.dimensions) drawDimension(ink, dimension, drawing.size, faces);
    for (const callout of drawing.callouts) {
      ink.stroke(EXTENSION);
      if (callout.leader) ink.line(callout.leader.from, callout.leader.to);
      const size = drawing.size * 0.85;
      ink.text(callout.text, { x: callout.at.x, y: callout.at.y - size * 0.36 }, { face: faces.regular, size, align: "centre" });
    }
  });
  ink.layer(LEGEND.key, () => {
    for (const label of drawing.labels) {
      const down = label.size * 0.36;
      const at = label.angle === 0 ? { x: label.at.x, y: label.at.y - down } : { x: label.at.x + down, y: label.at.y };
      ink.text(label.text, at, { face: faces.bold, size: label.size, align: "centre", angle: label.angle, tracking: label.size * 0.12 });
    }
    for (const arrow of drawing.grain) {
      ink.stroke(LINE);
      ink.line(arrow.from, arrow.to);
      for (const [tip, tail, flip] of [[arrow.to, arrow.from, 1], [arrow.from, arrow.to, 1]] as const) barb(ink, tip, tail, flip * drawing.size * 0.7);
      const off = drawing.size * 0.45;
      const at = arrow.angle === 0 ? { x: arrow.at.x, y: arrow.at.y + off } : { x: arrow.at.x - off, y: arrow.at.y };
      ink.text(arrow.text, at, { face: faces.regular, size: drawing.size * 0.85, align: "centre", angle: arrow.angle });
    }
  });
}

/** Half an arrowhead, on the line's left. */
function barb(ink: Ink, tip: Point, tail: Point, length: number): void {
  const d = Math.hypot(tail.x - tip.x, tail.y - tip.y);
  const [ux, uy] = [(tail.x - tip.x) / d, (tail.y - tip.y) / d];
  ink.line(tip, { x: tip.x + ux * length * 1.6 + uy * length * 0.45, y: tip.y + uy * length * 1.6 - ux * length * 0.45 });
}

function drawDimension(ink: Ink, d: Dimension, size: number, faces: Faces): void {
  const isAcross = d.measures === "x";
  const own = d.kind === "asked" ? size * 1.15 : size;
  ink.stroke(EXTENSION);
  for (const e of d.extensions) ink.line(e.from, e.to);
  ink.stroke(LINE);
  const half = figureWidth(d.text, own) / 2 + own * 0.35;
  const [dx, dy] = isAcross ? [1, 0] : [0, 1];
  if (d.fits) {
    ink.line(d.from, { x: d.textAt.x - dx * half, y: d.textAt.y - dy * half });
    ink.line({ x: d.textAt.x + dx * half, y: d.textAt.y + dy * half }, d.to);
  } else {
    ink.line(d.from, d.to);
  }
  const tick = size * 0.36;
  ink.stroke(LINE * 1.6);
  for (const p of [d.from, d.to]) ink.line({ x: p.x - tick, y: p.y - tick }, { x: p.x + tick, y: p.y + tick });
  const down = own * 0.36;
  const at = isAcross ? { x: d.textAt.x, y: d.textAt.y - down } : { x: d.textAt.x + down, y: d.textAt.y };
  ink.text(d.text, at, { face: d.kind === "asked" ? faces.bold : faces.regular, size: own, align: "centre", angle: isAcross ? 0 : 90 });
}
