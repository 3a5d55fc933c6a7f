import { sql } from "drizzle-orm";
import { check, index, mysqlEnum, mysqlTable, uniqueIndex, varchar } from "drizzle-orm/mysql-core";
import { clients } from "./clients";
import { moment, momentOfMaking, publicId } from "./columns";

/** A person who signs in. People are never deleted, only barred: what they made keeps its maker. */
export const users = mysqlTable(
  "users",
  {
    id: publicId("id").primaryKey(),
    role: mysqlEnum("role", ["owner", "designer", "finisher", "client"]).notNull(),
    clientId: publicId("client_id").references(() => clients.id),
    name: varchar("name", { length: 120 }).notNull(),
    /** Compared without regard to case by the table's collation. */
    email: varchar("email", { length: 254 }).notNull(),
    passwordHash: varchar("password_hash", { length: 255 }).notNull(),
    createdAt: momentOfMaking("created_at"),
    updatedAt: momentOfMaking("updated_at"),
    barredAt: moment("barred_at"),
  },
  (table) => [
    uniqueIndex("users_by_email").on(table.email),
    index("users_by_client").on(table.clientId),
    // A client's contact without a client could be scoped to nothing or to everything: the table refuses both.
    check("users_client_by_role", sql`(${table.role} = 'client') = (${table.clientId} is not null)`),
  ],
);
