import { int, json, mysqlTable, primaryKey } from "drizzle-orm/mysql-core";
import { code, momentOfMaking, publicId } from "./columns";
import { users } from "./users";

/** The studio's own copy of a board. A correction is a new revision; the old one stays for what was made with it. */
export const boards = mysqlTable(
  "boards",
  {
    id: code("id").notNull(),
    revision: int("revision").notNull(),
    data: json("data").$type<unknown>().notNull(),
    /** Null: taken from the catalogue that comes with the product. */
    createdBy: publicId("created_by").references(() => users.id),
    createdAt: momentOfMaking("created_at"),
  },
  (table) => [primaryKey({ columns: [table.id, table.revision] })],
);
