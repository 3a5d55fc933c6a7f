// Programs from Debian: found on the path, or installed by apt as root, or named so that somebody else can install them.
import { spawnSync } from "node:child_process";
import { accessSync, constants } from "node:fs";
import path from "node:path";
import { SetUpError, say } from "./paths.mjs";
import { cleanEnvironment, run } from "./processes.mjs";

/** The full path of a program, /usr/sbin included (where Debian puts mariadbd and many users' PATH does not look). */
export function findProgram(name, searchPath = process.env.PATH ?? "") {
  for (const folder of [...searchPath.split(":"), "/usr/local/sbin", "/usr/sbin", "/usr/bin"]) {
    if (!folder) continue;
    const candidate = path.join(folder, name);
    try {
      accessSync(candidate, constants.X_OK);
      return candidate;
    } catch {
      continue;
    }
  }
  return null;
}

/** Makes sure that every program is there, installing the packages once where one is missing. */
export async function ensurePrograms(programs, packages, { log, purpose }) {
  const missing = () => programs.filter((name) => findProgram(name) === null);
  if (missing().length === 0) return;
  const byHand = `sudo apt-get update && sudo apt-get install -y --no-install-recommends ${packages.join(" ")}`;
  const prefix = administratorPrefix();
  if (prefix === null || findProgram("apt-get") === null) {
    throw new SetUpError(
      `${purpose} needs ${missing().join(", ")}, which this machine does not have, and you may not install it here. ` +
        `Have it installed once, then start again:\n  ${byHand}`,
    );
  }
  say(`Installing ${packages.join(", ")} from Debian (${purpose}) …`);
  const apt = ["env", "DEBIAN_FRONTEND=noninteractive", "apt-get", "-q", "-o", "DPkg::Lock::Timeout=120"];
  const steps = [["update"], ["install", "-y", "--no-install-recommends", ...packages]];
  for (const step of steps) {
    const [command, ...args] = [...prefix, ...apt, ...step];
    const status = await run(command, args, { log, env: cleanEnvironment() });
    if (status !== 0 && step[0] === "install") {
      throw new SetUpError(`apt-get could not install ${packages.join(", ")} (status ${status}). Its words are in ${log}. By hand:\n  ${byHand}`);
    }
  }
  const left = missing();
  if (left.length > 0) throw new SetUpError(`${left.join(", ")} is still missing after the installation. See ${log}.`);
}

function administratorPrefix() {
  if (process.getuid?.() === 0) return [];
  if (findProgram("sudo") === null) return null;
  return spawnSync("sudo", ["-n", "true"], { stdio: "ignore" }).status === 0 ? ["sudo", "-n"] : null;
}
