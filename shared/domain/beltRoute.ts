import { type Contact, noGapMm } from "./beltTangents";
import { beltWarnings } from "./beltWarnings";
import { closeBelt } from "./closeBelt";
import { DomainError } from "./DomainError";

/** Which face of the belt lies on a pulley: one that it runs round, or one that presses on its back. */
export const beltWraps = ["inside", "back"] as const;
export type BeltWrap = (typeof beltWraps)[number];
/** Centre and diameter of the face that the belt lies on (the bottom of a groove), in mm. */
export type Pulley = { x: number; y: number; diameter: number; wrap: BeltWrap };
export type BeltRouteInput = {
  pulleys: readonly Pulley[];
  /** Of the belt between the pulley and its outside, mm. */
  thickness: number;
  /** Installed stretch, in percent of the relaxed length along the middle. */
  stretchPercent: { min: number; max: number };
};
export type BeltWarning = { pulley: number | null; words: string };
export type BeltRoute = {
  /** Length along the middle of the belt in place. */
  pitchLengthMm: number;
  /** Straight parts, from pulley i to the next. */
  spansMm: number[];
  wrapsDeg: number[];
  /** Relaxed, to buy: `min` belongs to the largest stretch, `mid` to the middle one. */
  insideCircumferenceMm: { min: number; mid: number; max: number };
  /** Against the inside pulleys. */
  turns: ("same" | "opposite")[];
  warnings: BeltWarning[];
  isCrossed: boolean;
  /** For drawings: where the belt meets and leaves each pulley (`beltOutline` makes a path of them). */
  contacts: Contact[];
};

/** Each [least, most]; lengths in mm. */
export const beltRouteLimits = {
  pulleys: [2, 24],
  place: [-10_000, 10_000],
  diameter: [0.1, 5000],
  thickness: [0, 50],
  stretchPercent: [0, 100],
} as const;

function check(field: string, value: number, [least, most]: readonly [number, number], what: string): void {
  if (!(value >= least && value <= most)) throw new DomainError(field, `${what} must be from ${least} to ${most}.`);
}

function checkInput({ pulleys, thickness, stretchPercent }: BeltRouteInput): void {
  const limits = beltRouteLimits;
  check("pulleys", pulleys.length, limits.pulleys, "The count of pulleys");
  for (const [i, { x, y, diameter, wrap }] of pulleys.entries()) {
    check(`pulleys/${i}/x`, x, limits.place, "Coordinate x in mm");
    check(`pulleys/${i}/y`, y, limits.place, "Coordinate y in mm");
    check(`pulleys/${i}/diameter`, diameter, limits.diameter, "A diameter in mm");
    if (!beltWraps.includes(wrap))
      throw new DomainError(`pulleys/${i}/wrap`, "A pulley touches the inside or the back.");
  }
  check("thickness", thickness, limits.thickness, "The thickness in mm");
  check("stretchPercent/min", stretchPercent.min, limits.stretchPercent, "Stretch in percent");
  check("stretchPercent/max", stretchPercent.max, limits.stretchPercent, "Stretch in percent");
  if (stretchPercent.min > stretchPercent.max)
    throw new DomainError("stretchPercent/max", "The largest stretch must not be less than the smallest.");
}

function checkRoom({ pulleys, thickness }: BeltRouteInput): void {
  for (const [j, second] of pulleys.entries()) {
    for (const [i, first] of pulleys.slice(0, j).entries()) {
      const gap = Math.hypot(second.x - first.x, second.y - first.y) - (first.diameter + second.diameter) / 2;
      const pair = `${i + 1} and ${j + 1}`;
      if (gap < -noGapMm)
        throw new DomainError(`pulleys/${j}`, `Pulleys ${pair} overlap. Move them apart or make one smaller.`);
      const follow = j - i === 1 || j - i === pulleys.length - 1;
      if (follow && first.wrap !== second.wrap && gap < thickness - noGapMm)
        throw new DomainError(
          `pulleys/${j}`,
          `There is no room for the belt between pulleys ${pair}. Move them apart by its thickness at least.`,
        );
    }
  }
}

/**
 * The route of a belt round pulleys in the order that it visits them: lengths, wraps, and the belt to buy.
 *
 * Shape:   any number of pulleys, each inside or on the back; two open or crossed are the simple case. The belt runs round
 *          the inside pulleys in the sense of their order (`closeBelt`), so x and y may point any way.
 * Units:   mm, degrees, percent. The middle of the belt lies (diameter + thickness) / 2 from each centre, on both sides.
 * Relaxed: inside circumference = pitch length / (1 + stretch) - pi x thickness. It holds with back pulleys and for crossed
 *          belts too: on the bench the belt is a plain loop, which turns once, with the same middle line.
 * Limits:  `beltRouteLimits`. Turns are told against the inside pulleys.
 * Errors:  DomainError with the path of the field, or of the pulley that overlaps, has no room, or is not touched.
 * Source:  exact tangents; two pulleys open or crossed agree with Shigley's Mechanical Engineering Design 8e, Eq. 17-1
 *          and 17-2, and with the "belt problem" (encyclopaedia article).
 */
export function solveBeltRoute(input: BeltRouteInput): BeltRoute {
  checkInput(input);
  checkRoom(input);
  const { pulleys, thickness, stretchPercent } = input;
  const { contacts, isCrossed } = closeBelt(pulleys, thickness);
  const pitchLengthMm = contacts.reduce((sum, { spanMm, radius, wrap }) => sum + spanMm + radius * wrap, 0);
  const { min, max } = stretchPercent;
  const relaxed = (percent: number) => pitchLengthMm / (1 + percent / 100) - Math.PI * thickness;
  if (!(relaxed(max) > 0))
    throw new DomainError(
      "thickness",
      "The belt is too thick for so short a route stretched so far: nothing is left inside.",
    );
  return {
    pitchLengthMm,
    spansMm: contacts.map(({ spanMm }) => spanMm),
    wrapsDeg: contacts.map(({ wrap }) => (wrap * 180) / Math.PI),
    insideCircumferenceMm: { min: relaxed(max), mid: relaxed((min + max) / 2), max: relaxed(min) },
    turns: pulleys.map(({ wrap }) => (wrap === "inside" ? "same" : "opposite")),
    warnings: beltWarnings(pulleys, contacts, thickness, isCrossed),
    isCrossed,
    contacts,
  };
}
