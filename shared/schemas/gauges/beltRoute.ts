import { z } from "zod";
import { beltRouteLimits, beltWraps } from "../../domain/beltRoute";
import { described, Figure } from "./numbers";

const within = ([minimum, maximum]: readonly [number, number], description: string) =>
  described({ minimum, maximum, description });
const [leastPulleys, mostPulleys] = beltRouteLimits.pulleys;

export const BeltRouteRequest = z.object({
  pulleys: z
    .array(
      z.object({
        x: within(beltRouteLimits.place, "Of the centre, mm"),
        y: within(beltRouteLimits.place, "Of the centre, mm"),
        diameter: within(beltRouteLimits.diameter, "Where the belt lies, mm"),
        wrap: z.enum(beltWraps).meta({ description: "The face of the belt that lies on it" }),
      }),
    )
    // The computation counts them, too; this only keeps a flood from it.
    .max(1000, `A belt visits at most ${mostPulleys} pulleys here.`)
    .meta({ description: "In the order that the belt visits them", minItems: leastPulleys, maxItems: mostPulleys }),
  thickness: within(beltRouteLimits.thickness, "Of the belt, mm"),
  stretchPercent: z.object({
    min: within(beltRouteLimits.stretchPercent, "Installed stretch, percent"),
    max: within(beltRouteLimits.stretchPercent, "Installed stretch, percent; not below `min`"),
  }),
});

export const BeltRouteAnswer = z.object({
  pitchLengthMm: Figure,
  spansMm: z.array(Figure),
  wrapsDeg: z.array(Figure),
  insideCircumferenceMm: z.object({ min: Figure, mid: Figure, max: Figure }),
  turns: z.array(z.enum(["same", "opposite"])),
  /** In words; pulleys are counted from 1. */
  warnings: z.array(z.string()),
});
