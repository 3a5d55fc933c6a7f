import { data, Form, useNavigation } from "react-router";
import { hashPassword } from "~/auth/passwords.server";
import { requireReach, requireViewer } from "~/auth/require.server";
import { roles } from "~/auth/viewer";
import { Button } from "~/components/button";
import { ErrorSentence, SelectField, TextField } from "~/components/field";
import { Page, PageHeader, Section } from "~/components/page";
import { type Column, Table } from "~/components/table";
import { problemOf } from "~/copy/errors";
import { db } from "~/db/client.server";
import { listClientChoices } from "~/db/queries/clients.server";
import { createUser, listPeople, setBarred } from "~/db/queries/users.server";
import { personSchema } from "~/forms/people";
import { shortestPassword } from "~/forms/fields";
import { parseForm, typedValues, type FieldErrors } from "~/forms/parse-form";
import type { Route } from "./+types/people";

export const meta: Route.MetaFunction = () => [{ title: "People: Cartonwright" }];

export async function loader({ context }: Route.LoaderArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "people.manage");
  return { people: await listPeople(db, viewer), clients: await listClientChoices(db, viewer), me: viewer.id };
}

export async function action({ request, context }: Route.ActionArgs) {
  const viewer = requireViewer(context);
  requireReach(viewer, "people.manage");
  const form = await request.formData();
  const intent = form.get("intent");
  if (intent === "bar" || intent === "admit") {
    await setBarred(db, viewer, String(form.get("id") ?? ""), intent === "bar");
    return data({ errors: {} as FieldErrors, values: {}, done: intent === "bar" ? "Barred: every sign-in of theirs has ended." : "Admitted again." });
  }
  const parsed = parseForm(form, personSchema);
  if (!parsed.ok) return data({ errors: parsed.errors, values: parsed.values, done: null }, 400);
  const { password, ...person } = parsed.value;
  const id = await createUser(db, viewer, { ...person, passwordHash: await hashPassword(password) });
  if (id === null) return data({ errors: { email: ["Somebody has this e-mail already. Type another."] } as FieldErrors, values: typedValues(form), done: null }, 400);
  return data({ errors: {} as FieldErrors, values: {}, done: `${person.name} can sign in now. Pass on the password; it can be changed under Account.` });
}

type Row = Route.ComponentProps["loaderData"]["people"][number];

export default function People({ loaderData, actionData }: Route.ComponentProps) {
  const { people, clients, me } = loaderData;
  const answer = actionData as { errors?: FieldErrors; values?: Record<string, string>; done?: string | null } | undefined;
  const problem = problemOf(actionData)?.sentence ?? answer?.errors?.[""]?.join(" ");
  const isBusy = useNavigation().state !== "idle";
  const columns: readonly Column<Row>[] = [
    { key: "name", head: "Name", cell: (row) => <b>{row.name}</b> },
    { key: "email", head: "E-mail", cell: (row) => row.email, least: true },
    { key: "role", head: "Role", cell: (row) => row.clientName ? `${row.role}, ${row.clientName}` : row.role, least: true },
    { key: "state", head: "State", cell: (row) => (row.barredAt ? "barred" : "may sign in"), least: true },
    {
      key: "act", head: "", align: "right",
      cell: (row) => row.id === me ? null : (
        <Form method="post">
          <input type="hidden" name="id" value={row.id} />
          <Button look="plain" type="submit" name="intent" value={row.barredAt ? "admit" : "bar"} aria-label={`${row.barredAt ? "Admit" : "Bar"} ${row.name}`}>{row.barredAt ? "Admit" : "Bar"}</Button>
        </Form>
      ),
    },
  ];
  return (
    <Page>
      <PageHeader title="People" aside="Who signs in, and as what" />
      {answer?.done && <p role="status" className="pt-4 font-bold">{answer.done}</p>}
      {problem && <ErrorSentence className="pt-4">{problem}</ErrorSentence>}
      <div className="pt-6"><Table caption="People" columns={columns} rows={people} rowKey={(row) => row.id} count={`${people.length} people`} /></div>
      <Section title="Add a person">
        <Form method="post" key={answer?.done ?? "form"} className="grid max-w-[760px] gap-4 sm:grid-cols-2" noValidate>
          <TextField label="Name" name="name" defaultValue={answer?.values?.["name"] ?? ""} error={answer?.errors?.["name"]} />
          <TextField label="E-mail" name="email" type="email" defaultValue={answer?.values?.["email"] ?? ""} error={answer?.errors?.["email"]} />
          <SelectField label="Role" name="role" defaultValue={answer?.values?.["role"] ?? "designer"} choices={roles.map((role) => ({ value: role, label: role }))} error={answer?.errors?.["role"]} />
          <SelectField label="Client" name="clientId" defaultValue={answer?.values?.["clientId"] ?? ""} choices={[{ value: "", label: "none: works in the studio" }, ...clients.map((c) => ({ value: c.id, label: c.name }))]} hint="For the role client, and only for it." error={answer?.errors?.["clientId"]} />
          <TextField label="First password" name="password" type="password" autoComplete="new-password" hint={`${shortestPassword} characters or more.`} error={answer?.errors?.["password"]} />
          <div className="sm:col-span-2"><Button look="main" type="submit" busy={isBusy}>Add the person</Button></div>
        </Form>
      </Section>
    </Page>
  );
}
