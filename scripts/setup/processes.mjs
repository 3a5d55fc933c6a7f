// Children and process numbers. A number in a file proves nothing: it may belong to somebody else by now.
import { spawn } from "node:child_process";
import { closeSync, openSync, readFileSync } from "node:fs";

/** The command line of a live process as a list of words; null when there is no such process. */
export function commandLineOf(pid, proc = "/proc") {
  try {
    const words = readFileSync(`${proc}/${pid}/cmdline`, "utf8").split("\0").filter(Boolean);
    return words.length > 0 ? words : null;
  } catch {
    return null;
  }
}

/** The process number in a file, if that process lives and its command line holds `word`; else null. */
export function livePid(pidFile, word, proc = "/proc") {
  let text;
  try {
    text = readFileSync(pidFile, "utf8");
  } catch {
    return null;
  }
  const pid = Number(text.trim());
  if (!Number.isInteger(pid) || pid <= 1) return null;
  return commandLineOf(pid, proc)?.includes(word) ? pid : null;
}

/** npm's own variables would reach into the commands we start (and turn `npm ci` into another). */
export function cleanEnvironment(extra = {}) {
  const kept = Object.entries(process.env).filter(([name]) => !/^npm_(config|lifecycle|package|command|node)_/i.test(name));
  return { ...Object.fromEntries(kept), ...extra };
}

const children = new Set();

/** Ends whatever `run` has started and is still at work: a signal to this process alone would leave it behind. */
export function endChildren(signal = "SIGTERM") {
  for (const child of children) child.kill(signal);
}

/**
 * Runs a command to its end. Resolves with the exit status (128 + n when killed by a signal).
 * `log`: a file that takes its output; without it the output goes to this terminal.
 */
export function run(command, args, { cwd, env = cleanEnvironment(), log } = {}) {
  const output = log ? openSync(log, "a", 0o600) : "inherit";
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd, env, stdio: ["ignore", output, output] });
    if (log) closeSync(output);
    children.add(child);
    child.once("error", reject);
    child.once("exit", (status, signal) => {
      children.delete(child);
      resolve(status ?? (signal === "SIGINT" ? 130 : 143));
    });
  });
}

/** Ends a process politely, then firmly after `patience` milliseconds. Resolves when it is gone. */
export async function endProcess(pid, word, patience = 15_000) {
  const isOurs = () => commandLineOf(pid)?.includes(word) ?? false;
  if (!isOurs()) return;
  process.kill(pid, "SIGTERM");
  const deadline = Date.now() + patience;
  while (isOurs()) {
    if (Date.now() > deadline) {
      process.kill(pid, "SIGKILL");
      return;
    }
    await pause(20);
  }
}

export function pause(milliseconds) {
  return new Promise((resolve) => setTimeout(resolve, milliseconds));
}
