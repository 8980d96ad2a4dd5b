import { z } from "zod";
import { recordSpeeds, tapeSpeeds } from "../../domain/nominalSpeeds";
import { speedBounds } from "../../domain/speedBounds";
import { strobeLimits } from "../../domain/strobe";
import { described, Figure } from "./numbers";

const within = ([minimum, maximum]: readonly [number, number], description?: string) =>
  described({ minimum, maximum, description });
const diameter = within(speedBounds.diameterMm, "mm");
const thickness = within(speedBounds.thicknessMm, "mm");
const [leastStages, mostStages] = speedBounds.stages;

const Target = z.enum([...recordSpeeds, ...tapeSpeeds]).optional();
const motor = {
  mainsHz: within(speedBounds.mainsHz),
  poles: within(speedBounds.poles, "An even number"),
  slipPercent: within(speedBounds.slipPercent, "Less than the maximum"),
  target: Target.meta({ description: `${recordSpeeds.join(", ")} rpm; for a capstan ${tapeSpeeds.join(", ")} in/s` }),
};

export const SpeedRequest = z.discriminatedUnion("drive", [
  z.object({
    drive: z.literal("rim"),
    ...motor,
    stepDiameter: diameter,
    rimDiameter: diameter,
    idlerDiameter: diameter.optional(),
  }),
  z.object({
    drive: z.literal("stepped-idler"),
    ...motor,
    stepDiameter: diameter,
    idlerLargeDiameter: diameter,
    idlerSmallDiameter: diameter,
    rimDiameter: diameter,
  }),
  z.object({
    drive: z.literal("belt"),
    ...motor,
    pulleyDiameter: diameter,
    drivenDiameter: diameter,
    beltThickness: thickness,
  }),
  z.object({
    drive: z.literal("capstan"),
    ...motor,
    stages: z
      .array(z.object({ driver: diameter, driven: diameter, beltThickness: thickness.optional() }))
      .max(100, `At most ${mostStages} stages.`)
      .meta({ description: "From the motor on", minItems: leastStages, maxItems: mostStages }),
    capstanDiameter: diameter,
  }),
]);

export const SpeedAnswer = z.object({
  motorRpm: Figure,
  /** Of the platter, or of the capstan. */
  outputRpm: Figure,
  tapeSpeedMmPerS: Figure.optional(),
  target: Target,
  errorPercent: Figure.optional(),
  errorCents: Figure.optional(),
  /** The sizes that set the speed and those that cancel, as the request names them. */
  sets: z.array(z.string()),
  cancels: z.array(z.string()),
  otherMains: z.object({ mainsHz: Figure, stepDiameterMm: Figure }),
});

export const StrobeRequest = z.object({
  mainsHz: within([strobeLimits.mainsHz.min, strobeLimits.mainsHz.max]),
  rpm: within([strobeLimits.rpm.min, strobeLimits.rpm.max]),
});

export const StrobeAnswer = z.object({ bars: z.int().positive(), shownRpm: Figure, errorPercent: Figure });
