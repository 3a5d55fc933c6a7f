import { readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { brotliCompressSync, constants } from "node:zlib";
import { reactRouter } from "@react-router/dev/vite";
import tailwindcss from "@tailwindcss/vite";
import { defineConfig, type Plugin } from "vite";

/** Scripts and styles packed once, when they are built: smaller than what a server has time for while somebody waits. */
function packedAssets(): Plugin {
  return {
    name: "packed-assets",
    apply: "build",
    applyToEnvironment: (environment) => environment.name === "client",
    writeBundle({ dir }, bundle) {
      for (const name of Object.keys(bundle).filter((file) => /\.(js|css|svg)$/.test(file))) {
        const file = path.join(dir ?? "", name);
        writeFileSync(`${file}.br`, brotliCompressSync(readFileSync(file), { params: { [constants.BROTLI_PARAM_QUALITY]: constants.BROTLI_MAX_QUALITY } }));
      }
    },
  };
}

export default defineConfig({
  plugins: [tailwindcss(), reactRouter(), packedAssets()],
  resolve: { tsconfigPaths: true },
  // Listed so that the first visit to a lazily loaded page does not reload it in development.
  optimizeDeps: { include: ["three", "@react-three/fiber", "zod", "clipper2-ts/dist/Core.js", "clipper2-ts/dist/Engine.js", "clipper2-ts/dist/Offset.js", "earcut"] },
  // Fonts as files, never inside the style sheet: the content security policy takes them from this site alone.
  build: { assetsInlineLimit: 0 },
  server: { host: "127.0.0.1" },
});
