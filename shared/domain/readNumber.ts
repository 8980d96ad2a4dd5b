/** A number as written, kept exact: `numerator / denominator`; the last place written is worth `1 / denominator`. */
export type WrittenNumber = {
  numerator: number;
  denominator: number;
  isFraction: boolean;
  /** Written again without doubt: a point for decimals, no grouping, "1-47/64" for mixed fractions. */
  canonical: string;
};

const digitsGroupedByBlanks = /^[1-9]\d{0,2}(?: \d{3})+(?:[.,]\d*)?$/;
const commaGroups = /^[1-9]\d{0,2}(?:(?:,\d{3})+\.\d*|(?:,\d{3}){2,})$/;
const pointGroups = /^[1-9]\d{0,2}(?:(?:\.\d{3})+,\d*|(?:\.\d{3}){2,})$/;
const decimal = /^(?:\d+[.,]?\d*|[.,]\d+)$/;
const commaBeforeThree = /^[1-9]\d{0,2},\d{3}$/;
const fraction = /^(?:(\d+)(?: ?- ?| ))?(\d+) ?\/ ?(\d+)$/;

function fromDecimal(text: string): WrittenNumber {
  const [whole = "", places = ""] = text.split(".");
  const shown = whole.replace(/^0+(?=\d)/, "") || "0";
  return {
    numerator: Number(whole + places),
    denominator: 10 ** places.length,
    isFraction: false,
    canonical: places ? `${shown}.${places}` : shown,
  };
}

function fromFraction(whole: string | undefined, above: string, below: string): WrittenNumber | string {
  const numerator = Number(above);
  const denominator = Number(below);
  if (denominator === 0) return "A fraction cannot have 0 below the line.";
  if (whole === undefined) {
    return { numerator, denominator, isFraction: true, canonical: `${numerator}/${denominator}` };
  }
  if (numerator >= denominator) return `The fraction ${above}/${below} after ${whole} is not less than one. Check it.`;
  return {
    numerator: Number(whole) * denominator + numerator,
    denominator,
    isFraction: true,
    canonical: `${Number(whole)}-${numerator}/${denominator}`,
  };
}

/**
 * Every way in which a number can be read: one reading as a rule, two for "1,234" (decimal or thousands), or a
 * problem in words. Takes "44.1", "44,1", ".5", "1,234.5", "1.234,5", "1 234,5", "3/16", "1-47/64", "1 7/8".
 * A single point is always a decimal point. Signs, exponents and ranges are not read.
 */
export function readNumber(text: string): readonly WrittenNumber[] | string {
  const parts = fraction.exec(text);
  if (parts) {
    const read = fromFraction(parts[1], parts[2]!, parts[3]!);
    return typeof read === "string" ? read : [read];
  }
  if (digitsGroupedByBlanks.test(text)) return [fromDecimal(text.replaceAll(" ", "").replace(",", "."))];
  if (commaGroups.test(text)) return [fromDecimal(text.replaceAll(",", ""))];
  if (pointGroups.test(text)) return [fromDecimal(text.replaceAll(".", "").replace(",", "."))];
  if (commaBeforeThree.test(text)) return [fromDecimal(text.replace(",", ".")), fromDecimal(text.replace(",", ""))];
  if (decimal.test(text)) return [fromDecimal(text.replace(",", "."))];
  return `“${text}” cannot be read as a number. Write one length, like 44.1 or 1-47/64.`;
}
