// How a permission becomes a condition in SQL. Every query that reads or changes a thing starts here.
import { and, eq, isNull, or, type SQL, sql } from "drizzle-orm";
import type { MySqlColumn } from "drizzle-orm/mysql-core";
import { type Act, reachOf } from "~/auth/permissions";
import type { Viewer } from "~/auth/viewer";
import { KnownError } from "~/copy/errors";
import { clients } from "../schema/clients";

/**
 * The rows that the viewer may do `act` to, by the column that names their client; undefined: all of them.
 * Throws `not-allowed` when the role never does it.
 */
export function within(viewer: Viewer, act: Act, clientColumn: MySqlColumn): SQL | undefined {
  const reach = reachOf(viewer.role, act);
  if (reach === "all") return undefined;
  if (reach === "none" || viewer.clientId === null) throw new KnownError("not-allowed");
  return eq(clientColumn, viewer.clientId);
}

/** Throws `not-allowed` when the role does not do `act` to everybody's things. */
export function requireReach(viewer: Viewer, act: Act): void {
  if (reachOf(viewer.role, act) !== "all") throw new KnownError("not-allowed");
}

/** Not in the trash, and not of a client that is: needs a left join of `clients`. */
export function isLive(deletedAt: MySqlColumn): SQL {
  return and(isNull(deletedAt), or(isNull(clients.id), isNull(clients.deletedAt))) as SQL;
}

/** "contains", with the wildcards of LIKE taken as themselves. */
export function contains(column: MySqlColumn, words: string): SQL {
  return sql`${column} LIKE ${`%${words.replace(/[\\%_]/g, "\\$&")}%`}`;
}

export interface Page {
  /** From 1. */
  readonly page: number;
  readonly pageSize: number;
}

export interface Listed<Row> {
  readonly rows: readonly Row[];
  readonly total: number;
  readonly page: number;
  readonly pageCount: number;
}

/** A page number beyond the end gives the last page, so that a link kept from a longer list still shows something. */
export function placeOf({ page, pageSize }: Page, total: number): { page: number; pageCount: number; offset: number } {
  const pageCount = Math.max(1, Math.ceil(total / pageSize));
  const at = Math.min(Math.max(1, Math.trunc(page) || 1), pageCount);
  return { page: at, pageCount, offset: (at - 1) * pageSize };
}
