import { conditionCorrection } from "./conditionCorrections";
import { type Condition, conditionFacts, conditionProblem } from "./conditions";
import { DomainError } from "./DomainError";
import type { WearRole } from "./dimensionTraits";
import { formatLength } from "./length";
import { type DimensionName, dimensionWords, type PartKind } from "./partKinds";
import type { Contribution } from "./uncertainty";

const noSource = "common practice, no source";
const mm = (length: number) => formatLength(length, "mm");

/** Throws a DomainError on "condition" where it makes no sense for the kind, or leaves nothing to measure. */
export function checkMeasurable(kind: PartKind, condition: Condition): void {
  const problem = conditionProblem(kind, condition);
  if (problem) throw new DomainError("condition", problem);
  if (!conditionFacts[condition].hasReadings) {
    const words = `A ${condition} part has no size left to measure. Work it out from the pulleys or the mechanism family.`;
    throw new DomainError("condition", words);
  }
}

function changeWords(correctionMm: number): string {
  if (correctionMm === 0) return "hardly changed";
  return correctionMm < 0 ? `added about ${mm(-correctionMm)} to` : `took about ${mm(correctionMm)} from`;
}

/**
 * What a condition took from a size (or added), to be put back, in mm: with its term of the uncertainty, where it has one,
 * and in words.
 */
export function putBackCondition(
  role: WearRole,
  condition: Condition,
  sizeMm: number,
  dimension: DimensionName,
): { correctionMm: number; terms: Contribution[]; basis: string } {
  const { correctionMm, standardUncertaintyMm } = conditionCorrection(role, condition, sizeMm);
  if (role === "rigid") {
    const basis = `The ${dimensionWords[dimension]} is metal or bush and does not change with the rubber: not corrected.`;
    return { correctionMm, terms: [], basis };
  }
  const { name } = conditionFacts[condition];
  if (standardUncertaintyMm === 0) {
    return {
      correctionMm,
      terms: [],
      basis: `A ${name} part is taken at the size it has: not corrected (${noSource}).`,
    };
  }
  const words = `Being ${name} ${changeWords(correctionMm)} the ${dimensionWords[dimension]}`;
  return {
    correctionMm,
    terms: [{ name: "condition", standardUncertaintyMm, words, source: noSource }],
    basis: `${words}, give or take ${mm(2 * standardUncertaintyMm)} (${noSource}).`,
  };
}
