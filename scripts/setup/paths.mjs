// Where the set-up keeps its things. Only Node's own modules: this file runs before any package is installed.
import { createHash } from "node:crypto";
import { chmodSync, mkdirSync, statSync } from "node:fs";
import { tmpdir, userInfo } from "node:os";
import path from "node:path";
import { fileURLToPath } from "node:url";

export const projectRoot = fileURLToPath(new URL("../..", import.meta.url)).replace(/\/$/, "");
export const dataRoot = path.join(projectRoot, ".data");

/** MariaDB refuses a socket path above 107 characters: the longest a path may be before a short one is used instead. */
const longestSocketPath = 100;

/**
 * Makes `.data` readable by its owner alone.
 * Throws a sentence when another user (usually root) made it: a private database cannot be opened then.
 */
export function openDataRoot(root = dataRoot) {
  mkdirSync(root, { recursive: true, mode: 0o700 });
  const owner = statSync(root).uid;
  const me = userInfo();
  if (me.uid !== owner && me.uid !== 0) {
    throw new SetUpError(
      `${root} belongs to another user (number ${owner}), so ${me.username} cannot open the database in it. ` +
        `Give it to yourself with: sudo chown -R ${me.username} ${root}`,
    );
  }
  if (me.uid === owner) chmodSync(root, 0o700);
  return root;
}

/** A socket path that MariaDB accepts: inside the data directory, or a short hashed name in the temporary folder. */
export function socketPathFor(dataDirectory, temporary = tmpdir()) {
  const inside = path.join(dataDirectory, "db.sock");
  if (inside.length <= longestSocketPath) return inside;
  const hash = createHash("sha256").update(dataDirectory).digest("hex").slice(0, 12);
  return path.join(temporary, `cartonwright-${hash}.sock`);
}

/** Something the person at the terminal can mend: shown as a sentence, without a stack. */
export class SetUpError extends Error {
  name = "SetUpError";
}

export function say(line) {
  process.stdout.write(`${line}\n`);
}
