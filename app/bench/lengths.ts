// Figures as the Bench shows and reads them: lengths in the units of the person, angles in degrees, counts as they are.
import type { UnitName } from "~/components/preferences";
import type { ConstructionInfo, OptionValue, ParameterKind, Size } from "~/cartons/types";
import type { Session } from "./session";

export type FigureKind = Extract<ParameterKind, "length" | "angle" | "count">;
export type Reading = { readonly ok: true; readonly value: number } | { readonly ok: false; readonly sentence: string };

const MM_PER_INCH = 25.4;
const rounded = (value: number, places: number) => String(Number(value.toFixed(places)) + 0);

/** A length without its unit: hundredths of a millimetre, thousandths of an inch. */
export const showLength = (mm: number, units: UnitName): string => (units === "mm" ? rounded(mm, 2) : rounded(mm / MM_PER_INCH, 3));

export function showFigure(value: number, kind: FigureKind, units: UnitName): string {
  return kind === "length" ? showLength(value, units) : rounded(value, 2);
}

export function withUnit(value: number, kind: FigureKind, units: UnitName): string {
  const text = showFigure(value, kind, units);
  return kind === "length" ? `${text} ${units}` : kind === "angle" ? `${text}°` : text;
}

/** "82 × 27 × 56 mm" */
export function showSize(size: Size, units: UnitName): string {
  return `${[size.L, size.W, size.D].map((mm) => showLength(mm, units)).join(" × ")} ${units}`;
}

/** The figure one step up or down: a millimetre or a sixteenth of an inch, a degree, one; `times` ten or a tenth with Shift or Alt. */
export function stepOf(value: number, by: number, kind: FigureKind, units: UnitName, times: number): number {
  if (kind === "count") return value + by * Math.max(1, Math.round(times));
  const one = kind === "length" && units === "in" ? MM_PER_INCH / 16 : 1;
  return Number((value + by * one * times).toFixed(4));
}

/** Reads what was typed; the figure comes in millimetres, degrees or as a count. */
export function readFigure(text: string, kind: FigureKind, units: UnitName, _session?: Pick<Session, "carton">): Reading {
  const value = Number(text.replace(",", "."));
  if (text.trim() === "" || !Number.isFinite(value)) return { ok: false, sentence: "Type a figure, such as 43, 43mm or 1.69in." };
  return { ok: true, value: kind === "length" && units === "in" ? value * MM_PER_INCH : value };
}

export function kindOf(construction: ConstructionInfo, parameter: string): ParameterKind {
  return construction.parameters.find((p) => p.name === parameter)?.kind ?? "length";
}

/** Any value as words: "11 mm", "8°", "on", "steel-rule die". */
export function showOption(value: OptionValue, parameter: string, kind: ParameterKind, units: UnitName, construction: ConstructionInfo): string {
  if (typeof value === "boolean") return value ? "on" : "off";
  if (typeof value === "string") return construction.parameters.find((p) => p.name === parameter)?.oneOf?.find((o) => o.value === value)?.label ?? value;
  if (kind === "choice" || kind === "switch") return String(value);
  return withUnit(value, kind, units);
}
