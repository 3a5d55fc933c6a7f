import { and, asc, count, eq, isNotNull, isNull, sql } from "drizzle-orm";
import type { Viewer } from "~/auth/viewer";
import { KnownError } from "~/copy/errors";
import type { Queryable } from "../client.server";
import { newId } from "../new-id.server";
import { cartons } from "../schema/cartons";
import { clients } from "../schema/clients";
import { contains, type Listed, type Page, placeOf, within } from "./scope.server";

export interface ClientRow {
  readonly id: string;
  readonly name: string;
  readonly note: string;
  readonly createdAt: Date;
  readonly cartonCount: number;
}

export interface ClientFilter extends Page {
  readonly q?: string;
}

const columns = {
  id: clients.id,
  name: clients.name,
  note: clients.note,
  createdAt: clients.createdAt,
  cartonCount: sql<number>`(SELECT COUNT(*) FROM ${cartons} WHERE ${cartons.clientId} = ${clients.id} AND ${cartons.deletedAt} IS NULL)`.mapWith(Number),
};

export async function findClient(db: Queryable, viewer: Viewer, id: string): Promise<ClientRow | null> {
  const [row] = await db.select(columns).from(clients).where(and(eq(clients.id, id), isNull(clients.deletedAt), within(viewer, "client.read", clients.id)));
  return row ?? null;
}

export async function listClients(db: Queryable, viewer: Viewer, filter: ClientFilter): Promise<Listed<ClientRow>> {
  const where = and(isNull(clients.deletedAt), within(viewer, "client.read", clients.id), filter.q ? contains(clients.name, filter.q) : undefined);
  const [all] = await db.select({ total: count() }).from(clients).where(where);
  const total = all?.total ?? 0;
  const { offset, ...place } = placeOf(filter, total);
  const rows = await db.select(columns).from(clients).where(where).orderBy(asc(clients.name), asc(clients.id)).limit(filter.pageSize).offset(offset);
  return { rows, total, ...place };
}

/** Every client the viewer sees, for a list to choose from. */
export function listClientChoices(db: Queryable, viewer: Viewer): Promise<{ id: string; name: string }[]> {
  return db
    .select({ id: clients.id, name: clients.name })
    .from(clients)
    .where(and(isNull(clients.deletedAt), within(viewer, "client.read", clients.id)))
    .orderBy(asc(clients.name), asc(clients.id));
}

export async function createClient(db: Queryable, viewer: Viewer, client: { name: string; note: string }): Promise<string> {
  within(viewer, "client.write", clients.id);
  const id = newId();
  await db.insert(clients).values({ id, name: client.name, note: client.note });
  return id;
}

export async function updateClient(db: Queryable, viewer: Viewer, id: string, client: { name: string; note: string }): Promise<void> {
  const [result] = await db
    .update(clients)
    .set({ name: client.name, note: client.note, updatedAt: new Date() })
    .where(and(eq(clients.id, id), isNull(clients.deletedAt), within(viewer, "client.write", clients.id)));
  if (result.affectedRows === 0) throw new KnownError("not-found");
}

/** Its cartons and templates go out of sight with it, and its contacts cannot sign in; restoring brings all back. */
export async function deleteClient(db: Queryable, viewer: Viewer, id: string): Promise<void> {
  const [result] = await db
    .update(clients)
    .set({ deletedAt: new Date() })
    .where(and(eq(clients.id, id), isNull(clients.deletedAt), within(viewer, "client.write", clients.id)));
  if (result.affectedRows === 0) throw new KnownError("not-found");
}

export async function restoreClient(db: Queryable, viewer: Viewer, id: string): Promise<void> {
  const [result] = await db
    .update(clients)
    .set({ deletedAt: null })
    .where(and(eq(clients.id, id), isNotNull(clients.deletedAt), within(viewer, "trash.restore", clients.id)));
  if (result.affectedRows === 0) throw new KnownError("not-found");
}

/** A thing may only be given to a client that is there: null (the studio itself) always is. */
export async function requireLiveClient(db: Queryable, viewer: Viewer, clientId: string | null): Promise<void> {
  if (clientId !== null && (await findClient(db, viewer, clientId)) === null) throw new KnownError("not-found");
}
