// A look without signing in: the Bench on a sample carton, all of it but saving.
import { benchReady, expect, expectAccessible, expectNoSideways, figure, finding, isPhone, test, typeFigure } from "../support/journey";

test.beforeEach(async ({ page }) => {
  await page.goto("/try");
  await benchReady(page);
});

test("shows the blank, its sizes side by side and what the fold check found", async ({ page }) => {
  await expect(finding(page)).toHaveText("Folds shut on 240 × 170 × 60 mm inside, as asked.");
  for (const size of ["Inside", "Clear inside", "Crease to crease", "Outside", "Blank"]) {
    await expect(page.locator("dt", { hasText: new RegExp(`^${size}$`) }).first()).toBeVisible();
  }
  await expectNoSideways(page);
  await expectAccessible(page, "The Bench");
});

test("takes sums, units and a comma for a point, and follows at once", async ({ page }) => {
  await typeFigure(page, "Length", "180+2*1.5");
  await expect(finding(page)).toContainText("183 × 170 × 60 mm inside");
  await typeFigure(page, "Width", "6 1/2 in");
  await expect(finding(page)).toContainText("183 × 165.1 × 60 mm inside");
  await typeFigure(page, "Depth", "62,5");
  await expect(finding(page)).toContainText("183 × 165.1 × 62.5 mm inside");
  // The expression is kept beside its value, for whoever reads it later.
  await expect(page.locator('[data-ledger-row="asked:L"]')).toContainText("180+2*1.5");
});

test("undoes and redoes everything", async ({ page }) => {
  await typeFigure(page, "Length", "200");
  await page.getByLabel("These sizes are").first().selectOption("outside");
  await expect(finding(page)).toContainText("outside, as asked");
  await page.locator("main").click({ position: { x: 5, y: 5 } });
  await page.keyboard.press("Control+z");
  await expect(finding(page)).toContainText("200 × 170 × 60 mm inside");
  await page.keyboard.press("Control+z");
  await expect(finding(page)).toContainText("240 × 170 × 60 mm inside");
  await page.keyboard.press("Control+Shift+z");
  await page.keyboard.press("Control+y");
  await expect(finding(page)).toContainText("outside, as asked");
});

test("goes with the arrow keys, a step a press", async ({ page }) => {
  await figure(page, "Width").focus();
  await page.keyboard.press("ArrowUp");
  await page.keyboard.press("Shift+ArrowUp");
  await page.keyboard.press("Alt+ArrowDown");
  await expect(finding(page)).toContainText("240 × 180.9 × 60 mm inside");
});

test("drags a figure on the drawing as one step of the history", async ({ page }) => {
  // On a phone a finger on the drawing scrolls the page: its figures are no buttons there.
  if (isPhone(page)) return expect(page.locator("[data-figure] button")).toHaveCount(0);
  const length = page.locator('[data-figure="asked:L"] button');
  const box = (await length.boundingBox())!;
  await page.mouse.move(box.x + box.width / 2, box.y + box.height / 2);
  await page.mouse.down();
  await page.mouse.move(box.x + box.width / 2 + 52, box.y + box.height / 2, { steps: 13 });
  await page.mouse.up();
  await expect(finding(page)).toContainText("250 × 170 × 60 mm inside");
  await page.keyboard.press("Control+z");
  await expect(finding(page)).toContainText("240 × 170 × 60 mm inside");
});

test("edits a figure where it stands on the drawing", async ({ page }) => {
  if (isPhone(page)) {
    // There they stand in three cells below it.
    await page.getByRole("button", { name: /^Length 240 mm/ }).first().tap();
    await page.getByRole("textbox", { name: "Length" }).fill("250-2*4");
    await page.getByRole("textbox", { name: "Length" }).press("Enter");
    await expect(finding(page)).toContainText("242 × 170 × 60 mm inside");
    return;
  }
  await page.locator('[data-figure="asked:L"] button').click();
  const field = page.locator('[data-figure="asked:L"] input');
  await expect(field).toBeFocused();
  await field.fill("250-2*4");
  await expect(finding(page)).toHaveText("Checking 242 mm …");
  await expect(page.locator('[data-figure="asked:L"]')).toContainText("= 242 mm");
  await field.press("Escape");
  await expect(finding(page)).toContainText("240 × 170 × 60 mm inside");
});

