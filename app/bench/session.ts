// The state of one sitting at the Bench. Pure: a command and what was before give what is next; history is kept as briefs.
import type { Axis, Brief, Carton, CartonResult, OptionValue, Refusal, SizeBasis } from "~/cartons/types";

export type Build = (brief: Brief) => CartonResult;

export interface Session {
  /** What is asked now; it may be refused. */
  readonly asked: Brief;
  /** The last carton that could be made: it stays on the stage while something is refused. */
  readonly carton: Carton;
  readonly refusals: readonly Refusal[];
  readonly past: readonly Brief[];
  readonly future: readonly Brief[];
  /** While set, further edits of the same gesture share one step of the history. */
  readonly gesture: string | null;
}

export type Command =
  | { readonly type: "edit"; readonly change: (brief: Brief) => Brief; readonly gesture?: string }
  | { readonly type: "end-gesture" }
  | { readonly type: "undo" }
  | { readonly type: "redo" }
  | { readonly type: "replace"; readonly brief: Brief };

/** Steps of history that are kept: more than a day's work. */
const HISTORY = 2000;

export function reduceSession(build: Build, session: Session, command: Command): Session {
  switch (command.type) {
    case "edit": {
      const next = command.change(session.asked);
      if (isSameBrief(next, session.asked)) return session;
      const goesOn = command.gesture !== undefined && command.gesture === session.gesture;
      const past = goesOn ? session.past : [...session.past, session.asked].slice(-HISTORY);
      return { ...rebuilt(build, session, next), past, future: [], gesture: command.gesture ?? null };
    }
    case "end-gesture": {
      if (session.gesture === null) return session;
      const before = session.past[session.past.length - 1];
      // Did the drag come back to where it began? Then nothing happened.
      const past = before && isSameBrief(before, session.asked) ? session.past.slice(0, -1) : session.past;
      return { ...session, past, gesture: null };
    }
    case "undo": {
      const before = session.past[session.past.length - 1];
      if (!before) return session;
      return { ...rebuilt(build, session, before), past: session.past.slice(0, -1), future: [session.asked, ...session.future], gesture: null };
    }
    case "redo": {
      const [after, ...future] = session.future;
      if (!after) return session;
      return { ...rebuilt(build, session, after), past: [...session.past, session.asked], future, gesture: null };
    }
    case "replace": {
      if (isSameBrief(command.brief, session.asked)) return session;
      return { ...rebuilt(build, session, command.brief), past: [...session.past, session.asked], future: [], gesture: null };
    }
  }
}

function rebuilt(build: Build, session: Session, asked: Brief): Session {
  const result = build(asked);
  return result.ok ? { ...session, asked, carton: result.carton, refusals: [] } : { ...session, asked, refusals: result.refusals };
}

/**
 * A sitting that starts from a stored brief. A brief that today's construction refuses is shown with the nearest figures
 * that work, its refusals beside the fields; null where not even that can be drawn.
 */
export function openSession(build: Build, brief: Brief): Session | null {
  const empty = { asked: brief, past: [], future: [], gesture: null };
  const result = build(brief);
  if (result.ok) return { ...empty, carton: result.carton, refusals: [] };
  const { carton, refusals } = everythingRefused(build, brief, result.refusals);
  return carton ? { ...empty, carton, refusals } : null;
}

/**
 * A build stops at the first kind of thing that is wrong; here each is mended in turn until it holds, so that all of
 * it can be told at once. `nearest` is then the value that works together with the other mends.
 */
export function everythingRefused(build: Build, brief: Brief, first: readonly Refusal[]): { readonly carton: Carton | null; readonly refusals: readonly Refusal[] } {
  const all = mendedInTurn(build, brief, first);
  const gone = all.refusals.filter((r) => r.code === "unknown-option");
  if (gone.length === 0) return all;
  // While an option is asked that is gone no value of another works: what else is wrong is judged without it.
  const without = gone.reduce((b, r) => withDefault(b, r.parameter), brief);
  const result = build(without);
  if (result.ok) return { carton: result.carton, refusals: gone };
  const others = mendedInTurn(build, without, result.refusals);
  return { carton: others.carton, refusals: [...others.refusals, ...gone] };
}

