// Databases for one run of the tests: made afresh, and never those of another run that is still going.
import { ensureDatabase, migrateDatabase } from "./database.mjs";
import { SetUpError } from "./paths.mjs";

const mostRuns = 8;

/**
 * Takes the first place that no other run holds. The server lets go of the place when this process ends, however it ends.
 * Resolves with { name, suffix, release() }.
 */
export async function takeTestPlace(server) {
  const { createConnection } = await import("mysql2/promise");
  const connection = await createConnection({ uri: server.url("") });
  connection.on("error", () => undefined);
  await connection.query("SET SESSION wait_timeout = 31536000");
  for (let place = 1; place <= mostRuns; place += 1) {
    const suffix = place === 1 ? "" : `_${place}`;
    const name = `${server.name}_test${suffix}`;
    const [rows] = await connection.query("SELECT GET_LOCK(?, 0) AS held", [`tests:${name}`]);
    if (Number(rows[0].held) === 1) return { name, suffix, release: () => connection.end().catch(() => connection.destroy()) };
  }
  await connection.end();
  throw new SetUpError(`${mostRuns} runs of the tests are going on. Wait for one to end.`);
}

/** An empty, migrated database. Resolves with its address. */
export async function makeTestDatabase(server, name, migrationsFolder) {
  await ensureDatabase(server, name, { afresh: true });
  const url = server.url(name);
  await migrateDatabase(url, migrationsFolder);
  return url;
}
