import { useMemo } from "react";
import { Form, useSearchParams } from "react-router";
import { type Drawn, drawn, sampleBrief } from "~/bench/use-cartons";
import { FoldedPicture } from "~/bench/folded-picture";
import { readFigure, showSize, withUnit } from "~/bench/lengths";
import { FlatPicture, flatScale } from "~/bench/stage/flat-picture";
import { scaleWords } from "~/bench/view";
import { listConstructions } from "~/cartons/constructions/registry";
import type { ConstructionInfo, Size } from "~/cartons/types";
import { Button, ButtonLink, Link } from "~/components/button";
import { classNames } from "~/components/class-names";
import { TextField } from "~/components/field";
import { EmptyState, Page, PageHeader } from "~/components/page";
import { type UnitName, usePreferences } from "~/components/preferences";
import { useHydrated } from "~/components/use-hydrated";
import { refusalSentence } from "~/copy/refusals";
import type { Route } from "./+types/gallery";

export const meta: Route.MetaFunction = () => [{ title: "Constructions: Cartonwright" }];

const PLATE = { width: 310, height: 168, foldedWidth: 190 };

export default function Gallery() {
  const [search] = useSearchParams();
  const { units } = usePreferences();
  const contents = useMemo(() => readContents(search, units), [search, units]);
  const all = listConstructions();
  const shown = all.filter((construction) => matches(construction, search));
  const plates = useMemo(() => shown.map((construction) => ({ construction, drawn: drawn(sampleBrief(construction, contents.size)) })), [shown.map((c) => c.id).join(" "), contents.size]);
  const holding = plates.filter((plate): plate is Plate & { drawn: { carton: object } } => plate.drawn.carton !== null);
  const refusing = plates.filter((plate) => plate.drawn.carton === null);
  // Around the same contents all blanks are drawn to one scale; samples of their own size each fill their plate.
  const oneScale = contents.size ? Math.min(...holding.map((plate) => flatScale(plate.drawn.carton, PLATE.width, PLATE.height))) : null;
  const isFiltered = [...search.keys()].length > 0;

  return (
    <Page>
      <PageHeader title="Constructions" aside={contents.size ? `${holding.length} of ${all.length} hold ${showSize(contents.size, units)}` : `${shown.length === all.length ? all.length : `${shown.length} of ${all.length}`} to start from`}>
        {isFiltered && <Link to="?" preventScrollReset>Clear</Link>}
      </PageHeader>
      <Filters search={search} />
      <ContentsForm search={search} units={units} errors={contents.errors} />
      {shown.length === 0 ? (
        <EmptyState title="None like that" action={<ButtonLink to="?" look="main">Show all</ButtonLink>}>
          <p>No construction has all of this. Take a filter away, or search for another word.</p>
        </EmptyState>
      ) : (
        <ul className="grid border-t-2 border-ink md:grid-cols-2">
          {holding.map(({ construction, drawn }, i) => (
            <li key={construction.id} className={classNames("min-w-0 border-b border-rule py-4", i % 2 === 0 ? "md:pr-5" : "md:border-l md:pl-5")}>
              <PlateOf construction={construction} carton={drawn.carton} oneScale={oneScale} contents={contents.size} units={units} />
            </li>
          ))}
        </ul>
      )}
      {refusing.length > 0 && (
        <section className="pt-8">
          <h2 className="border-b-2 border-ink pb-2 text-h2 font-black">Do not hold it</h2>
          <ul>
            {refusing.map(({ construction, drawn }) => (
              <li key={construction.id} className="border-b border-rule py-2.5">
                <b>{construction.name}.</b> <span className="text-ink-2">{drawn.refusals?.map((r) => refusalSentence({ ...r, nearest: null }, construction.id, (mm) => withUnit(mm, "length", units))).join(" ")}</span>
              </li>
            ))}
          </ul>
        </section>
      )}
    </Page>
  );
}

interface Plate {
  readonly construction: ConstructionInfo;
  readonly drawn: Drawn;
}

