// From what was asked to a value for every option: defaults by rule, limits with the nearest value that works.
import { compileRule, type CompiledRule } from "../units/rule";
import type { OptionValue, Refusal } from "../types";
import type { Ask, Asks } from "./parameter";

/** What rules of thumb may speak of. Switches are 1 or 0; a choice is the place of its value in the list, from 0. */
export type Scope = Record<string, number>;

export const BASE_VARIABLES = ["L", "W", "D", "t", "a", "aLeast", "micro", "cardSlide", "creaseSpacing"] as const;

interface CompiledAsk {
  readonly name: string;
  readonly ask: Ask;
  readonly rule: CompiledRule | null;
  readonly atLeast: CompiledRule | number | null;
  readonly atMost: CompiledRule | number | null;
}
export type CompiledAsks = readonly CompiledAsk[];

/** Compiles once a construction; a rule that speaks of something unknown throws here, when the registry is loaded. */
export function compileAsks(asks: Asks): CompiledAsks {
  const known: string[] = [...BASE_VARIABLES];
  return Object.entries(asks).map(([name, ask]) => {
    const compile = (rule: number | string | undefined) => (typeof rule === "string" ? compileRule(rule, known) : rule ?? null);
    const compiled = {
      name, ask,
      rule: typeof ask.default === "string" && ask.kind !== "choice" ? compileRule(ask.default, known) : null,
      atLeast: compile(ask.atLeast),
      atMost: compile(ask.atMost),
    };
    known.push(name);
    return compiled;
  });
}

export interface Resolved {
  readonly values: Readonly<Record<string, OptionValue>>;
  readonly isSet: ReadonlySet<string>;
  readonly scope: Scope;
  /** The default's rule with its values put in, by option. */
  readonly showRule: (name: string, format: (value: number) => string) => string | null;
  readonly refusals: readonly Refusal[];
}

const limitOf = (limit: CompiledRule | number | null, scope: Scope): number | null =>
  limit === null ? null : typeof limit === "number" ? limit : limit.evaluate(scope);

export function resolve(asks: CompiledAsks, given: Readonly<Record<string, OptionValue>>, base: Scope): Resolved {
  const scope: Scope = { ...base };
  const values: Record<string, OptionValue> = {};
  const isSet = new Set<string>();
  const refusals: Refusal[] = [];
  for (const name of Object.keys(given)) {
    if (!asks.some((a) => a.name === name)) {
      refusals.push({ code: "unknown-option", parameter: name, given: given[name]!, limit: { oneOf: asks.map((a) => a.name) }, nearest: null, because: "this construction has no such option" });
    }
  }
  for (const compiled of asks) {
    const { name, ask } = compiled;
    const asked = given[name];
    if (asked !== undefined) isSet.add(name);
    const { value, number, refusal } = ask.kind === "choice" ? resolveChoice(name, ask, asked) : resolveNumber(compiled, asked, scope);
    if (refusal) refusals.push(refusal);
    values[name] = value;
    scope[name] = number;
  }
  const showRule = (name: string, format: (value: number) => string) => asks.find((a) => a.name === name)?.rule?.show(scope, format) ?? null;
  return { values, isSet, scope, showRule, refusals };
}

interface One { value: OptionValue; number: number; refusal: Refusal | null }

function resolveChoice(name: string, ask: Ask, asked: OptionValue | undefined): One {
  const offered = (ask.oneOf ?? []).map((o) => o.value);
  const fallback = String(ask.default);
  const value = asked === undefined ? fallback : String(asked);
  if (offered.includes(value)) return { value, number: offered.indexOf(value), refusal: null };
  return {
    value: fallback, number: offered.indexOf(fallback),
    refusal: { code: "not-offered", parameter: name, given: asked ?? value, limit: { oneOf: offered }, nearest: fallback, because: "only these are offered" },
  };
}

function resolveNumber({ name, ask, rule, atLeast, atMost }: CompiledAsk, asked: OptionValue | undefined, scope: Scope): One {
  const usual = rule ? rule.evaluate(scope) : Number(ask.default);
  const isSwitch = ask.kind === "switch";
  const shape = (n: number): OptionValue => (isSwitch ? n !== 0 : n);
  if (asked === undefined) return { value: shape(usual), number: isSwitch ? (usual !== 0 ? 1 : 0) : usual, refusal: null };
  const number = typeof asked === "boolean" ? Number(asked) : typeof asked === "number" ? asked : Number.NaN;
  if (!Number.isFinite(number) || (isSwitch && number !== 0 && number !== 1) || (ask.kind === "count" && !Number.isInteger(number))) {
    const because = isSwitch ? "it is on or off" : ask.kind === "count" ? "it is a whole number" : "it is a number";
    return { value: shape(usual), number: usual, refusal: { code: "wrong-kind", parameter: name, given: asked, limit: null, nearest: shape(usual), because } };
  }
  const low = limitOf(atLeast, scope);
  const high = limitOf(atMost, scope);
  const because = ask.because ?? "past this it does not work";
  if (low !== null && number < low) return { value: shape(number), number, refusal: { code: "too-small", parameter: name, given: asked, limit: { atLeast: low }, nearest: low, because } };
  if (high !== null && number > high) return { value: shape(number), number, refusal: { code: "too-large", parameter: name, given: asked, limit: { atMost: high }, nearest: high, because } };
  return { value: shape(number), number, refusal: null };
}
