// Beside the stage: the Ledger, the options, the fold check. One at a time.
import { useRef } from "react";
import { classNames } from "~/components/class-names";
import { Icon } from "~/components/icon";
import type { ConstructionInfo, Finding } from "~/cartons/types";
import { CheckPanel } from "./check-panel";
import { LedgerPanel } from "./ledger-panel";
import { OptionsPanel } from "./options-panel";

export const panelNames = ["ledger", "options", "check"] as const;
export type PanelName = (typeof panelNames)[number];

const titles: { readonly [P in PanelName]: string } = { ledger: "Ledger", options: "Options", check: "Fold check" };

export interface SidePanelProps {
  panel: PanelName;
  setPanel: (panel: PanelName) => void;
  findings: readonly Finding[];
  constructions: readonly ConstructionInfo[];
  name: string;
  onClose?: () => void;
}

export function SidePanel({ panel, setPanel, findings, constructions, name, onClose }: SidePanelProps) {
  const tabs = useRef<HTMLDivElement>(null);
  return (
    <>
      <div ref={tabs} role="tablist" aria-label="Figures and checks" className="flex items-end gap-5 border-b border-rule px-5 pt-2">
        {panelNames.map((p) => (
          <button
            key={p}
            id={`tab-${p}`}
            type="button"
            role="tab"
            aria-selected={p === panel}
            aria-controls={`panel-${p}`}
            tabIndex={p === panel ? 0 : -1}
            onClick={() => setPanel(p)}
            onKeyDown={(event) => {
              const by = event.key === "ArrowRight" ? 1 : event.key === "ArrowLeft" ? -1 : 0;
              if (by === 0) return;
              event.preventDefault();
              event.stopPropagation();
              const next = panelNames[(panelNames.indexOf(p) + by + panelNames.length) % panelNames.length]!;
              setPanel(next);
              tabs.current?.querySelector<HTMLElement>(`#tab-${next}`)?.focus();
            }}
            className={classNames("min-h-10 border-b-2 text-h2 leading-8 max-md:min-h-11", p === panel ? "border-ink font-black" : "border-transparent text-base text-ink-2 hover:text-live")}
          >
            {titles[p]}
            {p === "check" && findings.length > 0 && <span className="ml-1.5 inline-flex items-center gap-0.5 text-small font-bold"><Icon name="warning" size={13} />{findings.length}</span>}
          </button>
        ))}
        {onClose && (
          <button type="button" onClick={onClose} aria-label="Close" className="mb-1 ml-auto inline-flex size-8 items-center justify-center hover:text-live"><Icon name="cross" size={14} /></button>
        )}
      </div>
      <div id={`panel-${panel}`} role="tabpanel" aria-labelledby={`tab-${panel}`} tabIndex={-1} data-panel className="min-h-0 flex-1 overflow-y-auto overscroll-contain outline-none max-md:overflow-visible">
        {panel === "ledger" && <LedgerPanel name={name} />}
        {panel === "options" && <OptionsPanel constructions={constructions} />}
        {panel === "check" && <CheckPanel findings={findings} />}
      </div>
      {panel !== "check" && <p className="border-t border-ink px-5 py-2 text-small text-ink-2 max-md:border-t-0">Calculated, not guaranteed: cut and fold a sample first.</p>}
    </>
  );
}
