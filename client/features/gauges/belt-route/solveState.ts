import { type BeltRoute, solveBeltRoute } from "#shared/domain/beltRoute";
import { DomainError } from "#shared/domain/DomainError";
import { parseLength } from "#shared/domain/length";
import type { SizeUnit } from "../../../lib/formatSize";
import { readPlainNumber } from "../readPlainNumber";
import { withItsUnit } from "../withItsUnit";
import { type BeltState, type NamedPulley, pulleyName } from "./beltState";

export type Refusal = { pulley: number | null; words: string };
export type FieldErrors = Partial<Record<"thickness" | "min" | "max", string>>;
export type Solved = {
  route: BeltRoute | null;
  thicknessMm: number | null;
  /** Relaxed inside circumference to buy. */
  buyMm: { min: number; max: number } | null;
  /** Why there is no route, where it is not a field of the belt. */
  refusal: Refusal | null;
  errors: FieldErrors;
};

/** The numbers of pulleys in words, with the names that they were given: "Pulley 2" becomes "Idler (2)". */
export const withNames = (words: string, pulleys: readonly NamedPulley[]): string =>
  words.replace(/\bpulley (\d+)/gi, (text, number) => {
    const name = pulleys[Number(number) - 1]?.name.trim();
    return name ? `${name} (${number})` : text;
  });

function readFields({ thickness, stretch }: BeltState, unit: SizeUnit) {
  const errors: FieldErrors = {};
  const length = parseLength(thickness, unit);
  if (!length.ok) errors.thickness = length.problem;
  const [min, max] = [readPlainNumber(stretch.min), readPlainNumber(stretch.max)];
  if (min === null) errors.min = "Write a percentage, like 3.";
  if (max === null) errors.max = "Write a percentage, like 6.";
  return { errors, thicknessMm: length.ok ? length.mm : null, min, max };
}

/** The route of the state, or what keeps it from closing. */
export function solveState(state: BeltState, unit: SizeUnit): Solved {
  const { errors, thicknessMm, min, max } = readFields(state, unit);
  const none: Solved = { route: null, thicknessMm, buyMm: null, refusal: null, errors };
  if (thicknessMm === null || min === null || max === null) return none;
  try {
    const stretchPercent = { min, max };
    const route = solveBeltRoute({ pulleys: state.pulleys, thickness: thicknessMm, stretchPercent });
    // Counted on the inside, the belt in place is longer than relaxed along its inner face; else along its middle.
    const inner = route.pitchLengthMm - Math.PI * thicknessMm;
    const buyMm = state.isInsideStretch
      ? { min: inner / (1 + max / 100), max: inner / (1 + min / 100) }
      : { min: route.insideCircumferenceMm.min, max: route.insideCircumferenceMm.max };
    return { ...none, route, buyMm };
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    const [root, part] = error.field.split("/");
    if (root === "thickness") return { ...none, errors: { thickness: error.words } };
    if (root === "stretchPercent") return { ...none, errors: { [part === "min" ? "min" : "max"]: error.words } };
    const pulley = part === undefined ? null : Number(part);
    return { ...none, refusal: { pulley, words: withNames(error.words, state.pulleys) } };
  }
}

/** What is known of the length to buy at best: pulleys that were placed by hand. Common practice, no source. */
const leastHalfShare = 0.005;

/**
 * A size that the belt is to have, as one that was worked out, since there is none to measure: to 5 %, at least 0.1 mm.
 * Common practice, no source.
 */
function wantedSize(text: string, unit: SizeUnit): string {
  const read = parseLength(text, unit);
  if (!read.ok) return withItsUnit(text, unit);
  const half = Math.min(Math.max(0.1, 0.05 * read.mm), read.mm / 2);
  return `${Number(read.mm.toFixed(3))} ± ${Number(half.toFixed(3))} mm`;
}

/** The search for this belt: its length as one that was worked out, and all that the search knew before. */
export function findAddress(state: BeltState, buyMm: { min: number; max: number }, unit: SizeUnit): string {
  const mid = (buyMm.min + buyMm.max) / 2;
  const half = Math.max((buyMm.max - buyMm.min) / 2, leastHalfShare * mid);
  const params = new URLSearchParams({
    kind: state.kind,
    insideCircumference: `${mid.toFixed(1)} ± ${half.toFixed(1)} mm`,
  });
  const { kind, thickness, width, handedOn } = state;
  if (kind === "flat-belt" && width.trim()) params.set("width", wantedSize(width, unit));
  params.set(kind === "flat-belt" ? "thickness" : "section", wantedSize(thickness, unit));
  params.set("condition", "missing");
  for (const [name, value] of Object.entries(handedOn)) params.set(name, value);
  return `/find?${params}`;
}

/** What is said after a move by keyboard. */
export function spokenRoute({ pulleys }: BeltState, { route, buyMm, refusal }: Solved, id: number): string {
  const index = pulleys.findIndex((pulley) => pulley.id === id);
  const moved = pulleys[index];
  if (!moved) return "";
  const place = `${pulleyName(moved, index)} at ${moved.x}, ${moved.y}, ${moved.diameter} mm across.`;
  if (!route || !buyMm) return `${place} ${refusal?.words ?? "The belt cannot be worked out."}`;
  return `${place} ${route.pitchLengthMm.toFixed(1)} mm in place, to buy ${buyMm.min.toFixed(0)} to ${buyMm.max.toFixed(0)} mm.`;
}
