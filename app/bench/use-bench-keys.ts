// Keys that work anywhere on the Bench, unless something is being typed.
import { type RefObject, useEffect, useRef } from "react";
import type { FoldModel } from "~/cartons/types";
import type { BenchActions } from "./bench-context";
import { clampTo, type Lever, nudged, stationAfter } from "./lever";
import type { PanelName } from "./side-panel";
import type { PanZoom } from "./stage/use-pan-zoom";
import type { FoldMotion } from "./use-fold-motion";

export interface KeyTargets {
  actions: Pick<BenchActions, "undo" | "redo">;
  lever: Lever;
  motion: FoldMotion;
  fold: FoldModel;
  zoom: RefObject<PanZoom | null>;
  flip: () => void;
  openHelp: () => void;
  openPanel: (panel: PanelName) => void;
}

const isTyping = (target: EventTarget | null) =>
  target instanceof HTMLElement && (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName)) && !(target instanceof HTMLInputElement && /^(checkbox|radio)$/.test(target.type));

export function useBenchKeys(targets: KeyTargets): void {
  const latest = useRef(targets);
  latest.current = targets;
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.defaultPrevented || document.querySelector("dialog[open]")) return;
      if (event.ctrlKey || event.metaKey ? withControl(event, latest.current) : !event.altKey && !isTyping(event.target) && plainKey(event, latest.current)) event.preventDefault();
    };
    window.addEventListener("keydown", onKeyDown);
    return () => window.removeEventListener("keydown", onKeyDown);
  }, []);
}

/** True when the key meant something. */
function withControl(event: KeyboardEvent, { actions }: KeyTargets): boolean {
  const key = event.key.toLowerCase();
  if (key !== "z" && key !== "y") return false;
  // Inside a field Ctrl+Z belongs to the text.
  if (isTyping(event.target)) return false;
  if (key === "y" || event.shiftKey) actions.redo();
  else actions.undo();
  return true;
}

function plainKey(event: KeyboardEvent, { lever, motion, fold, zoom, flip, openHelp, openPanel }: KeyTargets): boolean {
  const set = (u: number) => {
    motion.stop();
    lever.set(clampTo(fold, u));
    return true;
  };
  switch (event.key) {
    case "f": case "F": motion.toggle(); return true;
    case "[": return set(nudged(fold, lever.get(), -1));
    case "]": return set(nudged(fold, lever.get(), 1));
    case "PageUp": return set(stationAfter(fold, lever.get(), 1));
    case "PageDown": return set(stationAfter(fold, lever.get(), -1));
    case "+": case "=": zoom.current?.zoom(1.25); return true;
    case "-": zoom.current?.zoom(1 / 1.25); return true;
    case "0": zoom.current?.fit(); return true;
    case "1": zoom.current?.trueSize(); return true;
    case "t": case "T": flip(); return true;
    case "l": case "L": openPanel("ledger"); return true;
    case "o": case "O": openPanel("options"); return true;
    case "c": case "C": openPanel("check"); return true;
    case "?": openHelp(); return true;
    default: return false;
  }
}
