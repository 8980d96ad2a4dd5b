import type { Box, SceneItem } from "../Scene";
import { dimensionLine, extensionLine, extensionPast } from "./dimensionLine";
import type { LayoutContext } from "./LayoutContext";
import { dimensionLabel, setLabel } from "./labels";
import type { LinearMark } from "./PartView";

/**
 * Dimensions of heights, in tiers going outwards at one side of a view. The text stands along its line where the
 * measured length leaves room for it; else it lies beside the line, level with the middle or, where a longer
 * dimension's extension lines would run through it there, above them all.
 */
export function placeVertical(
  marks: readonly LinearMark[],
  side: "left" | "right",
  scale: number,
  clear: Box,
  { sizes, unit, style }: LayoutContext,
): SceneItem[] {
  const items: SceneItem[] = [];
  const out = side === "left" ? -1 : 1;
  const { arrow } = style;
  const edges = marks.map((mark) => {
    const half = sizes.known(mark.name)! / 2;
    return [(mark.middle - half) * scale, (mark.middle + half) * scale] as const;
  });
  let reach = (side === "left" ? clear.x : clear.x + clear.width) + out * style.clear;

  for (const [i, mark] of marks.entries()) {
    const [from, to] = edges[i]!;
    const middle = (from + to) / 2;
    const along = dimensionLabel(mark.name, sizes, unit, style, { sign: mark.sign })!;
    const start = (mark.start ?? (out < 0 ? mark.span[0] : mark.span[1])) * scale;
    const stands = to - from >= along.width + 8;
    const beyond = edges.slice(i + 1).flat();

    const words = stands ? along : dimensionLabel(mark.name, sizes, unit, style, { sign: mark.sign, stacked: true })!;
    let line = reach;
    let level = middle;
    let tail: { low?: number } = {};
    if (stands) {
      line = side === "right" ? reach + along.height + 3 : reach;
      const left = side === "right" ? reach : line - 3 - along.height;
      items.push(...setLabel(along, { x: left, y: middle - along.width / 2 }, { turned: true }));
      reach = side === "right" ? line + style.between : left - style.between;
    } else {
      const crossed = beyond.some((y) => Math.abs(y - middle) < words.height / 2 + 2);
      if (crossed) {
        const top = Math.min(from, ...beyond) - extensionPast;
        level = top - words.height / 2;
        tail = { low: level };
      }
      const x = side === "right" ? line + 7 : line - 7 - words.width;
      const align = side === "right" ? "start" : "end";
      items.push(...setLabel(words, { x, y: level - words.height / 2 }, { align }));
      reach = line + out * (7 + words.width + style.between);
    }
    items.push(extensionLine("y", from, start, line), extensionLine("y", to, start, line));
    items.push(...dimensionLine({ axis: "y", name: mark.name, from, to, at: line, arrow, reach: tail }));
  }
  return items;
}
