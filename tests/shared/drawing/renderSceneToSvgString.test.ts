import { describe, expect, it } from "vitest";
import { drawKit } from "#shared/drawing/drawKit";
import { drawPart } from "#shared/drawing/drawPart";
import { renderSceneToSvgString } from "#shared/drawing/renderSceneToSvgString";
import { colourNames } from "#shared/drawing/sceneStyle";
import { themeColours } from "#shared/drawing/themeColours";

const wheel = drawPart({
  kind: "idler-wheel",
  view: "large",
  dims: { outsideDiameter: { nominalMm: 44.2, plusMinusMm: 0.1 }, bore: { nominalMm: 4 } },
  asFound: { outsideDiameter: 43.9 },
});

describe("renderSceneToSvgString", () => {
  it("carries the sizes in words", () => {
    const svg = renderSceneToSvgString(wheel, "light");
    expect(svg).toContain("<title>Idler wheel, outside diameter 44.2 mm</title>");
    expect(svg).toContain("outside diameter 44.2 mm plus or minus 0.1, bore 4.0 mm.");
    expect(svg).toContain("Your old part, dashed: outside diameter 43.9 mm.");
    expect(svg).toContain("Not stated: tread width, overall height.");
  });

  it("stands alone: no fonts, no variables, no styles, no references outside", () => {
    const svg = renderSceneToSvgString(wheel, "dark");
    expect(svg).not.toMatch(/<text|var\(|style=|<style|href|NaN|undefined/);
    for (const [, id] of svg.matchAll(/url\(#([^)]+)\)/g)) expect(svg).toContain(`id="${id}"`);
  });

  it("takes its colours from the theme", () => {
    const [light, dark] = (["light", "dark"] as const).map((theme) => renderSceneToSvgString(wheel, theme));
    for (const name of ["ink", "measured", "rubber", "metal"] as const) {
      expect(light).toContain(themeColours.light[name]);
      expect(dark).toContain(themeColours.dark[name]);
    }
    expect(renderSceneToSvgString(wheel, "light", { background: false })).not.toContain("<rect");
  });

  it("hatches cut rubber and metal in different directions", () => {
    const svg = renderSceneToSvgString(wheel, "light", { idPrefix: "one" });
    expect(svg).toMatch(/<pattern id="one-rubber"[^>]*patternTransform="rotate\(45\)"/);
    expect(svg).toMatch(/<pattern id="one-metal"[^>]*patternTransform="rotate\(-45\)"/);
  });

  it("escapes what people wrote", () => {
    const nasty = `"><script>alert('x')</script>&\u0000\u0007`;
    const kit = drawKit([
      { label: nasty, kind: "round-belt", dims: { section: { nominalMm: 2 } } },
      { label: `漢字 <b>&</b>`, quantity: 2 },
    ]);
    const svg = renderSceneToSvgString(kit, "light");
    expect(svg).not.toContain("<script>");
    expect(svg).not.toContain("<b>");
    expect(["\u0000", "\u0007"].filter((control) => svg.includes(control))).toEqual([]);
    expect(svg).toContain("&quot;&gt;&lt;script&gt;alert(&#39;x&#39;)&lt;/script&gt;&amp;");
    expect(svg).toContain("漢字");
  });
});

/** WCAG 2.2, relative luminance and contrast ratio (definitions of terms). */
function contrast(a: string, b: string): number {
  const luminance = (hex: string) => {
    const [r, g, blue] = [1, 3, 5].map((at) => {
      const c = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
      return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
    });
    return 0.2126 * r! + 0.7152 * g! + 0.0722 * blue!;
  };
  const [dark, light] = [luminance(a), luminance(b)].sort((x, y) => x - y);
  return (light! + 0.05) / (dark! + 0.05);
}

describe.each(["light", "dark"] as const)("colours of the %s theme", (theme) => {
  const colours = themeColours[theme];

  it.each(["ink", "soft", "measured"] as const)("has words in %s that can be read (4.5 to 1)", (name) => {
    expect(contrast(colours[name], colours.sheet)).toBeGreaterThanOrEqual(4.5);
  });

  it.each([
    ["rubber-hatch", "rubber"],
    ["metal", "metal-fill"],
    ["ink", "felt"],
  ] as const)("has %s lines that can be seen on %s (3 to 1)", (line, ground) => {
    expect(contrast(colours[line], colours[ground])).toBeGreaterThanOrEqual(3);
  });

  it("has a value for every colour of a drawing", () => {
    for (const name of colourNames) expect(colours[name]).toMatch(/^#[0-9A-F]{6}$/);
  });
});
