import type { Browser, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, inject, it } from "vitest";
import { desk, expectAccessible, launchBrowser, openPage, phone, type Sizes } from "./browser";

const siteUrl = inject("siteUrl");

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

/** Says in the sentence that the belt is gone, and follows it to the pulleys. */
async function toPulleys(page: Page): Promise<void> {
  await page.goto(`${siteUrl}/`);
  await page.getByLabel("Kind of part").selectOption("flat-belt");
  await page.getByLabel("Condition of the old part").selectOption("missing");
  await expectAccessible(page, "the sentence without a sample");
  await page.getByRole("link", { name: "work it out from the pulleys" }).click();
  await page.waitForURL(/\/gauges\/belt-route\?/);
  await page.getByRole("link", { name: "Find this belt" }).waitFor();
}

describe("a belt that is gone", () => {
  it.each<[string, Sizes, "light" | "dark"]>([
    ["a phone", phone, "light"],
    ["a desk at night", desk, "dark"],
  ])("is worked out from its pulleys and searched on %s", async (_name, viewport, theme) => {
    const { page, complaints, close } = await openPage(browser, viewport, theme);
    await toPulleys(page);
    await page.getByRole("link", { name: "Find this belt" }).click();
    await page.waitForURL(/\/find\?/);
    await page.getByRole("slider").waitFor();
    await expectAccessible(page, "results for a worked-out size");

    const length = page.getByRole("textbox", { name: "inside circumference" });
    expect(await length.inputValue()).toMatch(/^\d+(\.\d+)? ± \d+(\.\d+)? mm$/);
    await page.getByText("worked out as").first().waitFor();
    expect(await page.getByLabel("Condition of the old part").inputValue()).toBe("missing");
    await page.getByText("What was worked out is taken as it stands, without correction").waitFor();

    // The size stays in the sentence to be changed, and is searched anew.
    await length.fill("540 ± 6 mm");
    await length.press("Enter");
    await page.waitForURL((url) => url.searchParams.get("insideCircumference") === "540 ± 6 mm");
    await page.locator('[role="slider"][aria-valuenow="540"]').waitFor();
    expect(complaints).toEqual([]);
    await close();
  });
});
