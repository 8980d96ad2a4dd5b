import type { TextItem } from "./Scene";
import type { SvgElement } from "./sceneElements";
import { baselineOf, signPath, signRoom } from "./signMark";
import font from "./workSansOutlines.json";

type Glyph = readonly [advance: number, path: string];
const weights = font.weights as unknown as Record<"500" | "600", Record<string, Glyph | undefined>>;
const unitsPerEm = 1000;

/**
 * A text as outlines of the product's typeface, so that a picture looks the same on a machine without any fonts.
 * A text with a letter that the outlines do not have becomes an ordinary text element, in the fonts that there are.
 */
export function outlineText(item: TextItem, colour: string): SvgElement[] {
  const { content, size, turned, sign } = item;
  const at = baselineOf(item);
  const transform = `translate(${at.x.toFixed(2)} ${at.y.toFixed(2)})${turned ? " rotate(-90)" : ""}`;
  const glyphs = [...content].map((character) => weights[item.weight][character] ?? weights[500][character]);
  const children: SvgElement[] = [];
  if (sign) {
    const strokeWidth = size * 0.085;
    children.push({ tag: "path", attributes: { d: signPath(sign, size), fill: "none", stroke: colour, strokeWidth } });
  }
  let x = signRoom(item);
  if (glyphs.some((glyph) => glyph === undefined)) {
    const attributes = {
      x,
      fill: colour,
      fontSize: size,
      fontWeight: item.weight,
      fontFamily: "Work Sans, sans-serif",
    };
    return [
      {
        tag: "g",
        attributes: { transform },
        children: [...children, { tag: "text", attributes, children: [{ tag: "#text", attributes: { content } }] }],
      },
    ];
  }
  const scale = size / unitsPerEm;
  for (const [advance, path] of glyphs as Glyph[]) {
    if (path)
      children.push({
        tag: "path",
        attributes: { d: path, fill: colour, transform: `translate(${x.toFixed(2)}) scale(${scale.toFixed(5)})` },
      });
    x += advance * scale;
  }
  return [{ tag: "g", attributes: { transform }, children }];
}
