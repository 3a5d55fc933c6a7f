// Errors become answers here and nowhere else: every loader, action and middleware of the build is wrapped.
import { randomBytes } from "node:crypto";
import { data, redirect, type ServerBuild } from "react-router";
import { type ErrorCode, isDatabaseLost, KnownError, type Problem, problemFor } from "../app/copy/errors";

type Handler = (args: { request: Request }, ...rest: unknown[]) => unknown;
type Kind = "loader" | "action" | "middleware";
type RouteModule = NonNullable<ServerBuild["routes"][string]>["module"];

const guardedBuilds = new WeakMap<ServerBuild, ServerBuild>();

/** The same build with guarded routes; made once a build. */
export function guardRoutes(build: ServerBuild): ServerBuild {
  const made = guardedBuilds.get(build);
  if (made) return made;
  const routes = Object.fromEntries(
    Object.entries(build.routes).map(([id, route]) => [id, route && { ...route, module: guardModule(route.module) }]),
  );
  const guarded = { ...build, routes };
  guardedBuilds.set(build, guarded);
  return guarded;
}

function guardModule(module: RouteModule): RouteModule {
  const isResource = module.default === undefined;
  const guarded: Record<string, unknown> = { ...module };
  for (const kind of ["loader", "action"] as const) {
    const handler = module[kind] as Handler | undefined;
    if (handler) guarded[kind] = guard(handler, kind, isResource);
  }
  const middleware = (module as { middleware?: Handler[] }).middleware;
  if (middleware) guarded.middleware = middleware.map((handler) => guard(handler, "middleware", isResource));
  return guarded as unknown as RouteModule;
}

function guard(handler: Handler, kind: Kind, isResource: boolean): Handler {
  return async (args, ...rest) => {
    try {
      return await handler(args, ...rest);
    } catch (error) {
      if (!(error instanceof Error)) throw error; // a redirect, a Response or data(): an answer already
      return answer(error, args.request, kind, isResource);
    }
  };
}

function answer(error: Error, request: Request, kind: Kind, isResource: boolean): unknown {
  const problem = problemFrom(error, request);
  const { status } = problem;
  const isDocument = request.method === "GET" || request.method === "HEAD";
  if (problem.code === "signed-out" && isDocument) throw redirect(signInAddress(request));
  // What was typed stands in the page that sent it: an action's problem goes back there, not to an error page.
  if (kind === "action") return data({ problem }, { status });
  if (isResource) throw new Response(`${problem.sentence}${problem.id ? ` (${problem.id})` : ""}\n`, { status, headers: { "Content-Type": "text/plain; charset=utf-8" } });
  throw data({ problem }, { status });
}

function problemFrom(error: Error, request: Request): Problem {
  const known = knownCode(error);
  if (known === "database-lost") {
    logError(`database-lost ${request.method} ${new URL(request.url).pathname}: ${rootMessage(error)}`);
  }
  if (known) return problemFor(known);
  const id = randomBytes(5).toString("hex");
  logError(`error ${id} ${request.method} ${new URL(request.url).pathname}`, describe(error));
  return problemFor("unknown", id);
}

/** By name as well as by class: the build carries its own copy of the class. */
function knownCode(error: Error): ErrorCode | null {
  if (error instanceof KnownError || error.name === "KnownError") return (error as KnownError).code;
  return isDatabaseLost(error) ? "database-lost" : null;
}

/** Without the values a query was given: they may be anybody's words. */
function describe(error: Error): string {
  if ("query" in error && error.cause instanceof Error) return `${error.cause.stack ?? error.cause.message}\n  in: ${String(error.query)}`;
  return error.stack ?? error.message;
}

function rootMessage(error: Error): string {
  const cause = error.cause instanceof Error ? error.cause : error;
  return "code" in cause ? String(cause.code) : cause.message;
}

/** Sign-in, and back to the page that was asked for. Data requests are named `<page>.data`. */
function signInAddress(request: Request): string {
  const url = new URL(request.url);
  url.searchParams.delete("_routes");
  url.searchParams.delete("index");
  const page = url.pathname.replace(/\/_\.data$/, "/").replace(/\.data$/, "").replace(/^\/_root$/, "/");
  const next = page + (url.searchParams.size > 0 ? url.search : "");
  return next === "/" ? "/sign-in" : `/sign-in?next=${encodeURIComponent(next)}`;
}

function logError(...words: string[]): void {
  console.error(new Date().toISOString(), ...words);
}
