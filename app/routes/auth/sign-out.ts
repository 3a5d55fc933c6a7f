import { redirect } from "react-router";
import { endThisSession } from "~/auth/sessions.server";
import { db } from "~/db/client.server";
import type { Route } from "./+types/sign-out";

/** A link to it does nothing: signing out is a change, and changes are posted. */
export const loader = () => redirect("/");

export async function action({ request }: Route.ActionArgs) {
  return redirect("/sign-in", { headers: { "Set-Cookie": await endThisSession(db, request) } });
}
