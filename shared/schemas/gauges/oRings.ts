import { z } from "zod";
import { oRingLimits } from "../../domain/oRings";
import { Figure, numberText } from "./numbers";

export const ORingsRequest = z.object({
  insideDiameterMm: numberText({ exclusiveMinimum: 0, maximum: oRingLimits.insideDiameterMm, example: 24.9 }),
  sectionMm: numberText({ exclusiveMinimum: 0, maximum: oRingLimits.sectionMm, example: 3.5 }).optional(),
  limit: numberText({ minimum: 1, maximum: oRingLimits.most }).optional(),
});

export const ORingsAnswer = z.object({
  /** Nearest first. */
  sizes: z.array(
    z.object({
      dash: z.string(),
      insideDiameterMm: Figure,
      insideDiameterTolMm: Figure,
      sectionMm: Figure,
      sectionTolMm: Figure,
      /** The ring's inside diameter less the one asked for. */
      differenceMm: Figure,
      /** On a seat of the diameter asked for; negative where the ring is loose. */
      stretchPercent: Figure,
    }),
  ),
  source: z.string(),
});
