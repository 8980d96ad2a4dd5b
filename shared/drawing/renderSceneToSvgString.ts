import { escapeXml } from "./escapeXml";
import { outlineText } from "./outlineText";
import type { Scene } from "./Scene";
import { sceneElements } from "./sceneElements";
import { textColour } from "./sceneStyle";
import { type DrawingTheme, themeColours } from "./themeColours";
import { writeSvgElement } from "./writeSvgElement";

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
    `${sheet}${elements.map(writeSvgElement).join("")}</svg>`
  );
}
