import { data, Form, redirect, useNavigation } from "react-router";
import { hashPassword, verifyPassword } from "~/auth/passwords.server";
import { requireSession } from "~/auth/require.server";
import { endThisSession } from "~/auth/sessions.server";
import { When } from "~/bench/when";
import { Button } from "~/components/button";
import { ErrorSentence, TextField } from "~/components/field";
import { Page, PageHeader, Section } from "~/components/page";
import { type Column, Table } from "~/components/table";
import { problemOf } from "~/copy/errors";
import { db } from "~/db/client.server";
import { endAllSessions, endOtherSessions, endSession, listSessions } from "~/db/queries/sessions.server";
import { changePassword, findPasswordHash } from "~/db/queries/users.server";
import { changePasswordSchema } from "~/forms/account";
import { shortestPassword } from "~/forms/fields";
import { parseForm, type FieldErrors } from "~/forms/parse-form";
import type { Route } from "./+types/account";

export const meta: Route.MetaFunction = () => [{ title: "Account: Cartonwright" }];

export async function loader({ context }: Route.LoaderArgs) {
  const { viewer, idHash } = requireSession(context);
  return { viewer, sessions: await listSessions(db, viewer, idHash, new Date()) };
}

export async function action({ request, context }: Route.ActionArgs) {
  const { viewer, idHash } = requireSession(context);
  const form = await request.formData();
  switch (form.get("intent")) {
    case "password": {
      const parsed = parseForm(form, changePasswordSchema);
      if (!parsed.ok) return data({ errors: parsed.errors, done: null }, 400);
      if (!(await verifyPassword(await findPasswordHash(db, viewer), parsed.value.currentPassword))) {
        return data({ errors: { currentPassword: ["That is not the password you use now. Type it again."] } as FieldErrors, done: null }, 400);
      }
      await changePassword(db, viewer, await hashPassword(parsed.value.newPassword));
      await endOtherSessions(db, viewer, idHash);
      return data({ errors: {} as FieldErrors, done: "The password is changed. Every other sign-in has ended." });
    }
    case "end":
      await endSession(db, viewer, String(form.get("id") ?? ""));
      return data({ errors: {} as FieldErrors, done: "That sign-in has ended." });
    case "everywhere": {
      await endAllSessions(db, viewer);
      return redirect("/sign-in", { headers: { "Set-Cookie": await endThisSession(db, request) } });
    }
    default:
      return data({ errors: { "": ["This page does not know what to do with that. Load it again."] } as FieldErrors, done: null }, 400);
  }
}

type Row = Route.ComponentProps["loaderData"]["sessions"][number];

/** "Firefox on Linux" from what a browser says of itself; its own words where that is not clear. */
function browserOf(userAgent: string): string {
  const browser = /Edg\//.test(userAgent) ? "Edge" : /Firefox\//.test(userAgent) ? "Firefox" : /Chrome\//.test(userAgent) ? "Chrome" : /Safari\//.test(userAgent) ? "Safari" : null;
  const system = /Android/.test(userAgent) ? "Android" : /iPhone|iPad/.test(userAgent) ? "iOS" : /Windows/.test(userAgent) ? "Windows" : /Mac OS/.test(userAgent) ? "macOS" : /Linux/.test(userAgent) ? "Linux" : null;
  return browser && system ? `${browser} on ${system}` : userAgent.slice(0, 60) || "unknown browser";
}

export default function Account({ loaderData, actionData }: Route.ComponentProps) {
  const { viewer, sessions } = loaderData;
  const answer = actionData as { errors?: FieldErrors; done?: string | null } | undefined;
  const problem = problemOf(actionData)?.sentence ?? answer?.errors?.[""]?.join(" ");
  const isBusy = useNavigation().state !== "idle";
  const columns: readonly Column<Row>[] = [
    { key: "browser", head: "Browser", cell: (row) => <>{browserOf(row.userAgent)}{row.isThis && <b>, this one</b>}</> },
    { key: "seen", head: "Last used", cell: (row) => <When at={row.lastSeen} />, least: true },
    { key: "since", head: "Since", cell: (row) => <When at={row.createdAt} />, least: true },
    {
      key: "end", head: "", align: "right",
      cell: (row) => row.isThis ? null : (
        <Form method="post">
          <input type="hidden" name="id" value={row.id} />
          <Button look="plain" type="submit" name="intent" value="end" aria-label={`End the sign-in in ${browserOf(row.userAgent)}`}>End it</Button>
        </Form>
      ),
    },
  ];
  return (
    <Page>
      <PageHeader title="Account" aside={`${viewer.name}, ${viewer.email}, ${viewer.clientName ?? viewer.role}`} />
      {answer?.done && <p role="status" className="pt-4 font-bold">{answer.done}</p>}
      {problem && <ErrorSentence className="pt-4">{problem}</ErrorSentence>}
      <Section title="Password" rule="none">
        <Form method="post" key={answer?.done ?? "form"} className="flex max-w-[440px] flex-col gap-4" noValidate>
          <input type="text" name="username" autoComplete="username" value={viewer.email} readOnly hidden />
          <TextField label="The one you use now" name="currentPassword" type="password" autoComplete="current-password" error={answer?.errors?.["currentPassword"]} />
          <TextField label="The new one" name="newPassword" type="password" autoComplete="new-password" hint={`${shortestPassword} characters or more. Every other sign-in ends.`} error={answer?.errors?.["newPassword"]} />
          <div><Button look="main" type="submit" name="intent" value="password" busy={isBusy}>Change the password</Button></div>
        </Form>
      </Section>
      <Section title="Signed in" aside={`${sessions.length} ${sessions.length === 1 ? "browser" : "browsers"}`}>
        <Table caption="Where you are signed in" columns={columns} rows={sessions} rowKey={(row) => row.id} />
        <Form method="post" className="pt-5">
          <Button type="submit" name="intent" value="everywhere">Sign out everywhere</Button>
        </Form>
      </Section>
    </Page>
  );
}
