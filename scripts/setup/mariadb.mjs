// A private MariaDB: its data inside the project, on a loopback port that is free, for this project's own account only.
import { spawn } from "node:child_process";
import { randomBytes } from "node:crypto";
import { closeSync, existsSync, openSync, readFileSync, renameSync, rmSync, statSync, writeFileSync } from "node:fs";
import { userInfo } from "node:os";
import path from "node:path";
import { ensurePrograms, findProgram } from "./debian.mjs";
import { withLock } from "./lock.mjs";
import { SetUpError, say, socketPathFor } from "./paths.mjs";
import { isPortFree, findFreePort } from "./ports.mjs";
import { endProcess, livePid, pause, run } from "./processes.mjs";

const account = "cartonwright";
const firstPort = 33_060;
const runsAsRoot = () => process.getuid?.() === 0;

/**
 * Starts the private server, or takes over the one that an interrupted run left behind.
 * Resolves with { port, user, password, host, close() }; close() stops the server unless another run still uses it.
 */
export async function openPrivateServer(dataRoot) {
  const place = placesIn(dataRoot);
  await ensurePrograms(["mariadbd", "mariadb-install-db"], ["mariadb-server-core", "mariadb-client-core"], {
    log: path.join(dataRoot, "apt.log"),
    purpose: "the database",
  });
  const { connection, entry, pid } = await withLock(place.lock, async () => {
    await makeDataDirectory(place);
    return (await adopt(place)) ?? (await launch(place));
  });
  // One open connection a run: the last run to leave stops the server.
  connection.on("error", () => undefined);
  await connection.query("SET SESSION wait_timeout = 31536000");
  return { ...entry, host: "127.0.0.1", pid, close: () => leave(place, connection, pid) };
}

function placesIn(dataRoot) {
  const directory = path.join(dataRoot, "mariadb");
  return {
    directory,
    entry: path.join(dataRoot, "database.json"),
    init: path.join(dataRoot, "mariadb-account.sql"),
    lock: path.join(dataRoot, "mariadb.lock"),
    log: path.join(dataRoot, "mariadb.log"),
    pid: path.join(directory, "server.pid"),
    socket: socketPathFor(directory),
    word: `--datadir=${directory}`,
  };
}

/** Made beside its place and renamed at the end, so that a broken-off set-up is never taken for a good one. */
async function makeDataDirectory(place) {
  if (existsSync(path.join(place.directory, "mysql"))) {
    const owner = statSync(place.directory).uid;
    if (!runsAsRoot() && owner !== process.getuid?.()) {
      throw new SetUpError(`${place.directory} was made by another user (number ${owner}). Start as that user, or move .data away to begin with an empty database.`);
    }
    return;
  }
  say("Making an empty database in .data/mariadb …");
  const fresh = `${place.directory}.new`;
  rmSync(fresh, { recursive: true, force: true });
  const status = await run(
    findProgram("mariadb-install-db"),
    [
      "--no-defaults", `--datadir=${fresh}`, "--skip-test-db",
      "--auth-root-authentication-method=socket",
      `--auth-root-socket-user=${userInfo().username}`,
      ...(runsAsRoot() ? ["--user=root"] : []),
    ],
    { log: place.log },
  );
  if (status !== 0) throw new SetUpError(`mariadb-install-db failed (status ${status}). Its words are in ${place.log}.`);
  renameSync(fresh, place.directory);
}

/** The server that is already running on this data directory, if its account lets us in; stopped when it does not. */
async function adopt(place) {
  const pid = livePid(place.pid, place.word);
  if (pid === null) return null;
  const entry = readEntry(place);
  const connection = entry && (await connectWithin(entry, 5000, () => livePid(place.pid, place.word) !== null));
  if (connection) return { connection, entry, pid };
  await endProcess(pid, place.word);
  return null;
}

