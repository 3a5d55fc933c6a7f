import path from "node:path";
import { defineConfig } from "@playwright/test";

// `npm test -- journeys` builds the pages, serves them on a database with demo data and says where.
const baseURL = process.env.BASE_URL;
if (!baseURL) throw new Error("BASE_URL is not set: run the journeys with `npm test -- journeys`.");

export default defineConfig({
  testDir: "tests/journeys",
  outputDir: path.join(process.env.TEST_RESULTS ?? "test-results", "playwright"),
  reporter: [["list"], ["json"]],
  forbidOnly: Boolean(process.env.CI),
  workers: 2,
  // On a shared machine a browser may be starved once; what fails twice has failed.
  retries: process.env.CI ? 1 : 0,
  timeout: 120_000,
  expect: { timeout: 20_000 },
  use: {
    baseURL,
    locale: "en-GB",
    timezoneId: "Europe/London",
    screenshot: "only-on-failure",
    launchOptions: {
      executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium",
      args: ["--no-sandbox", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
    },
  },
  projects: [
    { name: "desktop", use: { viewport: { width: 1440, height: 900 } } },
    { name: "phone", use: { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true } },
  ],
});
