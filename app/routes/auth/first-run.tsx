import { data, Form, redirect, useNavigation } from "react-router";
import { hashPassword } from "~/auth/passwords.server";
import { startSession } from "~/auth/sessions.server";
import { Button } from "~/components/button";
import { ErrorSentence, TextField } from "~/components/field";
import { Page, PageHeader } from "~/components/page";
import { KnownError, problemOf } from "~/copy/errors";
import { db } from "~/db/client.server";
import { createFirstOwner, hasAnyUser } from "~/db/queries/users.server";
import { firstRunSchema } from "~/forms/auth";
import { shortestPassword } from "~/forms/fields";
import { parseForm, type FieldErrors } from "~/forms/parse-form";
import type { Route } from "./+types/first-run";

export const meta: Route.MetaFunction = () => [{ title: "First account: Cartonwright" }];

/** Only while nobody has an account; afterwards there is no such page. */
async function requireEmptyStudio(): Promise<void> {
  if (await hasAnyUser(db)) throw new KnownError("not-found");
}

export async function loader() {
  await requireEmptyStudio();
  return null;
}

export async function action({ request }: Route.ActionArgs) {
  await requireEmptyStudio();
  const parsed = parseForm(await request.formData(), firstRunSchema);
  if (!parsed.ok) return data({ errors: parsed.errors, values: parsed.values }, 400);
  const { name, email, password } = parsed.value;
  const id = await createFirstOwner(db, { name, email, passwordHash: await hashPassword(password) });
  if (id === null) return redirect("/sign-in");
  return redirect("/", { headers: { "Set-Cookie": await startSession(db, request, id) } });
}

export default function FirstRun({ actionData }: Route.ComponentProps) {
  const answer = actionData as { errors?: FieldErrors; values?: Record<string, string> } | undefined;
  const problem = problemOf(actionData)?.sentence;
  const isBusy = useNavigation().state !== "idle";
  return (
    <Page>
      <PageHeader title="The first account" aside="It owns the studio: people, clients, boards" />
      <Form method="post" className="flex max-w-[440px] flex-col gap-4 pt-6" noValidate>
        <TextField label="Your name" name="name" autoComplete="name" defaultValue={answer?.values?.["name"] ?? ""} error={answer?.errors?.["name"]} autoFocus />
        <TextField label="E-mail" name="email" type="email" autoComplete="username" defaultValue={answer?.values?.["email"] ?? ""} error={answer?.errors?.["email"]} />
        <TextField label="Password" name="password" type="password" autoComplete="new-password" hint={`${shortestPassword} characters or more; three or four words are easy to remember.`} error={answer?.errors?.["password"]} />
        {problem && <ErrorSentence>{problem}</ErrorSentence>}
        <div className="pt-2"><Button look="main" type="submit" busy={isBusy}>Make the account</Button></div>
      </Form>
    </Page>
  );
}
