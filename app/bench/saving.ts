// How saving stands. Pure: what the server answered and what is on the Bench give one state and one sentence.
import type { Brief } from "~/cartons/types";
import type { SaveAnswer, SavedCarton } from "~/forms/save-answer";
import { isSameBrief } from "./session";

export type SaveState =
  | { readonly kind: "saved" | "unsaved" | "saving" | "refused" }
  | { readonly kind: "conflict"; readonly theirs: SavedCarton }
  | { readonly kind: "failed"; readonly sentence: string; readonly isOffline: boolean };

export interface SavingFacts {
  readonly asked: Brief;
  readonly isRefused: boolean;
  readonly saved: SavedCarton;
  readonly isBusy: boolean;
  /** The newest answer that has not been dealt with. */
  readonly answer: SaveAnswer | null;
}

export const OFFLINE = "No connection. What you typed is kept here and goes up when it returns.";

export function saveStateOf({ asked, isRefused, saved, isBusy, answer }: SavingFacts): SaveState {
  if (isBusy) return { kind: "saving" };
  if (isSameBrief(asked, saved.brief)) return { kind: "saved" };
  if (answer && "conflict" in answer) return { kind: "conflict", theirs: answer.conflict };
  if (answer && "offline" in answer) return { kind: "failed", sentence: OFFLINE, isOffline: true };
  if (answer && "problem" in answer) return { kind: "failed", sentence: answer.problem.sentence, isOffline: answer.problem.code === "database-lost" };
  if (answer && "refused" in answer) return { kind: "failed", sentence: answer.refused.join(" "), isOffline: false };
  return { kind: isRefused ? "refused" : "unsaved" };
}

/** What two briefs ask differently, by parameter. */
export function differences(mine: Brief, theirs: Brief): readonly { readonly parameter: string; readonly mine: unknown; readonly theirs: unknown }[] {
  const flat = (brief: Brief): Record<string, unknown> => ({
    construction: brief.construction, L: brief.size.L, W: brief.size.W, D: brief.size.D, basis: brief.basis,
    ...(brief.basis === "product" ? { room: brief.room } : {}), board: brief.board, ...brief.options,
  });
  const [a, b] = [flat(mine), flat(theirs)];
  return [...new Set([...Object.keys(a), ...Object.keys(b)])].filter((name) => a[name] !== b[name]).map((parameter) => ({ parameter, mine: a[parameter], theirs: b[parameter] }));
}

export const OFFLINE_ANSWER: SaveAnswer = { offline: true };
