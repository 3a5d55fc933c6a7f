// Figures as the Bench shows and reads them: lengths in the units of the person, angles in degrees, counts as they are.
import type { UnitName } from "~/components/preferences";
import type { ConstructionInfo, OptionValue, ParameterKind, Size } from "~/cartons/types";
import { type ExpressionError, parseAngle, parseCount, parseLength } from "~/cartons/units/expression";
import { describeExpressionError } from "~/cartons/units/expression-words";
import { formatLength } from "~/cartons/units/format";
import { MM_PER_INCH } from "~/cartons/units/length";

export type FigureKind = Extract<ParameterKind, "length" | "angle" | "count">;
export type Reading = { readonly ok: true; readonly value: number } | { readonly ok: false; readonly sentence: string };

/** A length without its unit: hundredths of a millimetre, thousandths of an inch. */
export const showLength = (mm: number, units: UnitName): string => formatLength(mm, { unit: units });

export function showFigure(value: number, kind: FigureKind, units: UnitName): string {
  return kind === "length" ? showLength(value, units) : String(Number(value.toFixed(2)) + 0);
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

const examples = {
  length: { mm: "43, 43mm or 1.69in", in: "1.69, 1 11/16 or 43mm" },
  angle: { mm: "a figure such as 15 or 12.5", in: "a figure such as 15 or 12.5" },
  count: { mm: "a whole number such as 3", in: "a whole number such as 3" },
} as const;

/** Reads what was typed; the figure comes in millimetres, in degrees or as a count. */
export function readFigure(text: string, kind: FigureKind, units: UnitName): Reading {
  const wrong = (error: ExpressionError): Reading => ({ ok: false, sentence: describeExpressionError(error, { example: examples[kind][units] }) });
  if (kind === "length") {
    const parsed = parseLength(text, { unit: units });
    return parsed.ok ? { ok: true, value: parsed.mm } : wrong(parsed.error);
  }
  const parsed = kind === "angle" ? parseAngle(text) : parseCount(text);
  return parsed.ok ? { ok: true, value: parsed.value } : wrong(parsed.error);
}

/**
 * What of a typed figure is worth keeping beside its value: an expression, with its unit where that would else be
 * forgotten ("(2+1/4) in"). Undefined for a bare number, which says no more than its value.
 */
export function expressionToKeep(text: string, kind: FigureKind, units: UnitName): string | undefined {
  const typed = text.trim();
  if (/^-?\s*[\d.,]*$/.test(typed)) return undefined;
  return kind === "length" && units === "in" && !/[a-z"″”']/i.test(typed) ? `(${typed}) in` : typed;
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
