import type { Browser } from "playwright-core";
import { afterAll, beforeAll, describe, expect, inject, it } from "vitest";
import { desk, expectAccessible, launchBrowser, openPage, phone, type Sizes } from "./browser";

const siteUrl = inject("siteUrl");
const gauges = ["belt-route", "belt-sample", "speed", "tolerances", "o-rings", "sheets"];
const everywhere = ["/gauges", ...gauges.map((name) => `/gauges/${name}`)];
const onPhone = ["/guides", "/guides/idler-wheel", "/guides/belts", "/guides/conditions", "/guides/cautions"];
const onDesk = ["/guides/rebuild-kit", "/guides/fit-chance", "/guides/instruments", "/guides/limits"];

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe("the gauge desk", () => {
  it.each<[string, Sizes, "light" | "dark", string[]]>([
    ["a phone", phone, "light", [...everywhere, ...onPhone]],
    ["a desk at night", desk, "dark", [...everywhere, ...onDesk]],
  ])("can be read and used by anybody on %s", async (_name, viewport, theme, paths) => {
    const { page, complaints, close } = await openPage(browser, viewport, theme);
    for (const path of paths) {
      await page.goto(`${siteUrl}${path}`);
      await page.locator("main h2").first().waitFor();
      await expectAccessible(page, path);
    }
    expect(complaints).toEqual([]);
    await close();
  });

  it("moves a pulley under the finger, and the belt with it", async () => {
    const { page, complaints, close } = await openPage(browser, desk);
    await page.goto(`${siteUrl}/gauges/belt-route`);
    const pulley = page.getByRole("button", { name: /^Flywheel: x 168/ });
    const box = await pulley.boundingBox();
    const [x, y] = [(box?.x ?? 0) + (box?.width ?? 0) / 2, (box?.y ?? 0) + (box?.height ?? 0) / 2];
    const length = page.getByText(/^\d+\.\d mm in place$/);
    const before = await length.textContent();
    await page.mouse.move(x, y);
    await page.mouse.down();
    await page.mouse.move(x + 60, y, { steps: 6 });
    await expect.poll(() => length.textContent()).not.toBe(before);
    await page.mouse.up();
    await page.getByRole("button", { name: /^Flywheel: x (1[789]|2)\d/ }).waitFor();
    // What was dragged stands in the address, and is there again when the page is opened anew.
    const dragged = await length.textContent();
    await page.waitForURL(/pulley=Flywheel/);
    await page.reload();
    await expect.poll(() => length.textContent()).toBe(dragged);
    expect(complaints).toEqual([]);
    await close();
  });

  it("opens each sheet as a PDF", async () => {
    const { page, close } = await openPage(browser, desk);
    for (const sheet of ["Stroboscope disc", "Ring gauge", "Belt ruler"]) {
      await page.goto(`${siteUrl}/gauges/sheets`);
      await page.getByRole("radio", { name: new RegExp(sheet) }).check({ force: true });
      const href = await page.getByRole("link", { name: "Open the PDF" }).getAttribute("href");
      const answer = await page.request.get(`${siteUrl}${href}`);
      expect(answer.headers()["content-type"], sheet).toContain("application/pdf");
      expect((await answer.body()).subarray(0, 5).toString()).toBe("%PDF-");
    }
    await close();
  });
});
