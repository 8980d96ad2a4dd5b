/** One reading or several; `mm` is their mean, and the coarsest rounding counts for all. */
export type ReadSize = { ok: true; mm: number; readingsMm: readonly number[]; roundedToMm: number; echo: string };
/** Not measured: known to lie within `plusMinusMm` of `mm`. */
export type WorkedOutSize = { ok: true; mm: number; plusMinusMm: number; echo: string };
/** A size as it was written and understood. */
export type WrittenSize = ReadSize | WorkedOutSize;

export const sizeLimits = { readings: 12, characters: 160 };

/** What stands between a worked-out size and half the width that it may have: ±, +/-, +-. */
export const plusMinus = /±|\+\s*[/\u2044\u2215]?\s*[-\u2010-\u2015\u2212]/;
/** Whether a text speaks of a size that was worked out (532 ± 8 mm); it may still be unclear. */
export const isWorkedOut = (text: string): boolean => plusMinus.test(text);
