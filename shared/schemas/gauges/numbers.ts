import { z } from "zod";
import { longestLengthMm } from "../../domain/length";

type Facts = { description?: string; minimum?: number; exclusiveMinimum?: number; maximum?: number; example?: number };

/**
 * A number whose range the computation itself checks, in its own words: the limits given here only describe it.
 * Finite at least, since JSON can write more than a double holds.
 */
export const described = (facts: Facts) => z.number().meta(facts);

/** A size in mm that the computation checks. */
export const sizeMm = (description: string, facts: Facts = {}) =>
  described({ description, exclusiveMinimum: 0, maximum: longestLengthMm, ...facts });

/** An amount in mm that may lie on either side of 0, at most 10 m from it. */
export const signedMm = z
  .number()
  .min(-longestLengthMm, "At most 10 m either way")
  .max(longestLengthMm, "At most 10 m either way");

/** A number of an answer: never infinite, never nothing. */
export const Figure = z.number();

const plainNumber = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d{1,3})?$/i;

/** A number in an address: plain decimal digits, once. Its range is the computation's affair. */
export const numberText = (facts: Facts) =>
  z
    .string("Give one number, like 44.1")
    .trim()
    .max(40, "Give one number, like 44.1")
    .regex(plainNumber, "Give one number, like 44.1")
    .transform(Number)
    .pipe(z.number())
    .meta({ ...facts, type: "number" });
