import { roundDecimal } from "#shared/domain/roundDecimal";

/** The least that is told: below it a speed counts as right. */
const rightPercent = 0.005;

const parts: readonly (readonly [upToCents: number, words: string])[] = [
  [3, "less than a twentieth of a semitone"],
  [7.5, "about a twentieth of a semitone"],
  [15, "about a tenth of a semitone"],
  [29, "about a quarter of a semitone"],
  [41, "about a third of a semitone"],
  [58, "about half a semitone"],
  [85, "about three quarters of a semitone"],
  [125, "about a semitone"],
];

/** How much a pitch is off, in words for whoever thinks in notes. */
export function semitoneWords(cents: number): string {
  const size = Math.abs(cents);
  const part = parts.find(([upTo]) => size < upTo);
  if (part) return part[1];
  const semitones = Math.round(size / 50) / 2;
  if (semitones % 12 === 0) return semitones === 12 ? "about an octave" : `about ${semitones / 12} octaves`;
  return `about ${semitones} semitones`.replace(".5", "½");
}

/** A percentage with the decimals that it is worth, and its sign: "+1.35", "-0.26". */
export function signed(value: number, decimals = 2): string {
  if (Math.abs(value) >= 1e6) return `+${value.toPrecision(2)}`;
  const text = roundDecimal(value, Math.abs(value) >= 100 ? Math.min(decimals, 1) : decimals);
  return (Number(text) > 0 ? `+${text}` : text).replace("-", "−");
}

/** "3.2 % fast: about half a semitone." */
export function errorSentence(errorPercent: number, errorCents: number): string {
  const size = Math.abs(errorPercent);
  if (size < rightPercent) return "Just right.";
  if (errorPercent > 1000) return "More than ten times too fast.";
  const way = errorPercent > 0 ? "fast" : "slow";
  const figure = roundDecimal(size, size >= 1 ? 1 : 2);
  return `${figure}\u00a0% ${way}: ${semitoneWords(errorCents)} ${errorCents > 0 ? "sharp" : "flat"}.`;
}
