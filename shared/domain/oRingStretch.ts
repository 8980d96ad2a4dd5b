import { stretchPercentOf } from "./oRings";
import { requireWithin } from "./requireWithin";

/** Sizes that the stretch is worked out for, in mm. */
export const oRingStretchLimits = { least: 0.01, diameterMm: 2000, sectionMm: 50, pathMm: 10_000 } as const;

/** Stretch in percent of the ring's inside diameter. Published O-ring design guidance, seals and rings as drive belts. */
export const stretchAdvice = {
  seat: { min: 1, ideal: 2, max: 5 },
  belt: { min: 8, ideal: 10, max: 12 },
  /** The smallest groove-bottom diameter that a ring may run over as a belt, in sections. */
  grooveSections: 4,
} as const;

export type OnSeat = {
  stretchPercent: number;
  /** What is left of the section, by constant volume. */
  sectionMm: number;
  lossPercent: number;
  /** By the empirical curve; null outside the 0 to 25 % that it is known for. */
  empiricalLossPercent: number | null;
};

/** Loss of section at a stretch, both in percent, of a ring much thinner than wide, by constant volume; none when loose. */
export const thinRingLossPercent = (stretchPercent: number) =>
  100 * (1 - 1 / Math.sqrt(1 + Math.max(stretchPercent, 0) / 100));

/**
 * Loss of section at a stretch, both in percent, by the curve of an O-ring handbook (from memory, not looked up); null
 * outside 0 to 25 %. It tells about 1 point more than constant volume does.
 */
export function empiricalLossPercent(stretchPercent: number): number | null {
  if (!(stretchPercent >= 0 && stretchPercent <= 25)) return null;
  return stretchPercent <= 3
    ? 0.01 + 1.06 * stretchPercent - 0.1 * stretchPercent ** 2
    : 0.56 + 0.59 * stretchPercent - 0.0046 * stretchPercent ** 2;
}

/**
 * The share of the section left, t, with t^2 (seat + section t) = inside diameter + section: what is round stays round
 * and keeps its volume. The left side is convex and grows with t, so Newton's steps from above come down to the root.
 */
function shareLeft(insideDiameterMm: number, sectionMm: number, seatMm: number): number {
  const volume = insideDiameterMm + sectionMm;
  let share = Math.min(Math.sqrt(volume / seatMm), Math.cbrt(volume / sectionMm));
  for (let turn = 0; turn < 60; turn++) {
    const over = share ** 2 * (seatMm + sectionMm * share) - volume;
    const next = share - over / (share * (2 * seatMm + 3 * sectionMm * share));
    if (!(next < share)) break;
    share = next;
  }
  return share;
}

/**
 * A ring on its seat: its stretch and what that leaves of its section, in mm and percent. A ring that is loose on its
 * seat keeps its section.
 *
 * Limits: from 0.01 mm up to 2000 mm (diameters) and 50 mm (section), else DomainError on the field.
 * Source: (seat - ID) / ID; section by constant volume, cs'^2 (seat + cs') = cs^2 (ID + cs), solved exactly.
 */
export function oRingOnSeat(ring: { insideDiameterMm: number; sectionMm: number; seatMm: number }): OnSeat {
  const { insideDiameterMm, sectionMm, seatMm } = ring;
  const { least, diameterMm, sectionMm: thickest } = oRingStretchLimits;
  requireWithin("insideDiameterMm", insideDiameterMm, least, diameterMm);
  requireWithin("sectionMm", sectionMm, least, thickest);
  requireWithin("seatMm", seatMm, least, diameterMm);

  const stretchPercent = stretchPercentOf(insideDiameterMm, seatMm);
  const share = stretchPercent > 0 ? shareLeft(insideDiameterMm, sectionMm, seatMm) : 1;
  return {
    stretchPercent,
    sectionMm: sectionMm * share,
    lossPercent: 100 * (1 - share),
    empiricalLossPercent: empiricalLossPercent(stretchPercent),
  };
}

/**
 * The rings that run as a belt over a path, by the stretch advised: inside diameters in mm, the smallest for the
 * largest stretch, path / (pi (1 + stretch)).
 *
 * Shape:  `pathMm` is the length along the bottoms of the grooves.
 * Limits: from 0.01 mm up to 10,000 mm, else DomainError on "pathMm".
 * Source: published O-ring design guidance, O-rings as drive belts: 8 to 12 % on the inside diameter.
 */
export function oRingsForPath(pathMm: number): { min: number; ideal: number; max: number } {
  requireWithin("pathMm", pathMm, oRingStretchLimits.least, oRingStretchLimits.pathMm);
  const at = (stretchPercent: number) => pathMm / (Math.PI * (1 + stretchPercent / 100));
  const { min, ideal, max } = stretchAdvice.belt;
  return { min: at(max), ideal: at(ideal), max: at(min) };
}

/**
 * +/- of the inside diameter of a class B ring, in mm, from its inside diameter in mm.
 *
 * Limits: above 0 up to 2000 mm, else DomainError on "insideDiameterMm".
 * Source: ISO 3601-1 class B, 0.009 d1^0.95 + 0.11. Reproductions print the exponent 0.93; their own values fit 0.95 only.
 */
export function classBPlusMinusMm(insideDiameterMm: number): number {
  requireWithin("insideDiameterMm", insideDiameterMm, 0, oRingStretchLimits.diameterMm);
  return 0.009 * insideDiameterMm ** 0.95 + 0.11;
}
