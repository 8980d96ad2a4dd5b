import { z } from "zod";
import { mostReadings } from "../../domain/measure";
import { Condition, Instrument } from "../need";
import { DimensionName, PartKind } from "../part";
import { Figure, sizeMm } from "./numbers";

/** Readings with one instrument. */
export const readingsMm = (most: number = mostReadings) =>
  z
    .array(sizeMm("One reading"))
    .max(most, `Give at most ${most} readings.`)
    .meta({ description: "Readings of one size, in mm", minItems: 1, example: [44.08, 44.1, 44.12] });

export const Estimate = z.object({ valueMm: Figure, standardUncertaintyMm: Figure });

export const AsNewRequest = z.object({
  kind: PartKind,
  dimension: DimensionName,
  readingsMm: readingsMm(),
  instrument: Instrument,
  condition: Condition,
});

export const AsNewAnswer = z.object({
  asFound: Estimate,
  asNew: Estimate,
  flatSpot: z.boolean(),
  /** Every step in words, with its source. */
  basis: z.array(z.string()),
});
