// The lever along the lower edge of the stage: from flat to closed in the order in which a person folds it.
import { type KeyboardEvent, lazy, type PointerEvent, Suspense, useRef } from "react";
import { classNames } from "~/components/class-names";
import type { Carton } from "~/cartons/types";
import { clampTo, type Lever, leverWords, nudged, stationAfter, stepAt, useLever } from "./lever";
import type { FoldMotion } from "./use-fold-motion";

// The drawing is there before the small pictures: they are worth a moment, not a wait.
const StationPictures = lazy(() => import("./station-pictures"));

export interface FoldLeverProps {
  carton: Carton;
  lever: Lever;
  motion: FoldMotion;
  /** Phone: ticks only, no pictures. */
  isCompact: boolean;
}

/** A release this near to a station, px, goes to it. */
const SNAP = 9;

export function FoldLever({ carton, lever, motion, isCompact }: FoldLeverProps) {
  const { fold } = carton;
  const u = clampTo(fold, useLever(lever));
  const track = useRef<HTMLDivElement>(null);
  const steps = fold.steps.length;
  const { station, detail } = leverWords(fold, u);
  const share = u / steps;
  const current = stepAt(u);

  const uAt = (event: PointerEvent) => {
    const box = track.current?.getBoundingClientRect();
    return box ? clampTo(fold, ((event.clientX - box.left) / box.width) * steps) : u;
  };
  const onPointerDown = (event: PointerEvent) => {
    if (event.button !== 0) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    motion.stop();
    lever.set(uAt(event));
  };
  const onPointerMove = (event: PointerEvent) => {
    if (event.currentTarget.hasPointerCapture(event.pointerId)) lever.set(uAt(event));
  };
  const onPointerUp = (event: PointerEvent) => {
    const box = track.current?.getBoundingClientRect();
    const at = uAt(event);
    const station = Math.round(at);
    if (box && Math.abs(at - station) * (box.width / steps) <= SNAP) motion.goTo(station);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const next = keyed(event.key);
    if (next === null || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    event.stopPropagation();
    motion.stop();
    lever.set(next);
  };
  function keyed(key: string): number | null {
    switch (key) {
      case "ArrowRight": case "ArrowUp": return nudged(fold, u, 1);
      case "ArrowLeft": case "ArrowDown": return nudged(fold, u, -1);
      case "PageUp": return stationAfter(fold, u, 1);
      case "PageDown": return stationAfter(fold, u, -1);
      case "Home": return 0;
      case "End": return steps;
      default: return null;
    }
  }

  return (
    <section aria-label="Fold lever" className="no-print flex h-[108px] border-t border-ink bg-desk max-md:sticky max-md:bottom-0 max-md:z-20 max-md:h-[104px] max-md:flex-col">
      <div className="flex w-36 shrink-0 flex-col justify-center pl-6 max-md:w-auto max-md:flex-row max-md:items-center max-md:justify-between max-md:px-4 max-md:pt-2">
        <span className="text-label text-ink-2">Fold lever</span>
        <span className="text-figure font-bold leading-5">{station}</span>
        <span className="text-small text-ink-2 max-md:hidden">{detail || "Drag, or press F"}</span>
      </div>
      <div className="relative min-w-0 flex-1 px-9 max-md:px-9">
        {!isCompact && <Suspense fallback={null}><StationPictures carton={carton} onPick={(at) => motion.goTo(at)} /></Suspense>}
        <div
          ref={track}
          onPointerDown={onPointerDown}
          onPointerMove={onPointerMove}
          onPointerUp={onPointerUp}
          className={classNames("absolute inset-x-9 h-11 cursor-pointer touch-none", isCompact ? "top-0" : "top-[52px]")}
        >
          <div className="fold-rule absolute inset-x-0 top-1/2" />
          <div className="absolute left-0 top-1/2 h-[3px] -translate-y-1/2 bg-live-line" style={{ width: `${share * 100}%` }} />
          {Array.from({ length: steps + 1 }, (_, i) => (
            <span key={i} className="absolute top-1/2 h-3.5 w-[1.5px] -translate-x-1/2 -translate-y-1/2 bg-ink" style={{ left: `${(i / steps) * 100}%` }} />
          ))}
          <div
            role="slider"
            tabIndex={0}
            aria-label="Fold lever"
            aria-orientation="horizontal"
            aria-valuemin={0}
            aria-valuemax={steps}
            aria-valuenow={Number(u.toFixed(3))}
            aria-valuetext={detail ? `${station}, ${detail}` : station}
            onKeyDown={onKeyDown}
            className="absolute top-1/2 flex h-7 w-[18px] -translate-x-1/2 -translate-y-1/2 items-center justify-center gap-[3px] rounded-control bg-ink max-md:h-11 max-md:w-7"
            style={{ left: `${share * 100}%` }}
          >
            {[0, 1, 2].map((i) => <span key={i} className="h-4 w-px bg-paper max-md:h-5" />)}
          </div>
        </div>
        {isCompact ? (
          <div className="absolute inset-x-9 bottom-1 flex justify-between text-label text-ink-2" aria-hidden>
            <span>flat</span><span>{detail || `${steps} steps`}</span><span>closed</span>
          </div>
        ) : (
          <div className="absolute inset-x-9 bottom-1 h-4" aria-hidden>
            {["Flat", ...fold.steps.map((s) => s.label)].map((label, i) => (
              <span
                key={i}
                className={classNames("absolute -translate-x-1/2 whitespace-nowrap text-label", i === current + 1 ? "font-bold text-ink" : "text-ink-2 max-lg:hidden", steps > 7 && i !== current + 1 && "max-xl:hidden")}
                style={{ left: `${(i / steps) * 100}%` }}
              >
                {label}
              </span>
            ))}
          </div>
        )}
      </div>
    </section>
  );
}
