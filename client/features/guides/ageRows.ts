import { conditionCorrection } from "#shared/domain/conditionCorrections";
import { type Condition, conditionFacts, conditions } from "#shared/domain/conditions";
import { traitsOf } from "#shared/domain/dimensionTraits";
import { type DimensionName, dimensionsOf, type PartKind, partKinds } from "#shared/domain/partKinds";

export type AgeRow = {
  condition: Condition;
  correctionMm: number;
  /** How far that may be off, k = 2. */
  spreadMm: number;
};

/**
 * What each condition does to a size like this one, mm: every condition that a part can be in of which a size ages alike.
 */
export function ageRows(kind: PartKind, dimension: DimensionName, sizeMm: number): AgeRow[] {
  const { role } = traitsOf(kind, dimension);
  const alike = partKinds.filter((one) => dimensionsOf(one).some((name) => traitsOf(one, name).role === role));
  return conditions
    .filter((condition) => conditionFacts[condition].hasReadings)
    .filter((condition) => alike.some((one) => conditionFacts[condition].kinds.includes(one)))
    .map((condition) => {
      const { correctionMm, standardUncertaintyMm } = conditionCorrection(role, condition, sizeMm);
      return { condition, correctionMm, spreadMm: 2 * standardUncertaintyMm };
    })
    .filter(({ condition, spreadMm }) => condition === "sound" || spreadMm > 0);
}
