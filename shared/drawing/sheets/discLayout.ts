import { DomainError } from "#shared/domain/DomainError";
import { type StrobeRing, strobeRings } from "#shared/domain/strobe";
import { sector } from "./paths";
import type { Step } from "./Sheet";

export type DiscRing = StrobeRing & {
  /** The speed wanted, rpm. */
  rpm: number;
  innerMm: number;
  outerMm: number;
};
export type Disc = { radiusMm: number; spindleMm: number; mainsHz: number; rings: DiscRing[] };

/** A bar thinner than this runs together in many printers: common practice, no source. */
const thinnestBarMm = 0.3;
/** Diameters of a spindle's hole that leave room for the rings, mm. */
export const spindleLimits = { min: 1, max: 40 };
const edgeMm = 1.5;
/** Room for the label outside each ring. */
const labelMm = 4.4;
const [shallowestBarMm, deepestBarMm] = [2, 13];

const byBars = (one: StrobeRing, other: StrobeRing) => other.bars - one.bars;

/**
 * A stroboscope disc: the rings of the speeds wanted, those with most bars outside, sharing the room between the hub
 * and the edge. A bar and the gap after it are equally wide.
 *
 * Errors: DomainError on "mainsHz"; on "spindleMm" outside `spindleLimits`; on "speeds" where a speed is out of range, its bars
 *         would be too thin to print, or the rings are too many.
 */
export function layOutDisc(wanted: {
  mainsHz: number;
  speeds: readonly number[];
  spindleMm: number;
  radiusMm: number;
}): Disc {
  const { mainsHz, speeds, spindleMm, radiusMm } = wanted;
  if (!(spindleMm >= spindleLimits.min && spindleMm <= spindleLimits.max)) {
    throw new DomainError("spindleMm", "The hole for the spindle is 1 to 40 mm wide.");
  }
  const rings = [...new Set(speeds)].flatMap((rpm) => ringsFor(mainsHz, rpm)).sort(byBars);
  const hub = Math.max(17, spindleMm / 2 + 10);
  const pitch = Math.min(deepestBarMm + labelMm, (radiusMm - edgeMm - hub) / Math.max(1, rings.length));
  if (pitch < shallowestBarMm + labelMm) {
    throw new DomainError("speeds", `The ${rings.length} rings of these speeds do not fit: choose fewer.`);
  }
  return {
    radiusMm,
    spindleMm,
    mainsHz,
    rings: rings.map((ring, i) => {
      const outerMm = radiusMm - edgeMm - labelMm - i * pitch;
      const innerMm = outerMm - (pitch - labelMm);
      const most = Math.floor((Math.PI * (innerMm + outerMm)) / (2 * thinnestBarMm));
      if (ring.bars > most) {
        const words = `The ${ring.bars} bars for this speed would be thinner than a printer can draw: ${most} fit there.`;
        throw new DomainError("speeds", words);
      }
      return { ...ring, innerMm, outerMm };
    }),
  };
}

function ringsFor(mainsHz: number, rpm: number) {
  try {
    return strobeRings({ mainsHz, rpm }).map((ring) => ({ ...ring, rpm }));
  } catch (error) {
    if (error instanceof DomainError && error.field === "rpm") throw new DomainError("speeds", error.words);
    throw error;
  }
}

/** The bars of a ring about a centre, one closed piece each, the first at the top. */
export function barSteps({ bars, innerMm, outerMm }: DiscRing, cx: number, cy: number): Step[] {
  const pitch = 360 / bars;
  return Array.from({ length: bars }, (_, i) => {
    const middle = -90 + i * pitch;
    return sector(cx, cy, [innerMm, outerMm], middle - pitch / 4, middle + pitch / 4);
  }).flat();
}
