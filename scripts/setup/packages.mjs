// npm packages exactly as the lock file says, fetched again only when the lock file has changed.
import { createHash } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { SetUpError, say } from "./paths.mjs";
import { cleanEnvironment, run } from "./processes.mjs";

export function lockStamp(root) {
  return createHash("sha256").update(readFileSync(path.join(root, "package-lock.json"))).digest("hex");
}

const stampFile = (root) => path.join(root, "node_modules", ".lock-stamp");

/** Whether node_modules was put in place from the lock file as it is now. */
export function packagesAreCurrent(root) {
  const file = stampFile(root);
  return existsSync(file) && readFileSync(file, "utf8").trim() === lockStamp(root);
}

/** Without install scripts: every package used here works without one, and no compiler is needed. */
export async function ensurePackages(root) {
  if (packagesAreCurrent(root)) return;
  say("Installing the packages named in package-lock.json …");
  const env = cleanEnvironment({ NODE_ENV: "development" });
  const status = await run("npm", ["ci", "--ignore-scripts", "--include=dev", "--no-audit", "--no-fund", "--loglevel=error"], { cwd: root, env });
  if (status !== 0) {
    throw new SetUpError("npm ci did not finish; its words are above. Check the connection to the registry, then start again.");
  }
  writeFileSync(stampFile(root), `${lockStamp(root)}\n`);
}
