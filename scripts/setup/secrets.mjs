// The secret that signs session cookies: from the environment, or made once and kept readable by its owner alone.
import { randomBytes } from "node:crypto";
import { readFileSync, writeFileSync } from "node:fs";
import path from "node:path";

export function sessionSecret(dataRoot, given = process.env.SESSION_SECRET) {
  if (given) return given;
  const file = path.join(dataRoot, "session-secret");
  try {
    const kept = readFileSync(file, "utf8").trim();
    if (kept.length >= 32) return kept;
  } catch (error) {
    if (error.code !== "ENOENT") throw error;
  }
  const made = randomBytes(32).toString("base64url");
  writeFileSync(file, `${made}\n`, { mode: 0o600 });
  return made;
}
