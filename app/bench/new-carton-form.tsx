// Everything that a new carton needs, with the blank beside it from the first figure on.
import { type ReactNode, useState } from "react";
import { Form, useNavigation } from "react-router";
import { Button } from "~/components/button";
import { RadioGroup, SelectField, TextField } from "~/components/field";
import { Icon } from "~/components/icon";
import { LengthField } from "~/components/length-field";
import { Page, PageHeader } from "~/components/page";
import { usePreferences } from "~/components/preferences";
import type { Board } from "~/cartons/boards/board";
import type { Axis, ConstructionInfo, SizeBasis } from "~/cartons/types";
import { closesSentence } from "~/copy/fold-check";
import { findingSentence } from "~/copy/findings";
import { boardGroups } from "./board-choices";
import { FoldedPicture } from "./folded-picture";
import { kindOf, showOption, showSize, withUnit } from "./lengths";
import { refusalWords } from "./refusal-words";
import { type Session, withBasis, withConstruction, withDefault, withValue } from "./session";
import { SizesLine } from "./sizes-line";
import { FlatPicture } from "./stage/flat-picture";
import { useSession } from "./use-session";

export interface NewCartonFormProps {
  opened: Session;
  boards: readonly Board[];
  constructions: readonly ConstructionInfo[];
  clients: readonly { readonly id: string; readonly name: string }[];
  /** What was typed before, and what is wrong with it. */
  values?: Readonly<Record<string, string>>;
  errors?: Readonly<Record<string, readonly string[]>>;
  /** A sentence about the whole: the database is away, the sign-in has ended. */
  problem?: string | null;
  /** Where it starts from a template: its name, and what no longer fits. */
  above?: ReactNode;
  title: string;
}

const axes: readonly { readonly axis: Axis; readonly label: string }[] = [{ axis: "L", label: "Length" }, { axis: "W", label: "Width" }, { axis: "D", label: "Depth" }];
const bases: readonly { readonly value: SizeBasis; readonly label: string }[] = [
  { value: "inside", label: "inside" },
  { value: "product", label: "the product's" },
  { value: "crease", label: "crease to crease" },
  { value: "outside", label: "outside" },
];

