import { sql } from "drizzle-orm";
import { db } from "~/db/client.server";

/** For whatever watches the server: 200 when the database answers, else 503 from the table of errors. */
export async function loader() {
  await db.execute(sql`SELECT 1`);
  return new Response("ok\n", { headers: { "Content-Type": "text/plain; charset=utf-8", "Cache-Control": "no-store" } });
}
