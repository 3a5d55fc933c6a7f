import { and, desc, eq, gt, lt, ne } from "drizzle-orm";
import type { Viewer } from "~/auth/viewer";
import { KnownError } from "~/copy/errors";
import type { Queryable } from "../client.server";
import { newId } from "../new-id.server";
import { sessions } from "../schema/sessions";

export interface StoredSession {
  readonly userId: string;
  readonly data: Record<string, unknown>;
  readonly lastSeen: Date;
}

export async function insertSession(db: Queryable, session: { idHash: string; userId: string; userAgent: string; data: Record<string, unknown>; expiresAt: Date }): Promise<void> {
  await db.insert(sessions).values({ ...session, publicId: newId() });
}

/** Null when there is none, or its time is over. */
export async function findSession(db: Queryable, idHash: string, now: Date): Promise<StoredSession | null> {
  const [row] = await db
    .select({ userId: sessions.userId, data: sessions.data, lastSeen: sessions.lastSeen })
    .from(sessions)
    .where(and(eq(sessions.idHash, idHash), gt(sessions.expiresAt, now)));
  return row ?? null;
}

export async function touchSession(db: Queryable, idHash: string, change: { data: Record<string, unknown>; lastSeen: Date; expiresAt: Date }): Promise<void> {
  await db.update(sessions).set(change).where(eq(sessions.idHash, idHash));
}

export async function deleteSession(db: Queryable, idHash: string): Promise<void> {
  await db.delete(sessions).where(eq(sessions.idHash, idHash));
}

export interface SessionRow {
  readonly id: string;
  readonly userAgent: string;
  readonly createdAt: Date;
  readonly lastSeen: Date;
  /** The one that asks. */
  readonly isThis: boolean;
}

export async function listSessions(db: Queryable, viewer: Viewer, thisIdHash: string, now: Date): Promise<SessionRow[]> {
  const rows = await db
    .select()
    .from(sessions)
    .where(and(eq(sessions.userId, viewer.id), gt(sessions.expiresAt, now)))
    .orderBy(desc(sessions.lastSeen), desc(sessions.publicId))
    .limit(100);
  return rows.map(({ publicId, userAgent, createdAt, lastSeen, idHash }) => ({ id: publicId, userAgent, createdAt, lastSeen, isThis: idHash === thisIdHash }));
}

/** Ends one of the viewer's own sign-ins, by the name it has in the list. */
export async function endSession(db: Queryable, viewer: Viewer, id: string): Promise<void> {
  const [result] = await db.delete(sessions).where(and(eq(sessions.publicId, id), eq(sessions.userId, viewer.id)));
  if (result.affectedRows === 0) throw new KnownError("not-found");
}

/** Ends every other sign-in of the viewer. Returns how many. */
export async function endOtherSessions(db: Queryable, viewer: Viewer, thisIdHash: string): Promise<number> {
  const [result] = await db.delete(sessions).where(and(eq(sessions.userId, viewer.id), ne(sessions.idHash, thisIdHash)));
  return result.affectedRows;
}

export async function endAllSessions(db: Queryable, viewer: Viewer): Promise<void> {
  await db.delete(sessions).where(eq(sessions.userId, viewer.id));
}

export async function purgeSessions(db: Queryable, now: Date): Promise<void> {
  await db.delete(sessions).where(lt(sessions.expiresAt, now));
}
