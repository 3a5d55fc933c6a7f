import { may } from "~/auth/permissions";
import { requireViewer } from "~/auth/require.server";
import { askedSizeWords } from "~/bench/asked-selects";
import { withUnit } from "~/bench/lengths";
import { BriefPicture } from "~/bench/stage/brief-picture";
import { briefOf, drawn } from "~/bench/use-cartons";
import { When } from "~/bench/when";
import { listConstructions } from "~/cartons/constructions/registry";
import { ButtonLink, Link, RowLink } from "~/components/button";
import { EmptyState, Page, PageHeader, Section } from "~/components/page";
import { type UnitName, usePreferences } from "~/components/preferences";
import { StateBadge } from "~/components/state-badge";
import { findingSentence } from "~/copy/findings";
import { refusalSentence } from "~/copy/refusals";
import { db } from "~/db/client.server";
import { listCartons } from "~/db/queries/cartons.server";
import { listTemplates } from "~/db/queries/templates.server";
import type { Route } from "./+types/desk";

export const meta: Route.MetaFunction = () => [{ title: "Desk: Cartonwright" }];

/** So many of the newest cartons are looked through for what waits. */
const LOOKED_AT = 30;
const SHOWN = 6;

export async function loader({ context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  const [cartons, templates] = await Promise.all([
    listCartons(db, viewer, { page: 1, pageSize: LOOKED_AT }),
    may(viewer, "template.read") ? listTemplates(db, viewer, { page: 1, pageSize: SHOWN, sort: "updated" }) : null,
  ]);
  return { cartons: cartons.rows, total: cartons.total, templates: templates?.rows ?? [], canEdit: may(viewer, "carton.write"), name: viewer.name, clientName: viewer.clientName };
}

type Row = Route.ComponentProps["loaderData"]["cartons"][number];
interface Waiting {
  readonly row: Row;
  readonly sentence: string;
}

export default function Desk({ loaderData }: Route.ComponentProps) {
  const { cartons, total, templates, canEdit, clientName } = loaderData;
  const { units } = usePreferences();
  const waiting = canEdit ? cartons.flatMap((row) => waitingFor(row, units)) : [];
  const held = new Set(waiting.map(({ row }) => row.id));
  const others = cartons.filter((row) => !held.has(row.id)).slice(0, SHOWN);
  if (total === 0) {
    const sample = listConstructions().find((c) => c.pieces === 1 && !c.glued) ?? listConstructions()[0];
    return (
      <Page>
        <EmptyState
          level={1}
          title={canEdit ? "A clear desk" : "Nothing here yet"}
          action={canEdit ? <><ButtonLink to="/constructions" look="main">Choose a construction</ButtonLink><ButtonLink to="/cartons/new" look="plain">Type a size first</ButtonLink></> : undefined}
          picture={sample && <BriefPicture brief={{ construction: sample.id, size: sample.sample.size, board: sample.sample.board, basis: "inside", room: 1, options: {}, typed: {} }} width={460} height={360} />}
        >
          <p>{canEdit ? "Cartons that you work on, and what waits to be mended on them, stand here. The first one begins with a construction." : clientName ? `The studio has not put a carton of ${clientName} here yet. When it does, it stands on this page.` : "The studio has not put a carton here yet."}</p>
        </EmptyState>
      </Page>
    );
  }
  return (
    <Page>
      <PageHeader title="Desk" large aside={clientName ?? (waiting.length === 0 ? "Nothing waits." : waiting.length === 1 ? "One carton waits to be mended." : `${waiting.length} cartons wait to be mended.`)}>
        {canEdit && <ButtonLink to="/cartons/new" look="main">New carton</ButtonLink>}
      </PageHeader>
      {waiting.length > 0 && (
        <Section title="To mend" aside="what the fold check or today's constructions found" rule="none">
          <ul className="border-t border-rule">{waiting.map(({ row, sentence }) => <DeskRow key={row.id} row={row} units={units} sentence={sentence} />)}</ul>
        </Section>
      )}
      {others.length > 0 && (
        <Section title={canEdit ? "Worked lately" : "Cartons"} rule={waiting.length > 0 ? "solid" : "none"} aside={total > SHOWN ? <Link to="/cartons">All {total} cartons</Link> : undefined}>
          <ul className="border-t border-rule">{others.map((row) => <DeskRow key={row.id} row={row} units={units} sentence={null} />)}</ul>
        </Section>
      )}
      {templates.length > 0 && (
        <Section title="Templates" aside={<Link to="/templates">All templates</Link>}>
          <ul className="grid gap-x-8 border-t border-rule md:grid-cols-2">
            {templates.map((template) => (
              <li key={template.id} className="flex items-center gap-4 border-b border-rule py-2.5">
                <span className="flex w-16 shrink-0 justify-center"><BriefPicture brief={template.brief} width={60} height={44} /></span>
                <span className="min-w-0 flex-1">
                  <RowLink to={`/templates/${template.id}`}>{template.name}</RowLink>
                  <span className="block truncate text-small text-ink-2">{template.clientName ?? "for every client"}</span>
                </span>
                {canEdit && <Link to={`/cartons/new?template=${template.id}`} aria-label={`Start a carton from ${template.name}`}>Start</Link>}
              </li>
            ))}
          </ul>
        </Section>
      )}
    </Page>
  );
}

/** Findings of error or warning, or a brief that today's construction refuses. */
function waitingFor(row: Row, units: UnitName): readonly Waiting[] {
  const brief = briefOf(row.brief);
  if (!brief) return [];
  const { construction } = brief;
  const format = (mm: number) => withUnit(mm, "length", units);
  const { carton, refusals } = drawn(brief);
  const refusal = refusals?.[0];
  if (!carton) return refusal ? [{ row, sentence: refusalSentence(refusal, construction, format) }] : [];
  const finding = carton.findings.find((f) => f.severity !== "note");
  return finding ? [{ row, sentence: findingSentence(finding, format) }] : [];
}

function DeskRow({ row, units, sentence }: { row: Row; units: UnitName; sentence: string | null }) {
  const brief = briefOf(row.brief);
  return (
    <li className="grid grid-cols-[64px_minmax(0,1fr)] items-center gap-x-4 gap-y-1 border-b border-rule py-3 md:grid-cols-[76px_minmax(0,1fr)_minmax(0,1.4fr)_220px] md:gap-x-6">
      <span className="flex justify-center max-md:row-span-3 max-md:self-start max-md:pt-1"><BriefPicture brief={row.brief} width={64} height={48} /></span>
      <span className="min-w-0">
        <RowLink to={`/cartons/${row.id}`}>{row.name}</RowLink>
        <span className="block text-small text-ink-2">{row.clientName ?? "The studio"}</span>
      </span>
      <span className="min-w-0">
        {sentence ? (
          <span className="flex items-start gap-2"><StateBadge state="warning">{" "}</StateBadge><span>{sentence}</span></span>
        ) : (
          brief && <span>{listConstructions().find((c) => c.id === brief.construction)?.name ?? brief.construction}, {askedSizeWords(brief, units)}</span>
        )}
      </span>
      <span className="text-right text-small text-ink-2 max-md:text-left">Saved <When at={row.updatedAt} />, {row.updatedBy}</span>
    </li>
  );
}
