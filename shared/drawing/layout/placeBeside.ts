import { dimensionText } from "../dimensionText";
import type { Box, SceneItem } from "../Scene";
import type { LayoutContext } from "./LayoutContext";
import { label, setLabel } from "./labels";
import type { DimensionMark } from "./PartView";

/** A small cross-section's sizes as words at its right, such as "5.0 × 0.6"; nothing where none is stated. */
export function placeBeside(
  mark: Extract<DimensionMark, { mark: "beside" }>,
  part: Box,
  { sizes, unit, style }: LayoutContext,
): SceneItem[] {
  const stated = mark.names.filter((name) => sizes.role(name) === "outline");
  const measured = stated.length === 0;
  const names = measured ? mark.names.filter((name) => sizes.found(name)) : stated;
  if (names.length === 0) return [];
  const words = names.map(
    (name) => dimensionText({ nominalMm: (measured ? sizes.found(name) : sizes.known(name))! }, unit).nominal,
  );
  const partial = names.length < mark.names.length;
  const content = partial ? words.map((word, i) => `${word} ${names[i]}`).join(" × ") : words.join(" × ");
  const role = measured ? "measured" : "stated";
  const line = { content, role, size: style.digits, weight: 600, ...(mark.sign ? { sign: mark.sign } : {}) } as const;
  const beside = label([line]);
  const at = { x: part.x + part.width + style.clear - 2, y: part.y + part.height / 2 - beside.height / 2 };
  return setLabel(beside, at, { align: "start" });
}
