import { DomainError } from "./DomainError";

export const toleranceClasses = ["M1", "M2", "M3", "M4"] as const;
export type ToleranceClass = (typeof toleranceClasses)[number];
/** Fixed: formed in one part of the mould. Closure: across the mould's split, where flash adds to the size. */
export type MouldDimension = "fixed" | "closure";

type RubberTolerance = {
  plusMinusMm: number;
  class: ToleranceClass;
  /** The row used: nominal above the first, up to and including the second; null for no upper end. */
  range: [over: number, upTo: number | null];
  source: string;
};

const source = "ISO 3302-1:2014 Table 1";

/** [up to and including, then +/- mm for M1 fixed, M1 closure, M2 fixed, .. M4 closure]. ISO 3302-1:2014 Table 1. */
const rows = [
  [4, 0.08, 0.1, 0.1, 0.15, 0.25, 0.4, 0.5, 0.5],
  [6.3, 0.1, 0.12, 0.15, 0.2, 0.25, 0.4, 0.5, 0.5],
  [10, 0.1, 0.15, 0.2, 0.2, 0.3, 0.5, 0.7, 0.7],
  [16, 0.15, 0.2, 0.2, 0.25, 0.4, 0.6, 0.8, 0.8],
  [25, 0.2, 0.2, 0.25, 0.35, 0.5, 0.8, 1, 1],
  [40, 0.2, 0.25, 0.35, 0.4, 0.6, 1, 1.3, 1.3],
  [63, 0.25, 0.35, 0.4, 0.5, 0.8, 1.3, 1.6, 1.6],
  [100, 0.35, 0.4, 0.5, 0.7, 1, 1.6, 2, 2],
  [160, 0.4, 0.5, 0.7, 0.8, 1.3, 2, 2.5, 2.5],
] as const;
/** Over 160 mm: +/- percent of the nominal, in the same order. */
const percents = [0.3, 0.4, 0.5, 0.7, 0.8, 1.3, 1.5, 1.5] as const;

/**
 * The tolerance of a moulded solid rubber dimension by class, in mm.
 *
 * Limits: nominal above 0, else DomainError on "nominalMm". Not for precision sealing rings, which the standard excludes.
 * Trap:   the table and the percentages do not meet at 160 mm (M2 fixed: 0.70, then 0.80 just above).
 * Source: ISO 3302-1:2014 Table 1.
 */
export function rubberTolerance(
  toleranceClass: ToleranceClass,
  nominalMm: number,
  dimension: MouldDimension,
): RubberTolerance {
  if (!(nominalMm > 0) || !Number.isFinite(nominalMm)) {
    throw new DomainError("nominalMm", "A nominal size is more than zero.");
  }
  const column = 2 * toleranceClasses.indexOf(toleranceClass) + (dimension === "closure" ? 1 : 0);
  const index = rows.findIndex(([upTo]) => nominalMm <= upTo);
  const row = rows[index];
  if (!row) {
    const plusMinusMm = (percents[column]! * nominalMm) / 100;
    return { plusMinusMm, class: toleranceClass, range: [160, null], source };
  }
  const over = rows[index - 1]?.[0] ?? 0;
  return { plusMinusMm: row[column + 1]!, class: toleranceClass, range: [over, row[0]], source };
}
