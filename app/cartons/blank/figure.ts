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
  if (terms.length === 1) return { mm: terms[0]!.value * terms[0]!.times, terms: terms[0]!.times === 0 ? [] : terms };
  return collect([terms], [1]);
}

export const plus = (...figures: readonly Figure[]): Figure => collect(figures.map((f) => f.terms), ONES);
export const minus = (a: Figure, b: Figure): Figure => collect([a.terms, b.terms], [1, -1]);
export const times = (f: Figure, factor: number): Figure => collect([f.terms], [factor]);

const ONES: readonly number[] = [1, 1, 1, 1, 1, 1, 1, 1];

function collect(lists: readonly (readonly Term[])[], factors: readonly number[]): Figure {
  const kept: Term[] = [];
  lists.forEach((terms, i) => {
    for (const t of terms) {
      const count = t.times * factors[i]!;
      const at = kept.findIndex((k) => k.name === t.name && k.value === t.value && k.source === t.source);
      if (at >= 0) kept[at] = { name: t.name, value: t.value, times: kept[at]!.times + count, source: t.source };
      else kept.push(count === t.times ? t : { name: t.name, value: t.value, times: count, source: t.source });
    }
  });
  const left = kept.filter((t) => t.times !== 0);
  return { mm: left.reduce((sum, t) => sum + t.value * t.times, 0), terms: left };
}
