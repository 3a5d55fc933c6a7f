import { index, json, mysqlTable, text, varchar } from "drizzle-orm/mysql-core";
import { clients } from "./clients";
import { code, moment, momentOfMaking, publicId } from "./columns";
import { users } from "./users";

/** A brief kept to start other cartons from. */
export const templates = mysqlTable(
  "templates",
  {
    id: publicId("id").primaryKey(),
    name: varchar("name", { length: 120 }).notNull(),
    note: text("note").notNull(),
    /** Null: offered for every client of the studio. */
    clientId: publicId("client_id").references(() => clients.id),
    brief: json("brief").$type<unknown>().notNull(),
    construction: code("construction").notNull(),
    board: code("board").notNull(),
    /** Of the construction when the template was saved: what no longer fits is listed when it is opened. */
    constructionVersion: code("construction_version").notNull(),
    createdBy: publicId("created_by").notNull().references(() => users.id),
    updatedBy: publicId("updated_by").notNull().references(() => users.id),
    createdAt: momentOfMaking("created_at"),
    updatedAt: momentOfMaking("updated_at"),
    deletedAt: moment("deleted_at"),
  },
  (table) => [index("templates_by_client").on(table.clientId, table.deletedAt, table.name)],
);
