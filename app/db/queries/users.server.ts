import { and, asc, eq, isNull, or } from "drizzle-orm";
import type { Role, Viewer } from "~/auth/viewer";
import { KnownError } from "~/copy/errors";
import type { Database, Queryable } from "../client.server";
import { newId } from "../new-id.server";
import { clients } from "../schema/clients";
import { sessions } from "../schema/sessions";
import { users } from "../schema/users";
import { requireReach } from "./scope.server";

/** May this person be here at all? Not when barred, and not as a contact of a client that is in the trash. */
const isWelcome = and(isNull(users.barredAt), or(isNull(users.clientId), isNull(clients.deletedAt)));

const viewerColumns = {
  id: users.id,
  name: users.name,
  email: users.email,
  role: users.role,
  clientId: users.clientId,
  clientName: clients.name,
};

/** For the session: the person behind an id. */
export async function findViewerById(db: Queryable, id: string): Promise<Viewer | null> {
  const [row] = await db.select(viewerColumns).from(users).leftJoin(clients, eq(clients.id, users.clientId)).where(and(eq(users.id, id), isWelcome));
  return row ?? null;
}

/** For signing in: the hash to compare with. */
export async function findCredentials(db: Queryable, email: string): Promise<{ id: string; passwordHash: string } | null> {
  const [row] = await db
    .select({ id: users.id, passwordHash: users.passwordHash })
    .from(users)
    .leftJoin(clients, eq(clients.id, users.clientId))
    .where(and(eq(users.email, email), isWelcome));
  return row ?? null;
}

export async function findPasswordHash(db: Queryable, viewer: Viewer): Promise<string | null> {
  const [row] = await db.select({ passwordHash: users.passwordHash }).from(users).where(eq(users.id, viewer.id));
  return row?.passwordHash ?? null;
}

export async function hasAnyUser(db: Queryable): Promise<boolean> {
  const [row] = await db.select({ id: users.id }).from(users).limit(1);
  return row !== undefined;
}

/** The first account of an empty studio. Null when somebody was quicker: there is an account already. */
export function createFirstOwner(db: Database, person: { name: string; email: string; passwordHash: string }): Promise<string | null> {
  return db.transaction(
    async (tx) => {
      const [anybody] = await tx.select({ id: users.id }).from(users).limit(1);
      if (anybody) return null;
      const id = newId();
      await tx.insert(users).values({ id, role: "owner", clientId: null, ...person });
      return id;
    },
    // Two at once: one of them waits for the other's lock and is then refused.
    { isolationLevel: "serializable" },
  );
}

export interface PersonToStore {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly clientId: string | null;
  readonly passwordHash: string;
}

/** Null when the e-mail is taken. */
export async function createUser(db: Queryable, viewer: Viewer, person: PersonToStore): Promise<string | null> {
  requireReach(viewer, "people.manage");
  const id = newId();
  try {
    await db.insert(users).values({ id, ...person });
  } catch (error) {
    if (isDuplicate(error)) return null;
    throw error;
  }
  return id;
}

export interface PersonRow extends Viewer {
  readonly barredAt: Date | null;
}

export function listPeople(db: Queryable, viewer: Viewer): Promise<PersonRow[]> {
  requireReach(viewer, "people.manage");
  return db
    .select({ ...viewerColumns, barredAt: users.barredAt })
    .from(users)
    .leftJoin(clients, eq(clients.id, users.clientId))
    .orderBy(asc(users.name), asc(users.id));
}

/** Barring ends every sign-in of that person at once. The owner who does it cannot bar themselves. */
export async function setBarred(db: Database, viewer: Viewer, id: string, isBarred: boolean): Promise<void> {
  requireReach(viewer, "people.manage");
  if (id === viewer.id) throw new KnownError("not-allowed");
  await db.transaction(async (tx) => {
    const [result] = await tx.update(users).set({ barredAt: isBarred ? new Date() : null, updatedAt: new Date() }).where(eq(users.id, id));
    if (result.affectedRows === 0) throw new KnownError("not-found");
    if (isBarred) await tx.delete(sessions).where(eq(sessions.userId, id));
  });
}

export async function changePassword(db: Queryable, viewer: Viewer, passwordHash: string): Promise<void> {
  await db.update(users).set({ passwordHash, updatedAt: new Date() }).where(eq(users.id, viewer.id));
}

function isDuplicate(error: unknown): boolean {
  const cause = error instanceof Error ? error.cause : null;
  return cause instanceof Error && "code" in cause && cause.code === "ER_DUP_ENTRY";
}
