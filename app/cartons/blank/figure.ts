// A figure remembers how it came about: the sum of its terms is its value, so the ledger cannot disagree with the drawing.
import type { Source, Term } from "../types";

/** A length, mm, with the signed terms it was added up from. */
export interface Figure {
  readonly mm: number;
  readonly terms: readonly Term[];
}

export const term = (name: string, value: number, times: number, source: Source): Term => ({ name, value, times, source });

/** Adds terms up; terms of the same name, value and source are counted together, and what cancels is left out. */
export function figure(terms: readonly Term[]): Figure {
  const kept: Term[] = [];
  let mm = 0;
  for (const t of terms) {
    mm += t.value * t.times;
    const at = kept.findIndex((k) => k.name === t.name && k.value === t.value && k.source === t.source);
    if (at < 0) kept.push(t);
    else kept[at] = { ...t, times: kept[at]!.times + t.times };
  }
  return { mm, terms: kept.filter((t) => t.times !== 0) };
}

export const plus = (...figures: readonly Figure[]): Figure => figure(figures.flatMap((f) => f.terms));

export const times = (f: Figure, factor: number): Figure => figure(f.terms.map((t) => ({ ...t, times: t.times * factor })));

export const minus = (a: Figure, b: Figure): Figure => plus(a, times(b, -1));
