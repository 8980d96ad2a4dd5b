import { estimateAsNew } from "#shared/domain/asNew";
import { assessFit, type FitInput } from "#shared/domain/fit";
import type { StatedSize } from "#shared/domain/partTolerance";

const kind = "idler-wheel";
const tool = { kind, instrument: "digital-caliper", condition: "hardened" } as const;
/** An idler gone hard, and a part that somebody offers: an example of ours. */
export const readings = { outsideDiameter: [43.86, 43.9, 43.88], bore: [4.01] } as const;
export const offered = {
  outsideDiameter: { nominalMm: 44.4, plusMinusMm: 0.15 },
  bore: { nominalMm: 4, plusMinusMm: 0.02 },
} as const satisfies Record<string, StatedSize>;

/** Every step from the readings to the chance, worked out by what the search uses. */
export function workExample() {
  const diameter = estimateAsNew({ ...tool, dimension: "outsideDiameter", readingsMm: readings.outsideDiameter });
  const bore = estimateAsNew({ ...tool, dimension: "bore", readingsMm: readings.bore });
  const input: FitInput = { kind, need: { outsideDiameter: diameter.asNew, bore: bore.asNew }, part: offered };
  const fit = assessFit(input);
  const [first, second] = fit?.dimensions ?? [];
  if (!fit || !first || !second) throw new Error("the example checks two sizes");
  return { diameter, bore, fit, first, second };
}
