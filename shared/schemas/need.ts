import { z } from "zod";
import { conditions } from "../domain/conditions";
import { instruments } from "../domain/instruments";
import { dimensionNames } from "../domain/partKinds";
import { sizeLimits } from "../domain/writtenSize";
import { CountryCode, Slug } from "./common";
import { DimensionName, PartKind } from "./part";

export const Instrument = z.enum(instruments);
export const Condition = z.enum(conditions);

/** A size as somebody wrote it: a reading, several, or one that was worked out. `parseSize` says what it means. */
const SizeText = z
  .string()
  .trim()
  .min(1)
  .max(sizeLimits.characters, `A size takes at most ${sizeLimits.characters} characters`);

const sizeByDimension = Object.fromEntries(dimensionNames.map((name) => [name, SizeText.optional()])) as {
  [name in (typeof dimensionNames)[number]]: z.ZodOptional<typeof SizeText>;
};

/** What is needed, as it stands in the address bar. */
export const NeedQuery = z.object({
  kind: PartKind.optional(),
  ...sizeByDimension,
  /** The as-new estimate of the primary dimension, moved by hand along the size rail, in mm. */
  estimateMm: z.coerce.number().positive().max(10_000).optional(),
  unit: z.enum(["mm", "in"]).default("mm"),
  instrument: Instrument.default("digital-caliper"),
  condition: Condition.default("sound"),
  family: Slug.optional(),
  shipTo: CountryCode.default("DE"),
});
export type NeedQuery = z.infer<typeof NeedQuery>;

/** One dimension of the need: what was written, what was understood, and its size when new. */
export const NeedDimension = z.object({
  dimension: DimensionName,
  /** As typed; null where the size comes from the register of a family. */
  text: z.string().nullable(),
  echo: z.string(),
  /** Mean of the readings; null where the size was worked out or comes from a register. */
  asFoundMm: z.number().nullable(),
  asNewMm: z.number(),
  standardUncertaintyMm: z.number().nonnegative(),
  /** The band accepted: of the service point where one is known, else the usual one for this dimension. */
  lowerMm: z.number(),
  upperMm: z.number(),
  bandFrom: z.enum(["service-point", "common-practice"]),
  basis: z.array(z.string()),
});
export type NeedDimension = z.infer<typeof NeedDimension>;

export const Need = z.object({
  kind: PartKind.nullable(),
  dimensions: z.array(NeedDimension),
  instrument: Instrument,
  condition: Condition,
  family: z.object({ slug: Slug, name: z.string() }).nullable(),
  q: z.string().nullable(),
  shipTo: CountryCode,
});
export type Need = z.infer<typeof Need>;
