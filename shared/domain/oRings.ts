import { DomainError } from "./DomainError";
import { type ORingSize, oRingTable } from "./oRingTable";
import { requireWithin } from "./requireWithin";

/** What may be asked, in mm and in sizes. */
export const oRingLimits = { insideDiameterMm: 2000, sectionMm: 50, most: 50, usual: 10 } as const;
export const oRingSource = "SAE AS568, dimensions as openly reproduced; 1 in = 25.4 mm exactly";

export type ORingNeed = { insideDiameterMm: number; sectionMm?: number | undefined; limit?: number | undefined };
export type NearORing = ORingSize & {
  /** The ring's inside diameter less the one asked for. */
  differenceMm: number;
  /** How far the ring stretches on a seat of the diameter asked for, in percent; negative where it is loose. */
  stretchPercent: number;
};

/** The stretch of a ring on its seat, in percent of its own inside diameter. Source: usual definition in seal guidance. */
export const stretchPercentOf = (insideDiameterMm: number, seatMm: number) =>
  ((seatMm - insideDiameterMm) / insideDiameterMm) * 100;

/**
 * The standard O-rings nearest to a need, nearest first.
 *
 * Order:  with a section by how far the ring's section lies from it, then by how far the inside diameter does; without
 *         one by the inside diameter, then by section.
 * Limits: inside diameter above 0 up to 2000 mm, section above 0 up to 50 mm, limit a whole number from 1 to 50 (10 if
 *         not given); else DomainError on "insideDiameterMm", "sectionMm" or "limit".
 * Source: SAE AS568.
 */
export function nearestORings({ insideDiameterMm, sectionMm, limit = oRingLimits.usual }: ORingNeed): {
  sizes: NearORing[];
  source: string;
} {
  requireWithin("insideDiameterMm", insideDiameterMm, 0, oRingLimits.insideDiameterMm);
  if (sectionMm !== undefined) requireWithin("sectionMm", sectionMm, 0, oRingLimits.sectionMm);
  if (!Number.isInteger(limit) || limit < 1 || limit > oRingLimits.most) {
    throw new DomainError("limit", `A whole number from 1 to ${oRingLimits.most}.`);
  }

  const offSection = (size: ORingSize) => (sectionMm === undefined ? 0 : Math.abs(size.sectionMm - sectionMm));
  const sizes = oRingTable
    .map((size) => ({
      ...size,
      differenceMm: size.insideDiameterMm - insideDiameterMm,
      stretchPercent: stretchPercentOf(size.insideDiameterMm, insideDiameterMm),
    }))
    .sort(
      (a, b) =>
        offSection(a) - offSection(b) ||
        Math.abs(a.differenceMm) - Math.abs(b.differenceMm) ||
        a.sectionMm - b.sectionMm,
    )
    .slice(0, limit);
  return { sizes, source: oRingSource };
}
