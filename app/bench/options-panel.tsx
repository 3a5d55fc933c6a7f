// Everything that may be asked of this construction, by group: value, reason, source, and back to the usual value.
import { CheckBox } from "~/components/field";
import { Icon } from "~/components/icon";
import type { ConstructionInfo, ParameterInfo } from "~/cartons/types";
import { refusalOf, useBench } from "./bench-context";
import { Figure } from "./figure";
import type { FigureKind } from "./lengths";
import { RefusalLine } from "./refusal-line";
import { askedValue } from "./session";

export function OptionsPanel({ constructions }: { constructions: readonly ConstructionInfo[] }) {
  const { session, canEdit, setConstruction } = useBench();
  const { construction } = session.carton;
  const groups = [...new Set(construction.parameters.map((p) => p.group))];
  return (
    <div className="pb-6">
      <section className="px-5 pt-3">
        <h3 className="text-small font-bold">Construction</h3>
        {canEdit ? (
          <span className="relative mt-1 block">
            <select
              aria-label="Construction"
              value={session.asked.construction}
              onChange={(event) => setConstruction(event.target.value)}
              className="min-h-10 w-full appearance-none rounded-control border border-rule-2 bg-board px-3 pr-9 hover:border-ink max-md:min-h-11"
            >
              {constructions.map((c) => <option key={c.id} value={c.id}>{c.name}</option>)}
            </select>
            <Icon name="down" className="pointer-events-none absolute right-3 top-1/2 -translate-y-1/2 text-ink-2" />
          </span>
        ) : (
          <p>{construction.name}</p>
        )}
        <p className="pt-2 text-small text-ink-2">{construction.summary}</p>
        <p className="pt-1 text-small text-ink-2">{construction.meaning}</p>
      </section>
      {groups.map((group) => (
        <section key={group} className="pt-3">
          <h3 className="mx-5 border-b-2 border-ink pb-1 pt-2 text-small font-bold">{group}</h3>
          <ul>{construction.parameters.filter((p) => p.group === group).map((p) => <Option key={p.name} parameter={p} />)}</ul>
        </section>
      ))}
    </div>
  );
}

function Option({ parameter }: { parameter: ParameterInfo }) {
  const { session, reset, canEdit, light } = useBench();
  const isSet = parameter.name in session.asked.options;
  const refusal = refusalOf(session, parameter.name);
  const row = session.carton.ledger.find((r) => r.parameter === parameter.name)?.id;
  return (
    <li
      className="mx-5 border-b border-rule py-1.5"
      onPointerEnter={() => row && light({ row, from: "ledger" })}
      onPointerLeave={() => light(null)}
    >
      <div className="flex items-center justify-between gap-3">
        <span className={isSet ? "font-bold" : undefined}>{parameter.label}</span>
        <span className="flex items-center gap-1">
          {isSet && canEdit && (
            <button type="button" onClick={() => reset(parameter.name)} title="Back to the usual value" aria-label={`${parameter.label}: back to the usual value`} className="inline-flex size-7 items-center justify-center text-ink-2 hover:text-live max-md:size-11">
              <Icon name="reset" size={14} />
            </button>
          )}
          <Control parameter={parameter} row={row} isSet={isSet} />
        </span>
      </div>
      <p className="text-small text-ink-2">
        <i>{parameter.why}</i>
        <span className="block text-label text-ink-3">{parameter.source}</span>
      </p>
      {refusal && <RefusalLine refusal={refusal} />}
    </li>
  );
}

function Control({ parameter, row, isSet }: { parameter: ParameterInfo; row: string | undefined; isSet: boolean }) {
  const { session, set, canEdit } = useBench();
  const value = askedValue(session, parameter.name);
  const { name, label, kind, oneOf } = parameter;
  if (kind === "choice") {
    if (!canEdit) return <span>{oneOf?.find((o) => o.value === value)?.label ?? String(value)}</span>;
    return (
      <span className="relative inline-flex items-center">
        <select
          aria-label={label}
          value={String(value)}
          onChange={(event) => set(name, event.target.value)}
          className="min-h-8 max-w-48 appearance-none truncate [field-sizing:content] border-b border-rule-2 bg-transparent pr-5 text-right hover:border-ink hover:text-live max-md:min-h-11"
        >
          {oneOf?.map((o) => <option key={o.value} value={o.value}>{o.label}</option>)}
        </select>
        <Icon name="down" size={12} className="pointer-events-none absolute right-0 text-ink-2" />
      </span>
    );
  }
  if (kind === "switch") {
    return <CheckBox label={<span className="sr-only">{label}</span>} checked={value === true} disabled={!canEdit} onChange={(event) => set(name, event.target.checked)} />;
  }
  return <Figure parameter={name} label={label} kind={kind as FigureKind} look="row" row={row} className={isSet ? undefined : "font-normal! no-underline!"} />;
}
