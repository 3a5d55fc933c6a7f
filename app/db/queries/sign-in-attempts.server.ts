import { and, eq, gt, lt, ne, or } from "drizzle-orm";
import type { Queryable } from "../client.server";
import { signInAttempts } from "../schema/sessions";

export interface Try {
  readonly email: string;
  readonly address: string;
}

/** Written down before it is judged, so that many tries at once cannot all slip under the limit. */
export async function recordTry(db: Queryable, attempt: Try, at: Date): Promise<number> {
  const [row] = await db.insert(signInAttempts).values({ ...attempt, at }).$returningId();
  if (!row) throw new Error("The database gave a sign-in attempt no number.");
  return row.id;
}

/** Moments of the other tries since `since`, with the same e-mail and from the same address. */
export async function findTries(db: Queryable, { email, address }: Try, since: Date, exceptId: number): Promise<{ email: Date[]; address: Date[] }> {
  const rows = await db
    .select({ email: signInAttempts.email, address: signInAttempts.address, at: signInAttempts.at })
    .from(signInAttempts)
    .where(and(gt(signInAttempts.at, since), ne(signInAttempts.id, exceptId), or(eq(signInAttempts.email, email), eq(signInAttempts.address, address))));
  return {
    email: rows.filter((row) => row.email.toLowerCase() === email.toLowerCase()).map((row) => row.at),
    address: rows.filter((row) => row.address === address).map((row) => row.at),
  };
}

export async function forgetTry(db: Queryable, id: number): Promise<void> {
  await db.delete(signInAttempts).where(eq(signInAttempts.id, id));
}

/** After a success: earlier slips with this e-mail no longer count. */
export async function forgetTriesOf(db: Queryable, email: string): Promise<void> {
  await db.delete(signInAttempts).where(eq(signInAttempts.email, email));
}

export async function purgeTries(db: Queryable, before: Date): Promise<void> {
  await db.delete(signInAttempts).where(lt(signInAttempts.at, before));
}
