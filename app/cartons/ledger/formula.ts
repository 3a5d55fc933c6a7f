// The arithmetic of a ledger row in words and figures.
import type { LedgerRow, Term } from "../types";

const value = (t: Term, format: (mm: number) => string): string => {
  const times = Math.abs(t.times);
  return times === 1 ? format(t.value) : `${Number(times.toPrecision(12))} × ${format(t.value)}`;
};

/**
 * "82 + 2 × 0.24 − 0.45": the terms of a figure, or its rule of thumb with the values put in. Empty when the figure
 * stands for itself. `format` writes a length without its unit.
 */
export function formulaOf(row: LedgerRow, format: (mm: number) => string): string {
  if (row.rule !== null) return row.rule;
  if (row.terms.length < 2 && row.terms.every((t) => t.times === 1)) return "";
  return row.terms.map((t, i) => `${t.times < 0 ? (i === 0 ? "−" : " − ") : i === 0 ? "" : " + "}${value(t, format)}`).join("");
}

/** The same with the names of its terms: "L + 2 × crease allowance − caliper". */
export function formulaInWords(row: LedgerRow): string {
  return row.terms.map((t, i) => {
    const times = Math.abs(t.times);
    return `${t.times < 0 ? (i === 0 ? "−" : " − ") : i === 0 ? "" : " + "}${times === 1 ? "" : `${Number(times.toPrecision(12))} × `}${t.name}`;
  }).join("");
}
