// One set-up at a time: a file that names its holder, ignored once the holder has died.
import { closeSync, mkdirSync, openSync, readFileSync, rmSync, writeSync } from "node:fs";
import path from "node:path";
import { SetUpError } from "./paths.mjs";
import { commandLineOf, pause } from "./processes.mjs";

/** Runs `work` while holding the lock; waits up to `patience` milliseconds for another holder. */
export async function withLock(file, work, { patience = 300_000 } = {}) {
  mkdirSync(path.dirname(file), { recursive: true });
  const deadline = Date.now() + patience;
  while (!take(file)) {
    if (Date.now() > deadline) {
      throw new SetUpError(`Another start of this project holds ${file}. If none is running, delete that file.`);
    }
    await pause(150);
  }
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
  }
}

function take(file) {
  try {
    const handle = openSync(file, "wx", 0o600);
    writeSync(handle, String(process.pid));
    closeSync(handle);
    return true;
  } catch (error) {
    if (error.code !== "EEXIST") throw error;
  }
  // Did its holder die? A number that now belongs to something other than Node is a dead holder too.
  if (!isHeld(file)) rmSync(file, { force: true });
  return false;
}

function isHeld(file) {
  let holder;
  try {
    holder = readFileSync(file, "utf8").trim();
  } catch {
    return false;
  }
  // Just made and not yet written: somebody is between the two lines above.
  if (holder === "") return true;
  return commandLineOf(Number(holder))?.some((word) => /\bnode|\.mjs$|\.ts$/.test(word)) ?? false;
}