function PlateOf({ construction, carton, oneScale, contents, units }: { construction: ConstructionInfo; carton: NonNullable<Drawn["carton"]>; oneScale: number | null; contents: Size | null; units: UnitName }) {
  // A carton half way through a step is turned by sines: server and browser may differ in their last digit.
  const isHydrated = useHydrated();
  const scale = oneScale ?? flatScale(carton, PLATE.width, PLATE.height);
  const size = new URLSearchParams({ construction: construction.id, ...(contents ? { L: String(contents.L), W: String(contents.W), D: String(contents.D), basis: "product" } : {}) });
  return (
    <article aria-labelledby={`plate-${construction.id}`}>
      <div className="flex items-center justify-between gap-4 overflow-hidden">
        <FlatPicture carton={carton} width={PLATE.width} height={PLATE.height} scale={scale} title={`${construction.name}, flat`} className="h-[168px] min-w-0 flex-1" />
        <span className="block h-[168px] w-[190px] shrink-0 max-[430px]:w-32">
          {isHydrated && <FoldedPicture carton={carton} u={carton.fold.steps.length - 0.45} width={PLATE.foldedWidth} height={PLATE.height} title={`${construction.name}, folded`} className="h-full w-full" />}
        </span>
      </div>
      <div className="flex flex-wrap items-baseline gap-x-3 pt-2">
        <h2 id={`plate-${construction.id}`} className="text-h2 font-black">{construction.name}</h2>
        <span className="text-small text-ink-2" title={construction.codes.map((c) => c.source).join(" ")}>
          {construction.codes.length === 0 ? "no code" : construction.codes.map((c) => `${c.system} ${c.code}`).join(", ")}
        </span>
        <span className="ml-auto text-small text-ink-3 max-md:hidden">flat {scaleWords(scale)}</span>
      </div>
      <p className="pt-1 text-ink-2">{construction.summary}</p>
      <p className="pt-1 text-small text-ink-3">
        {construction.families.map((f) => (f === "carton" ? "cartonboard" : "micro-flute")).join(" or ")}, {construction.glued ? "glued" : "no glue"}, {construction.pieces === 1 ? "one piece" : `${construction.pieces} pieces`}. Shown {showSize(carton.inside, units)} inside, {carton.board.name}; blank {withUnit(carton.blank.width, "length", units).replace(` ${units}`, "")} × {withUnit(carton.blank.height, "length", units)}.
      </p>
      <ButtonLink to={`/cartons/new?${size}`} size="small" className="mt-3" aria-label={`Take ${construction.name} to the Bench`}>Take it to the Bench</ButtonLink>
    </article>
  );
}

const filters = [
  { name: "board", title: "Board", choices: [["", "any"], ["carton", "cartonboard"], ["micro", "micro-flute"]] },
  { name: "glue", title: "Glue", choices: [["", "any"], ["yes", "glued"], ["no", "no glue"]] },
  { name: "pieces", title: "Pieces", choices: [["", "any"], ["1", "one"], ["2", "two"]] },
] as const;

function Filters({ search }: { search: URLSearchParams }) {
  const to = (name: string, value: string) => {
    const next = new URLSearchParams(search);
    if (value) next.set(name, value);
    else next.delete(name);
    return `?${next}`;
  };
  return (
    <div className="flex flex-wrap items-center gap-x-9 gap-y-1 py-3">
      {filters.map(({ name, title, choices }) => (
        <div key={name} role="group" aria-label={title} className="flex items-center gap-3 text-small">
          <span className="font-bold text-ink-2">{title}</span>
          {choices.map(([value, label]) => {
            const isChosen = (search.get(name) ?? "") === value;
            return (
              <ButtonLink key={value} to={to(name, value)} preventScrollReset look="plain" aria-current={isChosen ? "true" : undefined} className={isChosen ? "decoration-2! decoration-ink! font-bold" : "no-underline! text-ink-2"}>
                {label}
              </ButtonLink>
            );
          })}
        </div>
      ))}
    </div>
  );
}

function ContentsForm({ search, units, errors }: { search: URLSearchParams; units: UnitName; errors: Readonly<Record<string, string>> }) {
  const kept = [...search].filter(([name]) => !["L", "W", "D", "q"].includes(name));
  return (
    <Form method="get" preventScrollReset className="flex flex-wrap items-start gap-3 pb-5" key={search.toString()}>
      {kept.map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />)}
      <TextField label="Search" name="q" defaultValue={search.get("q") ?? ""} placeholder="name, code or word" className="w-52 max-md:w-full" />
      {(["L", "W", "D"] as const).map((axis, i) => (
        <TextField key={axis} label={["Contents, length", "width", "depth"][i]!} name={axis} defaultValue={search.get(axis) ?? ""} error={errors[axis]} placeholder={units} inputMode="text" className="w-32 max-md:w-[calc(33%-8px)]" />
      ))}
      <div className="self-end"><Button type="submit">Show what holds them</Button></div>
    </Form>
  );
}

function readContents(search: URLSearchParams, units: UnitName): { size: Size | null; errors: Record<string, string> } {
  const errors: Record<string, string> = {};
  const size: Record<string, number> = {};
  const typed = (["L", "W", "D"] as const).filter((axis) => (search.get(axis) ?? "").trim() !== "");
  if (typed.length === 0) return { size: null, errors };
  for (const axis of ["L", "W", "D"] as const) {
    const reading = readFigure(search.get(axis) ?? "", "length", units);
    if (!reading.ok) errors[axis] = reading.sentence;
    else if (reading.value <= 0) errors[axis] = "Type a figure above 0.";
    else size[axis] = reading.value;
  }
  return { size: Object.keys(errors).length === 0 ? (size as unknown as Size) : null, errors };
}

function matches(construction: ConstructionInfo, search: URLSearchParams): boolean {
  const board = search.get("board");
  const glue = search.get("glue");
  const pieces = search.get("pieces");
  const words = (search.get("q") ?? "").toLowerCase().split(/\s+/).filter(Boolean);
  const text = [construction.name, construction.summary, construction.closes, construction.meaning, ...construction.codes.map((c) => `${c.system} ${c.code}`)].join(" ").toLowerCase();
  return (
    (board !== "carton" && board !== "micro" ? true : construction.families.includes(board)) &&
    (glue === "yes" ? construction.glued : glue === "no" ? !construction.glued : true) &&
    (pieces === "1" || pieces === "2" ? construction.pieces === Number(pieces) : true) &&
    words.every((word) => text.includes(word))
  );
}
