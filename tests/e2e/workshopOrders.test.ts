import type { Browser } from "playwright-core";
import { afterAll, beforeAll, describe, expect, inject, it } from "vitest";
import { desk, expectAccessible, launchBrowser, openPage, phone, type Sizes } from "./browser";

const siteUrl = inject("siteUrl");

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe("a workshop's parcels", () => {
  it.each<[string, Sizes, "light" | "dark"]>([
    ["a phone", phone, "light"],
    ["a desk at night", desk, "dark"],
  ])("can be read by their workshop on %s, each with what to do next", async (_name, viewport, theme) => {
    const { page, complaints, close } = await openPage(browser, viewport, theme);
    await page.goto(`${siteUrl}/sign-in?next=${encodeURIComponent("/workshop/orders")}`);
    await page.getByLabel("E-mail address").fill("workshop@idlewright.example");
    await page.getByLabel("Password", { exact: true }).fill("measure twice cut once");
    await page.getByRole("button", { name: "Sign in" }).click();
    await page.getByRole("navigation", { name: "Parcels by state" }).waitFor();
    await expectAccessible(page, "the list");
    for (const name of ["Ready", "Core awaited"]) {
      await page.goto(`${siteUrl}/workshop/orders`);
      await page.getByRole("listitem").filter({ hasText: name }).getByRole("link").first().click();
      await page.getByRole("region", { name: "What to do next" }).getByText(name, { exact: true }).waitFor();
      await expectAccessible(page, name);
    }
    expect(complaints).toEqual([]);
    await close();
  });
});
