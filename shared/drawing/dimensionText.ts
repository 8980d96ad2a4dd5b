/** A length as a drawing states it. Tolerance is symmetrical, in mm; leave it out where none is stated. */
export type StatedSize = { nominalMm: number; plusMinusMm?: number | undefined };
export type LengthUnit = "mm" | "in";

const mmPerInch = 25.4;

/**
 * The digits of a size and of its tolerance, without unit or sign.
 *
 * Shape:  nominal and tolerance carry the same number of decimals, as ISO 129-1 asks of limit deviations.
 * Limits: mm to 1 um at most and to 0.1 mm at least below 100 mm; inches to a thousandth, or to a ten-thousandth
 *         where the tolerance is finer than two thousandths.
 */
export function dimensionText(size: StatedSize, unit: LengthUnit): { nominal: string; tolerance?: string } {
  const { nominalMm, plusMinusMm } = size;
  const digits = unit === "mm" ? mmDecimals(nominalMm, plusMinusMm) : inchDecimals(plusMinusMm);
  const per = unit === "mm" ? 1 : mmPerInch;
  const nominal = (nominalMm / per).toFixed(digits);
  if (plusMinusMm === undefined) return { nominal };
  return { nominal, tolerance: `±${(plusMinusMm / per).toFixed(digits)}` };
}

function mmDecimals(nominalMm: number, plusMinusMm: number | undefined): number {
  const least = nominalMm < 100 ? 1 : 0;
  return Math.max(least, decimalsOf(nominalMm), plusMinusMm === undefined ? 0 : toleranceDecimals(plusMinusMm));
}

/** Decimals that a tolerance is worth: one worked out as a share of a long belt is not stated to the micrometre. */
function toleranceDecimals(plusMinusMm: number): number {
  const most = plusMinusMm >= 1 ? 1 : plusMinusMm >= 0.1 ? 2 : 3;
  return Math.min(most, decimalsOf(plusMinusMm));
}

function inchDecimals(plusMinusMm: number | undefined): number {
  return plusMinusMm !== undefined && plusMinusMm / mmPerInch < 0.002 ? 4 : 3;
}

function decimalsOf(mm: number): number {
  const digits = mm.toFixed(3).replace(/0+$/, "").split(".")[1];
  return digits?.length ?? 0;
}
