import { index, mysqlTable, text, varchar } from "drizzle-orm/mysql-core";
import { moment, momentOfMaking, publicId } from "./columns";

/** A customer of the studio. */
export const clients = mysqlTable(
  "clients",
  {
    id: publicId("id").primaryKey(),
    name: varchar("name", { length: 120 }).notNull(),
    note: text("note").notNull(),
    createdAt: momentOfMaking("created_at"),
    updatedAt: momentOfMaking("updated_at"),
    deletedAt: moment("deleted_at"),
  },
  (table) => [index("clients_by_deletion").on(table.deletedAt, table.name)],
);
