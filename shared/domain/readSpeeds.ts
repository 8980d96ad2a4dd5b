import { DomainError } from "./DomainError";
import { readNumber } from "./readNumber";

/** More rings than these do not fit on a disc of paper. */
export const mostSpeeds = 6;

/**
 * Speeds in rpm from a list with commas: "16 2/3,33 1/3,45". Each is read as people write it, with a point for
 * decimals; a speed that stands there twice counts once.
 *
 * Errors: DomainError on "speeds" for none, more than six, or what is no number. The range is the stroboscope's affair.
 */
export function readSpeeds(text: string): number[] {
  const speeds = text.split(",").map((piece) => {
    const written = piece.trim();
    const read = readNumber(written);
    const [only] = typeof read === "string" ? [] : read;
    const rpm = only ? only.numerator / only.denominator : 0;
    if (!(rpm > 0) || !Number.isFinite(rpm)) {
      throw new DomainError("speeds", "Write speeds in turns a minute with commas between, like 33 1/3, 45.");
    }
    return rpm;
  });
  const different = [...new Set(speeds)];
  if (different.length > mostSpeeds) throw new DomainError("speeds", `Choose at most ${mostSpeeds} speeds.`);
  return different;
}
