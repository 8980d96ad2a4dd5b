import { describe, expect, it } from "vitest";
import { escapeHtml } from "#server/mail/escapeHtml";
import { type Letter, oneLine } from "#server/mail/Letter";
import { letterHtml } from "#server/mail/letterHtml";
import { letterText } from "#server/mail/letterText";
import { sizesText } from "#server/mail/sizesText";

const hostile = `<img src=x onerror="alert(1)">&'`;
const letter = (given: Partial<Letter> = {}): Letter => ({
  subject: "Order 26-10001 is paid",
  opening: ["Thank you."],
  action: { label: "See the order", url: "https://idlewright.example/orders/1?a=1&b=2" },
  blocks: [],
  why: "Because.",
  ...given,
});

describe("oneLine", () => {
  it.each([
    ["Ada\r\nBcc: x@example.org", "Ada Bcc: x@example.org"],
    ["a\u2028b\u2029c\u0000d", "a b c d"],
    ["right\u202Eto-left", "rightto-left"],
    ["  plain  ", "plain"],
  ])("puts %j on one line", (text, line) => {
    expect(oneLine(text)).toBe(line);
  });
});

describe("a letter", () => {
  it("escapes everything that it is told, wherever it stands", () => {
    const html = letterHtml(
      letter({
        subject: hostile,
        opening: [hostile],
        action: { label: hostile, url: `https://x.example/${hostile}` },
        blocks: [
          { heading: hostile },
          { paragraph: hostile },
          { lines: [hostile] },
          { facts: [[hostile, hostile]] },
          {
            part: {
              title: hostile,
              sizes: hostile,
              forNeed: hostile,
              notes: [hostile],
              amount: hostile,
              picture: { contentId: hostile, alt: hostile, png: Buffer.alloc(0), width: 1, height: 1 },
            },
          },
        ],
        why: hostile,
      }),
      "mark",
    );
    expect(html).not.toContain("<img src=x");
    expect(html).not.toContain('onerror="');
    expect(html.split(escapeHtml(hostile)).length - 1).toBe(18);
  });

  it("has one link, and says the same in both of its twins", () => {
    const one = letter({
      blocks: [{ heading: "Parcel" }, { facts: [["Total", "€26.00"]] }, { lines: ["Works Ltd", "1 Mould Lane"] }],
    });
    const [html, text] = [letterHtml(one, "mark"), letterText(one)];
    expect(html.match(/<a /g)).toHaveLength(1);
    expect(html).toContain('<html lang="en">');
    expect(html).toContain('href="https://idlewright.example/orders/1?a=1&amp;b=2"');
    expect(text).toContain("https://idlewright.example/orders/1?a=1&b=2");
    for (const said of ["Thank you.", "See the order", "Parcel", "Total", "€26.00", "Works Ltd", "1 Mould Lane"]) {
      expect(html).toContain(said);
      expect(text).toContain(said);
    }
    expect(text).not.toMatch(/[<>]/);
  });

  it("fetches nothing from anywhere", () => {
    const html = letterHtml(letter(), "mark");
    expect([...html.matchAll(/(?:src|background)="([^"]+)"/g)].map((match) => match[1])).toEqual(["cid:mark"]);
    expect(html).not.toMatch(/<script|<link|url\(/);
  });
});

describe("sizesText", () => {
  const size = (nominalMm: number, plusMinusMm: number) =>
    ({ nominalMm, plusMinusMm, tolerance: "stated", toleranceClass: null }) as const;

  it("names sizes in the order of the kind", () => {
    expect(
      sizesText({
        kind: "idler-wheel",
        dimensions: { bore: size(4, 0.05), outsideDiameter: size(44.05, 0.1) },
        kitLines: [],
      }),
    ).toBe("outside diameter 44.05 ±0.10 mm, bore 4.00 ±0.05 mm");
  });

  it("names the lines of a kit", () => {
    const line = { id: "1", servicePointName: null };
    expect(
      sizesText({
        kind: "rebuild-kit",
        dimensions: {},
        kitLines: [
          { ...line, kind: "round-belt", title: "Capstan belt", quantity: 2, dimensions: { section: size(2, 0.1) } },
          { ...line, kind: null, title: "Grease", quantity: 1, dimensions: {} },
        ],
      }),
    ).toBe("2 x Capstan belt (section 2.0 ±0.1 mm); 1 x Grease");
  });
});
