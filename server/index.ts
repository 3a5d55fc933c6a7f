// Serves the built pages. `npm start` calls `startServer`; on a host that has its own database and secrets, run this
// file itself: NODE_ENV=production DATABASE_URL=… SESSION_SECRET=… PORT=3000 tsx server/index.ts
import { createServer, type RequestListener, type Server } from "node:http";
import path from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { getRequestListener } from "@hono/node-server";
import type { ServerBuild } from "react-router";
import { createApp, entryOf } from "./app";

const root = fileURLToPath(new URL("..", import.meta.url));

export interface RunningServer {
  readonly port: number;
  /** Lets requests in flight end, closes every connection and the database pool. */
  close(): Promise<void>;
}

export interface ServerOptions {
  port: number;
  host?: string;
  /** Folder with client/ and server/, as `react-router build` makes it; relative to the project. */
  buildDirectory?: string;
}

export async function startServer({ port, host = "127.0.0.1", buildDirectory = "build" }: ServerOptions): Promise<RunningServer> {
  const directory = path.resolve(root, buildDirectory);
  const build = (await import(pathToFileURL(path.join(directory, "server/index.js")).href)) as ServerBuild;
  const app = createApp({
    loadBuild: () => build,
    mode: "production",
    clientDirectory: path.join(directory, "client"),
    trustProxy: process.env.TRUST_PROXY === "1",
  });
  const server = await listen(getRequestListener(app.fetch, { overrideGlobalObjects: false }) as RequestListener, port, host);
  return { port, close: () => closeServer(server, () => entryOf(build).closeDatabase()) };
}

export function listen(listener: RequestListener, port: number, host: string): Promise<Server> {
  const server = createServer({ requestTimeout: 30_000, headersTimeout: 15_000 }, listener);
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen({ port, host, exclusive: true }, () => {
      server.off("error", reject);
      resolve(server);
    });
  });
}

/** Idle connections go at once; those with a request in flight get `patience` milliseconds. */
export async function closeServer(server: Server, closeDatabase: () => Promise<void>, patience = 800): Promise<void> {
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  server.closeIdleConnections();
  const timer = setTimeout(() => server.closeAllConnections(), patience);
  await closed;
  clearTimeout(timer);
  // A database that has gone away must not keep us here.
  await Promise.race([closeDatabase().catch(() => undefined), new Promise((resolve) => setTimeout(resolve, 1500).unref())]);
}

const isMain = process.argv[1] !== undefined && path.resolve(process.argv[1]) === fileURLToPath(import.meta.url);
if (isMain) {
  const running = await startServer({
    port: Number(process.env.PORT ?? 3000),
    host: process.env.CARTONWRIGHT_HOST,
    buildDirectory: process.env.BUILD_DIRECTORY,
  });
  console.log(`Serving on http://${process.env.CARTONWRIGHT_HOST ?? "127.0.0.1"}:${running.port}`);
  for (const signal of ["SIGINT", "SIGTERM"] as const) {
    process.once(signal, () => void running.close().then(() => process.exit(0)));
  }
}
