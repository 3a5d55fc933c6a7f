// Cartons as they are stored. What a brief means is the core's business: here it goes in and out as it is.
import { and, asc, count, desc, eq, isNotNull, or, type SQL } from "drizzle-orm";
import { alias } from "drizzle-orm/mysql-core";
import type { Viewer } from "~/auth/viewer";
import { KnownError } from "~/copy/errors";
import type { Queryable } from "../client.server";
import { newId } from "../new-id.server";
import { cartons } from "../schema/cartons";
import { clients } from "../schema/clients";
import { users } from "../schema/users";
import { requireLiveClient } from "./clients.server";
import { contains, isLive, type Listed, type Page, placeOf, within } from "./scope.server";

/** A carton in a list. */
export interface CartonRow {
  readonly id: string;
  readonly name: string;
  readonly clientId: string | null;
  readonly clientName: string | null;
  readonly construction: string;
  readonly board: string;
  readonly brief: unknown;
  readonly rowVersion: number;
  readonly updatedAt: Date;
  readonly updatedBy: string;
}

export interface CartonRecord extends CartonRow {
  readonly note: string;
  readonly fingerprint: string;
  readonly coreVersion: string;
  readonly createdAt: Date;
  readonly createdBy: string;
}

export const cartonSorts = ["updated", "name", "client", "construction"] as const;
export interface CartonFilter extends Page {
  /** Words in the name, the note or the client's name. */
  readonly q?: string;
  readonly clientId?: string;
  readonly construction?: string;
  readonly sort?: (typeof cartonSorts)[number];
  readonly direction?: "up" | "down";
}

/** What the core worked out from a brief, kept beside it. `brief` has been through the core's schema. */
export interface BriefToStore {
  readonly brief: unknown;
  readonly construction: string;
  readonly board: string;
  /** SHA-256 of the layers, hexadecimal. */
  readonly fingerprint: string;
  readonly coreVersion: string;
}

export interface CartonToStore extends BriefToStore {
  readonly name: string;
  readonly clientId: string | null;
  readonly note: string;
}

const maker = alias(users, "maker");
const changer = alias(users, "changer");

const rowColumns = {
  id: cartons.id,
  name: cartons.name,
  clientId: cartons.clientId,
  clientName: clients.name,
  construction: cartons.construction,
  board: cartons.board,
  brief: cartons.brief,
  rowVersion: cartons.rowVersion,
  updatedAt: cartons.updatedAt,
  updatedBy: changer.name,
};

export async function findCarton(db: Queryable, viewer: Viewer, id: string): Promise<CartonRecord | null> {
  const [row] = await db
    .select({
      ...rowColumns,
      note: cartons.note,
      fingerprint: cartons.fingerprint,
      coreVersion: cartons.coreVersion,
      createdAt: cartons.createdAt,
      createdBy: maker.name,
    })
    .from(cartons)
    .leftJoin(clients, eq(clients.id, cartons.clientId))
    .innerJoin(maker, eq(maker.id, cartons.createdBy))
    .innerJoin(changer, eq(changer.id, cartons.updatedBy))
    .where(and(eq(cartons.id, id), isLive(cartons.deletedAt), within(viewer, "carton.read", cartons.clientId)));
  return row ?? null;
}

export async function listCartons(db: Queryable, viewer: Viewer, filter: CartonFilter): Promise<Listed<CartonRow>> {
  const where = and(
    isLive(cartons.deletedAt),
    within(viewer, "carton.read", cartons.clientId),
    filter.clientId ? eq(cartons.clientId, filter.clientId) : undefined,
    filter.construction ? eq(cartons.construction, filter.construction) : undefined,
    filter.q ? or(contains(cartons.name, filter.q), contains(cartons.note, filter.q), contains(clients.name, filter.q)) : undefined,
  );
  const [all] = await db.select({ total: count() }).from(cartons).leftJoin(clients, eq(clients.id, cartons.clientId)).where(where);
  const total = all?.total ?? 0;
  const { offset, ...place } = placeOf(filter, total);
  const rows = await db
    .select(rowColumns)
    .from(cartons)
    .leftJoin(clients, eq(clients.id, cartons.clientId))
    .innerJoin(changer, eq(changer.id, cartons.updatedBy))
    .where(where)
    .orderBy(...orderOf(filter))
    .limit(filter.pageSize)
    .offset(offset);
  return { rows, total, ...place };
}

