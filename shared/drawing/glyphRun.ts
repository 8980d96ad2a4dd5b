import type { SvgElement } from "./sceneElements";
import font from "./workSansOutlines.json";

type Glyph = readonly [advance: number, path: string];
const weights = font.weights as unknown as Record<"500" | "600", Record<string, Glyph | undefined>>;
const unitsPerEm = 1000;

/**
 * A line of text as filled outlines of the product's typeface, its baseline starting at x = `from`, y = 0, px.
 * Undefined where a letter is not among the outlines (Latin 1 and some punctuation).
 */
export function glyphRun(
  content: string,
  size: number,
  weight: 500 | 600,
  fill: string,
  from = 0,
): SvgElement[] | undefined {
  const elements: SvgElement[] = [];
  const scale = size / unitsPerEm;
  let x = from;
  for (const character of content) {
    const glyph = weights[weight][character] ?? weights[500][character];
    if (!glyph) return undefined;
    const [advance, d] = glyph;
    const transform = `translate(${x.toFixed(2)}) scale(${scale.toFixed(5)})`;
    if (d) elements.push({ tag: "path", attributes: { d, fill, transform } });
    x += advance * scale;
  }
  return elements;
}
