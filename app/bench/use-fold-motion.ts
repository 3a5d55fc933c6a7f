// Folds it by itself, 340 ms a step. Where motion is not wanted it steps from station to station.
import { useCallback, useEffect, useRef } from "react";
import type { FoldModel } from "~/cartons/types";
import type { Lever } from "./lever";

const STEP_MS = 340;
const RELEASE_MS = 180;
const wantsNoMotion = () => window.matchMedia("(prefers-reduced-motion: reduce)").matches;
const easeOut = (p: number) => 1 - (1 - p) ** 3;

export interface FoldMotion {
  /** To the closed carton, or back to the blank. */
  toggle(): void;
  goTo(u: number): void;
  stop(): void;
}

export function useFoldMotion(lever: Lever, fold: FoldModel): FoldMotion {
  const running = useRef<{ cancel: () => void; towards: number } | null>(null);
  const stop = useCallback(() => {
    running.current?.cancel();
    running.current = null;
  }, []);
  useEffect(() => stop, [stop]);

  const run = useCallback((target: number, duration: number, ease: (p: number) => number) => {
    stop();
    const from = lever.get();
    if (from === target) return;
    const start = performance.now();
    const frame = { id: 0 };
    const tick = (now: number) => {
      const p = Math.min(1, (now - start) / duration);
      lever.set(p === 1 ? target : from + (target - from) * ease(p));
      if (p < 1) frame.id = requestAnimationFrame(tick);
      else running.current = null;
    };
    frame.id = requestAnimationFrame(tick);
    running.current = { cancel: () => cancelAnimationFrame(frame.id), towards: target };
  }, [lever, stop]);

  const walk = useCallback((target: number) => {
    stop();
    const next = () => {
      const u = lever.get();
      if (u === target) return void (running.current = null);
      lever.set(target > u ? Math.min(target, Math.floor(u) + 1) : Math.max(target, Math.ceil(u) - 1));
      const timer = setTimeout(next, STEP_MS);
      running.current = { cancel: () => clearTimeout(timer), towards: target };
    };
    next();
  }, [lever, stop]);

  const toggle = useCallback(() => {
    const closed = fold.steps.length;
    const towards = running.current?.towards ?? null;
    const target = towards !== null ? closed - towards : lever.get() >= closed / 2 && lever.get() > 0 ? 0 : closed;
    if (wantsNoMotion()) walk(target);
    else run(target, Math.max(STEP_MS, Math.abs(target - lever.get()) * STEP_MS), (p) => p);
  }, [fold, lever, run, walk]);

  const goTo = useCallback((u: number) => {
    if (wantsNoMotion()) {
      stop();
      lever.set(u);
    } else run(u, RELEASE_MS, easeOut);
  }, [lever, run, stop]);

  return { toggle, goTo, stop };
}
