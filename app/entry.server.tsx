import { randomBytes } from "node:crypto";
import { PassThrough } from "node:stream";
import { createReadableStreamFromReadable } from "@react-router/node";
import { isbot } from "isbot";
import { renderToPipeableStream, type RenderToPipeableStreamOptions } from "react-dom/server";
import { type EntryContext, type HandleErrorFunction, isRouteErrorResponse, ServerRouter } from "react-router";

// For the HTTP server, which holds the build but none of its modules.
export { createLoadContext } from "./auth/request-context.server";
export { closeDatabase } from "./db/client.server";

export const streamTimeout = 5_000;

/** Scripts run only with this answer's nonce. Inline style attributes are needed by the drawings and the 3-D stage. */
function contentSecurityPolicy(nonce: string): string {
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}'`,
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    "connect-src 'self'",
    "worker-src 'self' blob:",
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join("; ");
}

export default function handleRequest(request: Request, status: number, headers: Headers, routerContext: EntryContext) {
  const nonce = randomBytes(16).toString("base64");
  headers.set("Content-Type", "text/html; charset=utf-8");
  // Pages show what a person may see: they are kept by nobody but that person's own browser, and asked for anew.
  if (!headers.has("Cache-Control")) headers.set("Cache-Control", "private, no-cache");
  // The development server injects scripts of its own that carry no nonce.
  if (import.meta.env.PROD) headers.set("Content-Security-Policy", contentSecurityPolicy(nonce));
  if (request.method === "HEAD") return new Response(null, { status, headers });

  const isReader = isbot(request.headers.get("user-agent") ?? "");
  return new Promise<Response>((resolve, reject) => {
    let hasShell = false;
    const start: keyof RenderToPipeableStreamOptions = isReader ? "onAllReady" : "onShellReady";
    const { pipe, abort } = renderToPipeableStream(<ServerRouter context={routerContext} url={request.url} nonce={nonce} />, {
      nonce,
      [start]() {
        hasShell = true;
        const body = new PassThrough({
          final(done) {
            clearTimeout(timer);
            done();
          },
        });
        resolve(new Response(createReadableStreamFromReadable(body), { status, headers }));
        pipe(body);
      },
      onShellError: reject,
      onError(error: unknown) {
        status = 500;
        // Before the shell the error is rejected, and logged by handleError.
        if (hasShell) console.error(error);
      },
    });
    const timer = setTimeout(() => abort(), streamTimeout + 1000);
  });
}

/** Errors of loaders, actions and middleware are logged with their number by the HTTP server; here come those of rendering. */
export const handleError: HandleErrorFunction = (error, { request }) => {
  if (request.signal.aborted || isRouteErrorResponse(error)) return;
  console.error(`${new Date().toISOString()} ${request.method} ${new URL(request.url).pathname}`, error);
};
