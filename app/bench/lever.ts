// How far the blank is folded: 0 is flat, the number of steps is closed. A store of its own, so that a turn of the lever
// redraws the stage and the lever and nothing else.
import { useSyncExternalStore } from "react";
import type { FoldModel } from "~/cartons/types";

export interface Lever {
  get(): number;
  set(u: number): void;
  subscribe(listener: () => void): () => void;
}

export function createLever(): Lever {
  const state = { u: 0 };
  const listeners = new Set<() => void>();
  return {
    get: () => state.u,
    set(u) {
      if (u === state.u) return;
      state.u = u;
      for (const listener of listeners) listener();
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => void listeners.delete(listener);
    },
  };
}

export const useLever = (lever: Lever): number => useSyncExternalStore(lever.subscribe, lever.get, () => 0);

/** Greatest turn of a step, degrees; null where the step moves a piece and turns no crease. */
export function degreesOf(fold: FoldModel, step: number): number | null {
  const turns = fold.hinges.filter((hinge) => hinge.step === step).map((hinge) => Math.abs(hinge.angle));
  return turns.length === 0 ? null : Math.round((Math.max(...turns) * 180) / Math.PI);
}

/** The step in which the lever stands, from 0; at a station, the step that has just been done. −1 when flat. */
export const stepAt = (u: number): number => Math.ceil(u) - 1;

/** "Flat", "Lid dust flaps, 67° of 90°", "Lid shut, closed". */
export function leverWords(fold: FoldModel, u: number): { readonly station: string; readonly detail: string } {
  const step = stepAt(u);
  const at = fold.steps[step];
  if (!at) return { station: "Flat", detail: "" };
  const degrees = degreesOf(fold, step);
  const part = u - step;
  if (u >= fold.steps.length) return { station: at.label, detail: "closed" };
  return { station: at.label, detail: degrees === null ? `${Math.round(part * 100)} % of the way` : `${Math.round(part * degrees)}° of ${degrees}°` };
}

/** One degree further, or a hundredth of the way where no crease turns. */
export function nudged(fold: FoldModel, u: number, by: 1 | -1): number {
  const step = by > 0 ? Math.floor(u) : Math.ceil(u) - 1;
  const next = u + by / (degreesOf(fold, step) ?? 100);
  // Floating steps must not creep past a station by a hair.
  const station = Math.round(next);
  return clampTo(fold, Math.abs(next - station) < 0.002 ? station : next);
}

export const stationAfter = (fold: FoldModel, u: number, by: 1 | -1): number => clampTo(fold, by > 0 ? Math.floor(u + 0.001) + 1 : Math.ceil(u - 0.001) - 1);

export const clampTo = (fold: FoldModel, u: number): number => Math.min(fold.steps.length, Math.max(0, u));
