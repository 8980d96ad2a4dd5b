import { z } from "zod";
import { checkInVerdicts, largestGuardFactor } from "../../domain/checkIn";
import { longestLengthMm } from "../../domain/length";
import { robustMeanLimits } from "../../domain/robustMean";
import { Instrument } from "../need";
import { readingsMm } from "./asNew";
import { described, Figure, sizeMm } from "./numbers";

const spreadMm = described({ minimum: 0, maximum: longestLengthMm });

export const CheckInRequest = z.object({
  readingsMm: readingsMm(),
  instrument: Instrument.optional().meta({ description: "Either this or `standardUncertaintyMm`" }),
  standardUncertaintyMm: spreadMm.optional(),
  nominalMm: sizeMm("As stated"),
  plusMinusMm: spreadMm,
  guardFactor: described({
    minimum: 0,
    maximum: largestGuardFactor,
    description: "Guard band in standard uncertainties; 1.65 if not given",
  }).optional(),
});

export const CheckInAnswer = z.object({
  verdict: z.enum(checkInVerdicts),
  meanMm: Figure,
  standardUncertaintyMm: Figure,
  guardBandMm: Figure,
});

const { least, most } = robustMeanLimits;
export const ConsensusRequest = z.object({
  valuesMm: z
    .array(sizeMm("One person's measurement"))
    .max(most, `Give at most ${most} values.`)
    .meta({ minItems: least, maxItems: most }),
});

export const ConsensusAnswer = z.object({
  robustMeanMm: Figure,
  robustSdMm: Figure,
  standardUncertaintyMm: Figure,
  n: z.int(),
  iterations: z.int(),
});
