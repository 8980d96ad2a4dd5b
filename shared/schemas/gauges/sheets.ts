import { z } from "zod";
import { strobeLimits } from "../../domain/strobe";
import { longestBeltMm, shortestBeltMm } from "../../drawing/sheets/beltRulerSheet";
import { spindleLimits } from "../../drawing/sheets/discLayout";
import { ringGaugeSizes, ringGaugeSteps } from "../../drawing/sheets/ringGaugeSheet";
import { numberText } from "./numbers";

const Paper = z.enum(["a4", "letter"]).default("a4");

const range = ({ min, max }: { min: number; max: number }) => ({ minimum: min, maximum: max });

export const StrobeSheetRequest = z.object({
  mainsHz: numberText({ ...range(strobeLimits.mainsHz), example: 50 }),
  speeds: z
    .string("Write speeds with commas between, like 33 1/3,45.")
    .max(100, "Choose at most six speeds.")
    .default("16 2/3,33 1/3,45,78")
    .meta({ description: "Turns a minute, commas between", example: "33 1/3,45,78" }),
  spindleMm: numberText({ ...range(spindleLimits), example: 7.2 }).prefault("7.2"),
  paper: Paper,
});

export const RingGaugeRequest = z.object({
  largestMm: numberText({ description: "Whole tens", ...range(ringGaugeSizes) }).prefault(String(ringGaugeSizes.max)),
  stepMm: z.enum(ringGaugeSteps).default("1"),
  paper: Paper,
});

export const BeltRulerRequest = z.object({
  longestMm: numberText({ minimum: shortestBeltMm, maximum: longestBeltMm, example: 800 }).prefault("800"),
  paper: Paper,
});
