// For a refusal: a value of its parameter that is accepted with all else unchanged. Every value offered has been tried.
import type { Registered } from "./constructions/registry";
import type { Brief, OptionValue, Refusal } from "./types";

type Accepts = (brief: Brief) => boolean;

const isAxis = (name: string): name is "L" | "W" | "D" => name === "L" || name === "W" || name === "D";

export function withParameter(brief: Brief, parameter: string, value: OptionValue): Brief {
  if (isAxis(parameter)) return { ...brief, size: { ...brief.size, [parameter]: Number(value) } };
  return { ...brief, options: { ...brief.options, [parameter]: value } };
}

function withoutOption(brief: Brief, name: string): Brief {
  const { [name]: _, ...rest } = brief.options;
  return { ...brief, options: rest };
}

/** Tidy figures first: a limit of 24.444… is better offered as 24.5. */
function candidates(refusal: Refusal): OptionValue[] {
  const near = refusal.nearest;
  if (typeof near !== "number") return near === null ? [] : [near];
  const up = refusal.code === "too-small";
  return [10, 100, 1000].map((k) => (up ? Math.ceil(near * k) : Math.floor(near * k)) / k).concat(near);
}

/** Steps away from what was given, in per cent, both ways; the nearest first. */
const STEPS = [2, 5, 10, 15, 20, 30, 40, 50, 75, 100, 150, 200, 300, 500, 900];

/** Rounds of mending all at once; each applies every limit that still stands. */
const MENDS = 10;

/**
 * The brief with every refused figure brought to its limit, until it is accepted; null when that does not end. `refusals`
 * are those of `brief`; `again` gives those of a mended one.
 */
export function mendedTogether(brief: Brief, refusals: readonly Refusal[], again: (brief: Brief) => readonly Refusal[]): Brief | null {
  let mended = brief;
  let left = refusals;
  for (let round = 0; round < MENDS && left.length > 0; round++) {
    for (const r of left) {
      const value = candidates(r)[0];
      if (value === undefined) return null;
      mended = withParameter(mended, r.parameter, value);
    }
    left = again(mended);
  }
  return left.length === 0 ? mended : null;
}

const valueIn = (brief: Brief, parameter: string): OptionValue | null => (isAxis(parameter) ? brief.size[parameter] : brief.options[parameter] ?? null);

/** For several refusals at once: each alone if it can be mended alone, else the value it has when all are mended together. */
export function nearestForAll(refusals: readonly Refusal[], brief: Brief, registered: Registered, attempt: (brief: Brief) => readonly Refusal[]): Refusal[] {
  const accepts = (b: Brief) => attempt(b).length === 0;
  const alone = refusals.length > 1 && refusals.some((r) => r.parameter !== refusals[0]!.parameter) ? null : refusals.map((r) => nearestThatWorks(r, brief, registered, accepts));
  if (alone?.every((r) => r.nearest !== null)) return alone;
  const together = mendedTogether(brief, refusals, attempt);
  return refusals.map((r, i) => (together ? { ...r, nearest: valueIn(together, r.parameter) } : alone?.[i] ?? nearestThatWorks(r, brief, registered, accepts)));
}

export function nearestThatWorks(refusal: Refusal, brief: Brief, registered: Registered, accepts: Accepts): Refusal {
  for (const value of candidates(refusal)) if (accepts(withParameter(brief, refusal.parameter, value))) return { ...refusal, nearest: value };
  if (refusal.code === "unknown-option") return { ...refusal, nearest: null };
  if (refusal.code === "does-not-fold") {
    for (const name of Object.keys(brief.options)) {
      const usual = withoutOption(brief, name);
      if (accepts(usual)) return { ...refusal, parameter: name, given: brief.options[name]!, nearest: null, because: `${refusal.because}; without it the usual value holds` };
    }
  }
  const names = isAxis(refusal.parameter) ? [refusal.parameter] : refusal.code === "does-not-fold" ? (["D", "W", "L"] as const) : [];
  for (const axis of names) {
    const { from, to } = registered.info.size[axis];
    const given = brief.size[axis];
    const start = Number.isFinite(given) ? Math.min(Math.max(given, from), to) : registered.info.sample.size[axis];
    const tries = [start, ...STEPS.flatMap((p) => [start * (1 + p / 100), start / (1 + p / 100)]), registered.info.sample.size[axis]];
    for (const t of tries) {
      const value = Math.round(t * 10) / 10;
      if (value >= from && value <= to && accepts(withParameter(brief, axis, value))) return { ...refusal, parameter: axis, given, nearest: value };
    }
  }
  return { ...refusal, nearest: null };
}
