// Who may import whom, and the habits that keep the house in order. Each rule says where the thing should go instead.
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import path from "node:path";
import ts from "typescript";
import { describe, expect, it } from "vitest";

const ROOT = path.resolve(import.meta.dirname, "..");

interface Source { readonly file: string; readonly text: string; readonly imports: readonly string[] }

function sourcesUnder(root: string, folder: string): Source[] {
  const found: Source[] = [];
  const walk = (dir: string) => {
    for (const entry of readdirSync(dir)) {
      const full = path.join(dir, entry);
      if (statSync(full).isDirectory()) walk(full);
      else if (/\.tsx?$/.test(entry)) {
        const text = readFileSync(full, "utf8");
        const file = path.relative(root, full).split(path.sep).join("/");
        const imports = ts.preProcessFile(text, true, true).importedFiles.map(({ fileName }) => resolved(file, fileName));
        found.push({ file, text, imports });
      }
    }
  };
  const start = path.join(root, folder);
  if (existsSync(start)) walk(start);
  return found;
}

/** "~/x" and "./x" as paths from the root; packages as they are. */
function resolved(file: string, name: string): string {
  if (name.startsWith("~/")) return `app/${name.slice(2)}`;
  return name.startsWith(".") ? path.posix.normalize(path.posix.join(path.posix.dirname(file), name)) : name;
}

const isTest = (file: string) => /\.test\.tsx?$/.test(file);
const within = (folder: string) => (s: Source) => s.file.startsWith(`${folder}/`) && !isTest(s.file);

/** Packages that one file or folder of the core alone may import. */
const CORE_PACKAGES: Readonly<Record<string, RegExp>> = {
  zod: /^app\/cartons\//, "clipper2-ts": /^app\/cartons\/geometry\/offset\.ts$/, earcut: /^app\/cartons\/geometry\/triangulate\.ts$/,
  makerjs: /^app\/cartons\/export\/dxf[\w-]*\.ts$/, "pdf-lib": /^app\/cartons\/export\/pdf\//, "@pdf-lib/fontkit": /^app\/cartons\/export\/pdf\//,
};

/** "clipper2-ts/dist/Core.js" is a part of "clipper2-ts". */
const packageOf = (name: string): string => name.split("/").slice(0, name.startsWith("@") ? 2 : 1).join("/");

interface Rule { readonly name: string; readonly instead: string; readonly broken: (s: Source) => string[] }

const forbids = (name: string, where: (s: Source) => boolean, what: (imported: string) => boolean, instead: string): Rule =>
  ({ name, instead, broken: (s) => (where(s) ? s.imports.filter(what).map((i) => `${s.file} imports ${i}`) : []) });

const says = (name: string, where: (s: Source) => boolean, pattern: RegExp, instead: string): Rule =>
  ({ name, instead, broken: (s) => (where(s) && pattern.test(s.text) ? [`${s.file} matches ${pattern}`] : []) });

