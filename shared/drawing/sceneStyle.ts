import type { LineRole, MaterialLook, TextRole } from "./Scene";

/** Colours by what they mean; the client has a CSS variable of the same name (`--color-ink`), mail and paper a table. */
export const colourNames = [
  "sheet",
  "ink",
  "soft",
  "measured",
  "rubber",
  "rubber-hatch",
  "metal",
  "metal-fill",
  "felt",
] as const;
export type ColourName = (typeof colourNames)[number];

export type Stroke = { colour: ColourName; width: number; dash?: string };

/** Wide lines are twice the narrow ones, centre lines are long-dash dot (ISO 128-2:2020, basic line types; from memory). */
const strokes: Record<LineRole, Stroke> = {
  outline: { colour: "ink", width: 1.8 },
  thin: { colour: "ink", width: 0.9 },
  presumed: { colour: "soft", width: 1.2, dash: "1.5 3" },
  centre: { colour: "soft", width: 0.9, dash: "12 3 2 3" },
  extension: { colour: "soft", width: 0.9 },
  dimension: { colour: "ink", width: 0.9 },
  measured: { colour: "measured", width: 1.8, dash: "6 4" },
  scale: { colour: "soft", width: 1.2 },
};
const fineStrokes: Partial<Record<LineRole, Partial<Stroke>>> = {
  outline: { width: 1.3 },
  thin: { width: 0.8 },
  presumed: { width: 1, dash: "1.5 2.5" },
  centre: { width: 0.8, dash: "8 2 1.5 2" },
  extension: { width: 0.7 },
  dimension: { width: 0.8 },
  measured: { width: 1.5, dash: "4 3" },
};

export function strokeOf(role: LineRole, fine: boolean): Stroke {
  return fine ? { ...strokes[role], ...fineStrokes[role] } : strokes[role];
}

/** Measured lines lie on a rim of sheet colour, under the outlines, so that they can be seen on rubber. */
export function rimStroke(fine: boolean): Stroke {
  return { colour: "sheet", width: strokeOf("measured", fine).width + (fine ? 1.4 : 2) };
}

type Fill = {
  base: ColourName;
  hatch: ColourName /** degrees, anticlockwise from the right */;
  angle: 45 | 135;
  pattern: "lines" | "dots";
};

/**
 * Adjacent materials are hatched at 45 degrees in opposite directions (ISO 128-3:2020, cuts and sections; from memory);
 * felt and cork are stippled, cut or not.
 */
export const fills: Record<MaterialLook, Fill> = {
  rubber: { base: "rubber", hatch: "rubber-hatch", angle: 45, pattern: "lines" },
  metal: { base: "metal-fill", hatch: "metal", angle: 135, pattern: "lines" },
  felt: { base: "felt", hatch: "ink", angle: 45, pattern: "dots" },
  cork: { base: "metal-fill", hatch: "ink", angle: 135, pattern: "dots" },
};

export function textColour(role: TextRole): ColourName {
  if (role === "measured") return "measured";
  return role === "note" || role === "tolerance" ? "soft" : "ink";
}
