export const verdicts = ["sure", "likely", "chancy", "unfit"] as const;
export type Verdict = (typeof verdicts)[number];

/** The least chance that earns each verdict, ends included. */
export const verdictThresholds = { sure: 0.9, likely: 0.6, chancy: 0.2 } as const;

/** The verdict that a fit chance (0 to 1) earns. */
export function verdictOf(chance: number): Verdict {
  if (chance >= verdictThresholds.sure) return "sure";
  if (chance >= verdictThresholds.likely) return "likely";
  return chance >= verdictThresholds.chancy ? "chancy" : "unfit";
}
