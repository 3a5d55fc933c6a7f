// What the Bench weighs on the wire.
import { benchReady, expect, test } from "../support/journey";

test("sends at most 200 kB of script before the lever is touched", async ({ page }) => {
  const sizes: Promise<number>[] = [];
  page.on("requestfinished", (request) => {
    if (new URL(request.url()).pathname.endsWith(".js")) sizes.push(request.sizes().then((s) => s.responseBodySize));
  });
  await page.goto("/try", { waitUntil: "networkidle" });
  const sent = (await Promise.all(sizes)).reduce((sum, size) => sum + size, 0);
  expect(sent).toBeGreaterThan(50_000);
  expect(sent).toBeLessThanOrEqual(200_000);
  await benchReady(page);
  const before = sizes.length;
  await page.keyboard.press("f");
  await expect.poll(() => sizes.length, { message: "3-D code comes with the lever" }).toBeGreaterThan(before);
});