export function NewCartonForm({ opened, boards, constructions, clients, values = {}, errors = {}, problem, above, title }: NewCartonFormProps) {
  const [session, dispatch] = useSession(opened, boards);
  const { units } = usePreferences();
  const { state } = useNavigation();
  const [unread, setUnread] = useState<ReadonlySet<string>>(new Set());
  const { asked, refusals } = session;
  const construction = constructions.find((c) => c.id === asked.construction) ?? session.carton.construction;
  const refusalOf = (parameter: string) => refusals.find((r) => r.parameter === parameter);
  const set = (parameter: string, value: number | string, typed?: string) => dispatch({ type: "edit", change: (brief) => withValue(brief, parameter, value, typed) });
  const readable = (parameter: string) => (is: boolean) => setUnread((before) => new Set(is ? [...before].filter((p) => p !== parameter) : [...before, parameter]));
  const mendOf = (parameter: string) => {
    const nearest = refusalOf(parameter)?.nearest;
    if (nearest === null || nearest === undefined || typeof nearest === "boolean") return null;
    return <Button look="mend" onClick={() => set(parameter, nearest)}>Make it {showOption(nearest, parameter, kindOf(construction, parameter), units, construction)}</Button>;
  };
  const sentenceOf = (parameter: string) => {
    const refusal = refusalOf(parameter);
    return refusal && refusalWords(refusal, asked.construction, units);
  };
  const shownElsewhere = new Set(["L", "W", "D", "room", "board", "construction"]);
  const others = refusals.filter((r) => !shownElsewhere.has(r.parameter));
  const toMend = refusals.length + unread.size;
  const board = boards.find((b) => b.id === asked.board);

  return (
    <Page>
      <PageHeader title={title} />
      <div className="grid gap-x-14 lg:grid-cols-[minmax(0,1fr)_380px]">
        <Form method="post" noValidate onSubmit={(event) => toMend > 0 && event.preventDefault()}>
          <input type="hidden" name="brief" value={JSON.stringify(asked)} />
          {above}
          {problem && <p role="alert" className="flex items-start gap-2 border-b border-rule py-4 text-stop"><Icon name="stop" className="mt-1" /> {problem}</p>}
          <Row title="Carton">
            <TextField label="Name" name="name" defaultValue={values.name} error={errors.name} required className="w-full max-w-md" placeholder="Bar carton 90 g" />
            <SelectField label="Client" name="clientId" defaultValue={values.clientId} error={errors.clientId} choices={[{ value: "", label: "The studio itself" }, ...clients.map((c) => ({ value: c.id, label: c.name }))]} className="w-full max-w-md" />
          </Row>
          <Row title="Construction">
            <SelectField
              label="Construction"
              hideLabel
              value={asked.construction}
              onChange={(event) => dispatch({ type: "edit", change: (brief) => withConstruction(brief, event.target.value) })}
              choices={constructions.map((c) => ({ value: c.id, label: c.name }))}
              error={sentenceOf("construction")}
              hint={construction.summary}
              className="w-full max-w-md"
            />
          </Row>
          <Row title="Size">
            {axes.map(({ axis, label }) => (
              <LengthField
                key={axis}
                label={label}
                value={asked.size[axis]}
                typed={asked.typed[axis]}
                units={units}
                onChange={(mm, typed) => set(axis, mm, typed)}
                onReadable={readable(axis)}
                error={sentenceOf(axis)}
                mend={mendOf(axis)}
                className="w-40 max-md:w-full"
              />
            ))}
            <p className="w-full text-small text-ink-2">{construction.meaning}. Sums and units work: 80+2*1, 4 3/4in.</p>
          </Row>
          <Row title="These sizes are">
            <RadioGroup legend="These sizes are" hideLegend name="basis" value={asked.basis} onChange={(basis) => dispatch({ type: "edit", change: (brief) => withBasis(brief, basis as SizeBasis) })} choices={bases} />
            {asked.basis === "product" && (
              <LengthField label="Room on each side" value={asked.room} typed={asked.typed.room} units={units} onChange={(mm, typed) => set("room", mm, typed)} onReadable={readable("room")} error={sentenceOf("room")} className="w-40" hint="so that it goes in and comes out" />
            )}
          </Row>
          <Row title="Board">
            <SelectField
              label="Board"
              hideLabel
              value={asked.board}
              onChange={(event) => set("board", event.target.value)}
              choices={boardGroups(boards, construction.families, asked.board).flatMap((group) => group.boards.map((b) => ({ value: b.id, label: `${b.name}, ${withUnit(b.caliper, "length", units)}`, group: group.label })))}
              error={sentenceOf("board")}
              mend={mendOf("board")}
              hint={board && `${board.plainGrade}, ${board.grammage} g/m²`}
              className="w-full max-w-md"
            />
          </Row>
          {others.length > 0 && (
            <Row title="Options that do not fit">
              <ul className="w-full">
                {others.map((refusal) => (
                  <li key={refusal.parameter} className="flex items-start gap-2 py-1 text-small text-stop">
                    <Icon name="stop" size={14} className="mt-0.5" />
                    <span>
                      {refusalWords(refusal, asked.construction, units)}{" "}
                      {mendOf(refusal.parameter) ?? <Button look="mend" onClick={() => dispatch({ type: "edit", change: (brief) => withDefault(brief, refusal.parameter) })}>Take the usual value</Button>}
                    </span>
                  </li>
                ))}
              </ul>
            </Row>
          )}
          <div className="flex flex-wrap items-center gap-4 pt-6">
            <Button look="main" type="submit" busy={state !== "idle"} disabled={toMend > 0} title={toMend > 0 ? "Mend the figures first" : undefined}>Take it to the Bench</Button>
            <span className="ml-auto text-small font-bold text-stop" role="status">{toMend === 0 ? "" : toMend === 1 ? "1 figure to mend" : `${toMend} figures to mend`}</span>
          </div>
        </Form>
        <Preview session={session} isStale={toMend > 0} />
      </div>
    </Page>
  );
}

function Row({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div className="grid gap-x-6 gap-y-2 border-b border-rule py-5 md:grid-cols-[170px_minmax(0,1fr)]">
      <h2 className="text-figure font-black">{title}</h2>
      <div className="flex flex-wrap items-start gap-x-4 gap-y-3">{children}</div>
    </div>
  );
}

function Preview({ session, isStale }: { session: Session; isStale: boolean }) {
  const { units } = usePreferences();
  const { carton } = session;
  return (
    <aside aria-label="What this makes" className="pt-5 max-lg:border-t-2 max-lg:border-ink max-lg:mt-8">
      <h2 className="border-b-2 border-ink pb-2 text-h2 font-black">What this makes</h2>
      <div className={isStale ? "opacity-55" : undefined}>
        <FlatPicture carton={carton} width={380} height={270} title={`${carton.construction.name}, flat`} className="mt-4 h-auto w-full" />
        <FoldedPicture carton={carton} width={380} height={200} title={`${carton.construction.name}, closed`} className="mt-3 h-auto w-full" />
      </div>
      <p className="border-t border-rule pt-3 text-small" role="status">
        {isStale ? `The pictures show the last figures that held: ${showSize(carton.inside, units)} inside. They follow when the figures are mended.` : closesSentence(carton, (size) => showSize(size, units))}
      </p>
      {!isStale && carton.findings.map((finding, i) => (
        <p key={i} className="flex items-start gap-2 pt-2 text-small"><Icon name="warning" size={14} className="mt-0.5" /> {findingSentence(finding, (mm) => withUnit(mm, "length", units))}</p>
      ))}
      <SizesLine carton={carton} units={units} className="pt-3" />
    </aside>
  );
}
