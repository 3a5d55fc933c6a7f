// Demo data, made once in an empty database, and the housekeeping of every start. People, firms and boxes are invented.
import { pathToFileURL } from "node:url";
import { inArray } from "drizzle-orm";
import { drizzle } from "drizzle-orm/mysql2";
import { createPool } from "mysql2";
import { hashPassword } from "../app/auth/passwords.server";
import type { Database } from "../app/db/client.server";
import { newId } from "../app/db/new-id.server";
import { signInLimits } from "../app/auth/rate-limit";
import { purgeSessions } from "../app/db/queries/sessions.server";
import { purgeTries } from "../app/db/queries/sign-in-attempts.server";
import { purgeTrash } from "../app/db/queries/trash.server";
import { clients } from "../app/db/schema/clients";
import { users } from "../app/db/schema/users";
import { seedCartons } from "./demo-cartons";

export const demoPassword = "fold-and-crease-1";

const demoClients = {
  pebble: { name: "Pebble & Finch Puzzles", note: "Jigsaws of 100 to 1,000 pieces. Boxes are opened often: lids must not tear." },
  saltmarsh: { name: "Saltmarsh Soap Works", note: "Bars of 60 and 90 g, unwrapped. Uncoated board only." },
  ninefold: { name: "Ninefold Tea", note: "Loose leaf in pouches, 50 and 100 g." },
} as const;
type DemoClient = keyof typeof demoClients;

export interface DemoPerson {
  readonly email: string;
  readonly name: string;
  readonly role: "owner" | "designer" | "finisher" | "client";
  readonly client: DemoClient | null;
}

export const demoPeople: readonly DemoPerson[] = [
  { email: "tess@harrowlane.example", name: "Tess Harrow", role: "owner", client: null },
  { email: "orla@harrowlane.example", name: "Orla Brandt", role: "designer", client: null },
  { email: "nia@harrowlane.example", name: "Nia Okafor", role: "finisher", client: null },
  { email: "petra@pebblefinch.example", name: "Petra Finch", role: "client", client: "pebble" },
  { email: "ines@saltmarshsoap.example", name: "Ines Calder", role: "client", client: "saltmarsh" },
];

export interface SignIns {
  readonly password: string;
  readonly people: readonly DemoPerson[];
}

/**
 * Readies a migrated database: demo data where it is wanted and nobody has an account yet.
 * Returns the demo sign-ins that exist, or null when this studio has none.
 */
export async function prepareData(url: string, { demo }: { demo: boolean }): Promise<SignIns | null> {
  const pool = createPool({ uri: url, timezone: "Z", connectionLimit: 2 });
  try {
    const db: Database = drizzle({ client: pool });
    if (demo) await seedOnce(db);
    await keepHouse(db, new Date());
    const found = await db.select({ email: users.email }).from(users).where(inArray(users.email, demoPeople.map((person) => person.email)));
    const emails = new Set(found.map((row) => row.email));
    return emails.size > 0 ? { password: demoPassword, people: demoPeople.filter((person) => emails.has(person.email)) } : null;
  } finally {
    await pool.promise().end();
  }
}

/** What has run out goes: deleted things after 30 days, sign-ins, old tries. */
async function keepHouse(db: Database, now: Date): Promise<void> {
  await purgeTrash(db, now);
  await purgeSessions(db, now);
  await purgeTries(db, new Date(now.getTime() - signInLimits.windowMs));
}

/** All or nothing: a start that is broken off here begins again with an empty database. */
async function seedOnce(db: Database): Promise<void> {
  await db.transaction(async (tx) => {
    const [anybody] = await tx.select({ id: users.id }).from(users).limit(1).for("update");
    if (anybody) return;
    const clientIds = {} as Record<DemoClient, string>;
    for (const [key, client] of Object.entries(demoClients)) {
      const id = newId();
      clientIds[key as DemoClient] = id;
      await tx.insert(clients).values({ id, ...client });
    }
    let maker = "";
    for (const person of demoPeople) {
      const id = newId();
      if (person.role === "designer") maker = id;
      await tx.insert(users).values({
        id,
        role: person.role,
        name: person.name,
        email: person.email,
        clientId: person.client && clientIds[person.client],
        passwordHash: await hashPassword(demoPassword),
      });
    }
    await seedCartons(tx, clientIds, maker);
  });
}

// By itself: readies the database that DATABASE_URL names.
if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const url = process.env.DATABASE_URL;
  if (!url) throw new Error("DATABASE_URL is not set.");
  await prepareData(url, { demo: process.env.CARTONWRIGHT_DEMO !== "0" });
}
