import { escapeXml } from "./escapeXml";
import type { SvgElement } from "./sceneElements";

/** An SVG element as markup, everything in it escaped. */
export function writeSvgElement({ tag, attributes, children = [] }: SvgElement): string {
  if (tag === "#text") return escapeXml(String(attributes.content));
  const written = Object.entries(attributes).map(
    ([name, value]) => ` ${attributeName(name)}="${escapeXml(String(value))}"`,
  );
  return `<${tag}${written.join("")}>${children.map(writeSvgElement).join("")}</${tag}>`;
}

/** React's spelling to SVG's: only presentation attributes are hyphenated there. */
function attributeName(name: string): string {
  if (name === "patternUnits" || name === "patternTransform") return name;
  return name.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);
}
