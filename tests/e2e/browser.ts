import { AxeBuilder } from "@axe-core/playwright";
import { type Browser, chromium, type Page } from "playwright-core";
import { expect } from "vitest";

/** Debian's Chromium, kept from looking for its maker's services. */
export const launchBrowser = (): Promise<Browser> =>
  chromium.launch({
    executablePath: "/usr/bin/chromium",
    headless: true,
    args: [
      "--no-sandbox",
      "--disable-gpu",
      "--disable-quic",
      "--no-first-run",
      "--disable-background-networking",
      "--disable-component-update",
      "--disable-sync",
      "--disable-dev-shm-usage",
    ],
  });

export type Sizes = { width: number; height: number };
export const phone: Sizes = { width: 390, height: 844 };
export const desk: Sizes = { width: 1280, height: 900 };

/** A page of somebody with an empty browser; what goes wrong in it fails the test at `expectCalm`. */
export async function openPage(browser: Browser, viewport: Sizes, colorScheme: "light" | "dark" = "light") {
  const context = await browser.newContext({
    viewport,
    colorScheme,
    hasTouch: viewport.width < 600,
    reducedMotion: "reduce",
  });
  context.setDefaultTimeout(20_000);
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on("pageerror", (error) => complaints.push(error.message));
  page.on("console", (message) => {
    // A refusal that the page shows in words is also noted by the browser: that is no fault of the page.
    if (message.type() === "error" && !/status of (401|403|404|409|422)/.test(message.text()))
      complaints.push(message.text());
  });
  return { page, complaints, close: () => context.close() };
}

const tags = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"];

/** No violation that axe knows of, and nothing wider than the window. */
export async function expectAccessible(page: Page, what: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(" ")).join(", ")}`);
  expect(found, what).toEqual([]);
  const beyond = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  expect(beyond, `${what}: px beyond the window`).toBeLessThanOrEqual(0);
}
