// The small HTTP application round the framework's request handler: static files, headers, limits. No page lives here.
import { randomBytes } from "node:crypto";
import path from "node:path";
import type { HttpBindings } from "@hono/node-server";
import { serveStatic } from "@hono/node-server/serve-static";
import { type Context, Hono } from "hono";
import { bodyLimit } from "hono/body-limit";
import { compress } from "hono/compress";
import { createRequestHandler, type RouterContextProvider, type ServerBuild } from "react-router";
import { problemFor } from "../app/copy/errors";
import { guardRoutes } from "./guard-routes";

/** A brief is a few kilobytes; nothing that is sent here is large. Bytes. */
const largestBody = 1024 * 1024;
const aYear = "public, max-age=31536000, immutable";
const anHour = "public, max-age=3600";

/** What `app/entry.server.tsx` exports besides the framework's own. */
export interface EntryModule {
  createLoadContext(facts: { address: string; requestId: string }): RouterContextProvider;
  closeDatabase(): Promise<void>;
}

export interface AppOptions {
  /** The build; asked for on every request, so that the development server can give the newest. */
  loadBuild: () => ServerBuild | Promise<ServerBuild>;
  mode: "production" | "development";
  /** Folder of the built browser files; absent in development, where Vite serves them. */
  clientDirectory?: string;
  /** Behind a proxy that sets it, the caller's address is the last entry of X-Forwarded-For. */
  trustProxy?: boolean;
}

type Bindings = { Bindings: HttpBindings };

export function entryOf(build: ServerBuild): EntryModule {
  return build.entry.module as unknown as EntryModule;
}

export function createApp({ loadBuild, mode, clientDirectory, trustProxy = false }: AppOptions): Hono<Bindings> {
  const app = new Hono<Bindings>();

  app.use(async (c, next) => {
    await next();
    setSafeHeaders(c.res.headers);
  });
  app.use(compress());
  app.use(async (c, next) => {
    if (isForeign(c.req.raw)) return refuse("foreign-origin");
    await next();
  });
  app.use(bodyLimit({ maxSize: largestBody, onError: () => refuse("too-large") }));

  if (clientDirectory) serveFiles(app, clientDirectory);

  const handle = createRequestHandler(async () => guardRoutes(await loadBuild()), mode);
  app.all("*", async (c) => {
    const requestId = randomBytes(5).toString("hex");
    const entry = entryOf(await loadBuild());
    const response = await handle(c.req.raw, entry.createLoadContext({ address: addressOf(c, trustProxy), requestId }));
    response.headers.set("X-Request-Id", requestId);
    return response;
  });
  return app;
}

function serveFiles(app: Hono<Bindings>, clientDirectory: string): void {
  const root = path.relative(process.cwd(), clientDirectory) || ".";
  app.use(
    "/assets/*",
    serveStatic({ root, precompressed: true, onFound: (_file, c) => c.header("Cache-Control", aYear) }),
    async (c) => c.text("There is no such file.\n", 404, { "Cache-Control": "no-store" }),
  );
  app.use(serveStatic({ root, onFound: (_file, c) => c.header("Cache-Control", anHour) }));
}

/** Headers for every answer. Pages bring their own content security policy with its nonce; what brings none may run nothing. */
function setSafeHeaders(headers: Headers): void {
  if (!headers.has("Content-Security-Policy") && !/^text\/html/.test(headers.get("Content-Type") ?? "")) {
    headers.set("Content-Security-Policy", "default-src 'none'; style-src 'unsafe-inline'; frame-ancestors 'none'");
  }
  headers.set("X-Content-Type-Options", "nosniff");
  headers.set("X-Frame-Options", "DENY");
  headers.set("Referrer-Policy", "same-origin");
  headers.set("Cross-Origin-Opener-Policy", "same-origin");
  headers.set("Cross-Origin-Resource-Policy", "same-origin");
  headers.set("Permissions-Policy", "camera=(), microphone=(), geolocation=(), payment=(), usb=()");
}

/** A change sent by a page of another site. The framework checks this for pages, not for resource routes. */
function isForeign(request: Request): boolean {
  if (["GET", "HEAD", "OPTIONS"].includes(request.method)) return false;
  const site = request.headers.get("sec-fetch-site");
  if (site !== null && site !== "same-origin" && site !== "none") return true;
  const origin = request.headers.get("origin");
  if (origin === null) return false;
  const host = request.headers.get("x-forwarded-host") ?? request.headers.get("host") ?? new URL(request.url).host;
  return origin.replace(/^https?:\/\//, "") !== host;
}

function refuse(code: "foreign-origin" | "too-large"): Response {
  const { sentence, status } = problemFor(code);
  return new Response(`${sentence}\n`, { status, headers: { "Content-Type": "text/plain; charset=utf-8" } });
}

function addressOf(c: Context<Bindings>, trustProxy: boolean): string {
  const forwarded = trustProxy ? c.req.header("x-forwarded-for")?.split(",").at(-1)?.trim() : undefined;
  return (forwarded || c.env?.incoming?.socket?.remoteAddress || "unknown").slice(0, 64);
}
