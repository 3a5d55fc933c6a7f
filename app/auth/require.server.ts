// What every loader and action begins with. The errors become answers in one place (server/guard-routes.ts).
import type { RouterContextProvider } from "react-router";
import { KnownError } from "~/copy/errors";
import { type Act, may } from "./permissions";
import { sessionContext, type SignedIn } from "./session-context";
import type { Viewer } from "./viewer";

type Context = Readonly<Pick<RouterContextProvider, "get">>;

/** Who is signed in. Throws `signed-out`, which leads a page to sign-in and back. */
export const requireViewer = (context: Context): Viewer => requireSession(context).viewer;

export function requireSession(context: Context): SignedIn {
  const signedIn = context.get(sessionContext);
  if (!signedIn) throw new KnownError("signed-out");
  return signedIn;
}

/** Throws `not-allowed` unless the role does this to at least something; the query then says to what. */
export function requireReach(viewer: Viewer, act: Act): void {
  if (!may(viewer, act)) throw new KnownError("not-allowed");
}