function orderOf({ sort = "updated", direction }: CartonFilter): SQL[] {
  const column = { updated: cartons.updatedAt, name: cartons.name, client: clients.name, construction: cartons.construction }[sort];
  const isUp = direction ? direction === "up" : sort !== "updated";
  // The id last, so that rows of equal rank keep their page.
  return [isUp ? asc(column) : desc(column), asc(cartons.id)];
}

export async function createCarton(db: Queryable, viewer: Viewer, carton: CartonToStore): Promise<string> {
  within(viewer, "carton.write", cartons.clientId);
  await requireLiveClient(db, viewer, carton.clientId);
  const id = newId();
  await db.insert(cartons).values({ id, ...stored(carton), createdBy: viewer.id, updatedBy: viewer.id });
  return id;
}

export type UpdateResult = { readonly saved: CartonRecord } | { readonly conflict: CartonRecord };

/**
 * Saves over the version that the page started from. Somebody saved in between: nothing is written, and `conflict` is
 * what they saved. `change` may leave out what stays as it is. Throws `not-found`.
 */
export async function updateCarton(db: Queryable, viewer: Viewer, id: string, rowVersion: number, change: Partial<CartonToStore>): Promise<UpdateResult> {
  const before = await requireWritable(db, viewer, id);
  if (change.clientId !== undefined && change.clientId !== before.clientId) await requireLiveClient(db, viewer, change.clientId);
  const [result] = await db
    .update(cartons)
    .set({ ...stored(change), rowVersion: rowVersion + 1, updatedBy: viewer.id, updatedAt: new Date() })
    .where(and(eq(cartons.id, id), eq(cartons.rowVersion, rowVersion), within(viewer, "carton.write", cartons.clientId)));
  const now = await requireWritable(db, viewer, id);
  return result.affectedRows === 1 ? { saved: now } : { conflict: now };
}

/** A new carton with the same brief, for the same client or another. */
export async function copyCarton(db: Queryable, viewer: Viewer, id: string, to: { name: string; clientId: string | null }): Promise<string> {
  const from = await requireWritable(db, viewer, id);
  return createCarton(db, viewer, { ...from, ...to });
}

export async function deleteCarton(db: Queryable, viewer: Viewer, id: string): Promise<void> {
  await requireWritable(db, viewer, id);
  await db.update(cartons).set({ deletedAt: new Date() }).where(and(eq(cartons.id, id), within(viewer, "carton.write", cartons.clientId)));
}

export async function restoreCarton(db: Queryable, viewer: Viewer, id: string): Promise<void> {
  const [result] = await db
    .update(cartons)
    .set({ deletedAt: null })
    .where(and(eq(cartons.id, id), isNotNull(cartons.deletedAt), within(viewer, "trash.restore", cartons.clientId)));
  if (result.affectedRows === 0) throw new KnownError("not-found");
}

async function requireWritable(db: Queryable, viewer: Viewer, id: string): Promise<CartonRecord> {
  within(viewer, "carton.write", cartons.clientId);
  const found = await findCarton(db, viewer, id);
  if (found === null) throw new KnownError("not-found");
  return found;
}

/** The columns of a carton, and nothing else that an object may carry. */
function stored<From extends Partial<CartonToStore>>(carton: From): Pick<From, keyof CartonToStore & keyof From> {
  const { name, clientId, note, brief, construction, board, fingerprint, coreVersion } = carton;
  const all = { name, clientId, note, brief, construction, board, fingerprint, coreVersion };
  return Object.fromEntries(Object.entries(all).filter(([, value]) => value !== undefined)) as Pick<From, keyof CartonToStore & keyof From>;
}