const RULES: readonly Rule[] = [
  {
    name: "the core imports nothing outside itself but its few packages", instead: "Hand it in as an argument, or wrap the package in the one file that may import it.",
    broken: (s) => (within("app/cartons")(s) ? s.imports.filter((i) => !i.startsWith("app/cartons/") && !CORE_PACKAGES[packageOf(i)]?.test(s.file)).map((i) => `${s.file} imports ${i}`) : []),
  },
  forbids("geometry knows no carton", within("app/cartons/geometry"), (i) => i.startsWith("app/cartons/") && !/^app\/cartons\/(geometry|units)\//.test(i), "Move what speaks of panels to blank/ or checks/."),
  forbids("a construction sees the kit and its parts", (s) => within("app/cartons/constructions")(s) && !s.file.endsWith("registry.ts"),
    (i) => i.startsWith("app/cartons/") && !/^app\/cartons\/(constructions|blank|parameters|geometry|types)/.test(i), "Ask the kit; if it cannot, teach it."),
  forbids("only the registry imports constructions", (s) => !s.file.startsWith("app/cartons/constructions/") && !isTest(s.file) && !s.file.startsWith("tests/"),
    (i) => /^app\/cartons\/constructions\/(?!registry|construction$)/.test(i), "Read the registry; a difference between constructions is a property of the blank."),
  forbids("exporters read the carton", within("app/cartons/export"), (i) => /^app\/cartons\/(constructions|checks|blank|parameters)\//.test(i), "What is missing belongs in layers, fold or ledger."),
  forbids("layers, fold and ledger do not import one another: layers", within("app/cartons/layers"), (i) => /^app\/cartons\/(fold|ledger|checks)\//.test(i), "They meet in assemble.ts; only checks read across."),
  forbids("layers, fold and ledger do not import one another: fold", within("app/cartons/fold"), (i) => /^app\/cartons\/(layers|ledger|checks)\//.test(i), "They meet in assemble.ts; only checks read across."),
  forbids("layers, fold and ledger do not import one another: ledger", within("app/cartons/ledger"), (i) => /^app\/cartons\/(layers|fold|checks)\//.test(i), "They meet in assemble.ts; only checks read across."),
  forbids("parts of a page reach no server", (s) => within("app/bench")(s) || within("app/components")(s), (i) => /\.server$/.test(i) || /^app\/(db|services)\//.test(i), "Load it in the route and hand it down."),
  forbids("database and services reach no page", (s) => within("app/db")(s) || within("app/services")(s), (i) => /^app\/(routes|components|bench)\//.test(i), "Return data; the route decides what to show."),
  forbids("three comes in by one door", (s) => within("app")(s) && !/^app\/bench\/(three\/|fold-view\.client)/.test(s.file), (i) => i === "three" || i.startsWith("three/") || i.startsWith("@react-three/"), "Draw it in app/bench/three, behind fold-view.client.tsx."),
  forbids("pages bring no PDF code to the browser", (s) => within("app/bench")(s) || within("app/components")(s), (i) => i.startsWith("app/cartons/export/pdf/") || i === "app/cartons/export/dxf", "Files are made by the export routes."),
  forbids("the app does not import its tests or scripts", within("app"), (i) => /^(tests|scripts)\//.test(i), "Move it into app/."),
  says("no clock, chance or console in the core", within("app/cartons"), /\b(Date\.now|new Date|Math\.random|console\.|performance\.now|setTimeout)\b/, "Take it as an argument."),
  says("no module-level let in the core", within("app/cartons"), /^(export )?let /m, "Return values; keep nothing."),
  {
    name: "small numbers live in geometry/tolerance.ts", instead: "Name it there, with its unit and its reason.",
    broken: (s) => (within("app/cartons")(s) && !s.file.endsWith("geometry/tolerance.ts") ? [...s.text.replace(/\/\/.*|\/\*[\s\S]*?\*\//g, "").matchAll(/\b0\.000\d*[1-9]|\b\d+e-\d+/g)].map((m) => `${s.file} has ${m[0]}`) : []),
  },
  { name: "no drawers", instead: "Name the file by what it holds.", broken: (s) => (/\/(utils?|helpers?|misc|common|legacy)(\/|\.|-)/i.test(`/${s.file}`) || /[-/]v\d+\.tsx?$/.test(s.file) ? [s.file] : []) },
  { name: "a file is what one head holds: 300 lines", instead: "Find the part that is hiding in it.", broken: (s) => (s.text.split("\n").length > 320 ? [`${s.file} has ${s.text.split("\n").length} lines`] : []) },
];

const brokenIn = (sources: readonly Source[]) => RULES.map((rule) => ({ rule, found: sources.flatMap(rule.broken) })).filter((b) => b.found.length > 0);

describe("the house", () => {
  const sources = ["app", "server", "scripts", "tests"].flatMap((folder) => sourcesUnder(ROOT, folder));
  it.each(RULES.map((r) => [r.name, r] as const))("%s", (_, rule) => {
    expect(sources.flatMap(rule.broken), rule.instead).toEqual([]);
  });

  it("has every path that DEVELOPERS.md names", () => {
    const named = [...readFileSync(path.join(ROOT, "DEVELOPERS.md"), "utf8").matchAll(/`((?:app|tests|scripts|server|drizzle|docs|public)\/[\w./$-]*)`/g)].map((m) => m[1]!);
    expect(named.length).toBeGreaterThan(15);
    expect(named.filter((p) => !existsSync(path.join(ROOT, p)))).toEqual([]);
  });
});

describe("the rules themselves", () => {
  const offence = (file: string, text: string): Source => ({ file, text, imports: ts.preProcessFile(text, true, true).importedFiles.map(({ fileName }) => resolved(file, fileName)) });
  it.each([
    ["app/cartons/layers/x.ts", 'import { readFile } from "node:fs";'],
    ["app/cartons/geometry/x.ts", 'import { Blank } from "../blank/blank";'],
    ["app/cartons/constructions/x.ts", 'import { poseAt } from "../fold/pose";'],
    ["app/bench/x.tsx", 'const t = await import("~/cartons/constructions/glued-tray");'],
    ["app/cartons/export/x.ts", 'import { createKit } from "../blank/kit";'],
    ["app/cartons/layers/x.ts", 'export { poseAt } from "../fold/pose";'],
    ["app/components/x.tsx", 'import { db } from "~/db/client.server";'],
    ["app/db/x.ts", 'import { Button } from "~/components/button";'],
    ["app/routes/x.tsx", 'import { Mesh } from "three";'],
    ["app/bench/x.tsx", 'import { dxfOf } from "~/cartons/export/dxf";'],
    ["app/routes/x.tsx", 'import { SEED } from "../../tests/support/arbitraries";'],
    ["app/cartons/fold/x.ts", "const seed = Math.random();"],
    ["app/cartons/fold/x.ts", "let counter = 0;"],
    ["app/cartons/fold/x.ts", "const near = 1e-7;"],
    ["app/components/utils.ts", ""],
    ["app/components/x.ts", "\n".repeat(400)],
  ])("catch %s: %s", (file, text) => expect(brokenIn([offence(file, text)])).toHaveLength(1));
});
