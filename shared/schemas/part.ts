import { z } from "zod";
import { dimensionNames, listingKinds, partKinds } from "../domain/partKinds";
import { Currency, Id, Minor, Slug } from "./common";

export const PartKind = z.enum(partKinds);
export const ListingKind = z.enum(listingKinds);
export const DimensionName = z.enum(dimensionNames);

export const materials = ["NBR", "CR", "EPDM", "silicone", "polyurethane", "natural-rubber", "cork", "felt"] as const;
export const Material = z.enum(materials);
export type Material = z.infer<typeof Material>;

export const offerTypes = ["stocked", "made-to-order", "re-mould"] as const;
export const OfferType = z.enum(offerTypes);
export type OfferType = z.infer<typeof OfferType>;

export const toleranceClasses = ["M1", "M2", "M3", "M4"] as const;
export const ToleranceClass = z.enum(toleranceClasses);

/** A stated size: nominal and the half width of its tolerance, and where that tolerance comes from. */
export const StatedDimension = z.object({
  nominalMm: z.number().positive(),
  plusMinusMm: z.number().nonnegative(),
  tolerance: z.enum(["stated", "class", "assumed"]),
  toleranceClass: ToleranceClass.nullable(),
});
export type StatedDimension = z.infer<typeof StatedDimension>;

export const StatedDimensions = z.partialRecord(DimensionName, StatedDimension);
export type StatedDimensions = z.infer<typeof StatedDimensions>;

export const Photo = z.object({ url: z.string(), alt: z.string(), width: z.int(), height: z.int() });
export type Photo = z.infer<typeof Photo>;

/** One line of a rebuild kit: a part with dimensions, or a plain item. */
export const KitLine = z.object({
  id: Id,
  kind: PartKind.nullable(),
  title: z.string(),
  quantity: z.int().positive(),
  dimensions: StatedDimensions,
  servicePointName: z.string().nullable(),
});
export type KitLine = z.infer<typeof KitLine>;

/** A part as it stands in a row of a list. */
export const PartSummary = z.object({
  id: Id,
  kind: ListingKind,
  title: z.string(),
  offerType: OfferType,
  material: Material.nullable(),
  hardnessShoreA: z.int().nullable(),
  priceMinor: Minor,
  currency: Currency,
  /** Pieces that can be bought now; null where the part is made when ordered. */
  available: z.int().nonnegative().nullable(),
  dispatchDays: z.int().nonnegative(),
  dimensions: StatedDimensions,
  kitLines: z.array(KitLine),
  photo: Photo.nullable(),
});
export type PartSummary = z.infer<typeof PartSummary>;

export const WorkshopSummary = z.object({
  id: Id,
  slug: Slug,
  name: z.string(),
  town: z.string(),
  country: z.string(),
  countryName: z.string(),
});
export type WorkshopSummary = z.infer<typeof WorkshopSummary>;

export const verdicts = ["sure", "likely", "chancy", "unfit"] as const;
export const Verdict = z.enum(verdicts);
export type Verdict = z.infer<typeof Verdict>;

export const DimensionFit = z.object({
  dimension: DimensionName,
  chance: z.number().min(0).max(1),
  deviationMm: z.number(),
  combinedUncertaintyMm: z.number().nonnegative(),
  lowerMm: z.number(),
  upperMm: z.number(),
  reason: z.string(),
});

export const Fit = z.object({
  chance: z.number().min(0).max(1),
  verdict: Verdict,
  /** Checked dimensions / dimensions that matter. */
  coverage: z.number().min(0).max(1),
  checked: z.int().nonnegative(),
  matters: z.int().positive(),
  dimensions: z.array(DimensionFit),
  reason: z.string(),
});
export type Fit = z.infer<typeof Fit>;

/** What restorers reported after fitting this part, and where the workshop claims it fits. */
export const Evidence = z.object({
  fitted: z.int().nonnegative(),
  fittedAfterWork: z.int().nonnegative(),
  didNotFit: z.int().nonnegative(),
  sentence: z.string(),
});
export type Evidence = z.infer<typeof Evidence>;
