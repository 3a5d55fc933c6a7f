// `npm test`: the set-up of `npm start` on a database of its own, then types, unit tests and journeys, and the count.
//   npm test                      everything
//   npm test -- unit [filter …]   vitest only, with its filters          npm test -- typecheck
//   npm test -- journeys [file …] Playwright only, with its arguments
import { spawn } from "node:child_process";
import { randomBytes } from "node:crypto";
import { closeSync, mkdirSync, openSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { ensureBuild } from "./setup/build.mjs";
import { openDatabaseServer } from "./setup/database.mjs";
import { ensurePrograms } from "./setup/debian.mjs";
import { withLock } from "./setup/lock.mjs";
import { ensurePackages } from "./setup/packages.mjs";
import { dataRoot, openDataRoot, projectRoot, say, SetUpError } from "./setup/paths.mjs";
import { findFreePort } from "./setup/ports.mjs";
import { cleanEnvironment, endChildren, pause, run } from "./setup/processes.mjs";
import { countPlaywright, countVitest } from "./setup/test-counts.mjs";
import { makeTestDatabase, takeTestPlace } from "./setup/test-database.mjs";

const parts = ["typecheck", "unit", "journeys"];
const [first, ...rest] = process.argv.slice(2);
const chosen = first === undefined ? parts : parts.filter((part) => part === first);
const migrations = path.join(projectRoot, "drizzle");
const bin = (name) => path.join(projectRoot, "node_modules/.bin", name);

const closers = [];
let isClosing = false;

async function close() {
  if (isClosing) return;
  isClosing = true;
  endChildren();
  for (const closer of closers.reverse()) await closer().catch((error) => say(`While stopping: ${error.message}`));
}

for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) {
  process.on(signal, () => void close().then(() => process.exit(130)));
}

async function setUp() {
  process.chdir(projectRoot);
  openDataRoot();
  await withLock(path.join(dataRoot, "packages.lock"), () => ensurePackages(projectRoot));
  const log = path.join(dataRoot, "apt.log");
  if (chosen.some((part) => part !== "typecheck")) {
    await ensurePrograms(["pdftoppm", "qpdf"], ["poppler-utils", "qpdf"], { log, purpose: "reading our PDF files with other programs" });
  }
  if (chosen.includes("journeys")) {
    await ensurePrograms(["chromium"], ["chromium"], { log, purpose: "the journeys through the pages" });
  }
  const server = await openDatabaseServer(dataRoot);
  closers.push(() => server.close());
  const place = await takeTestPlace(server);
  closers.push(() => place.release());
  const results = path.join(projectRoot, "test-results", place.name);
  rmSync(results, { recursive: true, force: true });
  mkdirSync(results, { recursive: true });
  const buildDirectory = `build/test${place.suffix}`;
  if (chosen.some((part) => part !== "typecheck")) {
    await withLock(path.join(dataRoot, "build.lock"), () => ensureBuild(projectRoot, buildDirectory, path.join(results, "build.log")));
  }
  return { server, place, results, buildDirectory };
}

const base = ({ buildDirectory, results }) => ({
  NODE_ENV: "test",
  BUILD_DIRECTORY: buildDirectory,
  TEST_RESULTS: results,
  SESSION_SECRET: randomBytes(32).toString("base64url"),
});

const runners = {
  async typecheck() {
    say("\nTypes …");
    const status = await run("npm", ["run", "--silent", "typecheck"], { cwd: projectRoot });
    say(status === 0 ? "Types agree." : "Types do not agree; see above.");
    return { passed: 0, failed: status === 0 ? 0 : 1, skipped: 0 };
  },

  async unit(context) {
    say("\nUnit tests …");
    const url = await makeTestDatabase(context.server, context.place.name, migrations);
    const report = path.join(context.results, "vitest.json");
    const status = await run(
      process.execPath,
      [bin("vitest"), "run", "--reporter=default", "--reporter=json", `--outputFile.json=${report}`, ...rest],
      { cwd: projectRoot, env: cleanEnvironment({ ...base(context), TEST_DATABASE_URL: url, DATABASE_URL: url }) },
    );
    return countVitest(report, status);
  },

  async journeys(context) {
    say("\nJourneys …");
    const url = await makeTestDatabase(context.server, `${context.place.name}_journeys`, migrations);
    const environment = cleanEnvironment({ ...base(context), TEST_DATABASE_URL: url, DATABASE_URL: url });
    const stop = await serve(environment, url, context.results);
    const report = path.join(context.results, "playwright.json");
    try {
      const status = await run(process.execPath, [bin("playwright"), "test", ...rest], {
        cwd: projectRoot,
        env: { ...environment, BASE_URL: stop.address, PLAYWRIGHT_JSON_OUTPUT_FILE: report },
      });
      return countPlaywright(report, status);
    } finally {
      await stop();
    }
  },
};

/** The built pages with demo data on a free port. Resolves with a function that stops them; `.address` is where they are. */
async function serve(environment, url, results) {
  const seeded = await run(process.execPath, ["--import", "tsx", "scripts/seed.ts"], { cwd: projectRoot, env: environment });
  if (seeded !== 0) throw new SetUpError("The demo data could not be made; see above.");
  const port = await findFreePort(4300);
  const log = path.join(results, "server.log");
  const output = openSync(log, "a");
  const child = spawn(process.execPath, ["--import", "tsx", "server/index.ts"], {
    cwd: projectRoot,
    env: { ...environment, NODE_ENV: "production", PORT: String(port) },
    stdio: ["ignore", output, output],
  });
  closeSync(output);
  let ended = false;
  const end = new Promise((resolve) => child.once("exit", () => resolve((ended = true))));
  const stop = async () => {
    if (!ended) child.kill("SIGTERM");
    await end;
  };
  closers.push(stop);
  const address = `http://127.0.0.1:${port}`;
  for (let tries = 0; tries < 300 && !ended; tries += 1) {
    const response = await fetch(`${address}/health`).catch(() => null);
    await response?.body?.cancel();
    if (response?.ok) return Object.assign(stop, { address });
    await pause(100);
  }
  await stop();
  throw new SetUpError(`The pages were not served. The server's words are in ${log}.`);
}

async function main() {
  if (chosen.length === 0) throw new SetUpError(`"${first}" is not a part of the tests. Name one of: ${parts.join(", ")}.`);
  const context = await setUp();
  const total = { passed: 0, failed: 0, skipped: 0 };
  for (const part of chosen) {
    if (isClosing) return;
    const counts = await runners[part](context).catch((error) => {
      say(error instanceof SetUpError ? error.message : error.stack);
      return { passed: 0, failed: 1, skipped: 0 };
    });
    for (const key of Object.keys(total)) total[key] += counts[key];
  }
  if (isClosing) return;
  await close();
  if (total.skipped > 0) say(`${total.skipped} skipped`);
  const line = `${total.passed} passed, ${total.failed} failed`;
  writeFileSync(path.join(projectRoot, "test-results", "summary.txt"), `${line}\n`);
  say(`\n${line}`);
  const ranSomething = total.passed + total.failed > 0 || (chosen.length === 1 && chosen[0] === "typecheck");
  process.exitCode = total.failed === 0 && ranSomething ? 0 : 1;
  if (!ranSomething) process.stderr.write("No test ran.\n");
}

main().catch(async (error) => {
  if (isClosing) return;
  process.stderr.write(`${error instanceof SetUpError ? error.message : (error.stack ?? error)}\n`);
  await close();
  say("\n0 passed, 1 failed");
  process.exit(1);
});
