// The frame of ordinary pages: strip above, text below. The Bench has its own.
import type { ReactNode } from "react";
import { classNames } from "./class-names";

/** The main part of a page, 1180 px wide. The skip link leads here. */
export function Page({ children, wide, className }: { children: ReactNode; wide?: boolean; className?: string }) {
  return (
    <main id="content" tabIndex={-1} className={classNames("mx-auto w-full px-4 pb-16 pt-6 outline-none md:px-8 md:pt-9", wide ? "max-w-[1440px]" : "max-w-[1244px]", className)}>
      {children}
    </main>
  );
}

/** Title, a line beside it, and the page's one main button; ends at a solid rule. */
export function PageHeader({ title, aside, children, large }: { title: ReactNode; aside?: ReactNode; children?: ReactNode; large?: boolean }) {
  return (
    <header className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3 border-b-2 border-ink pb-4">
      <div className="flex min-w-0 flex-wrap items-baseline gap-x-4 gap-y-1">
        <h1 className={classNames("font-black", large ? "text-h0" : "text-h1")}>{title}</h1>
        {aside && <p className="text-base text-ink-2">{aside}</p>}
      </div>
      {children && <div className="flex flex-wrap items-center gap-3">{children}</div>}
    </header>
  );
}

/** A part of a page. `rule`: solid ends what was before; dash unfolds more of the same. */
export function Section({ title, aside, children, rule = "solid", className }: { title: ReactNode; aside?: ReactNode; children: ReactNode; rule?: "solid" | "dash" | "none"; className?: string }) {
  return (
    <section className={classNames("pt-8", className)}>
      <div className={classNames("flex flex-wrap items-baseline justify-between gap-x-4", rule === "solid" && "border-t-2 border-ink pt-2")}>
        {rule === "dash" && <div className="fold-rule mb-3 w-full" />}
        <h2 className="text-h2 font-black">{title}</h2>
        {aside && <div className="text-small text-ink-2">{aside}</div>}
      </div>
      <div className="pt-3">{children}</div>
    </section>
  );
}

/** What it is, what it needs, one button, and where there is one a true drawing. */
export function EmptyState({ title, children, action, picture, level = 2 }: { title: string; children: ReactNode; action?: ReactNode; picture?: ReactNode; level?: 1 | 2 }) {
  const Heading = level === 1 ? "h1" : "h2";
  return (
    <div className="grid items-start gap-8 py-8 md:grid-cols-2">
      <div className="max-w-xl">
        <Heading className={classNames("font-black", level === 1 ? "text-h0" : "text-h1")}>{title}</Heading>
        <div className="pt-3 text-[17px] leading-7 text-ink-2">{children}</div>
        {action && <div className="flex flex-wrap items-center gap-4 pt-5">{action}</div>}
      </div>
      {picture && <div className="min-w-0">{picture}</div>}
    </div>
  );
}
