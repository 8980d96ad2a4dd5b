import type { Box, SceneItem } from "../Scene";
import type { LayoutContext } from "./LayoutContext";
import { dimensionLabel, setLabel } from "./labels";
import type { DimensionMark } from "./PartView";

/** The diameter at the bottom of a groove: two arrows inside the groove, one of them drawn out to the text. */
export function placeGroove(
  mark: Extract<DimensionMark, { mark: "groove" }>,
  scale: number,
  part: Box,
  { sizes, unit, style }: LayoutContext,
): SceneItem[] {
  const value = sizes.known(mark.name);
  const words = dimensionLabel(mark.name, sizes, unit, style, { sign: mark.sign, stacked: true });
  if (value === undefined || !words) return [];
  const half = (value / 2) * scale;
  const tail = style.arrow + 6;
  const rim = Math.max(part.x + part.width, half + tail) + style.clear;
  return [
    { type: "line", role: "dimension", from: { x: half, y: 0 }, to: { x: rim, y: 0 }, dimension: mark.name },
    { type: "line", role: "dimension", from: { x: -half - tail, y: 0 }, to: { x: -half, y: 0 } },
    { type: "arrow", tip: { x: half, y: 0 }, direction: { x: -1, y: 0 }, length: style.arrow },
    { type: "arrow", tip: { x: -half, y: 0 }, direction: { x: 1, y: 0 }, length: style.arrow },
    ...setLabel(words, { x: rim + 5, y: -words.height / 2 }, { align: "start" }),
  ];
}
