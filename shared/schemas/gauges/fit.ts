import { z } from "zod";
import { longestLengthMm } from "../../domain/length";
import { DimensionFit, DimensionName, PartKind, ToleranceClass, Verdict } from "../part";
import { described, signedMm, sizeMm } from "./numbers";

const spreadMm = described({ minimum: 0, maximum: longestLengthMm });

export const FitRequest = z.object({
  kind: PartKind,
  need: z
    .partialRecord(DimensionName, z.object({ valueMm: sizeMm("Size when new"), standardUncertaintyMm: spreadMm }))
    .meta({ description: "What is needed, as new" }),
  part: z
    .partialRecord(
      DimensionName,
      z.object({
        nominalMm: sizeMm("Nominal size"),
        plusMinusMm: spreadMm.optional(),
        toleranceClass: ToleranceClass.optional(),
      }),
    )
    .meta({ description: "What the workshop states; without tolerance or class, class M3 is assumed" }),
  bands: z
    .partialRecord(DimensionName, z.object({ lowerMm: signedMm, upperMm: signedMm }))
    .optional()
    .meta({ description: "What the service point accepts; else the usual band around the need" }),
});

export const FitAnswer = z.object({
  chance: z.number().min(0).max(1),
  verdict: Verdict,
  /** Checked dimensions / dimensions that matter. */
  coverage: z.number().min(0).max(1),
  dimensions: z.array(DimensionFit),
});
