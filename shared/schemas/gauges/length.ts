import { z } from "zod";
import { type LengthUnit, lengthUnits } from "../../domain/lengthUnits";
import { Figure } from "./numbers";

export const LengthRequest = z.object({
  text: z.string().meta({ description: "A length as somebody wrote it", example: '1-47/64"' }),
  defaultUnit: z.enum(["mm", "in"]).meta({ description: "The unit of a number without one" }),
});

export const LengthAnswer = z.object({
  mm: Figure,
  /** What the last place written is worth. */
  resolutionMm: Figure,
  unit: z.enum(Object.keys(lengthUnits) as LengthUnit[]),
  /** What was understood, to be shown back. */
  echo: z.string(),
});
