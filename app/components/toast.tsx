// One slip at a time, bottom left: what happened, and Undo where it can be undone. It waits while it is under the hand.
import { createContext, type ReactNode, useCallback, useContext, useEffect, useMemo, useState } from "react";
import { Icon } from "./icon";

export interface Slip {
  /** One sentence. */
  readonly sentence: string;
  readonly undo?: () => void;
  readonly undoLabel?: string;
}

/** Milliseconds that a slip stays when nobody touches it. */
const STAYS = 8000;

const ToastContext = createContext<(slip: Slip) => void>(() => undefined);

/** Shows a slip from anywhere below the root. */
export const useToast = () => useContext(ToastContext);

export function ToastProvider({ children }: { children: ReactNode }) {
  const [slip, setSlip] = useState<(Slip & { key: number }) | null>(null);
  const show = useCallback((next: Slip) => setSlip((before) => ({ ...next, key: (before?.key ?? 0) + 1 })), []);
  return (
    <ToastContext value={show}>
      {children}
      <div role="status" aria-live="polite" className="no-print fixed bottom-4 left-4 z-40 max-md:bottom-28 max-md:right-4">
        {slip && <SlipOfPaper key={slip.key} slip={slip} onGone={() => setSlip(null)} />}
      </div>
    </ToastContext>
  );
}

function SlipOfPaper({ slip, onGone }: { slip: Slip; onGone: () => void }) {
  const [isHeld, setHeld] = useState(false);
  useEffect(() => {
    if (isHeld) return;
    const timer = setTimeout(onGone, STAYS);
    return () => clearTimeout(timer);
  }, [isHeld, onGone]);
  const hold = useMemo(() => ({
    onPointerEnter: () => setHeld(true),
    onPointerLeave: () => setHeld(false),
    onFocus: () => setHeld(true),
    onBlur: () => setHeld(false),
  }), []);
  return (
    <div {...hold} className="slip flex items-center gap-4 rounded-control bg-ink py-2 pl-4 pr-2 text-paper">
      <p>{slip.sentence}</p>
      {slip.undo && (
        <button
          type="button"
          onClick={() => {
            slip.undo?.();
            onGone();
          }}
          className="min-h-8 border-b border-paper px-1 font-bold max-md:min-h-11"
        >
          {slip.undoLabel ?? "Undo"}
        </button>
      )}
      <button type="button" onClick={onGone} aria-label="Put away" className="inline-flex size-8 items-center justify-center max-md:size-11">
        <Icon name="cross" size={14} />
      </button>
    </div>
  );
}
