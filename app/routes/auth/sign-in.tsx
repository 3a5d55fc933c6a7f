import { data, Form, redirect, useNavigation, useSearchParams } from "react-router";
import { authenticatorFor, SignInRefused } from "~/auth/authenticator.server";
import { requestFactsContext } from "~/auth/request-context.server";
import { safeNext } from "~/auth/safe-next";
import { sessionContext } from "~/auth/session-context";
import { startSession } from "~/auth/sessions.server";
import { BriefPicture } from "~/bench/stage/brief-picture";
import type { Brief } from "~/cartons/types";
import { Button, Link } from "~/components/button";
import { ErrorSentence, TextField } from "~/components/field";
import { Wordmark } from "~/components/wordmark";
import { problemOf } from "~/copy/errors";
import { db } from "~/db/client.server";
import { hasAnyUser } from "~/db/queries/users.server";
import { typedValues, type FieldErrors } from "~/forms/parse-form";
import type { Route } from "./+types/sign-in";

const SHOWN: Brief = { construction: "roll-end-mailer", size: { L: 240, W: 170, D: 60 }, basis: "inside", room: 1, board: "e-flute", options: {}, typed: {} };

export const meta: Route.MetaFunction = () => [{ title: "Sign in: Cartonwright" }];

export async function loader({ request, context }: Route.LoaderArgs) {
  if (context.get(sessionContext)) return redirect(safeNext(new URL(request.url).searchParams.get("next")));
  if (!(await hasAnyUser(db))) return redirect("/first-run");
  return null;
}

export async function action({ request, context }: Route.ActionArgs) {
  const next = safeNext(new URL(request.url).searchParams.get("next"));
  const typed = typedValues(await request.clone().formData());
  try {
    const userId = await authenticatorFor(context.get(requestFactsContext).address).authenticate("form", request);
    return redirect(next, { headers: { "Set-Cookie": await startSession(db, request, userId) } });
  } catch (error) {
    if (!(error instanceof SignInRefused)) throw error;
    return data({ errors: error.errors, values: typed }, error.status);
  }
}

export default function SignIn({ actionData }: Route.ComponentProps) {
  const [search] = useSearchParams();
  const isBusy = useNavigation().state !== "idle";
  const answer = actionData as { errors?: FieldErrors; values?: Record<string, string> } | undefined;
  const problem = problemOf(actionData)?.sentence ?? answer?.errors?.[""]?.join(" ");
  const next = search.get("next");
  return (
    <div className="grid min-h-dvh lg:grid-cols-[57%_1fr]">
      <aside className="hidden flex-col justify-between border-r border-ink bg-desk p-14 lg:flex">
        <Wordmark height={26} />
        <BriefPicture brief={SHOWN} width={660} height={640} />
        <p className="text-small text-ink-2">A mailer of 240 × 170 × 60 mm, seen from the inside.</p>
      </aside>
      <main id="content" tabIndex={-1} className="flex flex-col justify-center px-6 py-10 outline-none sm:px-16 lg:px-24">
        <div className="w-full max-w-[400px]">
          <p className="pb-10 lg:hidden"><Wordmark height={22} /></p>
          <h1 className="text-h1 font-black">Sign in</h1>
          <p className="pb-6 pt-1 text-ink-2">Cartonwright, a workshop for folding cartons</p>
          <Form method="post" className="flex flex-col gap-4" noValidate>
            <TextField label="E-mail" name="email" type="email" autoComplete="username" defaultValue={answer?.values?.["email"] ?? ""} error={answer?.errors?.["email"]} autoFocus />
            <TextField label="Password" name="password" type="password" autoComplete="current-password" error={answer?.errors?.["password"]} />
            {problem && <ErrorSentence>{problem}</ErrorSentence>}
            <div className="flex flex-wrap items-center gap-5 pt-1">
              <Button look="main" type="submit" busy={isBusy}>Sign in</Button>
              {next && next !== "/" && <span className="text-small text-ink-2">You go back to where you were.</span>}
            </div>
          </Form>
          <div className="fold-rule mb-4 mt-8" />
          <p className="text-small text-ink-2">To look without an account, <Link to="/try">open a sample carton on the Bench</Link>. All of it works but saving.</p>
        </div>
      </main>
    </div>
  );
}
