// `npm run bench`: how long a carton takes, a construction at a time. Ratios are the figures to trust; times are this machine's.
// The core is bundled first, as it is for the browser, so that a development loader's overhead is not measured.
import path from "node:path";
import { pathToFileURL } from "node:url";
import { build } from "vite";
import { latoFonts } from "../app/services/fonts.server";

const root = path.resolve(import.meta.dirname, "..");
// Inside node_modules, so that what stays outside the bundle is found from there.
const outDir = path.join(root, "node_modules/.cache/bench");
await build({
  root, configFile: false, logLevel: "error", resolve: { alias: { "~": path.join(root, "app") } },
  ssr: { noExternal: true, external: ["makerjs", "pdf-lib", "@pdf-lib/fontkit"] },
  build: { ssr: path.join(root, "scripts/bench/measure.ts"), outDir, emptyOutDir: true, target: "es2022", minify: false, rolldownOptions: { output: { entryFileNames: "measure.mjs" } } },
});
const { measure } = (await import(pathToFileURL(path.join(outDir, "measure.mjs")).href)) as typeof import("./bench/measure");
await measure(await latoFonts(), Number(process.argv[2] ?? 400));
