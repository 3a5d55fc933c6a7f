import { expect, type Page } from "@playwright/test";

export const DEMO_PASSWORD = "fold-and-crease-1";

export const MAIL = {
  owner: "tess@harrowlane.example", designer: "orla@harrowlane.example", finisher: "nia@harrowlane.example",
  client: "petra@pebblefinch.example", "another client": "ines@saltmarshsoap.example",
} as const;

/** Signs in as one of the demo studio's people. `here`: on the sign-in page that is open already. */
export async function signIn(page: Page, who: keyof typeof MAIL, { here = false } = {}): Promise<void> {
  if (!here) await page.goto("/sign-in");
  await page.getByLabel("E-mail").fill(MAIL[who]);
  await page.getByLabel("Password").fill(DEMO_PASSWORD);
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page).not.toHaveURL(/\/sign-in/);
}
