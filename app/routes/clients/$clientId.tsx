import { data, Form, Link as RouterLink, redirect, useNavigation } from "react-router";
import { requireReach, requireViewer } from "~/auth/require.server";
import { BriefPicture } from "~/bench/stage/brief-picture";
import { Button, ButtonLink } from "~/components/button";
import { ErrorSentence, TextArea, TextField } from "~/components/field";
import { Page, PageHeader, Section } from "~/components/page";
import { KnownError, problemOf } from "~/copy/errors";
import { db } from "~/db/client.server";
import { listCartons } from "~/db/queries/cartons.server";
import { deleteClient, findClient, updateClient } from "~/db/queries/clients.server";
import { clientSchema } from "~/forms/client";
import { parseForm, type FieldErrors } from "~/forms/parse-form";
import type { Route } from "./+types/$clientId";

export const meta: Route.MetaFunction = ({ loaderData }) => [{ title: `${loaderData?.client.name ?? "Client"}: Cartonwright` }];

export async function loader({ params, context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "client.write");
  const client = await findClient(db, viewer, params.clientId);
  if (!client) throw new KnownError("not-found");
  return { client, cartons: await listCartons(db, viewer, { clientId: client.id, page: 1, pageSize: 12 }) };
}

export async function action({ params, request, context }: Route.ActionArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "client.write");
  const form = await request.formData();
  if (form.get("intent") === "delete") {
    await deleteClient(db, viewer, params.clientId);
    return redirect("/trash");
  }
  const parsed = parseForm(form, clientSchema);
  if (!parsed.ok) return data({ errors: parsed.errors, values: parsed.values, done: null }, 400);
  await updateClient(db, viewer, params.clientId, parsed.value);
  return data({ errors: {} as FieldErrors, values: {}, done: "Saved." });
}

export default function Client({ loaderData, actionData }: Route.ComponentProps) {
  const { client, cartons } = loaderData;
  const answer = actionData as { errors?: FieldErrors; values?: Record<string, string>; done?: string | null } | undefined;
  const problem = problemOf(actionData)?.sentence;
  const isBusy = useNavigation().state !== "idle";
  return (
    <Page>
      <PageHeader title={client.name} aside={`${client.cartonCount} ${client.cartonCount === 1 ? "carton" : "cartons"}`}>
        <ButtonLink look="main" to={`/cartons/new?client=${client.id}`}>New carton</ButtonLink>
      </PageHeader>
      {cartons.rows.length > 0 && (
        <ul className="grid grid-cols-2 gap-x-6 gap-y-5 py-6 md:grid-cols-4">
          {cartons.rows.map((row) => (
            <li key={row.id}>
              <RouterLink to={`/cartons/${row.id}`} className="block hover:text-live">
                <BriefPicture brief={row.brief} width={150} height={110} />
                <b className="block pt-1">{row.name}</b>
              </RouterLink>
            </li>
          ))}
        </ul>
      )}
      <Section title="Particulars">
        {answer?.done && <p role="status" className="pb-3 font-bold">{answer.done}</p>}
        {problem && <ErrorSentence className="pb-3">{problem}</ErrorSentence>}
        <Form method="post" className="flex max-w-[560px] flex-col gap-4" noValidate>
          <TextField label="Name" name="name" defaultValue={answer?.values?.["name"] ?? client.name} error={answer?.errors?.["name"]} />
          <TextArea label="Note" name="note" defaultValue={answer?.values?.["note"] ?? client.note} error={answer?.errors?.["note"]} />
          <div><Button look="main" type="submit" busy={isBusy}>Save</Button></div>
        </Form>
      </Section>
      <Section title="Delete" rule="dash">
        <p className="max-w-[560px] pb-3 text-ink-2">Its cartons and templates go out of sight with it, and its contacts cannot sign in. For 30 days all of it can be brought back.</p>
        <Form method="post"><Button type="submit" name="intent" value="delete">Delete {client.name}</Button></Form>
      </Section>
    </Page>
  );
}
