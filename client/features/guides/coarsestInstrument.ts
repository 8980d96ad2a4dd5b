import { defaultBand } from "#shared/domain/acceptedBands";
import { estimateAsNew } from "#shared/domain/asNew";
import { conformanceProbability } from "#shared/domain/conformance";
import { traitsOf } from "#shared/domain/dimensionTraits";
import type { Instrument } from "#shared/domain/instruments";
import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import { verdictOf } from "#shared/domain/verdict";

/** From coarse to fine. A string measures loops alone; a micrometer has no inside jaws. */
function usable(kind: PartKind, dimension: DimensionName): readonly Instrument[] {
  const { role, inside } = traitsOf(kind, dimension);
  if (role === "loop" && !inside) return ["string", "steel-rule", "digital-caliper"];
  const jaws: Instrument[] = ["steel-rule", "vernier-caliper", "digital-caliper"];
  return inside ? jaws : [...jaws, "micrometer"];
}

/**
 * The coarsest instrument with which one reading of a sound part, just the size that is needed, still gives the verdict
 * "sure" in the usual band; undefined where none does. Sizes in mm.
 */
export function coarsestInstrument(kind: PartKind, dimension: DimensionName, sizeMm: number): Instrument | undefined {
  const band = defaultBand(kind, dimension, sizeMm);
  return usable(kind, dimension).find((instrument) => {
    const reading = { kind, dimension, readingsMm: [sizeMm], instrument, condition: "sound" } as const;
    const { standardUncertaintyMm } = estimateAsNew(reading).asNew;
    return verdictOf(conformanceProbability(sizeMm, standardUncertaintyMm, band)) === "sure";
  });
}
