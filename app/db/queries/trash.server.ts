// What was deleted: seen and brought back for 30 days, then gone.
import { and, desc, eq, inArray, isNotNull, lt, or } from "drizzle-orm";
import type { Viewer } from "~/auth/viewer";
import type { Database, Queryable } from "../client.server";
import { cartons } from "../schema/cartons";
import { clients } from "../schema/clients";
import { templates } from "../schema/templates";
import { users } from "../schema/users";
import { within } from "./scope.server";

export const daysInTrash = 30;
const dayMs = 86_400_000;

export const trashKinds = ["carton", "template", "client"] as const;
export interface TrashRow {
  readonly kind: (typeof trashKinds)[number];
  readonly id: string;
  readonly name: string;
  readonly clientName: string | null;
  readonly deletedAt: Date;
  /** When it can no longer be brought back. */
  readonly goneAt: Date;
}

/** The latest first; at most 500 of a kind. */
export async function listTrash(db: Queryable, viewer: Viewer): Promise<TrashRow[]> {
  const limit = 500;
  const found = [
    ...(await db
      .select({ id: cartons.id, name: cartons.name, clientName: clients.name, deletedAt: cartons.deletedAt })
      .from(cartons)
      .leftJoin(clients, eq(clients.id, cartons.clientId))
      .where(and(isNotNull(cartons.deletedAt), within(viewer, "trash.restore", cartons.clientId)))
      .orderBy(desc(cartons.deletedAt))
      .limit(limit)
    ).map((row) => ({ kind: "carton" as const, ...row })),
    ...(await db
      .select({ id: templates.id, name: templates.name, clientName: clients.name, deletedAt: templates.deletedAt })
      .from(templates)
      .leftJoin(clients, eq(clients.id, templates.clientId))
      .where(and(isNotNull(templates.deletedAt), within(viewer, "trash.restore", templates.clientId)))
      .orderBy(desc(templates.deletedAt))
      .limit(limit)
    ).map((row) => ({ kind: "template" as const, ...row })),
    ...(await db
      .select({ id: clients.id, name: clients.name, deletedAt: clients.deletedAt })
      .from(clients)
      .where(and(isNotNull(clients.deletedAt), within(viewer, "trash.restore", clients.id)))
      .orderBy(desc(clients.deletedAt))
      .limit(limit)
    ).map((row) => ({ kind: "client" as const, clientName: null, ...row })),
  ];
  return found
    .flatMap((row) => (row.deletedAt ? [{ ...row, deletedAt: row.deletedAt, goneAt: new Date(row.deletedAt.getTime() + daysInTrash * dayMs) }] : []))
    .sort((a, b) => b.deletedAt.getTime() - a.deletedAt.getTime());
}

/** Removes for good what has been in the trash for 30 days; a client takes its cartons, templates and contacts along. */
export async function purgeTrash(db: Database, now: Date): Promise<void> {
  const limit = new Date(now.getTime() - daysInTrash * dayMs);
  await db.transaction(async (tx) => {
    const gone = (await tx.select({ id: clients.id }).from(clients).where(lt(clients.deletedAt, limit))).map((client) => client.id);
    const ofGone = <Column extends typeof cartons.clientId | typeof templates.clientId>(column: Column) => (gone.length > 0 ? inArray(column, gone) : undefined);
    await tx.delete(cartons).where(or(lt(cartons.deletedAt, limit), ofGone(cartons.clientId)));
    await tx.delete(templates).where(or(lt(templates.deletedAt, limit), ofGone(templates.clientId)));
    if (gone.length === 0) return;
    await tx.delete(users).where(inArray(users.clientId, gone));
    await tx.delete(clients).where(inArray(clients.id, gone));
  });
}
