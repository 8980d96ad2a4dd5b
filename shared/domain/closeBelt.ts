import { beltCrossings } from "./beltCrossings";
import type { Pulley } from "./beltRoute";
import { beltTangents, type Contact } from "./beltTangents";
import { DomainError } from "./DomainError";

type Sense = 1 | -1;
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
function sensesOf(pulleys: readonly Pulley[]): [Sense, Sense] {
  const inside = pulleys.filter(({ wrap }) => wrap === "inside");
  const first = (winding(inside) || winding(pulleys)) < 0 ? -1 : 1;
  return [first, first === 1 ? -1 : 1];
}

function attempt(pulleys: readonly Pulley[], thickness: number, sense: Sense): Attempt[] {
  const contacts = beltTangents(
    pulleys.map(({ x, y, diameter, wrap }) => ({
      x,
      y,
      radius: (diameter + thickness) / 2,
      turn: (wrap === "inside" ? sense : -sense) as Sense,
    })),
  );
  if (!contacts) return [];
  const total = contacts.reduce((sum, { wrap, turn }) => sum + sense * turn * wrap, 0);
  return [{ contacts, turns: Math.round(total / (2 * Math.PI)), isClean: beltCrossings(contacts).length === 0 }];
}

const attempts = (pulleys: readonly Pulley[], thickness: number): Attempt[] =>
  sensesOf(pulleys).flatMap((sense) => attempt(pulleys, thickness, sense));

/**
 * A route that turns once. The sense that is not given by the order is taken only where nothing crosses there: round an
 * idler that hangs free, the wrong sense adds up to one turn too, by looping through itself.
 */
const closed = (tries: readonly Attempt[]): Attempt | undefined =>
  tries.find(({ turns, isClean }) => turns === 1 && isClean) ?? tries.slice(0, 1).find(({ turns }) => turns === 1);

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
  const tries = attempts(pulleys, thickness);
  const good = closed(tries);
  if (good) return { contacts: good.contacts, isCrossed: false };

  const back = pulleys.findIndex(({ wrap }) => wrap === "back");
  if (tries.some(({ turns, isClean }) => turns === -1 && isClean)) {
    const words = "Inside and back are the wrong way round here: pulleys that the belt runs round are inside.";
    throw new DomainError(`pulleys/${back}`, `Pulley ${back + 1} cannot touch the back. ${words}`);
  }
  const eight = tries.find(({ turns }) => turns === 0);
  const contacts = (eight ?? tries[0])?.contacts ?? [];
  const byWrap = pulleys.map((_, i) => i).sort((a, b) => (contacts[b]?.wrap ?? 0) - (contacts[a]?.wrap ?? 0));
  const free = byWrap.find((left) =>
    closed(
      attempts(
        pulleys.filter((_, i) => i !== left),
        thickness,
      ),
    ),
  );
  if (eight && (pulleys.length === 2 || free === undefined)) return { contacts, isCrossed: true };

  const named = free ?? byWrap[0] ?? 0;
  throw new DomainError(
    `pulleys/${named}`,
    `The belt does not touch pulley ${named + 1}. Move it to the belt, change its side or its place in the order, or leave it out.`,
  );
}
