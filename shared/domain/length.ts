import { DomainError } from "./DomainError";
import { type LengthUnit, lengthUnits, namesFeet, unitNamed } from "./lengthUnits";
import { readNumber, type WrittenNumber } from "./readNumber";
import { roundDecimal } from "./roundDecimal";

export type ParsedLength =
  | { ok: true; mm: number; resolutionMm: number; unit: LengthUnit; echo: string; roundedToMm: number }
  | { ok: false; problem: string };

/** The longest length that is read, in millimetres: no part of these machines comes near it. */
export const longestLengthMm = 10_000;
const longestText = 40;

const blanks = /[\s\u00a0\u1680\u180e\u2000-\u200d\u202f\u205f\u2060\u3000\ufeff]+/g;
const vulgar: Record<string, string> = {
  "¼": "1/4",
  "½": "1/2",
  "¾": "3/4",
  "⅐": "1/7",
  "⅑": "1/9",
  "⅒": "1/10",
  "⅓": "1/3",
  "⅔": "2/3",
  "⅕": "1/5",
  "⅖": "2/5",
  "⅗": "3/5",
  "⅘": "4/5",
  "⅙": "1/6",
  "⅚": "5/6",
  "⅛": "1/8",
  "⅜": "3/8",
  "⅝": "5/8",
  "⅞": "7/8",
};
const diameterSign = "[øØ⌀∅φΦϕ]|[oi]\\.?d\\b\\.?|diam(?:eter)?\\b\\.?|dia\\b\\.?";
const signBefore = new RegExp(`^(?:${diameterSign})\\s*[:=]?\\s*`, "i");
const signAfter = new RegExp(`\\s*(?:${diameterSign})$`, "i");

function tidy(text: string): string {
  return text
    .replace(/[¼-¾⅐-⅞]/g, (sign) => ` ${vulgar[sign] ?? sign}`)
    .replace(/[\u2044\u2215]/g, "/")
    .replace(/[\u2010-\u2015\u2212]/g, "-")
    .replace(blanks, " ")
    .trim()
    .replace(signBefore, "")
    .replace(signAfter, "");
}

const toMm = ({ numerator, denominator }: WrittenNumber, unit: LengthUnit) =>
  (numerator * lengthUnits[unit].numerator) / (denominator * lengthUnits[unit].denominator);

/** Which unit a number without one is in; a fraction by halves down to 128ths is a fraction of an inch. */
function impliedUnit(number: WrittenNumber, defaultUnit: "mm" | "in"): LengthUnit | undefined {
  if (!number.isFraction || defaultUnit === "in") return defaultUnit;
  return [2, 4, 8, 16, 32, 64, 128].includes(number.denominator) ? "in" : undefined;
}

function echoOf(number: WrittenNumber, unit: LengthUnit, mm: number, resolutionMm: number): string {
  if (unit === "mm" && !number.isFraction) return `${number.canonical} mm`;
  const decimals = Math.ceil(-Math.log10(resolutionMm) - 1e-9);
  const metric = !number.isFraction && unit !== "in" && unit !== "thou";
  const shown = metric ? Math.max(decimals, 0) : Math.min(Math.max(decimals, 2), 4);
  return `${number.canonical} ${unit} = ${roundDecimal(mm, shown)} mm`;
}

/**
 * Reads a length as people write it: "44.1", "44,1 mm", "1.736 in", "1-47/64″", "7½\"", "3/16", "750 thou", "ø 4.41 cm".
 *
 * Units:      millimetres out. A number without a unit is in `defaultUnit`; a fraction without one is in inches.
 * Resolution: what the last place written is worth: the last decimal in its unit, or one over the denominator.
 * Rounding:   a fraction was rounded to its denominator, and `roundedToMm` counts that step in the uncertainty. A
 *             decimal is what the instrument showed: zeros at its end are often left out, so it adds no step of its own
 *             (common practice, no source).
 * Ambiguity:  `echo` says what was understood. "1,234 mm" may be 1.234 or 1234 mm and is refused with both
 *             readings; where only one of them is a possible length ("1,736 in"), that one is taken and echoed.
 * Limits:     more than 0 and at most 10 m, 40 characters. Refusals are in plain words, never thrown.
 */
export function parseLength(text: string, defaultUnit: "mm" | "in"): ParsedLength {
  const refuse = (problem: string): ParsedLength => ({ ok: false, problem });
  if (text.length > 4 * longestText) return refuse("This is too long for one length.");
  const tidied = tidy(text);
  if (tidied.length > longestText) return refuse("This is too long for one length.");
  if (tidied === "") return refuse("Write a length, like 44.1 mm or 1-47/64 in.");
  if (tidied.startsWith("-")) return refuse("A length cannot be negative.");

  const [, digits = "", unitText = ""] = /^([\d\s.,/-]*)(.*)$/.exec(tidied) ?? [];
  const numberText = digits.trim();
  if (numberText === "") return refuse(`“${tidied}” does not begin with a number. Write a length, like 44.1 mm.`);
  if (namesFeet(unitText)) return refuse("Feet are not read here. Write the length in inches or millimetres.");
  const named = unitText === "" ? undefined : unitNamed(unitText);
  if (unitText !== "" && !named) return refuse(`“${unitText}” is not a unit known here. Use mm, cm, m, in or thou.`);

  const readings = readNumber(numberText);
  if (typeof readings === "string") return refuse(readings);
  const unit = named ?? impliedUnit(readings[0]!, defaultUnit);
  if (!unit) return refuse(`“${numberText}” needs a unit: write in or mm after it.`);

  const possible = readings.filter((reading) => toMm(reading, unit) <= longestLengthMm);
  const number = possible[0];
  if (!number) return refuse("Lengths over 10 m are not read.");
  if (possible[1]) {
    const [one, other] = [number.canonical, possible[1].canonical];
    return refuse(`“${numberText}” can be ${one} ${unit} or ${other} ${unit}. Write ${one} or ${other}.`);
  }
  const mm = toMm(number, unit);
  if (!(mm > 0)) return refuse("A length must be more than zero.");
  const resolutionMm = toMm({ ...number, numerator: 1 }, unit);
  const note = named || unit === defaultUnit ? "" : " (a fraction without a unit is read as inches)";
  const roundedToMm = number.isFraction ? resolutionMm : 0;
  return { ok: true, mm, resolutionMm, unit, echo: echoOf(number, unit, mm, resolutionMm) + note, roundedToMm };
}

/**
 * A length or difference as it is shown: `formatLength(44.053125, "in")` gives "1.734 in".
 * Decimals default to what suits the unit (mm 2, cm 3, in 3, thou 1). Throws a DomainError for what is not a number.
 */
export function formatLength(mm: number, unit: LengthUnit, options: { decimals?: number } = {}): string {
  if (!Number.isFinite(mm)) throw new DomainError("mm", "This is not a length.");
  const { numerator, denominator, decimals } = lengthUnits[unit];
  return `${roundDecimal((mm * denominator) / numerator, options.decimals ?? decimals)} ${unit === "um" ? "µm" : unit}`;
}

/** The unit to show beside the one that the reader uses: inches beside a metric unit, millimetres beside inches. */
export function otherUnit(unit: LengthUnit): "mm" | "in" {
  return unit === "in" || unit === "thou" ? "mm" : "in";
}
