import { data, Form } from "react-router";
import { requireReach, requireViewer } from "~/auth/require.server";
import { When } from "~/bench/when";
import { Button } from "~/components/button";
import { ErrorSentence } from "~/components/field";
import { Page, PageHeader } from "~/components/page";
import { type Column, Table } from "~/components/table";
import { problemOf } from "~/copy/errors";
import { db } from "~/db/client.server";
import { restoreCarton } from "~/db/queries/cartons.server";
import { restoreClient } from "~/db/queries/clients.server";
import { restoreTemplate } from "~/db/queries/templates.server";
import { listTrash } from "~/db/queries/trash.server";
import type { Route } from "./+types/trash";

export const meta: Route.MetaFunction = () => [{ title: "Deleted things: Cartonwright" }];

export async function loader({ context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "trash.restore");
  return { things: await listTrash(db, viewer) };
}

const RESTORE = { carton: restoreCarton, template: restoreTemplate, client: restoreClient } as const;

export async function action({ request, context }: Route.ActionArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "trash.restore");
  const form = await request.formData();
  const kind = String(form.get("kind") ?? "");
  if (!Object.hasOwn(RESTORE, kind)) return data({ done: null, wrong: "This page does not know what to do with that. Load it again." }, 400);
  await RESTORE[kind as keyof typeof RESTORE](db, viewer, String(form.get("id") ?? ""));
  return data({ done: "It is back where it was.", wrong: null });
}

type Row = Route.ComponentProps["loaderData"]["things"][number];
const COLUMNS: readonly Column<Row>[] = [
  { key: "name", head: "Name", cell: (row) => <><b>{row.name}</b> <span className="text-ink-2">{row.kind}{row.clientName ? ` of ${row.clientName}` : ""}</span></> },
  { key: "deleted", head: "Deleted", cell: (row) => <When at={row.deletedAt} />, least: true },
  { key: "gone", head: "Gone for good", cell: (row) => <When at={row.goneAt} />, least: true },
  {
    key: "act", head: "", align: "right",
    cell: (row) => (
      <Form method="post">
        <input type="hidden" name="id" value={row.id} />
        <Button look="plain" type="submit" name="kind" value={row.kind} aria-label={`Bring back ${row.name}`}>Bring it back</Button>
      </Form>
    ),
  },
];

export default function Trash({ loaderData, actionData }: Route.ComponentProps) {
  const answer = actionData as { done?: string | null; wrong?: string | null } | undefined;
  const problem = problemOf(actionData)?.sentence ?? answer?.wrong;
  return (
    <Page>
      <PageHeader title="Deleted things" aside="Kept for 30 days" />
      {answer?.done && <p role="status" className="pt-4 font-bold">{answer.done}</p>}
      {problem && <ErrorSentence className="pt-4">{problem}</ErrorSentence>}
      <div className="pt-6">
        {loaderData.things.length > 0
          ? <Table caption="Deleted things" columns={COLUMNS} rows={loaderData.things} rowKey={(row) => `${row.kind}${row.id}`} />
          : <p className="text-ink-2">Nothing is here. What is deleted stands here for 30 days and can be brought back.</p>}
      </div>
    </Page>
  );
}
