import { dimensionWords } from "#shared/domain/partKinds";
import type { SceneItem } from "../Scene";
import type { LayoutContext } from "./LayoutContext";
import { dimensionLabel, type Label, label, setLabel } from "./labels";
import type { DimensionMark } from "./PartView";

const gap = 5;

/**
 * A belt's inside circumference, with an arrow on the inside edge: in the middle of the loop where the words fit,
 * with their name if there is room for that too, else below the loop.
 */
export function placeLoop(
  mark: Extract<DimensionMark, { mark: "loop" }>,
  scale: number,
  { sizes, unit, style }: LayoutContext,
): SceneItem[] {
  const value = dimensionLabel(mark.name, sizes, unit, style);
  if (!value) return [];
  const name = { content: dimensionWords[mark.name], role: "note", size: style.words, weight: 500 } as const;
  const named = label([name, ...value.lines]);
  const leader = style.arrow * 2 + gap;
  const least = sizes.found(mark.name);
  const shrink = least ? Math.min(1, least / sizes.known(mark.name)!) : 1;
  const [radius, straight] = [mark.radius * scale * shrink, mark.straight * scale * shrink];
  const fits = ({ width, height }: Label) => {
    const half = height / 2 + leader;
    if (half > radius - gap) return false;
    return width / 2 <= straight / 2 + Math.sqrt(radius ** 2 - half ** 2) - gap * 2;
  };
  const inside = style.full && fits(named) ? named : fits(value) ? value : undefined;
  const edge = mark.radius * scale;
  const arrow = { type: "arrow", tip: { x: 0, y: edge }, length: style.arrow } as const;
  if (inside) {
    const top = -inside.height / 2;
    return [
      ...setLabel(inside, { x: -inside.width / 2, y: top }),
      {
        type: "line",
        role: "dimension",
        from: { x: 0, y: top + inside.height + 2 },
        to: { x: 0, y: edge },
        dimension: mark.name,
      },
      { ...arrow, direction: { x: 0, y: 1 } },
    ];
  }
  const below = style.full ? named : value;
  const grown = sizes.found(mark.name) ? Math.max(1, sizes.found(mark.name)! / sizes.known(mark.name)!) : 1;
  const top = Math.max(mark.outer * scale, mark.radius * scale * grown) + leader;
  return [
    { type: "line", role: "dimension", from: { x: 0, y: edge }, to: { x: 0, y: top - 2 }, dimension: mark.name },
    { ...arrow, direction: { x: 0, y: -1 } },
    ...setLabel(below, { x: -below.width / 2, y: top }),
  ];
}
