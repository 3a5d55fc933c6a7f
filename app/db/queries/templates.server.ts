// Templates: briefs kept to start other cartons from, for one client or for every client of the studio.
import { and, asc, count, desc, eq, isNotNull, isNull, or, type SQL } from "drizzle-orm";
import { alias } from "drizzle-orm/mysql-core";
import type { Viewer } from "~/auth/viewer";
import { KnownError } from "~/copy/errors";
import type { Queryable } from "../client.server";
import { newId } from "../new-id.server";
import { clients } from "../schema/clients";
import { templates } from "../schema/templates";
import { users } from "../schema/users";
import { requireLiveClient } from "./clients.server";
import { contains, isLive, type Listed, type Page, placeOf, within } from "./scope.server";

export interface TemplateRecord {
  readonly id: string;
  readonly name: string;
  readonly note: string;
  /** Null: offered for every client. */
  readonly clientId: string | null;
  readonly clientName: string | null;
  readonly construction: string;
  readonly board: string;
  readonly constructionVersion: string;
  readonly brief: unknown;
  readonly createdAt: Date;
  readonly createdBy: string;
  readonly updatedAt: Date;
}

export interface TemplateToStore {
  readonly name: string;
  readonly note: string;
  readonly clientId: string | null;
  readonly brief: unknown;
  readonly construction: string;
  readonly board: string;
  readonly constructionVersion: string;
}

export const templateSorts = ["updated", "name", "client", "construction"] as const;
export interface TemplateFilter extends Page {
  readonly q?: string;
  /** Those that may be used for this client: its own and the studio's. */
  readonly forClientId?: string;
  readonly construction?: string;
  readonly sort?: (typeof templateSorts)[number];
  readonly direction?: "up" | "down";
}

const maker = alias(users, "maker");
const columns = {
  id: templates.id,
  name: templates.name,
  note: templates.note,
  clientId: templates.clientId,
  clientName: clients.name,
  construction: templates.construction,
  board: templates.board,
  constructionVersion: templates.constructionVersion,
  brief: templates.brief,
  createdAt: templates.createdAt,
  createdBy: maker.name,
  updatedAt: templates.updatedAt,
};

export async function findTemplate(db: Queryable, viewer: Viewer, id: string): Promise<TemplateRecord | null> {
  const [row] = await db
    .select(columns)
    .from(templates)
    .leftJoin(clients, eq(clients.id, templates.clientId))
    .innerJoin(maker, eq(maker.id, templates.createdBy))
    .where(and(eq(templates.id, id), isLive(templates.deletedAt), within(viewer, "template.read", templates.clientId)));
  return row ?? null;
}

export async function listTemplates(db: Queryable, viewer: Viewer, filter: TemplateFilter): Promise<Listed<TemplateRecord>> {
  const where = and(
    isLive(templates.deletedAt),
    within(viewer, "template.read", templates.clientId),
    filter.forClientId ? or(isNull(templates.clientId), eq(templates.clientId, filter.forClientId)) : undefined,
    filter.construction ? eq(templates.construction, filter.construction) : undefined,
    filter.q ? or(contains(templates.name, filter.q), contains(templates.note, filter.q), contains(clients.name, filter.q)) : undefined,
  );
  const [all] = await db.select({ total: count() }).from(templates).leftJoin(clients, eq(clients.id, templates.clientId)).where(where);
  const total = all?.total ?? 0;
  const { offset, ...place } = placeOf(filter, total);
  const rows = await db
    .select(columns)
    .from(templates)
    .leftJoin(clients, eq(clients.id, templates.clientId))
    .innerJoin(maker, eq(maker.id, templates.createdBy))
    .where(where)
    .orderBy(...orderOf(filter))
    .limit(filter.pageSize)
    .offset(offset);
  return { rows, total, ...place };
}

function orderOf({ sort = "name", direction }: TemplateFilter): SQL[] {
  const column = { updated: templates.updatedAt, name: templates.name, client: clients.name, construction: templates.construction }[sort];
  const isUp = direction ? direction === "up" : sort !== "updated";
  return [isUp ? asc(column) : desc(column), asc(templates.id)];
}

export async function createTemplate(db: Queryable, viewer: Viewer, template: TemplateToStore): Promise<string> {
  within(viewer, "template.write", templates.clientId);
  await requireLiveClient(db, viewer, template.clientId);
  const id = newId();
  const { name, note, clientId, brief, construction, board, constructionVersion } = template;
  await db.insert(templates).values({
    id, name, note, clientId, brief, construction, board, constructionVersion, createdBy: viewer.id, updatedBy: viewer.id,
  });
  return id;
}

/** Name, note and whom it is for; the brief of a template stays as it was saved. */
export async function updateTemplate(db: Queryable, viewer: Viewer, id: string, details: { name: string; note: string; clientId: string | null }): Promise<void> {
  await requireLiveClient(db, viewer, details.clientId);
  const [result] = await db
    .update(templates)
    .set({ name: details.name, note: details.note, clientId: details.clientId, updatedBy: viewer.id, updatedAt: new Date() })
    .where(and(eq(templates.id, id), isNull(templates.deletedAt), within(viewer, "template.write", templates.clientId)));
  if (result.affectedRows === 0) throw new KnownError("not-found");
}

export async function deleteTemplate(db: Queryable, viewer: Viewer, id: string): Promise<void> {
  const [result] = await db
    .update(templates)
    .set({ deletedAt: new Date() })
    .where(and(eq(templates.id, id), isNull(templates.deletedAt), within(viewer, "template.write", templates.clientId)));
  if (result.affectedRows === 0) throw new KnownError("not-found");
}

export async function restoreTemplate(db: Queryable, viewer: Viewer, id: string): Promise<void> {
  const [result] = await db
    .update(templates)
    .set({ deletedAt: null })
    .where(and(eq(templates.id, id), isNotNull(templates.deletedAt), within(viewer, "trash.restore", templates.clientId)));
  if (result.affectedRows === 0) throw new KnownError("not-found");
}
