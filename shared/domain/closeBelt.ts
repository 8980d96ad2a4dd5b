import { beltCrossings, leftOf, spanOf } from "./beltCrossings";
import type { Pulley } from "./beltRoute";
import { beltTangents, type Contact, noGapMm } from "./beltTangents";
import { DomainError } from "./DomainError";

type Sense = 1 | -1;
type Senses = [Sense, Sense];
type Attempt = {
  contacts: Contact[];
  /** Full turns of the belt, inside wraps counted up and back wraps down: 1 closes, 0 is a figure of eight. */
  turns: number;
  isClean: boolean;
};

/** Twice the signed area of the polygon of centres over the square of its girth: a pure number, 0 for a line. */
function winding(pulleys: readonly Pulley[]): number {
  let [area, girth] = [0, 0];
  for (const [i, { x, y }] of pulleys.entries()) {
    const next = pulleys[(i + 1) % pulleys.length]!;
    // From the first centre, so that digits survive far from the origin.
    const [x0, y0] = [pulleys[0]!.x, pulleys[0]!.y];
    area += (x - x0) * (next.y - y0) - (next.x - x0) * (y - y0);
    girth += Math.hypot(next.x - x, next.y - y);
  }
  const share = girth > 0 ? area / girth ** 2 : 0;
  return Math.abs(share) < 1e-12 ? 0 : share;
}

/** The sense that the order of the inside pulleys gives, else that of all of them; and the other one. */
function sensesOf(pulleys: readonly Pulley[]): Senses {
  const inside = pulleys.filter(({ wrap }) => wrap === "inside");
  const first = (winding(inside) || winding(pulleys)) < 0 ? -1 : 1;
  return [first, first === 1 ? -1 : 1];
}

function attempt(pulleys: readonly Pulley[], thickness: number, sense: Sense): Attempt | undefined {
  const contacts = beltTangents(
    pulleys.map(({ x, y, diameter, wrap }) => ({
      x,
      y,
      radius: (diameter + thickness) / 2,
      turn: (wrap === "inside" ? sense : -sense) as Sense,
    })),
  );
  if (!contacts) return undefined;
  const total = contacts.reduce((sum, { wrap, turn }) => sum + sense * turn * wrap, 0);
  return { contacts, turns: Math.round(total / (2 * Math.PI)), isClean: beltCrossings(contacts).length === 0 };
}

const closesCleanly = (tried: Attempt | undefined) => tried?.turns === 1 && tried.isClean;

/**
 * What leaving one pulley out would do: whether the rest close, and how far the pulley then stays clear of the belt that
 * goes past it, mm. Less than 0: it would be in the way, so it is the order or the side that is wrong. Not a number where
 * the rest have no route.
 */
function without(pulleys: readonly Pulley[], thickness: number, [sense, other]: Senses, index: number) {
  const rest = pulleys.filter((_, i) => i !== index);
  const tried = attempt(rest, thickness, sense);
  const { wrap, diameter } = pulleys[index]!;
  const past = tried && spanOf(tried.contacts, (index || rest.length) - 1);
  const aside = past ? leftOf(past, pulleys[index]!) : Number.NaN;
  const clear = (wrap === "inside" ? sense : -sense) * aside - (diameter + thickness) / 2;
  return {
    index,
    clear,
    closes: closesCleanly(tried) || closesCleanly(attempt(rest, thickness, other)),
    // A pulley that is touched may free others when it goes, so what stays clear is named before what makes the rest close.
    rank: (clear > -noGapMm ? 2 : 0) + (closesCleanly(tried) ? 1 : 0),
  };
}

/**
 * The line of a belt that really closes round these pulleys, and whether it is crossed (a figure of eight).
 *
 * Limits: expects pulleys that do not overlap and have room for the belt (`solveBeltRoute` sees to that).
 * Sense:  that of the order of the inside pulleys; two of them, or centres in one line, leave it open: then that of the
 *         order of all pulleys if it closes, else the other.
 * Errors: DomainError naming the pulley that is not touched ("pulleys/1"). A total of no turns is taken for a crossed
 *         belt with two pulleys, and with more only if no pulley can be left out so that the rest close in one turn.
 */
export function closeBelt(pulleys: readonly Pulley[], thickness: number): { contacts: Contact[]; isCrossed: boolean } {
  const senses = sensesOf(pulleys);
  const given = attempt(pulleys, thickness, senses[0]);
  // As a rule this is all; a belt that is dragged is worked out in every frame.
  if (given && closesCleanly(given)) return { contacts: given.contacts, isCrossed: false };
  const other = attempt(pulleys, thickness, senses[1]);
  const tries = [given, other].filter((tried) => tried !== undefined);
  // Round an idler that hangs free, the wrong sense adds up to one turn too, by looping through itself: hence clean ones.
  const good = tries.find(closesCleanly) ?? (given?.turns === 1 ? given : undefined);
  if (good) return { contacts: good.contacts, isCrossed: false };

  const eight = tries.find(({ turns }) => turns === 0);
  if (eight && pulleys.length === 2) return { contacts: eight.contacts, isCrossed: true };
  if (tries.some(({ turns, isClean }) => turns === -1 && isClean)) {
    const back = pulleys.findIndex(({ wrap }) => wrap === "back");
    throw new DomainError(
      `pulleys/${back}`,
      `The belt runs round pulley ${back + 1}, which is on its back: inside and back are the wrong way round here.`,
    );
  }
  const left = pulleys.map((_, i) => without(pulleys, thickness, senses, i));
  if (eight && !left.some(({ closes }) => closes)) return { contacts: eight.contacts, isCrossed: true };

  const named = left.reduce((a, b) => (b.rank > a.rank || (b.rank === a.rank && b.clear > a.clear) ? b : a));
  const [what, how] =
    named.rank > 1
      ? ["does not touch", "Move it to the belt, change its side"]
      : ["cannot close at", "Change its side"];
  throw new DomainError(
    `pulleys/${named.index}`,
    `The belt ${what} pulley ${named.index + 1}. ${how} or its place in the order, or leave it out.`,
  );
}
