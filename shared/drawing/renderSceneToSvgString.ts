import { escapeXml } from "./escapeXml";
import { outlineText } from "./outlineText";
import type { Scene } from "./Scene";
import { type SvgElement, sceneElements } from "./sceneElements";
import { textColour } from "./sceneStyle";
import { type DrawingTheme, themeColours } from "./themeColours";

export type SvgStringOptions = {
  /** Paints the sheet behind the drawing; leave it off for a transparent picture. */
  background?: boolean;
  /** Set before the ids of hatch patterns, where several drawings share one document. */
  idPrefix?: string;
};

/**
 * A scene as a complete SVG document with its colours and letters in it: for mail pictures, packing slips and
 * downloads. Needs no fonts and no style sheet.
 */
export function renderSceneToSvgString(scene: Scene, theme: DrawingTheme, options: SvgStringOptions = {}): string {
  const { background = true, idPrefix = "drawing" } = options;
  const colours = themeColours[theme];
  const elements = sceneElements(scene, {
    colour: (name) => colours[name],
    patternId: (material) => `${idPrefix}-${material}`,
    text: (item) => outlineText(item, colours[textColour(item.role)]),
  });
  const { width, height, title, description } = scene;
  const sheet = background ? `<rect width="100%" height="100%" fill="${colours.sheet}"/>` : "";
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" viewBox="0 0 ${width} ${height}" role="img">` +
    `<title>${escapeXml(title)}</title><desc>${escapeXml(description)}</desc>` +
    `${sheet}${elements.map(write).join("")}</svg>`
  );
}

function write({ tag, attributes, children = [] }: SvgElement): string {
  if (tag === "#text") return escapeXml(String(attributes.content));
  const written = Object.entries(attributes).map(
    ([name, value]) => ` ${attributeName(name)}="${escapeXml(String(value))}"`,
  );
  return `<${tag}${written.join("")}>${children.map(write).join("")}</${tag}>`;
}

/** React's spelling to SVG's: only presentation attributes are hyphenated there. */
function attributeName(name: string): string {
  if (name === "patternUnits" || name === "patternTransform") return name;
  return name.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);
}
