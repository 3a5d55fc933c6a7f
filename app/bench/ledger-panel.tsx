// Every figure with its value, its arithmetic, its reason and where it came from. Its rows light up on the drawing.
import { useMemo, useState } from "react";
import { Button } from "~/components/button";
import { classNames } from "~/components/class-names";
import { Icon, type IconName } from "~/components/icon";
import type { UnitName } from "~/components/preferences";
import { formulaOf } from "~/cartons/ledger/formula";
import type { LedgerRow, Source } from "~/cartons/types";
import { refusalOf, useBench } from "./bench-context";
import { Figure } from "./figure";
import { ledgerCsv } from "./ledger-csv";
import { saveText } from "./save-text";
import { showFigure, showLength } from "./lengths";
import { BoardSelect, BasisSelect, RoomFigure } from "./asked-selects";
import { RefusalLine } from "./refusal-line";

const sources: readonly { readonly source: Source; readonly word: string; readonly glyph: IconName }[] = [
  { source: "asked", word: "asked", glyph: "asked" },
  { source: "board", word: "board", glyph: "board" },
  { source: "allowance", word: "allowance", glyph: "allowance" },
  { source: "rule", word: "rule of thumb", glyph: "rule" },
];
const groups: readonly { readonly group: LedgerRow["group"]; readonly title: string }[] = [
  { group: "asked", title: "Asked" },
  { group: "board", title: "From the board" },
  { group: "worked-out", title: "Worked out" },
  { group: "option", title: "Options" },
];

export function LedgerPanel({ name }: { name: string }) {
  const { session, units } = useBench();
  const { ledger } = session.carton;
  const [shown, setShown] = useState<ReadonlySet<Source>>(new Set());
  const rows = useMemo(() => (shown.size === 0 ? ledger : ledger.filter((row) => shown.has(row.source) || row.terms.some((term) => shown.has(term.source)))), [ledger, shown]);
  const toggle = (source: Source) => setShown((before) => new Set(before.has(source) ? [...before].filter((s) => s !== source) : [...before, source]));
  return (
    <div>
      <div className="flex items-baseline gap-3 px-5 pt-3">
        <p className="text-small text-ink-2">{rows.length === ledger.length ? `${ledger.length} figures` : `${rows.length} of ${ledger.length} figures`}</p>
        <span className="ml-auto"><Button look="plain" onClick={() => saveText(`${name} ledger.csv`, ledgerCsv(rows), "text/csv")} aria-label="Ledger as CSV">CSV</Button></span>
      </div>
      <div role="group" aria-label="Show figures by where they come from" className="flex flex-wrap gap-x-4 px-5 pb-2 text-small">
        {sources.map(({ source, word, glyph }) => (
          <button
            key={source}
            type="button"
            aria-pressed={shown.has(source)}
            onClick={() => toggle(source)}
            className={classNames("inline-flex min-h-7 items-center gap-1.5 border-b-2 hover:text-live max-md:min-h-11", shown.has(source) ? "border-ink font-bold" : "border-transparent text-ink-2")}
          >
            <Icon name={glyph} size={14} /> {word}
          </button>
        ))}
      </div>
      <div className="mx-5 border-t-2 border-ink" />
      {groups.map(({ group, title }, i) => {
        const own = rows.filter((row) => row.group === group);
        if (own.length === 0) return null;
        return (
          <section key={group} aria-label={title}>
            {i > 0 && <div className="fold-rule mx-5" />}
            <div className="flex min-h-9 flex-wrap items-center justify-between gap-x-3 px-5 pt-1">
              <h3 className="text-small font-bold">{title}</h3>
              {group === "asked" && <BasisSelect />}
              {group === "board" && <BoardSelect />}
            </div>
            <ul>
              {own.map((row) => <Row key={row.id} row={row} units={units} />)}
              {group === "asked" && session.asked.basis === "product" && <RoomRow />}
            </ul>
          </section>
        );
      })}
    </div>
  );
}

function RoomRow() {
  return (
    <li className="flex items-baseline gap-3 px-5 py-1">
      <Icon name="asked" size={14} className="translate-y-0.5 text-ink-2" />
      <span className="flex-1">Room on each side</span>
      <RoomFigure />
    </li>
  );
}

function Row({ row, units }: { row: LedgerRow; units: UnitName }) {
  const { session, lit, light } = useBench();
  const isLit = lit?.row === row.id;
  const glyph = sources.find((s) => s.source === row.source)?.glyph ?? "asked";
  const kind = row.unit === "deg" ? "angle" : row.unit === "count" ? "count" : "length";
  const typed = row.parameter ? session.asked.typed[row.parameter] : undefined;
  const arithmetic = typed ?? formulaOf(row, (mm) => showLength(mm, units));
  const parameter = row.parameter === "caliper" ? null : row.parameter;
  const refusal = parameter ? refusalOf(session, parameter) : undefined;
  const isAsked = row.source === "asked";
  return (
    <li
      data-ledger-row={row.id}
      onPointerEnter={() => light({ row: row.id, from: "ledger" })}
      onPointerLeave={() => light(null)}
      className={classNames("relative border-l-[3px] pl-[17px] pr-5", isLit ? "border-live-line bg-wash" : "border-transparent")}
    >
      <div className="flex items-baseline gap-3 py-1">
        <Icon name={glyph} size={14} className="translate-y-0.5 text-ink-2" />
        <div className="min-w-0 flex-1 border-b border-rule pb-1">
          <div className="flex items-baseline justify-between gap-3">
            <span className={classNames("min-w-0 first-letter:uppercase", isLit && "font-bold text-live")}>{row.name}</span>
            {parameter && (row.unit === "mm" || row.unit === "deg" || row.unit === "count") ? (
              <Figure parameter={parameter} label={row.name} kind={kind} look="row" row={row.id} className={classNames(isLit && "text-live", !isAsked && !row.isSet && "font-normal! no-underline!")} />
            ) : (
              <button
                type="button"
                onFocus={() => light({ row: row.id, from: "ledger" })}
                onBlur={() => light(null)}
                aria-label={`${row.name} ${showFigure(row.value, kind, units)}${row.mark ? ", shown on the drawing" : ""}`}
                className={classNames("min-h-6 cursor-default text-figure", isLit && "font-bold text-live")}
              >
                {showFigure(row.value, kind, units)}
                {row.unit === "deg" && "°"}
              </button>
            )}
          </div>
          {(arithmetic || row.reason) && (
            <p className="text-small text-ink-2">
              {arithmetic && <span className="pr-2">{arithmetic}</span>}
              {row.reason && <i>{row.reason}</i>}
            </p>
          )}
          {refusal && <RefusalLine refusal={refusal} />}
        </div>
      </div>
    </li>
  );
}
