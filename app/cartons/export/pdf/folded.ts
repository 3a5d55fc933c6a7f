// The carton almost shut, beside the drawing: one small picture from the pose that is checked.
import type { Box, Path, Point } from "../../geometry/outline";
import type { Carton } from "../../types";
import { foldedPicture, type PictureFace } from "../folded-picture";
import type { Drawing } from "../drawing";
import type { Faces } from "./fonts";
import type { Ink } from "./ink";
import { LEGEND } from "./layer-groups";
import { notesHeight } from "./sheet";
import type { PageLayout } from "./page-boxes";

/** Smallest place in which a picture still says something, and the largest it takes, mm. */
const LEAST = { width: 70, height: 48 };
const MOST = { width: 115, height: 95 };
const AIR = 6;
const CAPTION = 6;
/** How far the last step has gone: the closure is still open enough to see how it goes in. */
const ALMOST = 0.45;
const TINTS: Record<PictureFace["tone"], number> = { print: 0.02, inside: 0.13, core: 0.34 };
const SHADED = 0.14;

/** Where the picture stands and what is left of the stage for the drawing; no picture where there is no room for it. */
export function placeForPicture(layout: PageLayout, drawing: Drawing, carton: Carton, faces: Faces): { readonly stage: Box; readonly picture: Box | null } {
  const { stage, notes, legend } = layout;
  if (carton.fold.steps.length === 0) return { stage, picture: null };
  const isColumn = legend.minX > stage.maxX;
  if (isColumn) {
    const room = { minX: notes.minX, maxX: notes.maxX, minY: legend.maxY + AIR, maxY: notes.maxY - notesHeight(carton, drawing, faces) - AIR };
    return { stage, picture: room.maxY - room.minY >= LEAST.height ? cropped(room) : null };
  }
  const spare = stage.maxX - stage.minX - (drawing.bounds.maxX - drawing.bounds.minX);
  if (spare < LEAST.width + AIR || stage.maxY - stage.minY < LEAST.height) return { stage, picture: null };
  const width = Math.min(MOST.width, spare - AIR);
  return { stage: { ...stage, maxX: stage.maxX - width - AIR }, picture: cropped({ ...stage, minX: stage.maxX - width }) };
}

function cropped(room: Box): Box {
  const height = Math.min(MOST.height, room.maxY - room.minY);
  const middle = (room.minY + room.maxY) / 2;
  return { ...room, minY: middle - height / 2, maxY: middle + height / 2 };
}

export function drawFolded(ink: Ink, box: Box, carton: Carton, faces: Faces): void {
  const { steps } = carton.fold;
  const last = steps[steps.length - 1]!;
  const picture = foldedPicture(carton, { u: steps.length - 1 + ALMOST });
  const { bounds } = picture;
  const room = { ...box, minY: box.minY + CAPTION };
  const scale = Math.min((room.maxX - room.minX) / (bounds.maxX - bounds.minX), (room.maxY - room.minY) / (bounds.maxY - bounds.minY), 1);
  const dx = (room.minX + room.maxX - scale * (bounds.minX + bounds.maxX)) / 2;
  const dy = (room.minY + room.maxY + scale * (bounds.minY + bounds.maxY)) / 2;
  const at = (p: Point): Point => ({ x: dx + scale * p.x, y: dy - scale * p.y });
  ink.layer(LEGEND.key, () => {
    ink.raw("1 J 1 j");
    for (const face of picture.faces) {
      ink.tint(Math.min(1, TINTS[face.tone] + (1 - Math.min(1, face.shade)) * SHADED));
      ink.paths([ring(face.points.map(at))], "f");
      for (const line of face.lines) {
        ink.stroke(line.kind === "outline" ? 0.25 : 0.12, line.kind === "crease" ? [1.6, 0.7] : []);
        ink.line(at(line.from), at(line.to));
      }
    }
    ink.tint(1);
    ink.text(`On the way to “${last.label}”. Not to scale.`, { x: (box.minX + box.maxX) / 2, y: box.minY }, { face: faces.regular, size: 2.7, align: "centre" });
  });
}

const ring = (points: readonly Point[]): Path => ({ closed: true, vertices: points.map((p) => ({ ...p, bulge: 0 })) });
