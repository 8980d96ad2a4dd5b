import { DomainError } from "./DomainError";
import { requireWithin } from "./requireWithin";

const longest = 10_000;

/** The share of a strain, in percent, that was not given back. All in mm; what was given back lies between the two. */
function setPercent(original: number, strained: number, after: number): number {
  if (original === strained) throw new DomainError("strainedMm", "It has to differ from the original size.");
  const isBetween = after >= Math.min(original, strained) && after <= Math.max(original, strained);
  if (!isBetween) throw new DomainError("afterMm", "It lies between the original and the strained size.");
  return 100 * (Math.abs(after - original) / Math.abs(strained - original));
}

export type Strained = { originalMm: number; strainedMm: number; afterMm: number };

function requireSizes({ originalMm, strainedMm, afterMm }: Strained): void {
  requireWithin("originalMm", originalMm, 0, longest);
  requireWithin("strainedMm", strainedMm, 0, longest);
  requireWithin("afterMm", afterMm, 0, longest);
}

/**
 * Compression set in percent: 0 springs back wholly, 100 not at all.
 * Limits: heights above 0 up to 10,000 mm, strained < original, else DomainError on the field.
 * Source: ISO 815-1 and ASTM D395 method B, 100 (h0 - h1) / (h0 - hs).
 */
export function compressionSetPercent(sizes: Strained): number {
  requireSizes(sizes);
  const { originalMm, strainedMm, afterMm } = sizes;
  if (strainedMm > originalMm) throw new DomainError("strainedMm", "It is less than the original height.");
  return setPercent(originalMm, strainedMm, afterMm);
}

/**
 * Tension set in percent: 0 springs back wholly, 100 not at all.
 * Limits: lengths above 0 up to 10,000 mm, strained > original, else DomainError on the field.
 * Source: ISO 2285 (formula from memory), 100 (l1 - l0) / (ls - l0).
 */
export function tensionSetPercent(sizes: Strained): number {
  requireSizes(sizes);
  const { originalMm, strainedMm, afterMm } = sizes;
  if (strainedMm < originalMm) throw new DomainError("strainedMm", "It is more than the original length.");
  return setPercent(originalMm, strainedMm, afterMm);
}

/**
 * A belt that has taken its set: its relaxed length in mm, and the stretch in percent that it still has in place.
 * Limits: relaxed length above 0 up to 10,000 mm, stretch and set 0 to 100 %, else DomainError on the field.
 * Source: the definition of tension set (ISO 2285, from memory), l1 = l0 (1 + set x stretch).
 */
export function beltAfterSet(belt: { relaxedMm: number; stretchPercent: number; setPercent: number }): {
  relaxedMm: number;
  remainingStretchPercent: number;
} {
  requireWithin("relaxedMm", belt.relaxedMm, 0, longest);
  for (const field of ["stretchPercent", "setPercent"] as const) {
    if (!(belt[field] >= 0 && belt[field] <= 100)) throw new DomainError(field, "From 0 to 100 %.");
  }
  const stretch = belt.stretchPercent / 100;
  const grown = 1 + (stretch * belt.setPercent) / 100;
  return { relaxedMm: belt.relaxedMm * grown, remainingStretchPercent: 100 * ((1 + stretch) / grown - 1) };
}

/** Polyurethane round belts: stretch to install with, and the share of tension left after 24 to 48 h. Published advice. */
export const polyurethaneBelts = {
  stretchPercent: { "83A": 10, "92A": 7.5 },
  tensionLeft: 0.5,
} as const;

/**
 * Tension of an 83A polyurethane round belt put on with 10 % stretch, in N, at first and after 24 to 48 h, from its
 * section diameter in mm (above 0 up to 50, else DomainError on "sectionMm").
 * Source: published advice for such belts, about 200 psi (200 lbf/in2; 1 lbf = 4.4482216152605 N), half of it later.
 */
export function polyurethaneTension(sectionMm: number): { initialN: number; settledN: number } {
  requireWithin("sectionMm", sectionMm, 0, 50);
  const initialN = 200 * 4.4482216152605 * (Math.PI / 4) * (sectionMm / 25.4) ** 2;
  return { initialN, settledN: initialN * polyurethaneBelts.tensionLeft };
}
