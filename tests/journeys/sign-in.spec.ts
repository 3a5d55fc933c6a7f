// Getting in and out, and what each role then sees.
import { expect, expectAccessible, expectNoSideways, test } from "../support/journey";
import { DEMO_PASSWORD, signIn } from "../support/sign-in";

test("says what is wrong beside the field and keeps the e-mail", async ({ page }) => {
  await page.goto("/sign-in");
  await expectAccessible(page, "Sign-in");
  await expectNoSideways(page);
  await page.getByLabel("E-mail").fill("orla@harrowlane");
  await page.getByLabel("Password").fill("x");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByRole("alert").first()).toContainText("Type an e-mail, such as orla@harrowlane.example.");
  await page.getByLabel("E-mail").fill("orla@harrowlane.example");
  await page.getByLabel("Password").fill("not the password");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByRole("alert")).toContainText("E-mail and password do not go together.");
  await expect(page.getByLabel("E-mail")).toHaveValue("orla@harrowlane.example");
  await page.getByLabel("Password").fill(DEMO_PASSWORD);
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByRole("heading", { name: "Desk" })).toBeVisible();
});
test.use({ expectedErrors: [/status of 40[0134]/] });

test("goes back to the page that was asked for", async ({ page }) => {
  await page.goto("/templates?q=tuck");
  await expect(page).toHaveURL(/\/sign-in\?next=/);
  await signIn(page, "designer", { here: true });
  await expect(page).toHaveURL(/\/templates\?q=tuck/);
});

test("shows a client's contact their own cartons and no other's", async ({ page }) => {
  await signIn(page, "client");
  await page.goto("/cartons");
  await expect(page.getByRole("link", { name: "Puzzle mailer, 500 pieces" })).toBeVisible();
  await expect(page.getByText("Bar carton 90 g")).toHaveCount(0);
  await expect(page.getByRole("link", { name: "New carton" })).toHaveCount(0);
  await page.goto("/clients");
  await expect(page.getByRole("heading", { name: "Not for your role" })).toBeVisible();
});

for (const [name, address, role] of [["Account", "/account", "finisher"], ["People", "/people", "owner"], ["Clients", "/clients", "designer"], ["Deleted things", "/trash", "designer"]] as const) {
  test(`${name} works for everybody at this width`, async ({ page }) => {
    await signIn(page, role);
    await page.goto(address);
    await expect(page.getByRole("heading", { name, level: 1 })).toBeVisible();
    await expectNoSideways(page);
    await expectAccessible(page, name);
  });
}

test("signs out from the menu", async ({ page }) => {
  await signIn(page, "finisher");
  await page.locator("summary").filter({ visible: true }).last().click();
  await page.getByRole("button", { name: "Sign out" }).filter({ visible: true }).click();
  await expect(page).toHaveURL(/\/sign-in/);
  await page.goto("/cartons");
  await expect(page).toHaveURL(/\/sign-in\?next=/);
});

test("brings back what was deleted", async ({ page }) => {
  await signIn(page, "designer");
  await page.goto("/clients");
  const name = `Trial client ${Date.now()}`;
  await page.getByLabel("Name").fill(name);
  await page.getByRole("button", { name: "Add the client" }).click();
  await expect(page.getByRole("heading", { name, level: 1 })).toBeVisible();
  await expectAccessible(page, "A client");
  await page.getByRole("button", { name: `Delete ${name}` }).click();
  await expect(page.getByRole("heading", { name: "Deleted things" })).toBeVisible();
  await page.getByRole("button", { name: `Bring back ${name}` }).click();
  await expect(page.getByRole("status").filter({ hasText: "It is back where it was." })).toBeVisible();
  await page.goto(`/clients?q=${encodeURIComponent(name)}`);
  await expect(page.getByRole("link", { name })).toBeVisible();
});
