import { z } from "zod";
import { longestLengthMm } from "../../domain/length";
import { ToleranceClass } from "../part";
import { Figure, numberText, signedMm } from "./numbers";

export const RubberToleranceRequest = z.object({
  class: ToleranceClass,
  nominalMm: numberText({ exclusiveMinimum: 0, maximum: longestLengthMm, example: 44 }),
  dimension: z.enum(["fixed", "closure"]).meta({
    description: "fixed: formed in one part of the mould; closure: across its split",
  }),
});

export const RubberToleranceAnswer = z.object({
  plusMinusMm: Figure,
  class: ToleranceClass,
  range: z.tuple([Figure, Figure]).meta({
    description: `The row used: over the first, up to and including the second (in the last row, the ${longestLengthMm} mm that are the most taken here)`,
  }),
  source: z.string(),
});

export const ConformanceRequest = z.object({
  estimateMm: signedMm,
  standardUncertaintyMm: z
    .number()
    .min(0, "An uncertainty is zero or more.")
    .max(longestLengthMm, "An uncertainty is at most 10 m."),
  lowerMm: signedMm.optional(),
  upperMm: signedMm.optional(),
});

export const ConformanceAnswer = z.object({ probability: z.number().min(0).max(1) });
