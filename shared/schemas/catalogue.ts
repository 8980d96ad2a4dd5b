import { z } from "zod";
import { Currency, Id, Minor, Slug } from "./common";
import { Need } from "./need";
import { DimensionName, Evidence, Fit, ListingKind, PartKind, PartSummary, Photo, WorkshopSummary } from "./part";

export const FitClaim = z.object({
  familySlug: Slug,
  familyName: z.string(),
  servicePointName: z.string(),
  evidence: z.enum(["measured-on-machine", "fitted-here", "from-drawing", "customer-report"]),
});
export type FitClaim = z.infer<typeof FitClaim>;

export const TraderIdentity = z.object({
  legalName: z.string(),
  address: z.array(z.string()),
  email: z.string(),
  phone: z.string(),
  registration: z.string().nullable(),
});
export type TraderIdentity = z.infer<typeof TraderIdentity>;

export const PartPage = z.object({
  part: PartSummary,
  description: z.string(),
  workshop: WorkshopSummary,
  trader: TraderIdentity,
  photos: z.array(Photo),
  fitClaims: z.array(FitClaim),
  evidence: Evidence,
  need: Need,
  fit: Fit.nullable(),
  shippingMinor: Minor.nullable(),
  landedMinor: Minor.nullable(),
  currency: Currency,
  /** Made to the buyer's size: no withdrawal without a reason. */
  madeToSize: z.boolean(),
});
export type PartPage = z.infer<typeof PartPage>;

export const mechanismKinds = [
  "record-changer",
  "manual-turntable",
  "reel-to-reel-deck",
  "cassette-deck",
  "wire-recorder",
  "dictation-machine",
  "cine-projector",
] as const;
export const MechanismKind = z.enum(mechanismKinds);
export type MechanismKind = z.infer<typeof MechanismKind>;

export const FamilySummary = z.object({
  slug: Slug,
  name: z.string(),
  maker: z.string(),
  kind: MechanismKind,
  servicePointCount: z.int().nonnegative(),
  models: z.array(z.string()),
});
export type FamilySummary = z.infer<typeof FamilySummary>;
export const FamilyList = z.object({ items: z.array(FamilySummary) });

/** The plan view of a mechanism: round things with a place and a size, and belts that visit them in order. */
export const DriveMap = z.object({
  widthMm: z.number().positive(),
  heightMm: z.number().positive(),
  wheels: z.array(
    z.object({
      id: z.string(),
      role: z.enum(["motor", "platter", "idler", "pulley", "flywheel", "capstan", "pinch-roller", "reel", "clutch"]),
      label: z.string(),
      xMm: z.number(),
      yMm: z.number(),
      diameterMm: z.number().positive(),
    }),
  ),
  belts: z.array(z.object({ wheels: z.array(z.string()).min(2), label: z.string() })),
});
export type DriveMap = z.infer<typeof DriveMap>;

export const ServicePoint = z.object({
  id: Id,
  number: z.int().positive(),
  name: z.string(),
  partKind: PartKind,
  note: z.string(),
  xMm: z.number(),
  yMm: z.number(),
  sizes: z.partialRecord(DimensionName, z.object({ nominalMm: z.number(), lowerMm: z.number(), upperMm: z.number() })),
  partCount: z.int().nonnegative(),
});
export type ServicePoint = z.infer<typeof ServicePoint>;

export const FamilyPage = FamilySummary.extend({
  about: z.string(),
  driveTrain: z.string(),
  driveMap: DriveMap,
  servicePoints: z.array(ServicePoint),
});
export type FamilyPage = z.infer<typeof FamilyPage>;

export const WorkshopList = z.object({
  items: z.array(WorkshopSummary.extend({ partCount: z.int().nonnegative(), kinds: z.array(ListingKind) })),
});

export const ShippingRate = z.object({
  zone: z.string(),
  countries: z.array(z.string()),
  baseMinor: Minor,
  perItemMinor: Minor,
  freeOverMinor: Minor.nullable(),
  currency: Currency,
});
export type ShippingRate = z.infer<typeof ShippingRate>;

export const WorkshopPage = z.object({
  workshop: WorkshopSummary,
  about: z.string(),
  dispatchDays: z.int().nonnegative(),
  returnsTerms: z.string(),
  trader: TraderIdentity,
  shippingRates: z.array(ShippingRate),
  taxRegistrations: z.array(z.object({ country: z.string(), countryName: z.string(), ratePercent: z.number() })),
  parts: z.array(PartSummary),
});
export type WorkshopPage = z.infer<typeof WorkshopPage>;

/** Countries that at least one workshop ships to. */
export const CountryList = z.object({ items: z.array(z.object({ code: z.string(), name: z.string() })) });
