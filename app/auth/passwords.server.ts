import { randomBytes } from "node:crypto";
import argon2 from "argon2";

// OWASP Password Storage Cheat Sheet, argon2id: m = 19456 KiB, t = 2, p = 1.
const cost = { type: argon2.argon2id, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

export function hashPassword(password: string): Promise<string> {
  return argon2.hash(password, cost);
}

/**
 * Whether the password belongs to the hash. Without a hash (an unknown e-mail) the same work is done on another one,
 * so that the time taken does not tell who has an account.
 */
export async function verifyPassword(hash: string | null, password: string): Promise<boolean> {
  const isRight = await argon2.verify(hash ?? (await decoyHash()), password);
  return hash !== null && isRight;
}

const kept: { decoy?: Promise<string> } = {};
function decoyHash(): Promise<string> {
  kept.decoy ??= hashPassword(randomBytes(24).toString("base64url"));
  return kept.decoy;
}
