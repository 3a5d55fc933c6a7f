// The same application on the framework's development server: modules are taken from Vite, edits are seen at once.
import type { RequestListener } from "node:http";
import { createServer as createHttpServer } from "node:http";
import { getRequestListener } from "@hono/node-server";
import type { ServerBuild } from "react-router";
import { createServer as createViteServer } from "vite";
import { createApp, entryOf } from "./app";
import { closeServer, type RunningServer } from "./index";

export async function startDevelopmentServer({ port, host = "127.0.0.1" }: { port: number; host?: string }): Promise<RunningServer> {
  const server = createHttpServer();
  const vite = await createViteServer({
    server: { middlewareMode: true, host, hmr: { server }, watch: { ignored: ["**/.data/**", "**/test-results/**", "**/build/**"] } },
    appType: "custom",
  });
  const loadBuild = async () => (await vite.ssrLoadModule("virtual:react-router/server-build")) as unknown as ServerBuild;
  const listener = getRequestListener(createApp({ loadBuild, mode: "development" }).fetch, { overrideGlobalObjects: false }) as RequestListener;
  server.on("request", (request, response) => {
    vite.middlewares(request, response, () => listener(request, response));
  });
  await new Promise<void>((resolve, reject) => {
    server.once("error", reject);
    server.listen({ port, host, exclusive: true }, resolve);
  });
  return {
    port,
    close: async () => {
      const entry = entryOf(await loadBuild());
      await vite.close();
      await closeServer(server, () => entry.closeDatabase());
    },
  };
}
