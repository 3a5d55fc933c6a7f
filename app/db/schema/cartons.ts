import { index, int, json, mysqlTable, text, varchar } from "drizzle-orm/mysql-core";
import { clients } from "./clients";
import { code, hash, moment, momentOfMaking, publicId } from "./columns";
import { users } from "./users";

/** A carton: its brief is what was asked; everything else of it is worked out again from that. */
export const cartons = mysqlTable(
  "cartons",
  {
    id: publicId("id").primaryKey(),
    name: varchar("name", { length: 120 }).notNull(),
    /** Null: the studio's own. */
    clientId: publicId("client_id").references(() => clients.id),
    note: text("note").notNull(),
    brief: json("brief").$type<unknown>().notNull(),
    /** Copies from the brief, for lists. */
    construction: code("construction").notNull(),
    board: code("board").notNull(),
    /** Grows by one with every save; a save names the one it started from. */
    rowVersion: int("row_version").notNull().default(1),
    /** Of the layers as they were when saved: a later build that moves a line is noticed. */
    fingerprint: hash("fingerprint").notNull(),
    coreVersion: code("core_version").notNull(),
    createdBy: publicId("created_by").notNull().references(() => users.id),
    updatedBy: publicId("updated_by").notNull().references(() => users.id),
    createdAt: momentOfMaking("created_at"),
    updatedAt: momentOfMaking("updated_at"),
    deletedAt: moment("deleted_at"),
  },
  (table) => [
    index("cartons_by_client").on(table.clientId, table.deletedAt, table.updatedAt),
    index("cartons_by_change").on(table.deletedAt, table.updatedAt),
  ],
);
