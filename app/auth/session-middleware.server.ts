import type { MiddlewareFunction } from "react-router";
import { db } from "~/db/client.server";
import { sessionContext } from "./session-context";
import { readSession } from "./sessions.server";

/** Finds out once a request who sent it; loaders and actions ask `requireViewer`. */
export const sessionMiddleware: MiddlewareFunction<Response> = async ({ request, context }, next) => {
  context.set(sessionContext, await readSession(db, request));
  return next();
};
