// The job from end to end, as a new user does it: choose, size, read, fold, save, find, keep as a template, export.
import { benchReady, expect, expectAccessible, expectNoSideways, finding, isPhone, test, typeFigure } from "../support/journey";
import { signIn } from "../support/sign-in";

test("makes a carton from a construction to its files, and another one from its template", async ({ page }, info) => {
  // Both projects work in one studio: each has its own names.
  const name = `Bar carton ${info.project.name} ${Date.now().toString(36)}`;
  await signIn(page, "designer");

  // 1. A construction from the gallery.
  await page.goto("/constructions");
  await page.getByRole("link", { name: "Take Straight tuck to the Bench" }).click();
  await expect(page.getByRole("heading", { name: "New carton", level: 1 })).toBeVisible();

  // 2. Its size, which size that is, and a board; the blank is there at once.
  await page.getByLabel("Name").fill(name);
  await page.getByLabel("Client").selectOption({ label: "Saltmarsh Soap Works" });
  await page.getByLabel("Length").fill("80+2*1");
  await page.getByLabel("Width").fill("27");
  await page.getByLabel("Depth").fill("56");
  await page.getByLabel("Board").selectOption("sbb-350");
  const preview = page.getByRole("complementary", { name: "What this makes" });
  await expect(preview).toContainText("Folds shut on 82 × 27 × 56 mm inside, as asked.");
  for (const size of ["Inside", "Clear inside", "Outside", "Blank"]) await expect(preview.locator("dt", { hasText: new RegExp(`^${size}$`) })).toBeVisible();
  await expectNoSideways(page);
  await expectAccessible(page, "New carton");
  await page.getByRole("button", { name: "Take it to the Bench" }).click();
  await expect(page).toHaveURL(/\/cartons\/[0-9a-z]{16}$/);
  const address = new URL(page.url()).pathname;
  await benchReady(page);
  await expect(finding(page)).toHaveText("Folds shut on 82 × 27 × 56 mm inside, as asked.");
  await expectNoSideways(page);

  // 3. A figure is edited, undone and done again.
  await typeFigure(page, "Width", "28,5");
  await expect(finding(page)).toContainText("82 × 28.5 × 56 mm inside");
  await page.getByRole("button", { name: "Undo" }).click();
  await expect(finding(page)).toContainText("82 × 27 × 56 mm inside");
  await page.keyboard.press("Control+y");
  await expect(finding(page)).toContainText("82 × 28.5 × 56 mm inside");

  // 4. The lever closes it in the order in which a person folds it.
  const lever = page.getByRole("slider", { name: "Fold lever" });
  await lever.focus();
  const stations: string[] = [];
  for (let i = 0; i < 7; i++) {
    await page.keyboard.press("PageUp");
    stations.push((await lever.getAttribute("aria-valuetext"))!.split(",")[0]!);
  }
  expect(stations).toEqual(["Body", "Bottom dust flaps", "Bottom tuck", "Bottom shut", "Lid dust flaps", "Lid tuck", "Lid shut"]);
  await page.keyboard.press("Home");

  // 5. The Ledger says where a figure comes from.
  const front = page.locator("[data-ledger-row]", { hasText: /^Front/ }).first();
  await expect(front).toContainText("82 + 2 ×");
  await page.getByRole("group", { name: "Show figures by where they come from" }).getByRole("button", { name: "rule of thumb" }).click();
  await expect(page.getByRole("tabpanel")).toContainText(/\d+ of \d+ figures/);

  // 6. The fold check in sentences.
  await page.getByRole("tab", { name: /Fold check/ }).click();
  await expect(page.getByRole("tabpanel")).toContainText("Width. 28.5 mm meant inside, 28.5 mm measured on the folded carton.");
  await expect(page.getByRole("tabpanel").getByRole("heading", { name: "Locks" })).toBeVisible();

  // 7. Saved, found again, kept as a template, and another client's carton begun from it.
  await page.keyboard.press("Control+s");
  await expect(page.getByText(/^Saved \d\d:\d\d$/).first()).toBeAttached();
  await page.getByLabel("More").click();
  await page.getByRole("button", { name: "Keep it as a template" }).click();
  const dialog = page.getByRole("dialog", { name: "Keep it as a template" });
  await dialog.getByLabel("Name").fill(`Template of ${name}`);
  await dialog.getByLabel("Note").fill("For bars of 60 to 120 g.");
  await expectAccessible(page, "The template's form");
  await dialog.getByRole("button", { name: "Save the template" }).click();
  await expect(page.getByText(`“Template of ${name}” is kept as a template.`)).toBeVisible();
  await expectAccessible(page, "The Bench of a saved carton");

  await page.goto(`/cartons?q=${encodeURIComponent(name)}`);
  await expect(page.getByText("1 carton", { exact: true })).toBeVisible();
  await expectNoSideways(page);
  await page.getByRole("link", { name, exact: true }).click();
  await expect(page).toHaveURL(new RegExp(`${address}$`));
  await benchReady(page);
  await expect(finding(page)).toContainText("82 × 28.5 × 56 mm inside");

  await page.goto(`/templates?q=${encodeURIComponent(name)}`);
  await page.getByRole("link", { name: `Start a carton from Template of ${name}` }).click();
  await page.getByLabel("Name").fill(`${name} for tea`);
  await page.getByLabel("Client").selectOption({ label: "Ninefold Tea" });
  await page.getByRole("button", { name: "Take it to the Bench" }).click();
  await expect(page).toHaveURL(/\/cartons\/[0-9a-z]{16}$/);
  expect(new URL(page.url()).pathname).not.toBe(address);
  await benchReady(page);
  await expect(page.getByRole("banner")).toContainText("Ninefold Tea");
  await expect(finding(page)).toContainText("82 × 28.5 × 56 mm inside");

  // 8. The files, of either side.
  await page.getByLabel("Export", { exact: true }).click();
  await page.getByLabel("the print side").check();
  const kinds: Record<string, string> = { PDF: "application/pdf", SVG: "image/svg+xml", DXF: "image/vnd.dxf" };
  for (const [kind, type] of Object.entries(kinds)) {
    const href = (await page.getByRole("link", { name: new RegExp(`^${kind}`) }).getAttribute("href"))!;
    expect(href).toContain("side=print");
    const response = await page.request.get(href);
    expect(response.status()).toBe(200);
    expect(response.headers()["content-type"]).toContain(type);
    expect(response.headers()["content-disposition"]).toContain("print side");
  }
});

