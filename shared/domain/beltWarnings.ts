import { beltCrossings, spanOf } from "./beltCrossings";
import type { BeltWarning, Pulley } from "./beltRoute";
import type { Contact } from "./beltTangents";

type Point = { x: number; y: number };
/** The least wrap of an inside pulley that drives or is driven, in degrees. Common practice, no source. */
const drivingWrap = 90;
/** The least wrap of any pulley, in degrees, that can drive something at all. Common practice, no source. */
const guidingWrap = 30;
/** A wrap, in degrees, that a slightly longer belt no longer has. Common practice, no source. */
const bareTouch = 5;
/**
 * The least diameter of a pulley in thicknesses of the belt. Source: published design guidance for O-rings as drive belts
 * (bottom of the groove at least 4 sections across); for other belts common practice, no source.
 */
const leastDiameter = 4;

const degrees = (radians: number) => (radians * 180) / Math.PI;
const apart = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y);

/** The point of a span that lies nearest to a point. */
function nearest({ from, to }: { from: Point; to: Point }, { x, y }: Point): Point {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  const square = dx * dx + dy * dy;
  const share = square > 0 ? Math.min(1, Math.max(0, ((x - from.x) * dx + (y - from.y) * dy) / square)) : 0;
  return { x: from.x + share * dx, y: from.y + share * dy };
}

/** Whether the belt lies on that side of its pulley, towards a point. */
function isWrapped({ x, y, arrive, turn, wrap }: Contact, towards: Point): boolean {
  const angle = (point: Point) => Math.atan2(point.y - y, point.x - x);
  const along = (turn * (angle(towards) - angle(arrive))) / (2 * Math.PI);
  return (along - Math.floor(along)) * 2 * Math.PI <= wrap;
}

function wrapWords(pulley: Pulley, number: number, wrap: number, thickness: number): string[] {
  const words: string[] = [];
  const shown = `${wrap.toFixed(wrap < 10 ? 1 : 0)}°`;
  if (wrap < bareTouch)
    words.push(`Pulley ${number} has only ${shown} of wrap: a little slack and the belt leaves it.`);
  else if (wrap < (pulley.wrap === "inside" ? drivingWrap - 1e-6 : guidingWrap))
    words.push(
      `Pulley ${number} has only ${shown} of wrap: enough to guide the belt, little to drive with (common practice, no source: ${drivingWrap}°).`,
    );
  if (pulley.diameter < leastDiameter * thickness)
    words.push(`Pulley ${number} is small for this belt: less than ${leastDiameter} times its thickness across.`);
  return words;
}

/**
 * What to mind about a route that closes, in words; `pulley` counts from 0, the words from 1.
 *
 * Told: little wrap, a pulley small against the belt, a straight part that runs into another pulley, and a belt that
 * crosses or touches itself. Each of the last two once, at the first place, however often it happens.
 */
export function beltWarnings(
  pulleys: readonly Pulley[],
  contacts: readonly Contact[],
  thickness: number,
  isCrossed: boolean,
): BeltWarning[] {
  const warnings: BeltWarning[] = pulleys.flatMap((pulley, i) =>
    wrapWords(pulley, i + 1, degrees(contacts[i]!.wrap), thickness).map((words) => ({ pulley: i, words })),
  );
  const count = contacts.length;
  const spanName = (i: number) => `${i + 1} to ${((i + 1) % count) + 1}`;
  let touching = "";
  const touch = (one: string, other: string) => {
    touching ||= `The belt touches itself: ${one} lies against ${other}.`;
  };

  for (let i = 0; i < count; i++) {
    const line = spanOf(contacts, i);
    const next = (i + 1) % count;
    for (const [k, contact] of contacts.entries()) {
      if (k === i || k === next) continue;
      const point = nearest(line, contact);
      const gap = apart(point, contact) - contact.radius;
      // The middle line of the belt on this pulley lies at its radius, the pulley's face half a thickness further in.
      if (gap < -1e-9) warnings.push({ pulley: k, words: `The belt from ${spanName(i)} runs into pulley ${k + 1}.` });
      else if (gap < thickness && isWrapped(contact, point)) touch(`${spanName(i)}`, `pulley ${k + 1}`);
    }
    for (let j = i + 2; j < count; j++) {
      if ((j + 1) % count === i) continue;
      const other = spanOf(contacts, j);
      const ends: [Point, Point][] = [
        [line.from, nearest(other, line.from)],
        [line.to, nearest(other, line.to)],
        [other.from, nearest(line, other.from)],
        [other.to, nearest(line, other.to)],
      ];
      if (ends.some(([a, b]) => apart(a, b) < thickness)) touch(spanName(i), spanName(j));
    }
  }

  const crossing = beltCrossings(contacts)[0];
  if (isCrossed) warnings.push({ pulley: null, words: "A crossed belt rubs on itself where it crosses." });
  else if (crossing)
    warnings.push({ pulley: null, words: `The belt crosses itself: ${crossing.map(spanName).join(" and ")}.` });
  else if (touching) warnings.push({ pulley: null, words: touching });
  return warnings;
}
