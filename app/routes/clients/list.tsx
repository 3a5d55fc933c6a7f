import { data, Form, Link as RouterLink, redirect, useNavigation } from "react-router";
import { requireReach, requireViewer } from "~/auth/require.server";
import { Button } from "~/components/button";
import { ErrorSentence, TextArea, TextField } from "~/components/field";
import { readListAddress } from "~/components/list-address";
import { Page, PageHeader, Section } from "~/components/page";
import { type Column, Pages, Table } from "~/components/table";
import { problemOf } from "~/copy/errors";
import { db } from "~/db/client.server";
import { createClient, listClients } from "~/db/queries/clients.server";
import { clientSchema } from "~/forms/client";
import { parseForm, type FieldErrors } from "~/forms/parse-form";
import type { Route } from "./+types/list";

export const meta: Route.MetaFunction = () => [{ title: "Clients: Cartonwright" }];

export async function loader({ request, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "client.write");
  const { q, page } = readListAddress(new URL(request.url).searchParams);
  return { clients: await listClients(db, viewer, { q, page, pageSize: 25 }), q: q ?? "" };
}

export async function action({ request, context }: Route.ActionArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "client.write");
  const parsed = parseForm(await request.formData(), clientSchema);
  if (!parsed.ok) return data({ errors: parsed.errors, values: parsed.values }, 400);
  return redirect(`/clients/${await createClient(db, viewer, parsed.value)}`);
}

type Row = Route.ComponentProps["loaderData"]["clients"]["rows"][number];
const COLUMNS: readonly Column<Row>[] = [
  { key: "name", head: "Client", cell: (row) => <RouterLink to={`/clients/${row.id}`} className="inline-flex min-h-6 items-center font-bold hover:text-live max-md:min-h-11">{row.name}</RouterLink> },
  { key: "note", head: "Note", cell: (row) => <span className="text-ink-2">{row.note.split("\n")[0]}</span>, least: true },
  { key: "cartons", head: "Cartons", align: "right", cell: (row) => row.cartonCount },
];

export default function Clients({ loaderData, actionData }: Route.ComponentProps) {
  const { clients, q } = loaderData;
  const answer = actionData as { errors?: FieldErrors; values?: Record<string, string> } | undefined;
  const problem = problemOf(actionData)?.sentence;
  const isBusy = useNavigation().state !== "idle";
  return (
    <Page>
      <PageHeader title="Clients" aside="Whose cartons these are" />
      <Form className="flex flex-wrap items-end gap-3 py-5" role="search">
        <TextField label="Find" name="q" defaultValue={q} className="w-64" />
        <Button type="submit">Find</Button>
      </Form>
      {clients.rows.length > 0
        ? <Table caption="Clients" columns={COLUMNS} rows={clients.rows} rowKey={(row) => row.id} csv={`/clients/csv${q ? `?q=${encodeURIComponent(q)}` : ""}`} count={`${clients.total} ${clients.total === 1 ? "client" : "clients"}`} />
        : <p className="py-6 text-ink-2">{q ? `No client is called “${q}”. Type less of the name.` : "No clients yet. Add the first one below."}</p>}
      <Pages page={clients.page} pageCount={clients.pageCount} />
      <Section title="Add a client">
        {problem && <ErrorSentence className="pb-3">{problem}</ErrorSentence>}
        <Form method="post" className="flex max-w-[560px] flex-col gap-4" noValidate>
          <TextField label="Name" name="name" defaultValue={answer?.values?.["name"] ?? ""} error={answer?.errors?.["name"]} />
          <TextArea label="Note" name="note" defaultValue={answer?.values?.["note"] ?? ""} hint="What a colleague should know: boards, habits, who answers." error={answer?.errors?.["note"]} />
          <div><Button look="main" type="submit" busy={isBusy}>Add the client</Button></div>
        </Form>
      </Section>
    </Page>
  );
}
