import { type AsNewInput, type Estimate, estimateAsNew } from "./asNew";
import { conditionFacts, conditionProblem } from "./conditions";
import { DomainError } from "./DomainError";
import { traitsOf } from "./dimensionTraits";
import { formatLength } from "./length";
import { type Contribution, rectangular } from "./uncertainty";
import type { WrittenSize } from "./writtenSize";

export type SizeAsNew = {
  /** Mean of the readings; null where nothing was measured. */
  asFoundMm: number | null;
  asNew: Estimate;
  flatSpot: boolean;
  basis: string[];
  /** The terms of the uncertainty of what was measured. */
  budget: Contribution[];
};
type Circumstances = Pick<AsNewInput, "kind" | "dimension" | "instrument" | "condition">;

/**
 * A size as it was written (see `parseSize`) and as it was when new, in millimetres with a standard uncertainty.
 *
 * Readings go to `estimateAsNew`. A worked-out size is taken as it stands, whatever the condition: every value within
 * its ± is held for equally likely, so its standard uncertainty is half the width / sqrt 3; no instrument, no correction.
 *
 * Errors: DomainError as `estimateAsNew`; on "condition" for readings of a melted or missing part, with the way out.
 * Source: JCGM 100:2008 4.3.7.
 */
export function sizeAsNew(size: WrittenSize, circumstances: Circumstances): SizeAsNew {
  const { kind, dimension, condition } = circumstances;
  if ("readingsMm" in size) {
    if (!conditionFacts[condition].hasReadings && !conditionProblem(kind, condition)) {
      const words = `A ${condition} part has no size left to measure. Write what was worked out, like 532 ± 8 mm, or choose another condition.`;
      throw new DomainError("condition", words);
    }
    const { readingsMm, roundedToMm: resolutionMm } = size;
    const { asFound, ...estimate } = estimateAsNew({ ...circumstances, readingsMm, resolutionMm });
    return { ...estimate, asFoundMm: asFound.valueMm };
  }
  traitsOf(kind, dimension);
  const problem = conditionProblem(kind, condition);
  if (problem) throw new DomainError("condition", problem);
  const standardUncertaintyMm = rectangular(size.plusMinusMm);
  const [half, uncertainty] = [size.plusMinusMm, standardUncertaintyMm].map((length) => formatLength(length, "mm"));
  return {
    asFoundMm: null,
    asNew: { valueMm: size.mm, standardUncertaintyMm },
    flatSpot: false,
    basis: [
      `W${size.echo.slice(1)}, not measured: no correction.`,
      `Anything within ±${half} is held for equally likely: standard uncertainty ${uncertainty} (JCGM 100:2008 4.3.7).`,
    ],
    budget: [],
  };
}
