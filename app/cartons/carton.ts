// The only door into the core: a brief and a board go in, a carton or refusals come out.
import { withCaliper } from "./boards/allowance-card";
import type { Board } from "./boards/board";
import { declare, document, type Options } from "./assemble";
import type { Blank } from "./blank/blank";
import { checkMotion, type MotionReport } from "./checks/motion";
import { findConstruction, listConstructions, type Registered } from "./constructions/registry";
import { foldModelOf } from "./fold/fold-model";
import { SAME_POINT } from "./geometry/tolerance";
import { nearestForAll } from "./nearest";
import type { Axis, Brief, Carton, CartonResult, Refusal, Size } from "./types";

/** Rounds of closing in on an inside size from another basis; each corrects by what is still missing. */
const ROUNDS = 12;

/**
 * Builds the whole document. Lengths in mm. An impossible brief gives refusals, each with its parameter, limit and the
 * nearest value that works; nothing is thrown for what a person may type.
 */
export function buildCarton(brief: Brief, board: Board): CartonResult {
  const registered = findConstruction(brief.construction);
  if (!registered) {
    return { ok: false, refusals: [{ code: "unknown-construction", parameter: "construction", given: brief.construction, limit: { oneOf: listConstructions().map((c) => c.id) }, nearest: null, because: "there is no such construction" }] };
  }
  const result = attempt(registered, brief, board);
  if (result.ok) return result;
  const refusalsOf = (other: Brief) => {
    const again = attempt(registered, other, board);
    return again.ok ? [] : again.refusals;
  };
  const [first] = result.refusals;
  if (first?.parameter === "caliper") return { ok: false, refusals: [{ ...first, nearest: thicknessThatWorks(registered, brief, board, Number(first.nearest)) }] };
  return { ok: false, refusals: nearestForAll(result.refusals, brief, registered, refusalsOf) };
}

/** A thickness of the same kind of board, mm, that is accepted: the limit in tidy figures, or thinner by degrees; null when none is. */
function thicknessThatWorks(registered: Registered, brief: Brief, board: Board, limit: number): number | null {
  const tries = [limit, 0.8 * limit, 0.6 * limit, 0.4 * limit, 0.25 * limit].map((t) => Math.floor(t * 100) / 100);
  return tries.find((t) => t > 0 && attempt(registered, brief, withCaliper(board, t)).ok) ?? null;
}

/** The same without looking for nearest values. */
function attempt(registered: Registered, brief: Brief, board: Board): CartonResult {
  if (brief.basis === "inside") return attemptInside(registered, brief, brief.size, brief.options, board);
  const target = brief.basis === "product"
    ? { L: brief.size.L + 2 * brief.room, W: brief.size.W + 2 * brief.room, D: brief.size.D + 2 * brief.room }
    : brief.size;
  const start = startingInside(registered, brief, target, board);
  let inside = start;
  for (let round = 0; round < ROUNDS; round++) {
    const result = attemptInside(registered, brief, inside, brief.options, board);
    if (!result.ok) return { ok: false, refusals: result.refusals.map((r) => inTermsOf(r, brief.size, inside)) };
    const reached = readingOf(result.carton, brief);
    const missing = { L: target.L - reached.L, W: target.W - reached.W, D: target.D - reached.D };
    if (Math.max(Math.abs(missing.L), Math.abs(missing.W), Math.abs(missing.D)) < SAME_POINT) return result;
    inside = { L: inside.L + missing.L, W: inside.W + missing.W, D: inside.D + missing.D };
  }
  throw new Error(`no inside size gives ${brief.basis} ${brief.size.L} × ${brief.size.W} × ${brief.size.D} in ${brief.construction}`);
}

const readingOf = (carton: Carton, brief: Brief): Size =>
  brief.basis === "crease" ? carton.crease : brief.basis === "outside" ? carton.outside : carton.clearInside;

/** What inside and basis differ by in the construction's sample is a good first guess for any size. */
function startingInside(registered: Registered, brief: Brief, target: Size, board: Board): Size {
  const sample = registered.info.sample.size;
  const built = attemptInside(registered, brief, sample, {}, board);
  if (!built.ok) return target;
  const reading = readingOf(built.carton, brief);
  return { L: target.L - reading.L + sample.L, W: target.W - reading.W + sample.W, D: target.D - reading.D + sample.D };
}

/** A refusal about the inside, told in the figures that were asked. */
function inTermsOf(refusal: Refusal, asked: Size, inside: Size): Refusal {
  if (!(refusal.parameter === "L" || refusal.parameter === "W" || refusal.parameter === "D")) return refusal;
  const axis: Axis = refusal.parameter;
  const shift = (value: number) => value - inside[axis] + asked[axis];
  const limit = refusal.limit && "atLeast" in refusal.limit ? { atLeast: shift(refusal.limit.atLeast) } : refusal.limit && "atMost" in refusal.limit ? { atMost: shift(refusal.limit.atMost) } : refusal.limit;
  return { ...refusal, given: asked[axis], limit, nearest: typeof refusal.nearest === "number" ? shift(refusal.nearest) : refusal.nearest };
}

function attemptInside(registered: Registered, brief: Brief, inside: Size, options: Options, board: Board): CartonResult {
  const declared = declare(registered, inside, options, board);
  if (!declared.ok) return declared;
  const carton = document(registered, brief, board, declared.blank, declared.resolved);
  if (carton.foldCheck.closes) return { ok: true, carton };
  // The limits let it through and it does not fold: the option that was set is to blame, or else a size.
  const blamed = Object.keys(options)[0] ?? "D";
  const first = carton.foldCheck.findings[0];
  return {
    ok: false,
    refusals: [{
      code: "does-not-fold", parameter: blamed, given: options[blamed] ?? inside.D, limit: null, nearest: null,
      because: first ? `folded, ${first.panels.join(" and ")} fail the check "${first.code}"` : "it does not fold shut",
    }],
  };
}

/** The declared blank on an inside size, for checks that look deeper than the document. Null when it is refused. */
export function blankOf(brief: Brief, inside: Size, board: Board): Blank | null {
  const registered = findConstruction(brief.construction);
  const declared = registered ? declare(registered, inside, brief.options, board) : null;
  return declared?.ok ? declared.blank : null;
}

/** Collisions on the way from flat to closed, `samples` poses a step. */
export function motionOf(carton: Carton, samples?: number): MotionReport {
  const blank = blankOf(carton.brief, carton.inside, carton.board);
  if (!blank) throw new Error("a built carton is not refused");
  return checkMotion(blank, foldModelOf(blank), samples);
}
