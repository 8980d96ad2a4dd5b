import { DomainError } from "./DomainError";
import { normalQuantile } from "./normalDistribution";

/**
 * A rate of success with the interval that holds the true one with 95 % confidence (or what z stands for); each 0 to 1.
 *
 * Limits: whole counts, at least one trial (of none there is no rate: refused), z from 0 to 10.
 * Errors: DomainError on "successes", "trials", "z".
 * Source: E. B. Wilson, "Probable inference, the law of succession, and statistical inference", Journal of the American
 *         Statistical Association 22 (1927) 209-212: (p + z²/2n ± z sqrt(p(1 - p)/n + z²/4n²))/(1 + z²/n).
 */
export function wilsonInterval(
  successes: number,
  trials: number,
  z = normalQuantile(0.975),
): { rate: number; lower: number; upper: number } {
  if (!(Number.isSafeInteger(trials) && trials >= 1)) {
    throw new DomainError("trials", "Give a whole number of trials, at least 1.");
  }
  if (!(Number.isSafeInteger(successes) && successes >= 0 && successes <= trials)) {
    throw new DomainError("successes", "Give a whole number of successes, at most as many as trials.");
  }
  if (!(z >= 0 && z <= 10)) throw new DomainError("z", "Give a z from 0 to 10.");
  const rate = successes / trials;
  const spread = (z * z) / trials;
  const middle = rate + spread / 2;
  const half = z * Math.sqrt((rate * (1 - rate)) / trials + spread / (4 * trials));
  // Without rounding the ends are exactly 0 and 1 where all trials went one way, and never pass the rate.
  const lower = successes === 0 ? 0 : Math.min((middle - half) / (1 + spread), rate);
  const upper = successes === trials ? 1 : Math.max((middle + half) / (1 + spread), rate);
  return { rate, lower: Math.max(lower, 0), upper: Math.min(upper, 1) };
}
