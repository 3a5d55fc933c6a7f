// A template whose construction has changed since it was saved: what no longer fits is listed, and can be mended.
import mysql from "mysql2/promise";
import { benchReady, expect, expectAccessible, expectNoSideways, finding, test } from "../support/journey";
import { signIn } from "../support/sign-in";

/** Puts into the database what an older build would have left there: a tray smaller than today's least, with an option that is gone. */
async function olderTemplate(name: string): Promise<void> {
  const url = process.env["TEST_DATABASE_URL"];
  if (!url) throw new Error("TEST_DATABASE_URL is not set: run the journeys with `npm test -- journeys`.");
  const connection = await mysql.createConnection(url);
  try {
    const [people] = await connection.query<mysql.RowDataPacket[]>("SELECT id FROM users WHERE email = 'orla@harrowlane.example'");
    const by: unknown = people[0]?.["id"];
    const brief = { construction: "glued-tray", size: { L: 3, W: 80, D: 30 }, basis: "inside", room: 1, board: "sbb-400", options: { thumbHole: 12 }, typed: {} };
    const id = Math.random().toString(36).slice(2).padEnd(16, "0").slice(0, 16);
    await connection.query(
      "INSERT INTO templates (id, name, note, client_id, brief, construction, board, construction_version, created_by, updated_by, created_at, updated_at) VALUES (?, ?, ?, NULL, ?, 'glued-tray', 'sbb-400', 'before', ?, ?, UTC_TIMESTAMP(), UTC_TIMESTAMP())",
      [id, name, "From an earlier year.", JSON.stringify(brief), by, by],
    );
  } finally {
    await connection.end();
  }
}

test("lists what no longer fits, the limit of today and what works", async ({ page }, info) => {
  const name = `Old tray ${info.project.name} ${Date.now().toString(36)}`;
  await olderTemplate(name);
  await signIn(page, "designer");
  await page.goto(`/templates?q=${encodeURIComponent(name)}`);
  await page.getByRole("link", { name, exact: true }).click();
  await expect(page.getByRole("heading", { name: "2 figures of this template no longer fit" })).toBeVisible();
  await expect(page.getByRole("row", { name: /^Length/ })).toContainText(/3 mm.*at least \d+ mm.*\d+ mm/);
  await expect(page.getByRole("row", { name: /^thumbHole/ })).toContainText("is no option any more");
  await expectNoSideways(page);
  await expectAccessible(page, "A template that no longer fits");

  await page.getByRole("link", { name: "Start a carton" }).click();
  await expect(page.getByText("2 figures to mend")).toBeVisible();
  await page.getByRole("button", { name: /^Make it/ }).first().click();
  await page.getByRole("button", { name: "Take the usual value" }).click();
  await expect(page.getByText(/figures? to mend/)).toHaveCount(0);
  await page.getByLabel("Name").fill(`${name}, mended`);
  await page.getByRole("button", { name: "Take it to the Bench" }).click();
  await benchReady(page);
  await expect(finding(page)).toContainText(/^Folds shut on/);
});

test("changes name and note, deletes and brings back", async ({ page }, info) => {
  const name = `Kept tray ${info.project.name} ${Date.now().toString(36)}`;
  await olderTemplate(name);
  await signIn(page, "designer");
  await page.goto(`/templates?q=${encodeURIComponent(name)}`);
  await page.getByRole("link", { name, exact: true }).click();
  await page.getByLabel("Note").fill("Only for the archive.");
  await page.getByRole("button", { name: "Save name and note" }).click();
  await expect(page.getByText(`“${name}” is saved.`)).toBeVisible();
  await page.getByRole("button", { name: "Delete the template" }).click();
  await expect(page).toHaveURL(/\/templates$/);
  await expect(page.getByRole("link", { name, exact: true })).toHaveCount(0);
  await page.getByText("Undo", { exact: true }).click();
  await expect(page.getByRole("link", { name, exact: true })).toBeVisible();
});
