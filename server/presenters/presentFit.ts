import type { Fit as ReckonedFit } from "#shared/domain/fit";
import type { Fit } from "#shared/schemas/part";

/** A fit as it is sent. `pointName` names the service point that it holds for, where a family has several. */
export function presentFit(fit: ReckonedFit, pointName: string | null = null): Fit {
  const checked = fit.dimensions.length;
  return {
    chance: fit.chance,
    verdict: fit.verdict,
    coverage: fit.coverage,
    checked,
    matters: Math.max(1, Math.round(checked / fit.coverage)),
    dimensions: fit.dimensions.map(
      ({ dimension, chance, deviationMm, combinedUncertaintyMm, lowerMm, upperMm, reason }) => ({
        dimension,
        chance,
        deviationMm,
        combinedUncertaintyMm,
        lowerMm,
        upperMm,
        reason,
      }),
    ),
    reason: pointName ? `As ${pointName}: ${fit.reason}` : fit.reason,
  };
}
