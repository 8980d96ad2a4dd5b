import { requireWithin } from "./requireWithin";

/** The scale to read a rubber on. */
export type HardnessScale = "A" | "D" | "AO" | "AM";

const scaleUnit = "on the scale";

/**
 * The hardness that a part of a nominal Shore A hardness may show: the nominal +/- 5, within the scale.
 * Limits: 0 < nominal <= 100, else DomainError on "nominal". Source: ASTM D2000, where the digit 7 means 70 +/- 5.
 */
export function hardnessWindow(nominal: number): { lower: number; upper: number } {
  requireWithin("nominal", nominal, 0, 100, scaleUnit);
  return { lower: Math.max(nominal - 5, 0), upper: Math.min(nominal + 5, 100) };
}

/**
 * The scale that a reading should be taken on, from a first reading on A or D.
 *
 * Limits: 0 < reading <= 100, thickness above 0 up to 1000 mm, else DomainError on "reading" or "thicknessMm".
 * Source: ISO 48-4:2018, choice of scale: under 20 D read A, under 20 A read AO, over 90 A read D, under 6 mm read AM.
 */
export function hardnessScale(first: { scale: "A" | "D"; reading: number; thicknessMm?: number }): HardnessScale {
  const { scale, reading, thicknessMm = 6 } = first;
  requireWithin("reading", reading, 0, 100, scaleUnit);
  requireWithin("thicknessMm", thicknessMm, 0, 1000);
  if (thicknessMm < 6) return "AM";
  if (scale === "D") return reading < 20 ? "A" : "D";
  if (reading < 20) return "AO";
  return reading > 90 ? "D" : "A";
}

/**
 * The spring of a type A durometer at a reading: its force in N and how far its point stands in the rubber, in mm.
 * Limits: 0 < reading <= 100, else DomainError on "reading". Source: ISO 48-4 type A, from memory: 0.550 + 0.075 H; 2.5 mm at 0, 0 at 100.
 */
export function shoreASpring(reading: number): { forceN: number; depthMm: number } {
  requireWithin("reading", reading, 0, 100, scaleUnit);
  return { forceN: 0.55 + 0.075 * reading, depthMm: 2.5 * (1 - reading / 100) };
}
