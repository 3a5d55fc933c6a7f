import { data, Form } from "react-router";
import { may } from "~/auth/permissions";
import { requireReach, requireViewer } from "~/auth/require.server";
import { askedSizeWords } from "~/bench/asked-selects";
import { BriefPicture } from "~/bench/stage/brief-picture";
import { briefOf } from "~/bench/use-cartons";
import { When } from "~/bench/when";
import type { Brief } from "~/cartons/types";
import { listConstructions } from "~/cartons/constructions/registry";
import { Button, ButtonLink, RowLink } from "~/components/button";
import { TextField } from "~/components/field";
import { readListAddress } from "~/components/list-address";
import { EmptyState, Page, PageHeader } from "~/components/page";
import { usePreferences, type UnitName } from "~/components/preferences";
import { type Column, Pages, Table } from "~/components/table";
import { db } from "~/db/client.server";
import { listTemplates, restoreTemplate, templateSorts } from "~/db/queries/templates.server";
import type { Route } from "./+types/list";

export const meta: Route.MetaFunction = () => [{ title: "Templates: Cartonwright" }];

export async function loader({ request, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  const search = new URL(request.url).searchParams;
  const { q, page, sort, direction } = readListAddress(search);
  const templates = await listTemplates(db, viewer, { q, page, pageSize: 25, direction, sort: templateSorts.find((s) => s === sort) });
  return { templates, canStart: may(viewer, "carton.write"), q: q ?? "", address: search.toString() };
}

export async function action({ request, context }: Route.ActionArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "trash.restore");
  const form = await request.formData();
  if (form.get("intent") !== "restore") return data({ refused: ["This page does not know what to do with that. Load it again."] }, 400);
  await restoreTemplate(db, viewer, String(form.get("id") ?? ""));
  return data({ restored: true });
}

type Row = Route.ComponentProps["loaderData"]["templates"]["rows"][number];

const sizeText = (brief: Brief | null, units: UnitName): string => (brief ? askedSizeWords(brief, units) : "");

export default function Templates({ loaderData }: Route.ComponentProps) {
  const { templates, canStart, q, address } = loaderData;
  const { units } = usePreferences();
  const constructions = listConstructions();
  const columns: readonly Column<Row>[] = [
    {
      key: "name", head: "Template", sort: "name",
      cell: (row) => (
        <span className="flex items-center gap-4">
          <span className="flex w-16 shrink-0 justify-center max-md:hidden"><BriefPicture brief={row.brief} width={60} height={44} /></span>
          <span>
            <RowLink to={`/templates/${row.id}`}>{row.name}</RowLink>
            {row.note && <span className="line-clamp-2 max-w-md text-small text-ink-2">{row.note}</span>}
          </span>
        </span>
      ),
    },
    { key: "client", head: "For", sort: "client", least: true, cell: (row) => row.clientName ?? "every client" },
    { key: "construction", head: "Construction", sort: "construction", least: true, cell: (row) => constructions.find((c) => c.id === row.construction)?.name ?? row.construction },
    { key: "size", head: "Size", align: "right", least: true, cell: (row) => <span className="whitespace-nowrap">{sizeText(briefOf(row.brief), units)}</span> },
    { key: "updated", head: "Saved", sort: "updated", align: "right", least: true, cell: (row) => <span className="text-small"><When at={row.updatedAt} /></span> },
    ...(canStart ? [{ key: "start", head: "Start", align: "right" as const, cell: (row: Row) => <ButtonLink to={`/cartons/new?template=${row.id}`} look="plain" aria-label={`Start a carton from ${row.name}`} className="whitespace-nowrap">Start</ButtonLink> }] : []),
  ];
  if (templates.total === 0 && !q) {
    return (
      <Page>
        <EmptyState level={1} title="No template yet" action={canStart ? <ButtonLink to="/cartons" look="main">Open a carton</ButtonLink> : undefined}>
          <p>A template keeps what was asked of a carton, to start others from: for another client, in another size. Open a carton that came out well and keep it as a template; the sheet under the two lines at the right of its strip has it.</p>
        </EmptyState>
      </Page>
    );
  }
  return (
    <Page>
      <PageHeader title="Templates" aside="to start other cartons from" />
      <Form method="get" className="flex flex-wrap items-end gap-3 py-5" key={address}>
        <TextField label="Search" name="q" defaultValue={q} placeholder="name, note or client" className="w-60 max-md:w-full" />
        <Button type="submit">Show them</Button>
        {q && <ButtonLink to="/templates" look="plain" className="mb-2">Show all</ButtonLink>}
      </Form>
      {templates.total === 0 ? (
        <EmptyState title="No template like that" action={<ButtonLink to="/templates" look="main">Show all templates</ButtonLink>}><p>Search for fewer words.</p></EmptyState>
      ) : (
        <>
          <Table caption="Templates" columns={columns} rows={templates.rows} rowKey={(row) => row.id} sortedBy={{ column: "name", direction: "up" }} csv={`/templates/csv?${address}`} count={templates.total === 1 ? "1 template" : `${templates.total} templates`} />
          <Pages page={templates.page} pageCount={templates.pageCount} />
        </>
      )}
    </Page>
  );
}
