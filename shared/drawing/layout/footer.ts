import type { LengthUnit } from "../dimensionText";
import { roundBelow } from "../roundBelow";
import type { LineRole, SceneItem } from "../Scene";
import type { DrawingStyle } from "./DrawingStyle";
import { type Label, label, setLabel } from "./labels";

export type Footer = { height: number; draw: (pxPerMm: number, top: number) => SceneItem[] };

const barMost = 110;

/**
 * The foot of a large drawing: a scale bar, and the meaning of the kinds of line that occur in it.
 * Its height depends on the width only, so that the drawing above can be fitted first.
 */
export function footer(roles: ReadonlySet<LineRole>, width: number, unit: LengthUnit, style: DrawingStyle): Footer {
  const note = (content: string, role: "note" | "measured" = "note") =>
    label([{ content, role, size: style.words, weight: 500 }]);
  const notes: Label[] = [];
  if (roles.has("measured")) notes.push(note("Dashed: the part you measured", "measured"));
  if (roles.has("presumed")) notes.push(note("Dotted: size not stated"));
  if (roles.has("thin")) notes.push(note("Thin lines: proportion, not size"));
  const line = style.words * 1.5;
  const wide = Math.max(0, ...notes.map((n) => n.width));
  const beside = barMost + 70 + wide <= width;
  const rows = beside ? Math.max(1, notes.length) : notes.length + 1;
  return {
    height: rows * line,
    draw: (pxPerMm, top) => {
      const items = scaleBar(pxPerMm, unit, style, top + rows * line - line / 2);
      for (const [i, n] of notes.entries()) {
        const x = beside ? width - n.width : 0;
        const y = beside ? top + (rows - notes.length + i) * line : top + i * line;
        items.push(...setLabel(n, { x, y: y + (line - n.height) / 2 }));
      }
      return items;
    },
  };
}

function scaleBar(pxPerMm: number, unit: LengthUnit, style: DrawingStyle, y: number): SceneItem[] {
  const perUnit = pxPerMm * (unit === "mm" ? 1 : 25.4);
  const length = roundBelow(barMost / perUnit);
  const px = length * perUnit;
  const tick = (x: number, tall: number): SceneItem => ({
    type: "line",
    role: "scale",
    from: { x, y: y - tall },
    to: { x, y: y + tall },
  });
  const words = label([{ content: `${length} ${unit}`, role: "note", size: style.words, weight: 500 }]);
  return [
    { type: "line", role: "scale", from: { x: 0, y }, to: { x: px, y } },
    tick(0, 4),
    tick(px / 2, 2.5),
    tick(px, 4),
    ...setLabel(words, { x: px + 8, y: y - words.height / 2 }),
  ];
}
