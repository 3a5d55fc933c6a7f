// Small ink glyphs as SVG: the letters shipped with the pages have no arrows, ticks or triangles.
import type { ReactNode } from "react";

const glyphs = {
  tick: <path d="m3 8.5 3.2 3.5L13 4" strokeWidth="2" />,
  cross: <path d="m4 4 8 8m0-8-8 8" strokeWidth="1.75" />,
  stop: (
    <>
      <path d="M1.5 1.5h13v13h-13z" fill="currentColor" stroke="none" />
      <path d="m5.2 5.2 5.6 5.6m0-5.6-5.6 5.6" stroke="var(--paper)" strokeWidth="1.75" />
    </>
  ),
  warning: <path d="M8 2 14.6 14H1.4ZM8 6.4v3.8m0 1.4v.8" strokeWidth="1.4" />,
  note: <path d="M8 1.8a6.2 6.2 0 1 1 0 12.4A6.2 6.2 0 0 1 8 1.8Zm0 5.4v4.2M8 4.6v1" strokeWidth="1.4" />,
  undo: <path d="M5.6 2.4 2.4 5.6l3.2 3.2M2.6 5.6h6.8a4 4 0 0 1 0 8H6.6" strokeWidth="1.6" />,
  redo: <path d="m10.4 2.4 3.2 3.2-3.2 3.2m3-3.2H6.6a4 4 0 0 0 0 8h2.8" strokeWidth="1.6" />,
  menu: <path d="M1.5 5h13M1.5 11h13" strokeWidth="1.5" />,
  down: <path d="m4 6.2 4 4 4-4" strokeWidth="1.5" />,
  up: <path d="m4 9.8 4-4 4 4" strokeWidth="1.5" />,
  right: <path d="m6.2 4 4 4-4 4" strokeWidth="1.5" />,
  left: <path d="m9.8 4-4 4 4 4" strokeWidth="1.5" />,
  plus: <path d="M8 3v10M3 8h10" strokeWidth="1.6" />,
  minus: <path d="M3 8h10" strokeWidth="1.6" />,
  fit: <path d="M2 5.5V2h3.5M10.5 2H14v3.5M14 10.5V14h-3.5M5.5 14H2v-3.5" strokeWidth="1.5" />,
  search: <path d="M7 2.5a4.5 4.5 0 1 1 0 9 4.5 4.5 0 0 1 0-9Zm3.4 7.9 3.4 3.4" strokeWidth="1.5" />,
  reset: <path d="M3 2.8v3.4h3.4M3.3 6A5.4 5.4 0 1 1 2.6 9" strokeWidth="1.5" />,
  /** Where a figure comes from. */
  asked: <circle cx="8" cy="8" r="3.6" fill="currentColor" stroke="none" />,
  board: <path d="M2.5 4.2h11M2.5 8h11M2.5 11.8h11" strokeWidth="1.6" />,
  allowance: <path d="M4 2v10.5h9.5M4 8.2a4.3 4.3 0 0 1 4.3 4.3" strokeWidth="1.5" />,
  rule: <path d="M1.8 6.4c2-2.6 4-2.6 6.2 0s4.2 2.6 6.2 0M1.8 10.9c2-2.6 4-2.6 6.2 0s4.2 2.6 6.2 0" strokeWidth="1.5" />,
  /** Where a thing stands. */
  draft: <path d="M2.5 2.5h11v11h-11z" strokeWidth="1.4" strokeDasharray="2.75 2.75" strokeDashoffset="1.4" />,
  out: (
    <>
      <path d="M2.5 2.5h11v11h-11z" strokeWidth="1.4" />
      <path d="M13.5 2.5v11h-11Z" fill="currentColor" stroke="none" />
    </>
  ),
  approved: <path d="M2.5 2.5h11v11h-11zM5 8.2l2.2 2.4L11.2 5.6" strokeWidth="1.4" />,
  released: <path d="M2.5 2.5h11v11h-11z" fill="currentColor" strokeWidth="1.4" />,
} satisfies Record<string, ReactNode>;

export type IconName = keyof typeof glyphs;

/** Says nothing to a screen reader unless it is given a `title`: a word stands beside it. */
export function Icon({ name, size = 16, title, className = "" }: { name: IconName; size?: number; title?: string; className?: string }) {
  return (
    <svg
      viewBox="0 0 16 16"
      width={size}
      height={size}
      fill="none"
      stroke="currentColor"
      className={`shrink-0 ${className}`}
      role={title ? "img" : undefined}
      aria-label={title}
      aria-hidden={title ? undefined : true}
      focusable="false"
    >
      {glyphs[name]}
    </svg>
  );
}