test("deletes a carton and brings it back", async ({ page }, info) => {
  const name = `Short-lived ${info.project.name} ${Date.now().toString(36)}`;
  await signIn(page, "designer");
  await page.goto("/cartons/new?construction=glued-tray");
  await page.getByLabel("Name").fill(name);
  await page.getByRole("button", { name: "Take it to the Bench" }).click();
  await benchReady(page);
  await page.getByLabel("More").click();
  await page.getByRole("button", { name: "Delete this carton" }).click();
  await expect(page).toHaveURL(/\/cartons$/);
  await expect(page.getByRole("link", { name, exact: true })).toHaveCount(0);
  await page.getByText("Undo", { exact: true }).click();
  await expect(page.getByRole("link", { name, exact: true })).toBeVisible();
});

test("lets a finisher and a client's contact look and not change", async ({ page }) => {
  await signIn(page, "client");
  await page.getByRole("link", { name: "Puzzle mailer, 500 pieces" }).first().click();
  await benchReady(page);
  await expect(finding(page)).toContainText("Folds shut on");
  await expect(page.getByRole("button", { name: /Change it$/ })).toHaveCount(0);
  await expect(page.getByRole("button", { name: "Save" })).toHaveCount(0);
  await page.getByRole("slider", { name: "Fold lever" }).focus();
  await page.keyboard.press("End");
  await expect(page.locator("[data-fold-view]")).toBeVisible();
  await expectAccessible(page, "The Bench for those who look");
});

test("sorts and filters the list in its address, and gives it as a table", async ({ page }) => {
  await signIn(page, "designer");
  await page.goto("/cartons");
  if (!isPhone(page)) {
    await page.getByRole("columnheader", { name: "Client" }).getByRole("link").click();
    await expect(page).toHaveURL(/sort=client&direction=up/);
    await expect(page.getByRole("columnheader", { name: "Client" })).toHaveAttribute("aria-sort", "ascending");
  }
  await page.getByLabel("Construction").selectOption({ label: "Lid and base" });
  await page.getByRole("button", { name: "Show them" }).click();
  await expect(page).toHaveURL(/construction=lid-and-base/);
  await expect(page.getByRole("row").filter({ hasText: "Frame tray, 300 pieces" })).toBeVisible();
  await expect(page.getByRole("link", { name: "Bar carton 90 g", exact: true })).toHaveCount(0);
  await expectAccessible(page, "The list of cartons");
  const csv = await page.request.get((await page.getByRole("link", { name: "Cartons as CSV" }).getAttribute("href"))!);
  const lines = (await csv.text()).replace(/^\uFEFF/, "").trim().split("\r\n");
  expect(lines[0]).toBe("name,client,construction,L mm,W mm,D mm,sizes are,board,saved (UTC),saved by");
  expect(lines.slice(1).every((line) => line.includes(",lid-and-base,"))).toBe(true);
});
