import { roundDecimal } from "#shared/domain/roundDecimal";

export type SizeUnit = "mm" | "in";
const perInch = 25.4;

const decimalsOf = (value: number, most: number) => {
  for (let decimals = 0; decimals < most; decimals++) {
    if (Math.abs(Number(value.toFixed(decimals)) - value) < 1e-9) return decimals;
  }
  return most;
};

/** The number alone: millimetres with one to three decimals as stated, inches with three, or four for small differences. */
export function sizeNumber(mm: number, unit: SizeUnit, atLeast = 1): string {
  if (unit === "in") return roundDecimal(mm / perInch, Math.abs(mm) < 0.5 ? 4 : 3);
  return roundDecimal(mm, Math.max(atLeast, decimalsOf(mm, 3)));
}

/** A calculated length in mm with two decimals, or inches with three: estimates and bands. */
export const roundedSize = (mm: number, unit: SizeUnit): string =>
  unit === "in" ? roundDecimal(mm / perInch, 3) : roundDecimal(mm, 2);

/** A nominal and its tolerance with decimals that agree: 44.2 +/- 0.15 gives "44.20" and "0.15". */
export function statedNumbers(nominalMm: number, plusMinusMm: number, unit: SizeUnit): [string, string] {
  if (unit === "in")
    return [roundDecimal(nominalMm / perInch, 3), roundDecimal(plusMinusMm / perInch, plusMinusMm < 0.03 ? 4 : 3)];
  // A tolerance worked out as a share of a long belt is not stated to the micrometre.
  const tolerance = Math.max(1, decimalsOf(plusMinusMm, plusMinusMm >= 1 ? 1 : plusMinusMm >= 0.1 ? 2 : 3));
  return [roundDecimal(nominalMm, Math.max(tolerance, decimalsOf(nominalMm, 3))), roundDecimal(plusMinusMm, tolerance)];
}
