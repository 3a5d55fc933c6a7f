// What a person may type by mistake: the field says what is wrong and what works, the last good drawing stays.
import { benchReady, expect, expectAccessible, figure, finding, test, typeFigure } from "../support/journey";
import { signIn } from "../support/sign-in";

const refused = [
  { typed: "0", says: /^Length is 0 mm; the least is \d/ },
  { typed: "0.001", says: /^Length is 0.001 mm; the least is \d/ },
  { typed: "-40", says: /^Length is -40 mm; the least is \d/ },
  { typed: "10000", says: /^Length is 10000 mm; the most is \d/ },
  { typed: "9".repeat(60), says: /^Length is .*the most is \d/ },
];

test("refuses nought, less and far too much, and mends it at one press", async ({ page }) => {
  await page.goto("/try");
  await benchReady(page);
  const drawing = page.locator('[aria-label^="Drawing"] svg path[fill="var(--board)"]');
  const before = await drawing.getAttribute("d");
  for (const { typed, says } of refused) {
    await typeFigure(page, "Length", typed);
    await expect(finding(page)).toHaveText(says);
    await expect(page.locator("dl").first()).toContainText("240 × 170 × 60 mm");
    expect(await drawing.getAttribute("d")).toBe(before);
    await page.keyboard.press("Escape");
  }
  await typeFigure(page, "Length", "5");
  await expect(page.getByRole("tabpanel").getByRole("alert").first()).toContainText("Length is 5 mm; the least is");
  await expectAccessible(page, "The Bench with a refused figure");
  await page.getByRole("tabpanel").getByRole("button", { name: /^Make it/ }).first().click();
  await expect(finding(page)).toHaveText(/^Folds shut on \d+ × 170 × 60 mm inside, as asked\.$/);
});

test("says what does not parse, beside the field, and changes nothing", async ({ page }) => {
  await page.goto("/try");
  await benchReady(page);
  const sentences: Record<string, string> = {
    "43 mn": "“mn” is not a unit. Type 43, 43mm or 1.69in.",
    "abc": "“abc” is not a number. Type 43, 43mm or 1.69in.",
    "3+": "The sum is not finished. Type 43, 43mm or 1.69in.",
    "5/0": "Nothing can be divided by 0. Type 43, 43mm or 1.69in.",
    "": "Nothing is typed here. Type 43, 43mm or 1.69in.",
    "<b>1": "is out of place. Type 43, 43mm or 1.69in.",
  };
  await figure(page, "Length").click();
  const field = page.getByRole("tabpanel").getByRole("textbox", { name: "Length" });
  for (const [typed, says] of Object.entries(sentences)) {
    await field.fill(typed);
    await field.press("Enter");
    await expect(page.getByRole("tabpanel").getByRole("alert")).toContainText(says);
    await expect(field).toBeFocused();
  }
  await field.press("Escape");
  await expect(finding(page)).toHaveText("Folds shut on 240 × 170 × 60 mm inside, as asked.");
});

test("tells swapped sides apart and keeps the figures of the form", async ({ page }) => {
  await signIn(page, "designer");
  await page.goto("/cartons/new?construction=straight-tuck");
  await page.getByLabel("Name").fill("Swapped");
  await page.getByLabel("Length").fill("25");
  await page.getByLabel("Width").fill("60");
  const alert = page.getByRole("alert").first();
  await expect(alert).toContainText(/is \d+ mm; the (least|most) is/);
  await expect(page.getByText("1 figure to mend")).toBeVisible();
  await page.getByRole("button", { name: "Take it to the Bench" }).click({ force: true });
  await expect(page).toHaveURL(/\/cartons\/new/);
  await expect(page.getByLabel("Name")).toHaveValue("Swapped");
  await page.getByRole("button", { name: /^Make it/ }).click();
  await expect(page.getByRole("complementary", { name: "What this makes" })).toContainText("Folds shut on");
});

test("does not take a carton without a name, and loses nothing", async ({ page }) => {
  test.info().annotations.push({ type: "covers", description: "a form refused by the server" });
  await signIn(page, "designer");
  await page.goto("/cartons/new?construction=glued-tray");
  await page.getByLabel("Length").fill("131");
  await page.getByLabel("Client").selectOption({ label: "Ninefold Tea" });
  await page.getByRole("button", { name: "Take it to the Bench" }).click();
  await expect(page.getByText("Type a name for the carton.")).toBeVisible();
  await expect(page.getByLabel("Length")).toHaveValue("131");
  await expect(page.getByLabel("Client").locator("option:checked")).toHaveText("Ninefold Tea");
});
test.use({ expectedErrors: [/status of 400/] });
