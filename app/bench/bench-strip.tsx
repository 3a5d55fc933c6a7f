// The strip above the Bench: what is worked, how it is kept, what can be taken away.
import type { ReactNode } from "react";
import { Link as RouterLink } from "react-router";
import { Switch } from "~/components/button";
import { classNames } from "~/components/class-names";
import { Icon } from "~/components/icon";
import { usePreferences } from "~/components/preferences";
import { FoldOut, PersonChoices } from "~/components/top-strip";
import { useViewer } from "~/components/use-viewer";
import { Mark } from "~/components/wordmark";
import { useBench } from "./bench-context";

export interface BenchStripProps {
  /** The client, or what kind of carton it is. */
  owner: ReactNode;
  title: ReactNode;
  /** "Saved 10:42" */
  state: ReactNode;
  /** Export, save. */
  actions: ReactNode;
  /** Lines of the sheet under the last glyph. */
  more: ReactNode;
  openHelp: () => void;
}

export function BenchStrip({ owner, title, state, actions, more, openHelp }: BenchStripProps) {
  const { session, undo, redo, canEdit } = useBench();
  const { units, setUnits } = usePreferences();
  const viewer = useViewer();
  const line = "flex min-h-10 w-full items-center text-left hover:text-live max-md:min-h-11";
  return (
    <header className="no-print flex min-h-13 items-center gap-4 border-b border-ink bg-desk px-4 max-md:gap-2 lg:px-5">
      <RouterLink to="/" aria-label="Cartonwright, to the Desk" className="flex min-h-8 items-center border-r border-rule-2 pr-4 max-md:border-r-0 max-md:pr-1"><Mark height={18} /></RouterLink>
      <div className="min-w-0 flex-1 max-md:flex max-md:flex-col-reverse md:flex md:items-center md:gap-2">
        <span className="truncate text-ink-2 max-md:text-label">{owner}</span>
        <span aria-hidden className="text-ink-3 max-md:hidden">/</span>
        <span className="min-w-0 truncate font-bold">{title}</span>
        <span className="ml-2 truncate text-small text-ink-2 max-lg:hidden">{state}</span>
      </div>
      {canEdit && (
        <div className="flex items-center">
          <HistoryButton glyph="undo" label="Undo" isOff={session.past.length === 0} onClick={undo} />
          <HistoryButton glyph="redo" label="Redo" isOff={session.future.length === 0} onClick={redo} />
        </div>
      )}
      <Switch label="Units" value={units} onChange={setUnits} choices={[{ value: "mm", label: "mm" }, { value: "in", label: "in" }]} className="max-md:hidden" />
      <div className="flex items-center gap-3 max-md:gap-2">{actions}</div>
      <FoldOut label="More" summary={<Icon name="menu" size={20} />}>
        <div className="flex w-64 max-w-[80vw] flex-col">
          <p className="pb-1 text-small text-ink-2 lg:hidden">{state}</p>
          {more}
          <button type="button" className={line} onClick={openHelp}>Keys of the Bench</button>
          <div className="fold-rule my-2" />
          <RouterLink to="/" className={line}>{viewer ? "Desk" : "First page"}</RouterLink>
          {viewer ? <><RouterLink to="/cartons" className={line}>Cartons</RouterLink><div className="fold-rule my-2" /><PersonChoices viewer={viewer} /></> : <RouterLink to="/sign-in" className={line}>Sign in</RouterLink>}
        </div>
      </FoldOut>
    </header>
  );
}

function HistoryButton({ glyph, label, isOff, onClick }: { glyph: "undo" | "redo"; label: string; isOff: boolean; onClick: () => void }) {
  return (
    <button
      type="button"
      aria-label={label}
      title={label}
      aria-disabled={isOff || undefined}
      onClick={onClick}
      className={classNames("inline-flex size-8 items-center justify-center hover:text-live max-md:size-11", isOff && "text-ink-3 hover:text-ink-3", glyph === "redo" && "max-md:hidden")}
    >
      <Icon name={glyph} size={18} />
    </button>
  );
}
