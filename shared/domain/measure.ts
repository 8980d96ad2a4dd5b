import type { Condition } from "./conditions";
import { DomainError } from "./DomainError";
import type { DimensionTraits } from "./dimensionTraits";
import { type Instrument, instrumentFacts } from "./instruments";
import { formatLength, longestLengthMm } from "./length";
import { permissibleError } from "./permissibleError";
import { type Contribution, combined, meanOf, ofMean, ofStep, rectangular } from "./uncertainty";

export type Measurement = { valueMm: number; standardUncertaintyMm: number; budget: Contribution[] };
type MeasureInput = {
  readingsMm: readonly number[];
  instrument: Instrument;
  traits: DimensionTraits;
  condition: Condition;
  /** What the last place written is worth, where coarser than the instrument's own step. */
  resolutionMm?: number;
};

export const mostReadings = 100;
const noSource = "common practice, no source";

/** Throws a DomainError on "readingsMm" or "readingsMm/<index>" for what cannot be readings of a length. */
export function checkReadings(readingsMm: readonly number[]) {
  if (readingsMm.length === 0) throw new DomainError("readingsMm", "Give at least one reading.");
  if (readingsMm.length > mostReadings) throw new DomainError("readingsMm", `Give at most ${mostReadings} readings.`);
  for (const [i, reading] of readingsMm.entries()) {
    if (!(reading > 0)) throw new DomainError(`readingsMm/${i}`, "A reading is a length of more than zero.");
    if (reading > longestLengthMm) throw new DomainError(`readingsMm/${i}`, "A reading is at most 10 m.");
  }
}

/** How far the part gives way while it is measured, as a standard uncertainty in mm; 0 where it does not. */
function softness({ role, material }: DimensionTraits, instrument: Instrument, condition: Condition, sizeMm: number) {
  if (role === "rigid") return 0;
  if (role === "loop") return Math.max(0.03, 0.0015 * sizeMm);
  if (!instrumentFacts[instrument].presses) return 0;
  if (material === "felt") return 0.05;
  return condition === "hardened" ? 0.015 : 0.03;
}

/**
 * The mean of the readings and its combined standard uncertainty, in millimetres.
 *
 * Terms:  the instrument's permissible error / sqrt 3; its step (or that of the writing, if coarser) / (2 sqrt 3); the
 *         scatter of two or more readings s / sqrt n; how far rubber or felt gives way (common practice, no source).
 * Errors: DomainError for no readings, more than 100, or one outside 0 to 10 m.
 * Source: JCGM 100:2008 4.2.3, 4.3.7, 5.1.2, F.2.2.1.
 */
export function measure({ readingsMm, instrument, traits, condition, resolutionMm = 0 }: MeasureInput): Measurement {
  checkReadings(readingsMm);
  if (!(resolutionMm >= 0)) throw new DomainError("resolutionMm", "A resolution is not negative.");
  const valueMm = meanOf(readingsMm);
  const { withArticle, stepMm } = instrumentFacts[instrument];
  const mm = (length: number) => formatLength(length, "mm", { decimals: 3 });

  const error = permissibleError(instrument, valueMm, { inside: traits.inside });
  const step = Math.max(stepMm, resolutionMm);
  const budget: Contribution[] = [
    {
      name: "instrument",
      standardUncertaintyMm: rectangular(error.plusMinusMm),
      words: `${withArticle.replace(/^a /, "A ")} may be off by ±${mm(error.plusMinusMm)} at this size`,
      source: error.source,
    },
    {
      name: "resolution",
      standardUncertaintyMm: ofStep(step),
      words: `${resolutionMm > stepMm ? "The size is written" : "It is read"} in steps of ${mm(step)}`,
      source: "JCGM 100:2008 F.2.2.1",
    },
  ];
  if (readingsMm.length > 1) {
    budget.push({
      name: "repeatability",
      standardUncertaintyMm: ofMean(readingsMm),
      words: `The ${readingsMm.length} readings scatter`,
      source: "JCGM 100:2008 4.2.3",
    });
  }
  const soft = softness(traits, instrument, condition, valueMm);
  if (soft > 0) {
    const words =
      traits.role === "loop" ? "It stretches while it is measured" : `The ${traits.material} gives under the jaws`;
    budget.push({ name: "softness", standardUncertaintyMm: soft, words, source: noSource });
  }
  return { valueMm, standardUncertaintyMm: combined(budget), budget };
}
