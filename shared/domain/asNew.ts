import type { Condition } from "./conditions";
import { traitsOf } from "./dimensionTraits";
import { findFlatSpot } from "./flatSpot";
import { type Instrument, instrumentFacts } from "./instruments";
import { formatLength } from "./length";
import { measure } from "./measure";
import type { DimensionName, PartKind } from "./partKinds";
import { checkMeasurable, putBackCondition } from "./putBackCondition";
import { type Contribution, combined, rectangular } from "./uncertainty";

export type Estimate = { valueMm: number; standardUncertaintyMm: number };
export type AsNewInput = {
  kind: PartKind;
  dimension: DimensionName;
  readingsMm: readonly number[];
  instrument: Instrument;
  condition: Condition;
  /** What the last place written is worth (see parseLength), where that is coarser than the instrument. */
  resolutionMm?: number;
};
export type AsNewEstimate = {
  asFound: Estimate;
  asNew: Estimate;
  flatSpot: boolean;
  /** Every step in words, with its source or "common practice, no source". */
  basis: string[];
  /** The terms of asNew's uncertainty; those named "flat-spot" and "condition" do not belong to asFound. */
  budget: Contribution[];
};

const noSource = "common practice, no source";
const mm = (length: number, decimals = 2) => formatLength(length, "mm", { decimals });
/** "44.15 ± 0.17 mm", with k = 2. */
export const plusMinus = ({ valueMm, standardUncertaintyMm }: Estimate) =>
  `${mm(valueMm).replace(" mm", "")} ± ${mm(2 * standardUncertaintyMm)}`;

/** A flat only takes away, so the highest reading lies nearest to the round; one reading may lie across the flat. */
function flatSpotTerm(readingsMm: readonly number[], meanMm: number): { correctionMm: number; term: Contribution } {
  const single = readingsMm.length === 1;
  const shortfall = single ? Math.min(0.1, meanMm / 10) : Math.max(...readingsMm) - meanMm;
  const words = single
    ? "One reading may lie across the flat spot"
    : "The highest reading lies nearest to the round wheel";
  return {
    correctionMm: shortfall,
    term: { name: "flat-spot", standardUncertaintyMm: rectangular(shortfall), words, source: noSource },
  };
}

/**
 * The size of an old part as found and, from its condition, as it was when new; in millimetres with standard uncertainties.
 *
 * Shape:  asFound is the mean of the readings (see `measure`); asNew adds what the condition took, with the uncertainty of
 *         that. Metal sizes (bore, hub length) are not corrected. Three readings around a wheel may show a flat spot;
 *         as new is then reckoned from the highest.
 * Errors: DomainError on "dimension" (not of the kind), "condition" (makes no sense for the kind; melted and missing parts
 *         have nothing to measure), "readingsMm" or "readingsMm/<index>", "resolutionMm".
 * Source: JCGM 100:2008 for the uncertainties; the corrections are common practice without a source, and `basis` says so.
 */
export function estimateAsNew(input: AsNewInput): AsNewEstimate {
  const { kind, dimension, readingsMm, instrument, condition } = input;
  const traits = traitsOf(kind, dimension);
  checkMeasurable(kind, condition);

  const found = measure({ ...input, traits });
  const asFound = { valueMm: found.valueMm, standardUncertaintyMm: found.standardUncertaintyMm };
  const flat = findFlatSpot(traits.role, readingsMm, found);
  const flatSpot = flat.found || (condition === "flat-spotted" && traits.role === "tread");
  const taken = readingsMm.length === 1 ? "One reading" : `Mean of ${readingsMm.length} readings`;
  const basis = [
    `${taken} with ${instrumentFacts[instrument].withArticle}: as found ${plusMinus(asFound)} (k = 2).`,
    ...found.budget.map((term) => `${term.words}: ${mm(term.standardUncertaintyMm, 3)} (${term.source}).`),
  ];
  const budget = [...found.budget];
  let valueMm = asFound.valueMm;

  if (flat.found) {
    const [range, explained] = [mm(flat.rangeMm), mm(flat.explainedMm)];
    basis.push(`The readings differ by ${range}; measuring alone explains ${explained}. That is a flat spot.`);
  }
  if (flatSpot) {
    const { correctionMm, term } = flatSpotTerm(readingsMm, asFound.valueMm);
    valueMm += correctionMm;
    budget.push(term);
    basis.push(`${term.words}: ${mm(correctionMm)} put back (${noSource}).`);
  }

  const change = putBackCondition(traits.role, condition, asFound.valueMm, dimension);
  valueMm += change.correctionMm;
  budget.push(...change.terms);
  basis.push(change.basis);

  const asNew = { valueMm, standardUncertaintyMm: combined(budget) };
  basis.push(`As new ${plusMinus(asNew)} (k = 2).`);
  return { asFound, asNew, flatSpot, basis, budget };
}