async function launch(place) {
  const known = readEntry(place);
  const password = known?.password ?? randomBytes(24).toString("base64url");
  const port = known && (await isPortFree(known.port)) ? known.port : await findFreePort(firstPort);
  const entry = { user: account, password, port };
  writeFileSync(place.entry, `${JSON.stringify(entry, null, 2)}\n`, { mode: 0o600 });
  writeFileSync(place.init, accountStatements(entry), { mode: 0o600 });

  const output = openSync(place.log, "a", 0o600);
  const child = spawn(findProgram("mariadbd"), serverArguments(place, port), {
    // Its own process group: Ctrl-C at the terminal must not stop it before the pages have finished with it.
    detached: true,
    stdio: ["ignore", output, output],
  });
  closeSync(output);
  let ended = null;
  child.once("error", (error) => (ended = error.message));
  child.once("exit", (status, signal) => (ended = `status ${status ?? signal}`));
  child.unref();
  const connection = await connectWithin(entry, 60_000, () => ended === null);
  rmSync(place.init, { force: true });
  if (!connection) throw new SetUpError(`MariaDB did not start (${ended ?? "no answer within a minute"}). Its words are in ${place.log}.`);
  return { connection, entry, pid: child.pid };
}

function accountStatements({ user, password }) {
  const both = ["localhost", "127.0.0.1"];
  return [
    ...both.map((host) => `CREATE USER IF NOT EXISTS '${user}'@'${host}' IDENTIFIED BY '${password}';`),
    // The file that holds the password may have been lost while the database was kept.
    ...both.map((host) => `ALTER USER '${user}'@'${host}' IDENTIFIED BY '${password}';`),
    ...both.flatMap((host) => [
      `GRANT ALL PRIVILEGES ON \`app\`.* TO '${user}'@'${host}';`,
      `GRANT ALL PRIVILEGES ON \`app\\_test%\`.* TO '${user}'@'${host}';`,
    ]),
    "",
  ].join("\n");
}

function serverArguments(place, port) {
  return [
    "--no-defaults",
    place.word,
    `--socket=${place.socket}`,
    `--pid-file=${place.pid}`,
    `--init-file=${place.init}`,
    "--bind-address=127.0.0.1",
    `--port=${port}`,
    "--skip-name-resolve",
    "--skip-log-bin",
    "--character-set-server=utf8mb4",
    "--collation-server=utf8mb4_unicode_ci",
    "--sql-mode=STRICT_ALL_TABLES,ONLY_FULL_GROUP_BY,NO_ZERO_IN_DATE,NO_ZERO_DATE,ERROR_FOR_DIVISION_BY_ZERO,NO_ENGINE_SUBSTITUTION",
    "--default-time-zone=+00:00",
    "--innodb-buffer-pool-size=64M",
    "--innodb-log-file-size=32M",
    "--performance-schema=OFF",
    "--max-connections=100",
    ...(runsAsRoot() ? ["--user=root"] : []),
  ];
}

function readEntry(place) {
  try {
    const entry = JSON.parse(readFileSync(place.entry, "utf8"));
    return typeof entry.password === "string" && Number.isInteger(entry.port) ? { ...entry, user: account } : null;
  } catch {
    return null;
  }
}

/** Tries until it is let in, the time is over, or `isAlive` says that nobody will answer. Null when not. */
async function connectWithin(entry, milliseconds, isAlive) {
  const { createConnection } = await import("mysql2/promise");
  const deadline = Date.now() + milliseconds;
  while (Date.now() < deadline && isAlive()) {
    try {
      return await createConnection({ host: "127.0.0.1", port: entry.port, user: entry.user, password: entry.password, connectTimeout: 2000 });
    } catch (error) {
      // Up and answering, but the password is not the one we know: waiting does not help.
      if (error.code === "ER_ACCESS_DENIED_ERROR" && milliseconds < 10_000) return null;
      await pause(50);
    }
  }
  return null;
}

async function leave(place, connection, pid) {
  let others = 0;
  try {
    const [rows] = await connection.query(
      "SELECT COUNT(*) AS others FROM information_schema.PROCESSLIST WHERE USER = ? AND ID <> CONNECTION_ID()",
      [account],
    );
    others = Number(rows[0].others);
    await connection.end();
  } catch {
    connection.destroy();
  }
  if (others === 0) await endProcess(pid, place.word);
}
