import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

type Colours = Record<string, string>;
const css = readFileSync("client/styles/tokens.css", "utf8");

/** The variables of the block that begins with this selector. */
function block(selector: string): Colours {
  const start = css.indexOf(`${selector} {`);
  if (start < 0) throw new Error(`no block ${selector}`);
  const body = css.slice(start, css.indexOf("}", start));
  return Object.fromEntries(
    [...body.matchAll(/--color-([a-z-]+): (#[0-9a-f]{6});/g)].map(([, name, hex]) => [name, hex]),
  );
}

/** Relative luminance, WCAG 2.2 definition. */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5]
    .map((at) => Number.parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4)) as [number, number, number];
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

/** Contrast ratio, WCAG 2.2 definition. */
function contrast(one: string, other: string): number {
  const [lighter, darker] = [luminance(one), luminance(other)].sort((a, b) => b - a) as [number, number];
  return (lighter + 0.05) / (darker + 0.05);
}

const light = block(":root");
const dark = block(':root[data-theme="dark"]');
const body = [
  ["ink", "ground"],
  ["ink", "sheet"],
  ["soft", "ground"],
  ["soft", "sheet"],
  ["ink", "inband-fill"],
  ["ink", "measured-fill"],
] as const;
const text = [
  ["measured", "ground"],
  ["measured", "sheet"],
  ["on-measured", "measured"],
  ["ground", "ink"],
  ["inband", "ground"],
  ["inband", "sheet"],
  ["inband", "inband-fill"],
  ["outband", "ground"],
  ["outband", "sheet"],
  ["measured", "measured-fill"],
] as const;
/** Marks and edges of controls: WCAG 2.2, 1.4.11. */
const marks = [
  ["edge", "sheet"],
  ["edge", "ground"],
  ["focus", "ground"],
  ["focus", "sheet"],
  ["outband", "inband-fill"],
  ["inband", "measured-fill"],
  ["ink", "metal-fill"],
  ["rubber-hatch", "rubber"],
] as const;

describe.each([
  ["light", light],
  ["dark", dark],
])("contrast of the %s colours", (_theme, colours) => {
  it.each(body)("body text %s on %s reaches 7:1", (ink, ground) => {
    expect(contrast(colours[ink]!, colours[ground]!)).toBeGreaterThanOrEqual(7);
  });
  it.each(text)("text %s on %s reaches 4.5:1", (ink, ground) => {
    expect(contrast(colours[ink]!, colours[ground]!)).toBeGreaterThanOrEqual(4.5);
  });
  it.each(marks)("mark %s on %s reaches 3:1", (ink, ground) => {
    expect(contrast(colours[ink]!, colours[ground]!)).toBeGreaterThanOrEqual(3);
  });
});

describe("the colour table", () => {
  it("computes the ratio that the standard gives for black on white", () => {
    expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 10);
  });
  it("names the same colours in both themes", () => {
    expect(Object.keys(dark)).toEqual(Object.keys(light));
  });
  it("is the same dark whether the system or the reader asks for it", () => {
    expect(block('  :root:not([data-theme="light"])')).toEqual(dark);
  });
});
