import { glyphRun } from "./glyphRun";
import type { TextItem } from "./Scene";
import type { SvgElement } from "./sceneElements";
import { baselineOf, signPath, signRoom } from "./signMark";

/**
 * A text as outlines of the product's typeface, so that a picture looks the same on a machine without any fonts.
 * A text with a letter that the outlines do not have becomes an ordinary text element, in the fonts that there are.
 */
export function outlineText(item: TextItem, colour: string): SvgElement[] {
  const { content, size, weight, turned, sign } = item;
  const at = baselineOf(item);
  const transform = `translate(${at.x.toFixed(2)} ${at.y.toFixed(2)})${turned ? " rotate(-90)" : ""}`;
  const children: SvgElement[] = [];
  if (sign) {
    const strokeWidth = size * 0.085;
    children.push({ tag: "path", attributes: { d: signPath(sign, size), fill: "none", stroke: colour, strokeWidth } });
  }
  const x = signRoom(item);
  const outlined = glyphRun(content, size, weight, colour, x);
  if (outlined) return [{ tag: "g", attributes: { transform }, children: [...children, ...outlined] }];

  const attributes = { x, fill: colour, fontSize: size, fontWeight: weight, fontFamily: "Work Sans, sans-serif" };
  const typed: SvgElement = { tag: "text", attributes, children: [{ tag: "#text", attributes: { content } }] };
  return [{ tag: "g", attributes: { transform }, children: [...children, typed] }];
}
