// One line at a right angle from the lit figure to its row of the Ledger.
import { useLayoutEffect, useRef, useState } from "react";
import type { Lit } from "./bench-context";

export function Leader({ lit, panel }: { lit: Lit | null; panel: string }) {
  const ref = useRef<SVGSVGElement>(null);
  const [path, setPath] = useState<string | null>(null);
  const row = lit?.row ?? null;
  const from = lit?.from;

  useLayoutEffect(() => {
    const main = ref.current?.parentElement;
    if (!row || !main) {
      setPath(null);
      return;
    }
    const rowElement = main.querySelector<HTMLElement>(`[data-ledger-row="${CSS.escape(row)}"]`);
    if (from === "stage") rowElement?.scrollIntoView({ block: "nearest" });
    const draw = () => setPath(pathBetween(main, row));
    draw();
    const scroller = rowElement?.closest("[data-panel]");
    scroller?.addEventListener("scroll", draw, { passive: true });
    return () => scroller?.removeEventListener("scroll", draw);
  }, [row, from, panel]);

  return (
    <svg ref={ref} aria-hidden className="pointer-events-none absolute inset-0 z-10 size-full">
      {path && <path d={path} fill="none" stroke="var(--live-line)" strokeWidth={1.25} />}
    </svg>
  );
}

/** Null where one of the two cannot be seen. */
function pathBetween(main: HTMLElement, row: string): string | null {
  const figure = main.querySelector<HTMLElement>(`[data-figure="${CSS.escape(row)}"] > *`);
  const rowElement = main.querySelector<HTMLElement>(`[data-ledger-row="${CSS.escape(row)}"]`);
  const scroller = rowElement?.closest<HTMLElement>("[data-panel]");
  if (!figure || !rowElement || !scroller || figure.checkVisibility?.({ visibilityProperty: true }) === false) return null;
  const origin = main.getBoundingClientRect();
  const a = figure.getBoundingClientRect();
  const b = rowElement.getBoundingClientRect();
  const seen = scroller.getBoundingClientRect();
  const y = b.top + Math.min(b.height / 2, 18);
  if (y < seen.top || y > seen.bottom) return null;
  const toX = b.left - origin.left;
  const toY = y - origin.top;
  const middle = (a.left + a.right) / 2 - origin.left;
  if (toY > a.top - origin.top && toY < a.bottom - origin.top) return `M${a.right - origin.left + 2} ${toY}H${toX}`;
  const startY = toY < a.top - origin.top ? a.top - origin.top - 2 : a.bottom - origin.top + 2;
  return `M${middle} ${startY}V${toY}H${toX}`;
}
