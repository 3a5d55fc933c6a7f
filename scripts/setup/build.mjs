// The built pages: made again only when something they are made from has changed.
import { createHash } from "node:crypto";
import { existsSync, readFileSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { SetUpError, say } from "./paths.mjs";
import { cleanEnvironment, run } from "./processes.mjs";

const sources = ["app", "public", "package-lock.json", "react-router.config.ts", "tsconfig.json", "vite.config.ts"];

/** A hash over the names and bytes of everything the build reads. Tests beside the modules are left out. */
export function hashSources(root, entries = sources) {
  const hash = createHash("sha256");
  const visit = (relative) => {
    const full = path.join(root, relative);
    if (!existsSync(full)) return;
    let names = null;
    try {
      names = readdirSync(full);
    } catch (error) {
      if (error.code !== "ENOTDIR") throw error;
    }
    if (names) {
      for (const name of names.sort()) visit(path.join(relative, name));
    } else if (!/\.test\.tsx?$/.test(relative)) {
      hash.update(relative).update("\0").update(readFileSync(full)).update("\0");
    }
  };
  for (const entry of entries) visit(entry);
  return hash.digest("hex");
}

/**
 * Builds into `directory` (relative to the project) unless it holds the build of these very sources.
 * `log` takes the build's words, which are shown when it fails. The stamp is written last, so an interrupted build is made again.
 */
export async function ensureBuild(root, directory, log) {
  const stamp = path.join(root, directory, ".sources-stamp");
  const hash = hashSources(root);
  if (existsSync(stamp) && readFileSync(stamp, "utf8").trim() === hash) return;
  say("Building the pages …");
  rmSync(stamp, { force: true });
  rmSync(log, { force: true });
  const status = await run(
    process.execPath,
    [reactRouterBin(root), "build"],
    { cwd: root, env: cleanEnvironment({ NODE_ENV: "production", BUILD_DIRECTORY: directory }), log },
  );
  if (status !== 0) throw new SetUpError(`${readFileSync(log, "utf8")}\nThe build failed; its words are above.`);
  writeFileSync(stamp, `${hash}\n`);
}

/** The framework's command, as its own package names it. */
export function reactRouterBin(root) {
  const folder = path.join(root, "node_modules/@react-router/dev");
  const { bin } = JSON.parse(readFileSync(path.join(folder, "package.json"), "utf8"));
  return path.join(folder, typeof bin === "string" ? bin : bin["react-router"]);
}
