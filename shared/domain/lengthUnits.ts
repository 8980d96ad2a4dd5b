/**
 * The units in which lengths are written.
 *
 * Shape:  one unit is exactly `numerator / denominator` millimetres, kept as whole numbers so that a written
 *         decimal is turned into the nearest double in one division.
 * Source: inch 25.4 mm exactly, international yard and pound agreement 1959; thou = mil = 0.001 in.
 */
export const lengthUnits = {
  mm: { numerator: 1, denominator: 1, decimals: 2 },
  cm: { numerator: 10, denominator: 1, decimals: 3 },
  m: { numerator: 1000, denominator: 1, decimals: 5 },
  um: { numerator: 1, denominator: 1000, decimals: 0 },
  in: { numerator: 254, denominator: 10, decimals: 3 },
  thou: { numerator: 254, denominator: 10_000, decimals: 1 },
} as const;
export type LengthUnit = keyof typeof lengthUnits;

const spellings: Record<LengthUnit, readonly string[]> = {
  mm: ["mm", "millimetre", "millimetres", "millimeter", "millimeters"],
  cm: ["cm", "centimetre", "centimetres", "centimeter", "centimeters"],
  m: ["m", "metre", "metres", "meter", "meters"],
  // Both code points for the micro sign; lower case of either stays apart.
  um: ["um", "\u00b5m", "\u03bcm", "micron", "microns", "micrometre", "micrometres", "micrometer", "micrometers"],
  in: ["in", "inch", "inches", '"', "\u2033", "\u201d", "\u201c", "''", "\u2032\u2032", "\u2019\u2019"],
  thou: ["thou", "thous", "mil", "mils"],
};
const unitBySpelling = new Map(
  Object.entries(spellings).flatMap(([unit, words]) => words.map((word) => [word, unit as LengthUnit] as const)),
);

/** The unit that a piece of text names, whatever its case and with or without a full stop; undefined for none. */
export function unitNamed(text: string): LengthUnit | undefined {
  return unitBySpelling.get(text.toLowerCase().replace(/\.$/, ""));
}

const feet = /^(?:'|\u2032|\u2019|ft\.?|foot|feet)(?:\s*[\d'"\u2032\u2033\u2019\u201d]|$)/i;
/** Whether the text after a number speaks of feet, which are not read. */
export function namesFeet(text: string): boolean {
  return feet.test(text) && unitNamed(text) === undefined;
}
