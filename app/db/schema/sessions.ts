import { bigint, index, json, mysqlTable, varchar } from "drizzle-orm/mysql-core";
import { hash, moment, momentOfMaking, publicId } from "./columns";
import { users } from "./users";

/** A sign-in. The cookie holds the id; this table holds only its hash, so a leaked table opens no door. */
export const sessions = mysqlTable(
  "sessions",
  {
    idHash: hash("id_hash").primaryKey(),
    /** What pages call it, e.g. to end it: says nothing about the cookie. */
    publicId: publicId("public_id").notNull().unique(),
    userId: publicId("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    data: json("data").$type<Record<string, unknown>>().notNull(),
    userAgent: varchar("user_agent", { length: 255 }).notNull(),
    createdAt: momentOfMaking("created_at"),
    lastSeen: momentOfMaking("last_seen"),
    expiresAt: moment("expires_at").notNull(),
  },
  (table) => [index("sessions_by_user").on(table.userId), index("sessions_by_expiry").on(table.expiresAt)],
);

/** Tries to sign in that have failed, or are being judged. A success clears those of its e-mail. */
export const signInAttempts = mysqlTable(
  "sign_in_attempts",
  {
    id: bigint("id", { mode: "number" }).primaryKey().autoincrement(),
    email: varchar("email", { length: 254 }).notNull(),
    address: varchar("address", { length: 64 }).notNull(),
    at: moment("at").notNull(),
  },
  (table) => [index("attempts_by_email").on(table.email, table.at), index("attempts_by_address").on(table.address, table.at)],
);