test("lights the drawing from the Ledger, and the Ledger from the drawing", async ({ page }) => {
  if (isPhone(page)) {
    // No pointer rests on a phone: the row that has the focus is lit.
    await figure(page, "Length").focus();
    await expect(page.locator('[data-ledger-row="asked:L"]')).toHaveClass(/bg-wash/);
    await expect(page.locator('[data-figure="asked:L"] > span')).toHaveClass(/text-live/);
    return;
  }
  await page.locator('[data-ledger-row="asked:L"]').hover();
  await expect(page.locator('[data-figure="asked:L"] > button')).toHaveClass(/text-live/);
  await page.locator('[data-figure="asked:W"] button').hover();
  await expect(page.locator('[data-ledger-row="asked:W"]')).toHaveClass(/bg-wash/);
  await expect(page.locator('[data-ledger-row="asked:L"]')).not.toHaveClass(/bg-wash/);
});

test("pulls the fold lever with keys, and lays the blank flat again", async ({ page }) => {
  const lever = page.getByRole("slider", { name: "Fold lever" });
  await lever.focus();
  await expect(lever).toHaveAttribute("aria-valuetext", "Flat");
  await page.keyboard.press("ArrowRight");
  await expect(lever).toHaveAttribute("aria-valuetext", "Front and back up, 1° of 90°");
  await page.keyboard.press("PageUp");
  await page.keyboard.press("PageUp");
  await expect(lever).toHaveAttribute("aria-valuetext", /^Corner flaps/);
  await expect(page.locator("[data-fold-view]")).toBeVisible();
  await page.keyboard.press("End");
  await expect(lever).toHaveAttribute("aria-valuetext", "Lid shut, closed");
  await expectAccessible(page, "The folded carton");
  await page.keyboard.press("Home");
  await expect(lever).toHaveAttribute("aria-valuetext", "Flat");
  await expect(page.locator("[data-fold-view]")).toBeHidden();
});

test("folds by itself at F", async ({ page }) => {
  await page.keyboard.press("f");
  await expect(page.getByRole("slider", { name: "Fold lever" })).toHaveAttribute("aria-valuetext", "Lid shut, closed", { timeout: 30_000 });
});

test("says in sentences what folding and tolerances come to", async ({ page }) => {
  await page.getByRole("tab", { name: /Fold check/ }).click();
  const panel = page.getByRole("tabpanel");
  await expect(panel).toContainText("Length. 240 mm meant inside, 240 mm measured on the folded carton.");
  await expect(panel).toContainText(/Board, creases and cuts can move it by ±\s[\d.]+ mm at worst, by ±\s[\d.]+ mm as a rule/);
  await expectAccessible(page, "The fold check");
});

test("sets an option with its reason, and puts it back", async ({ page }) => {
  await page.getByRole("tab", { name: "Options" }).click();
  const bleed = page.getByRole("tabpanel").locator("li", { hasText: "print runs past the cut" });
  await bleed.getByRole("button", { name: /^Bleed/ }).first().click();
  await bleed.getByRole("textbox").fill("5");
  await bleed.getByRole("textbox").press("Enter");
  await expect(bleed.getByRole("button", { name: /^Bleed 5 mm/ })).toBeVisible();
  await bleed.getByRole("button", { name: "Bleed: back to the usual value" }).click();
  await expect(bleed.getByRole("button", { name: /^Bleed 3 mm/ })).toBeVisible();
  await expectAccessible(page, "The options");
});

test("shows inches and never changes the carton for it", async ({ page }) => {
  await page.getByRole("group", { name: "Units" }).filter({ visible: true }).getByRole("button", { name: "in" }).click();
  await expect(finding(page)).toHaveText("Folds shut on 9.449 × 6.693 × 2.362 in inside, as asked.");
  await page.reload();
  await benchReady(page);
  await expect(finding(page)).toHaveText("Folds shut on 9.449 × 6.693 × 2.362 in inside, as asked.");
});

test("gives its files without an account", async ({ page }) => {
  await page.getByLabel("Export", { exact: true }).click();
  const links = page.getByRole("link", { name: /PDF|SVG|DXF|A4|Letter/ });
  await expect(links).toHaveCount(5);
  for (const link of await links.all()) {
    const response = await page.request.get((await link.getAttribute("href"))!);
    expect(response.status(), await link.innerText()).toBe(200);
    expect((await response.body()).length).toBeGreaterThan(1000);
  }
});

test("lists its keys", async ({ page }) => {
  await page.keyboard.press("?");
  const help = page.getByRole("dialog", { name: "Keys of the Bench" });
  await expect(help).toContainText("fold it, or unfold it");
  await expectAccessible(page, "The keys");
  await page.keyboard.press("Escape");
  await expect(help).toBeHidden();
});
