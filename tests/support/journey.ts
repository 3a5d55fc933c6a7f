// What every journey shares: a console that must stay quiet, and the check for accessibility.
import AxeBuilder from "@axe-core/playwright";
import { test as base, expect, type Page } from "@playwright/test";

/** Said by the browser's own 3-D driver and by the 3-D library, of which the product has no say. */
const KNOWN = [/GL Driver Message/, /THREE\.Clock: This module has been deprecated/, /GPU stall due to ReadPixels/];

interface Journey {
  /** Console errors that this journey provokes on purpose, e.g. a refused save: a list of one, for two would be read as a value and its options. */
  expectedErrors: RegExp[];
  quietConsole: void;
}

export const test = base.extend<Journey>({
  expectedErrors: [[], { option: true }],
  quietConsole: [
    async ({ page, expectedErrors }, use) => {
      const heard: string[] = [];
      page.on("console", (message) => {
        if (message.type() === "error" || message.type() === "warning") heard.push(`${message.type()}: ${message.text()}`);
      });
      page.on("pageerror", (error) => heard.push(`page error: ${error.message}`));
      await use();
      expect(heard.filter((line) => ![...KNOWN, ...expectedErrors].some((known) => known.test(line)))).toEqual([]);
    },
    { auto: true },
  ],
});

export { expect };

/** WCAG 2.2, levels A and AA, as axe judges them. */
export async function expectAccessible(page: Page, where: string): Promise<void> {
  const results = await new AxeBuilder({ page }).withTags(["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"]).analyze();
  const found = results.violations.map((violation) => ({ rule: violation.id, help: violation.help, nodes: violation.nodes.map((node) => node.html.slice(0, 200)) }));
  expect(found, `${where} for everybody`).toEqual([]);
}

/** Nothing wider than the window: no page scrolls sideways. */
export async function expectNoSideways(page: Page): Promise<void> {
  const [content, window] = await page.evaluate(() => [document.documentElement.scrollWidth, document.documentElement.clientWidth]);
  expect(content).toBeLessThanOrEqual(window!);
}

export const isPhone = (page: Page): boolean => (page.viewportSize()?.width ?? 0) < 768;

/** Waits until the Bench listens to keys and pointers. */
export const benchReady = (page: Page) => expect(page.locator("main[data-ready=true]")).toBeVisible();

/** The sentence at the top of the Bench. */
export const finding = (page: Page) => page.locator("main").getByRole("status").first();

/** A figure of the Ledger that can be typed over. */
export const figure = (page: Page, name: string) => page.getByRole("tabpanel").getByRole("button", { name: new RegExp(`^${name} .*Change it$`) });

/** Types over a figure of the Ledger. */
export async function typeFigure(page: Page, name: string, text: string): Promise<void> {
  await figure(page, name).click();
  const field = page.getByRole("tabpanel").getByRole("textbox", { name, exact: true });
  await field.fill(text);
  await field.press("Enter");
}
