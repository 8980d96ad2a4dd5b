import type { Verdict } from "#shared/schemas/part";

export const verdictWords: Record<Verdict, string> = {
  sure: "Sure",
  likely: "Likely",
  chancy: "Chancy",
  unfit: "Won’t fit",
};

/** Good colours only for what is likely to fit; the shape and the word say the same. */
export const verdictColour: Record<Verdict, string> = {
  sure: "text-inband",
  likely: "text-inband",
  chancy: "text-ink",
  unfit: "text-outband",
};

/** "96 %", "over 99 %", "under 1 %": never a certainty that the numbers do not give. */
export function chanceWords(chance: number): string {
  if (chance > 0.99) return "over 99 %";
  if (chance < 0.01) return "under 1 %";
  return `${Math.round(chance * 100)} %`;
}
