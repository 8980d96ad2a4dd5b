import { z } from "zod";
import { beltSampleMethods, thickestBeltMm } from "../../domain/beltSample";
import { Condition, Instrument } from "../need";
import { readingsMm } from "./asNew";
import { described, Figure } from "./numbers";

const Circumference = z.object({ insideCircumferenceMm: Figure, standardUncertaintyMm: Figure });

export const BeltSampleRequest = z.object({
  method: z.enum(beltSampleMethods),
  readingsMm: readingsMm(),
  thicknessMm: described({
    minimum: 0,
    maximum: thickestBeltMm,
    description: "Of the belt; 0 where the method does not need it",
  }),
  instrument: Instrument,
  condition: Condition,
});

export const BeltSampleAnswer = z.object({
  asFound: Circumference,
  asNew: Circumference,
  /** Every step in words, with its source. */
  basis: z.array(z.string()),
});
