// Two people at one carton, and a connection that goes away: nobody loses anything.
import type { Page } from "@playwright/test";
import { benchReady, expect, expectAccessible, finding, test, typeFigure } from "../support/journey";
import { signIn } from "../support/sign-in";

test.use({ expectedErrors: [/status of (409|503)|ERR_INTERNET_DISCONNECTED/] });

const saved = (page: Page) => expect(page.getByText(/^Saved \d\d:\d\d$/).first()).toBeAttached();

async function newTray(page: Page, name: string): Promise<string> {
  await page.goto("/cartons/new?construction=glued-tray");
  await page.getByLabel("Name").fill(name);
  await page.getByRole("button", { name: "Take it to the Bench" }).click();
  await expect(page).toHaveURL(/\/cartons\/[0-9a-z]{16}$/);
  await benchReady(page);
  return page.url();
}

test("tells the second of two people, and keeps both", async ({ page, browser }, info) => {
  const name = `Shared tray ${info.project.name} ${Date.now().toString(36)}`;
  await signIn(page, "designer");
  const address = await newTray(page, name);
  await typeFigure(page, "Width", "77");

  const other = await (await browser.newContext(info.project.use)).newPage();
  await signIn(other, "owner");
  await other.goto(address);
  await benchReady(other);
  await typeFigure(other, "Depth", "33");
  await other.keyboard.press("Control+s");
  await saved(other);

  await page.keyboard.press("Control+s");
  const dialog = page.getByRole("dialog");
  await expect(dialog).toContainText("Tess Harrow saved this carton at");
  await expect(dialog.getByRole("row", { name: /Width/ })).toContainText("77 mm");
  await expect(dialog.getByRole("row", { name: /Depth/ })).toContainText("33 mm");
  await expectAccessible(page, "The question after a conflict");

  // Putting the question off loses nothing either.
  await page.keyboard.press("Escape");
  await expect(finding(page)).toContainText("120 × 77 × 30 mm inside");
  await page.getByRole("button", { name: "Save", exact: true }).click();
  await dialog.getByRole("button", { name: "Take theirs" }).click();
  await expect(finding(page)).toContainText("120 × 80 × 33 mm inside");
  await saved(page);
  await page.keyboard.press("Control+z");
  await expect(finding(page)).toContainText("120 × 77 × 30 mm inside");

  // After seeing it, over it.
  await page.keyboard.press("Control+s");
  await saved(page);
  await other.reload();
  await benchReady(other);
  await expect(finding(other)).toContainText("120 × 77 × 30 mm inside");

  // Or as a copy.
  await typeFigure(other, "Length", "133");
  await typeFigure(page, "Depth", "41");
  await page.keyboard.press("Control+s");
  await saved(page);
  await other.keyboard.press("Control+s");
  await other.getByRole("dialog").getByRole("button", { name: "Save mine as a copy" }).click();
  await expect(other).not.toHaveURL(address);
  await benchReady(other);
  await expect(finding(other)).toContainText("133 × 77 × 30 mm inside");
  await expect(other.getByRole("banner")).toContainText(`${name}, copy`);
  await other.context().close();
});

test("keeps what was typed through a lost connection, and sends it when it is back", async ({ page, context }, info) => {
  await signIn(page, "designer");
  await newTray(page, `Tray in a tunnel ${info.project.name} ${Date.now().toString(36)}`);
  await typeFigure(page, "Width", "73");
  await context.setOffline(true);
  await page.keyboard.press("Control+s");
  await expect(page.getByRole("alert").first()).toContainText("No connection. What you typed is kept here and goes up when it returns.");
  await typeFigure(page, "Depth", "37");
  await expect(finding(page)).toContainText("120 × 73 × 37 mm inside");
  await context.setOffline(false);
  await page.keyboard.press("Control+s");
  await saved(page);
  await page.reload();
  await benchReady(page);
  await expect(finding(page)).toContainText("120 × 73 × 37 mm inside");
});

test("offers what was left unsaved the next time", async ({ page }, info) => {
  await signIn(page, "designer");
  const address = await newTray(page, `Forgotten tray ${info.project.name} ${Date.now().toString(36)}`);
  await typeFigure(page, "Width", "69");
  await page.goto("/");
  await page.goto(address);
  await benchReady(page);
  await expect(finding(page)).toContainText("120 × 80 × 30 mm inside");
  await expect(page.getByText(/^What you did here at \d\d:\d\d was not saved\.$/)).toBeVisible();
  await page.getByRole("button", { name: "Take it up again" }).click();
  await expect(finding(page)).toContainText("120 × 69 × 30 mm inside");
  await page.keyboard.press("Control+s");
  await saved(page);
});