function mendedInTurn(build: Build, brief: Brief, first: readonly Refusal[]): { readonly carton: Carton | null; readonly refusals: readonly Refusal[] } {
  const found = new Map<string, Refusal>();
  let at = brief;
  let against = first;
  for (let round = 0; round < 8; round++) {
    for (const refusal of against) if (!found.has(refusal.parameter)) found.set(refusal.parameter, refusal);
    at = against.reduce(mended, at);
    const result = build(at);
    if (result.ok) {
      const { carton } = result;
      const isKept = (parameter: string) => isAxis(parameter) || parameter in at.options;
      return { carton, refusals: [...found.values()].map((r) => (r.nearest === null && isKept(r.parameter) ? { ...r, nearest: askedValue({ asked: at, carton }, r.parameter) } : r)) };
    }
    against = result.refusals;
  }
  return { carton: null, refusals: [...found.values()] };
}

/** The nearest value; where none works alone, the limit itself; where there is none either, the default. */
function mended(brief: Brief, { parameter, nearest, limit }: Refusal): Brief {
  if (nearest !== null) return withValue(brief, parameter, nearest);
  if (limit && "atLeast" in limit) return withValue(brief, parameter, limit.atLeast);
  if (limit && "atMost" in limit) return withValue(brief, parameter, limit.atMost);
  return withDefault(brief, parameter);
}

const axes: readonly string[] = ["L", "W", "D"];
export const isAxis = (parameter: string): parameter is Axis => axes.includes(parameter);

/** Sets a size, the room, the board, the construction or an option. `typed` is kept when it says more than the number. */
export function withValue(brief: Brief, parameter: string, value: OptionValue, typed?: string): Brief {
  const { [parameter]: _before, ...others } = brief.typed;
  const isMore = typed !== undefined && typed.trim() !== "" && typed.trim() !== String(value);
  const next = { ...brief, typed: isMore ? { ...others, [parameter]: typed.trim() } : others };
  if (isAxis(parameter)) return { ...next, size: { ...brief.size, [parameter]: Number(value) } };
  if (parameter === "room") return { ...next, room: Number(value) };
  if (parameter === "board") return { ...next, board: String(value) };
  if (parameter === "construction") return { ...next, construction: String(value) };
  return { ...next, options: { ...brief.options, [parameter]: value } };
}

/** Lets the construction decide an option again. */
export function withDefault(brief: Brief, option: string): Brief {
  const { [option]: _option, ...options } = brief.options;
  const { [option]: _typed, ...typed } = brief.typed;
  return { ...brief, options, typed };
}

export const withBasis = (brief: Brief, basis: SizeBasis): Brief => ({ ...brief, basis });

/** Another construction: its options are its own, the size and the board go along. */
export const withConstruction = (brief: Brief, construction: string): Brief => ({ ...brief, construction, options: {}, typed: sizesOnly(brief.typed) });

const sizesOnly = (typed: Brief["typed"]): Brief["typed"] => Object.fromEntries(Object.entries(typed).filter(([name]) => isAxis(name)));

/** What is asked for a parameter: the figure in the brief, or the value in force. */
export function askedValue(session: Pick<Session, "asked" | "carton">, parameter: string): OptionValue {
  const { asked, carton } = session;
  if (isAxis(parameter)) return asked.size[parameter];
  if (parameter === "room") return asked.room;
  if (parameter === "board") return asked.board;
  return asked.options[parameter] ?? carton.parameters[parameter] ?? "";
}

/** The same question, whatever order its options were set in. */
export const isSameBrief = (a: Brief, b: Brief): boolean => a === b || briefKey(a) === briefKey(b);

export function briefKey(brief: Brief): string {
  const sorted = (record: Readonly<Record<string, unknown>>) => Object.entries(record).sort(([a], [b]) => (a < b ? -1 : 1));
  const { construction, size, basis, room, board, options, typed } = brief;
  return JSON.stringify([construction, size.L, size.W, size.D, basis, room, board, sorted(options), sorted(typed)]);
}
