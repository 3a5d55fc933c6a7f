// Every page in both themes: nothing scrolls sideways, and axe finds nothing.
import { benchReady, expect, expectAccessible, expectNoSideways, test } from "../support/journey";
import { signIn } from "../support/sign-in";

for (const theme of ["light", "dark"] as const) {
  test(`pages in the ${theme} theme`, async ({ page }) => {
    await page.emulateMedia({ colorScheme: theme });
    await signIn(page, "owner");
    for (const address of ["/", "/cartons", "/cartons/new", "/templates", "/constructions", "/clients", "/trash", "/account", "/people"]) {
      await page.goto(address);
      await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
      await expectNoSideways(page);
      await expectAccessible(page, `${address} in the ${theme} theme`);
    }
    await page.goto("/cartons");
    await page.getByRole("link", { name: "Puzzle mailer, 500 pieces", exact: true }).click();
    await benchReady(page);
    await expectNoSideways(page);
    await expectAccessible(page, `The Bench in the ${theme} theme`);
    await page.goto("/templates");
    await page.getByRole("link", { name: "Small tuck carton", exact: true }).click();
    await expect(page.getByRole("heading", { name: "Small tuck carton", level: 1 })).toBeVisible();
    await expectAccessible(page, `A template in the ${theme} theme`);
  });
}

test("remembers a chosen theme before the first paint", async ({ page }) => {
  await page.emulateMedia({ colorScheme: "light" });
  await signIn(page, "designer");
  await page.locator("summary").filter({ visible: true }).click();
  await page.getByRole("group", { name: "Theme" }).filter({ visible: true }).getByRole("button", { name: "Dark" }).click();
  await page.goto("/cartons");
  await expect(page.locator("html")).toHaveAttribute("data-theme", "dark");
  expect(await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor)).toBe("rgb(27, 26, 25)");
  // It is in the page as it comes, so nothing flashes.
  expect(await (await page.request.get("/cartons")).text()).toContain('data-theme="dark"');
});

test("says that there is nothing at an address", async ({ page }) => {
  await signIn(page, "designer");
  const response = await page.goto("/no-such-page");
  expect(response?.status()).toBe(404);
  await expect(page.getByRole("heading", { name: "Nothing here" })).toBeVisible();
  await expectAccessible(page, "The page for nothing");
  expect((await page.goto("/cartons/0000000000000000"))?.status()).toBe(404);
});
test.use({ expectedErrors: [/status of 404/] });

test("lets a keyboard skip to the content", async ({ page }) => {
  await page.goto("/constructions");
  await page.keyboard.press("Tab");
  await expect(page.getByRole("link", { name: "Skip to the content" })).toBeFocused();
  await page.keyboard.press("Enter");
  await expect(page.locator("#content")).toBeFocused();
});
