import { data, Form } from "react-router";
import { may } from "~/auth/permissions";
import { requireReach, requireViewer } from "~/auth/require.server";
import { BriefPicture } from "~/bench/stage/brief-picture";
import { showSize } from "~/bench/lengths";
import { briefOf } from "~/bench/use-cartons";
import { When } from "~/bench/when";
import { basisWords } from "~/bench/asked-selects";
import { findBoard } from "~/cartons/boards/catalogue";
import type { Brief } from "~/cartons/types";
import { listConstructions } from "~/cartons/constructions/registry";
import { Button, ButtonLink, RowLink } from "~/components/button";
import { SelectField, TextField } from "~/components/field";
import { readListAddress } from "~/components/list-address";
import { EmptyState, Page, PageHeader } from "~/components/page";
import { usePreferences, type UnitName } from "~/components/preferences";
import { type Column, Pages, Table } from "~/components/table";
import { db } from "~/db/client.server";
import { cartonSorts, listCartons, restoreCarton } from "~/db/queries/cartons.server";
import { listClientChoices } from "~/db/queries/clients.server";
import type { Route } from "./+types/list";

export const meta: Route.MetaFunction = () => [{ title: "Cartons: Cartonwright" }];

export async function loader({ request, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  const search = new URL(request.url).searchParams;
  const { q, page, sort, direction } = readListAddress(search);
  const [cartons, clients] = await Promise.all([
    listCartons(db, viewer, {
      q, page, pageSize: 25, direction,
      sort: cartonSorts.find((s) => s === sort),
      clientId: search.get("client") || undefined,
      construction: search.get("construction") || undefined,
    }),
    listClientChoices(db, viewer),
  ]);
  return { cartons, clients, canEdit: may(viewer, "carton.write"), isFiltered: Boolean(q || search.get("client") || search.get("construction")), address: search.toString(), q: q ?? "", client: search.get("client") ?? "", construction: search.get("construction") ?? "" };
}

export async function action({ request, context }: Route.ActionArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "trash.restore");
  const form = await request.formData();
  if (form.get("intent") !== "restore") return data({ refused: ["This page does not know what to do with that. Load it again."] }, 400);
  await restoreCarton(db, viewer, String(form.get("id") ?? ""));
  return data({ restored: true });
}

type Row = Route.ComponentProps["loaderData"]["cartons"]["rows"][number];

function SizeOf({ brief, units }: { brief: Brief | null; units: UnitName }) {
  if (!brief) return "";
  return <span className="whitespace-nowrap max-md:text-small">{showSize(brief.size, units)} <span className="block text-label text-ink-3">{basisWords[brief.basis]}</span></span>;
}

export default function Cartons({ loaderData }: Route.ComponentProps) {
  const { cartons, clients, canEdit, isFiltered, address, q, client, construction } = loaderData;
  const { units } = usePreferences();
  const constructions = listConstructions();
  const columns: readonly Column<Row>[] = [
    {
      key: "name", head: "Carton", sort: "name",
      cell: (row) => (
        <span className="flex items-center gap-4">
          <span className="flex w-16 shrink-0 justify-center max-md:hidden"><BriefPicture brief={row.brief} width={60} height={44} /></span>
          <RowLink to={`/cartons/${row.id}`}>{row.name}</RowLink>
        </span>
      ),
    },
    { key: "client", head: "Client", sort: "client", least: true, cell: (row) => row.clientName ?? "The studio" },
    { key: "construction", head: "Construction", sort: "construction", least: true, cell: (row) => constructions.find((c) => c.id === row.construction)?.name ?? row.construction },
    { key: "size", head: "Size", align: "right", cell: (row) => <SizeOf brief={briefOf(row.brief)} units={units} /> },
    { key: "board", head: "Board", least: true, cell: (row) => findBoard(row.board)?.name ?? row.board },
    { key: "updated", head: "Saved", sort: "updated", align: "right", least: true, cell: (row) => <span className="text-small"><When at={row.updatedAt} /><span className="block text-label text-ink-3 max-md:hidden">{row.updatedBy}</span></span> },
  ];
  const add = canEdit && <ButtonLink to="/cartons/new" look="main">New carton</ButtonLink>;
  if (cartons.total === 0 && !isFiltered) {
    return (
      <Page>
        <EmptyState level={1} title="No carton yet" action={canEdit ? <><ButtonLink to="/constructions" look="main">Choose a construction</ButtonLink><ButtonLink to="/cartons/new" look="plain">Type a size first</ButtonLink></> : undefined} picture={<SamplePicture />}>
          <p>{canEdit ? "A carton begins with a construction, the size of what goes inside, and a board. The blank is drawn at once." : "The studio has not put a carton here for you yet."}</p>
        </EmptyState>
      </Page>
    );
  }
  return (
    <Page>
      <PageHeader title="Cartons">{add}</PageHeader>
      <Form method="get" className="flex flex-wrap items-end gap-3 py-5" key={address}>
        <TextField label="Search" name="q" defaultValue={q} placeholder="name, note or client" className="w-60 max-md:w-full" />
        {clients.length > 1 && <SelectField label="Client" name="client" defaultValue={client} choices={[{ value: "", label: "all clients" }, ...clients.map((c) => ({ value: c.id, label: c.name }))]} className="w-52 max-md:w-full" />}
        <SelectField label="Construction" name="construction" defaultValue={construction} choices={[{ value: "", label: "all constructions" }, ...constructions.map((c) => ({ value: c.id, label: c.name }))]} className="w-52 max-md:w-full" />
        <Button type="submit">Show them</Button>
        {isFiltered && <ButtonLink to="/cartons" look="plain" className="mb-2">Show all</ButtonLink>}
      </Form>
      {cartons.total === 0 ? (
        <EmptyState title="No carton like that" action={<ButtonLink to="/cartons" look="main">Show all cartons</ButtonLink>}><p>Search for fewer words, or for another client.</p></EmptyState>
      ) : (
        <>
          <Table caption="Cartons" columns={columns} rows={cartons.rows} rowKey={(row) => row.id} sortedBy={{ column: "updated", direction: "down" }} csv={`/cartons/csv?${address}`} count={cartons.total === 1 ? "1 carton" : `${cartons.total} cartons`} />
          <Pages page={cartons.page} pageCount={cartons.pageCount} />
        </>
      )}
    </Page>
  );
}

function SamplePicture() {
  const construction = listConstructions()[0];
  return construction ? <BriefPicture brief={{ construction: construction.id, size: construction.sample.size, board: construction.sample.board, basis: "inside", room: 1, options: {}, typed: {} }} width={440} height={320} /> : null;
}
