import type { Box, SceneItem } from "../Scene";
import { arrowsFit, dimensionLine, extensionLine, extensionPast, tailLength } from "./dimensionLine";
import type { LayoutContext } from "./LayoutContext";
import { dimensionLabel, setLabel } from "./labels";
import type { LinearMark } from "./PartView";

/**
 * Dimensions of widths, in tiers above or below a view. The text stands above its line. Below the view, where the
 * extension lines of a short length would run through a text wider than it, the line is drawn out to the right and
 * carries the text there.
 */
export function placeHorizontal(
  marks: readonly LinearMark[],
  side: "top" | "bottom",
  scale: number,
  clear: Box,
  { sizes, unit, style }: LayoutContext,
): SceneItem[] {
  const items: SceneItem[] = [];
  const { arrow } = style;
  let reach = side === "top" ? clear.y - style.clear : clear.y + clear.height + style.clear;

  for (const mark of marks) {
    const half = sizes.known(mark.name)! / 2;
    const [from, to] = [(mark.middle - half) * scale, (mark.middle + half) * scale];
    const words = dimensionLabel(mark.name, sizes, unit, style, { sign: mark.sign })!;
    const start = (side === "top" ? mark.span[0] : mark.span[1]) * scale;
    const above = extensionPast + 2;
    const wide = words.width + 6 > to - from;

    let line: number;
    let x = (from + to) / 2 - words.width / 2;
    let ends: { high?: number } = {};
    if (side === "top") {
      line = reach;
      reach = line - above - words.height - style.between;
    } else {
      line = wide ? Math.max(reach, reach - style.clear + words.height + 6) : reach + words.height;
      reach = line + extensionPast + style.between;
      if (wide) {
        x = to + (arrowsFit(to - from, arrow) ? 8 : tailLength(arrow) + 2);
        ends = { high: x + words.width };
      }
    }
    const textTop = line - (side === "top" ? above : 3) - words.height;
    items.push(...setLabel(words, { x, y: textTop }));
    items.push(extensionLine("x", from, start, line), extensionLine("x", to, start, line));
    items.push(...dimensionLine({ axis: "x", name: mark.name, from, to, at: line, arrow, reach: ends }));
  }
  return items;
}
