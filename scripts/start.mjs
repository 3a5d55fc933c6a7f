// `npm start` and `npm run dev`: set everything up, then serve. Nothing but Node's own modules until the packages are there.
import { existsSync } from "node:fs";
import path from "node:path";
import { ensureBuild } from "./setup/build.mjs";
import { ensureDatabase, migrateDatabase, openDatabaseServer } from "./setup/database.mjs";
import { withLock } from "./setup/lock.mjs";
import { ensurePackages } from "./setup/packages.mjs";
import { dataRoot, openDataRoot, projectRoot, say, SetUpError } from "./setup/paths.mjs";
import { findFreePort, isPortFree, readPort } from "./setup/ports.mjs";
import { endChildren } from "./setup/processes.mjs";
import { sessionSecret } from "./setup/secrets.mjs";

const isDevelopment = process.argv.includes("--dev");
const wantsDemo = !process.argv.includes("--no-demo") && process.env.CARTONWRIGHT_DEMO !== "0";
const host = process.env.CARTONWRIGHT_HOST || "127.0.0.1";

/** Undone in reverse order at the end, whatever the reason for it. */
const closers = [];
let isClosing = false;

async function close(status) {
  if (isClosing) return;
  isClosing = true;
  endChildren();
  for (const closer of closers.reverse()) {
    await closer().catch((error) => say(`While stopping: ${error.message}`));
  }
  process.exit(status);
}

for (const [signal, status] of [["SIGINT", 130], ["SIGTERM", 143], ["SIGHUP", 129]]) {
  process.on(signal, () => {
    if (!isClosing) say("\nStopping …");
    // Asked to stop while serving is the ordinary end, not a failure.
    void close(isServing ? 0 : status);
  });
}
let isServing = false;

async function choosePort() {
  const wanted = readPort(process.env.PORT, 3000);
  if (await isPortFree(wanted, host)) return wanted;
  const port = await findFreePort(wanted + 1, { host });
  say(`Port ${wanted} is taken, so the pages are served on ${port}.`);
  return port;
}

async function main() {
  process.chdir(projectRoot);
  openDataRoot();
  const port = await choosePort();
  await withLock(path.join(dataRoot, "packages.lock"), () => ensurePackages(projectRoot));

  const server = await openDatabaseServer(dataRoot);
  closers.push(() => server.close());
  await ensureDatabase(server, server.name);
  const url = server.url(server.name);
  await migrateDatabase(url, path.join(projectRoot, "drizzle"));

  process.env.DATABASE_URL = url;
  process.env.SESSION_SECRET = sessionSecret(dataRoot);
  process.env.NODE_ENV = isDevelopment ? "development" : "production";
  const { register } = await import("tsx/esm/api");
  register({ tsconfig: path.join(projectRoot, "tsconfig.json") });
  const { prepareData } = await import("./seed.ts");
  const signIns = await prepareData(url, { demo: wantsDemo });

  if (!isDevelopment) {
    await withLock(path.join(dataRoot, "build.lock"), () => ensureBuild(projectRoot, "build", path.join(dataRoot, "build.log")));
  }
  if (isClosing) return;
  const running = isDevelopment
    ? await (await import("../server/dev.ts")).startDevelopmentServer({ port, host })
    : await (await import("../server/index.ts")).startServer({ port, host });
  closers.push(() => running.close());
  isServing = true;
  announce(running.port, signIns);
}

function announce(port, signIns) {
  say(`\nCartonwright is at http://${host}:${port}\n`);
  if (signIns) {
    say(`  Sign in with any of these; the password is ${signIns.password}`);
    for (const person of signIns.people) say(`    ${person.email.padEnd(30)} ${person.role.padEnd(9)} ${person.name}`);
  } else {
    say("  Sign in, or open the page to make the first account of this studio.");
  }
  say("\nCtrl-C stops it. The data stays in " + (existsSync(path.join(dataRoot, "mariadb")) ? ".data." : "your database."));
}

main().catch((error) => {
  if (isClosing) return;
  process.stderr.write(`${error instanceof SetUpError || error instanceof RangeError ? error.message : (error.stack ?? error)}\n`);
  void close(1);
});
