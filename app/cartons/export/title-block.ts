// What a drawing says about itself, as plain data: the sheet on paper and the page on screen print the same cells.
import type { Carton, LayerName, Size } from "../types";
import type { Drawing } from "./drawing";
import { unite } from "./drawing-space";
import { shown } from "./number";
import { LAYER_ORDER, PROCESSING_STEPS } from "./processing-steps";
import { layersSeen, type Side } from "./sheet-view";
import { lengthOf } from "../geometry/path";

export interface SheetFacts {
  readonly title: string;
  readonly client: string;
  readonly revision: string;
  /** As it is to be printed, e.g. "2026-11-24". */
  readonly date: string;
  readonly side: Side;
  readonly drawnBy?: string;
}

export interface Cell {
  readonly label: string;
  readonly value: string;
  /** Share of the row's width. */
  readonly share: number;
  readonly weight: "regular" | "bold" | "title" | "wordmark";
}

export interface LegendRow {
  readonly layer: LayerName;
  readonly label: string;
  /** Length of lines, or how wide a zone is. */
  readonly figure: string;
}

const sizeText = (s: Size): string => `${shown(s.L)} × ${shown(s.W)} × ${shown(s.D)}`;

export function constructionText(carton: Carton): string {
  const codes = carton.construction.codes.map((c) => `${c.system} ${c.code}`);
  return `${carton.construction.name}, ${codes.length > 0 ? codes.join(", ") : "no code"}`;
}

/** Rows from the top; heights are shares of the block's. */
export function titleBlockOf(carton: Carton, facts: SheetFacts): readonly { readonly height: number; readonly cells: readonly Cell[] }[] {
  const cell = (label: string, value: string, share: number, weight: Cell["weight"] = "regular"): Cell => ({ label, value, share, weight });
  const squareCentimetres = carton.blank.area / 100;
  return [
    { height: 13, cells: [cell("Carton", facts.title, 0.66, "title"), cell("Revision", facts.revision, 0.14, "bold"), cell("Date", facts.date, 0.2)] },
    { height: 9.5, cells: [cell("Client", facts.client, 0.4), cell("Construction", constructionText(carton), 0.6)] },
    { height: 9.5, cells: [cell("Inside L × W × D", sizeText(carton.inside), 0.34, "bold"), cell("Clear inside", sizeText(carton.clearInside), 0.33), cell("Outside", sizeText(carton.outside), 0.33)] },
    { height: 9.5, cells: [cell("Board", boardText(carton), 0.5), cell("Blank", `${blankText(carton)}, ${squareCentimetres.toFixed(squareCentimetres < 100 ? 1 : 0)} cm²`, 0.5, "bold")] },
    { height: 9.5, cells: [cell("Tolerance of the inside, root of squares", toleranceText(carton), 0.5), cell("Seen from", facts.side === "inside" ? "inside" : "print side", 0.25, "bold"), cell("Scale", "1 : 1", 0.25, "bold")] },
    { height: 11, cells: [cell("Drawn", facts.drawnBy ?? "", 0.5), cell("Units", "millimetres", 0.18), cell("", "CARTONWRIGHT", 0.32, "wordmark")] },
  ];
}

/** Width × height; piece by piece where there are several. */
function blankText(carton: Carton): string {
  if (carton.fold.parts.length < 2) return `${shown(carton.blank.width)} × ${shown(carton.blank.height)}`;
  return carton.fold.parts.map((part) => {
    const box = unite(carton.panels.filter((p) => p.part === part.name).map((p) => p.bounds));
    return `${part.label} ${shown(box.maxX - box.minX)} × ${shown(box.maxY - box.minY)}`;
  }).join("; ");
}

function boardText(carton: Carton): string {
  const { board } = carton;
  const tolerance = board.caliperTolerance > 0 ? ` ± ${shown(board.caliperTolerance)}` : "";
  return `${board.name}, caliper ${shown(board.caliper)}${tolerance}`;
}

function toleranceText(carton: Carton): string {
  const stacks = carton.foldCheck.tolerance;
  return stacks.length === 0 ? "not worked out" : stacks.map((s) => `${s.axis} ± ${shown(s.rootSumSquare)}`).join("   ");
}

export function legendOf(carton: Carton, side: Side): readonly LegendRow[] {
  const layers = layersSeen(carton, side);
  return [...LAYER_ORDER].reverse().filter((name) => layers[name].length > 0).map((layer): LegendRow => {
    const { label } = PROCESSING_STEPS[layer];
    if (layer === "bleed") return { layer, label, figure: widthText(carton, "bleed") };
    if (layer === "safe") return { layer, label, figure: widthText(carton, "safe") };
    if (layer === "glue") return { layer, label: "Glue, no ink, no varnish", figure: "" };
    return { layer, label, figure: `${Math.round(layers[layer].reduce((sum, p) => sum + lengthOf(p.path), 0))} mm` };
  });
}

function widthText(carton: Carton, option: "bleed" | "safe"): string {
  const value = carton.parameters[option];
  return typeof value === "number" ? `${shown(value)} mm wide` : "";
}

/** Sentences for the sheet, most weighty first. */
export function notesOf(carton: Carton, drawing: Drawing, missing: Iterable<string>): readonly string[] {
  const { foldCheck, findings } = carton;
  const open = findings.filter((f) => f.severity !== "note").length;
  const notes = [
    "Calculated: cut and fold a sample before the run.",
    foldCheck.closes
      ? `Folded by calculation: shuts on ${sizeText(foldCheck.measuredInside)} mm inside.`
      : "Folded by calculation: does not shut as asked. See the fold check before anything is cut.",
    "Figures are in millimetres; figures in brackets are the size that was asked.",
  ];
  if (open > 0) notes.push(`${open === 1 ? "One warning stands" : `${open} warnings stand`} open on this carton.`);
  if (drawing.leftToFile > 0) notes.push("What carries no figure is cut from the file.");
  const [outer, inner] = [Number(carton.parameters["creaseInset"] ?? 0), Number(carton.parameters["creaseInsetInner"] ?? 0)];
  if (outer > 0 || inner > 0) notes.push(`Creases stop ${shown(outer)} mm before outer cuts and ${shown(inner)} mm before inner ones.`);
  const lost = [...missing].map((c) => `U+${c.codePointAt(0)!.toString(16).toUpperCase().padStart(4, "0")}`);
  if (lost.length > 0) notes.push(`Characters that the typeface lacks stand as ?: ${lost.join(", ")}.`);
  return notes;
}
