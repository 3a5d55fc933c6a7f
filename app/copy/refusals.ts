// Sentences for what cannot be built: what was asked, the limit, the value that works, and why. Figures in millimetres unless a format is given.
import { findConstruction } from "~/cartons/constructions/registry";
import type { OptionValue, Refusal } from "~/cartons/types";

export type FormatLength = (mm: number) => string;
const inMillimetres: FormatLength = (mm) => `${Number(mm.toFixed(2))} mm`;

const SIZES: Readonly<Record<string, string>> = { L: "Length", W: "Width", D: "Depth", construction: "Construction", board: "Board", caliper: "Caliper" };

/** The parameter as people call it. */
export function parameterLabel(parameter: string, construction: string): string {
  return SIZES[parameter] ?? findConstruction(construction)?.asks[parameter]?.label ?? parameter;
}

function written(value: OptionValue, refusal: Refusal, construction: string, format: FormatLength): string {
  if (typeof value === "boolean") return value ? "on" : "off";
  if (typeof value === "string") return value;
  const kind = findConstruction(construction)?.asks[refusal.parameter]?.kind ?? "length";
  return kind === "angle" ? `${Number(value.toFixed(2))}°` : kind === "count" ? String(value) : format(value);
}

/**
 * "Depth is 20 mm; the least is 24.5 mm, because the two tucks would meet behind the front. Type 24.5 mm."
 * `construction` is the construction's id, for the names of its options.
 */
export function refusalSentence(refusal: Refusal, construction: string, format: FormatLength = inMillimetres): string {
  const name = parameterLabel(refusal.parameter, construction);
  const say = (value: OptionValue) => written(value, refusal, construction, format);
  const mend = refusal.nearest === null ? "" : ` Type ${say(refusal.nearest)}.`;
  switch (refusal.code) {
    case "unknown-construction":
      return `There is no construction “${refusal.given}”. There are ${listOf(refusal)}.`;
    case "unknown-option":
      return `There is no option “${refusal.parameter}” here. There are ${listOf(refusal)}.`;
    case "not-offered":
      return `${name} cannot be “${refusal.given}”. Choose ${listOf(refusal, "or")}.`;
    case "wrong-kind":
      return `${name} cannot be ${say(refusal.given)}: ${refusal.because}.${mend}`;
    case "too-small":
      return `${name} is ${say(refusal.given)}; the least is ${limitOf(refusal, say)}, because ${refusal.because}.${mend}`;
    case "too-large":
      return `${name} is ${say(refusal.given)}; the most is ${limitOf(refusal, say)}, because ${refusal.because}.${mend}`;
    case "does-not-fold":
      return `This does not fold shut: ${refusal.because}.${refusal.nearest === null ? ` Put ${name} back to its usual value.` : ` Make ${name} ${say(refusal.nearest)}.`}`;
  }
}

function limitOf(refusal: Refusal, say: (value: OptionValue) => string): string {
  const { limit } = refusal;
  if (limit && "atLeast" in limit) return say(limit.atLeast);
  if (limit && "atMost" in limit) return say(limit.atMost);
  return "another";
}

function listOf(refusal: Refusal, last = "and"): string {
  const all = refusal.limit && "oneOf" in refusal.limit ? refusal.limit.oneOf.map(String) : [];
  return all.length < 2 ? all.join("") : `${all.slice(0, -1).join(", ")} ${last} ${all[all.length - 1]}`;
}
