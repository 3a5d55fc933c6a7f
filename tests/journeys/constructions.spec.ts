// Choosing: every plate is drawn from the geometry, and what does not hold the contents is not offered.
import { expect, expectAccessible, expectNoSideways, test } from "../support/journey";

test("shows each construction flat and folded, as vectors", async ({ page }) => {
  await page.goto("/constructions");
  const plates = page.getByRole("article");
  await expect(plates).toHaveCount(5);
  for (const plate of await plates.all()) {
    await expect(plate.getByRole("img")).toHaveCount(2);
    expect(await plate.locator("svg path").count()).toBeGreaterThan(5);
    await expect(plate.locator("img, canvas")).toHaveCount(0);
  }
  // Names and codes as FEFCO's own catalogue gives them.
  await expect(page.getByRole("article", { name: "Mailer, roll-over sides" })).toContainText("FEFCO 0427");
  await expectNoSideways(page);
  await expectAccessible(page, "The constructions");
});

test("filters and searches, and keeps that in the address", async ({ page }) => {
  await page.goto("/constructions");
  await page.getByRole("group", { name: "Glue" }).getByRole("link", { name: "no glue" }).click();
  await expect(page).toHaveURL(/glue=no/);
  await expect(page.getByRole("article")).toHaveCount(1);
  await page.getByRole("link", { name: "Clear" }).click();
  // The page is drawn anew when the address has changed: what is typed before that is lost.
  await expect(page).not.toHaveURL(/glue=/);
  await expect(page.getByRole("article")).toHaveCount(5);
  await page.getByLabel("Search").fill("0301");
  await page.getByLabel("Search").press("Enter");
  await expect(page.getByRole("article")).toHaveCount(1);
  await page.getByLabel("Search").fill("barrel");
  await page.getByLabel("Search").press("Enter");
  await expect(page.getByRole("heading", { name: "None like that" })).toBeVisible();
});

test("offers only what holds the contents, and says why the others do not", async ({ page }) => {
  await page.goto("/constructions?L=30&W=20&D=60");
  const refused = page.getByRole("heading", { name: "Do not hold it" });
  await expect(refused).toBeVisible();
  await expect(page.locator("li", { hasText: /Mailer, roll-over sides\./ })).toContainText("Length is 30 mm; the least is");
  await page.goto("/constructions?L=30+mn&W=20&D=60");
  await expect(page.getByRole("alert")).toContainText("“mn” is not a unit. Type 43, 43mm or 1.69in.");
});
