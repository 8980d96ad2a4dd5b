import { ProviderError } from "./ProviderError";

/**
 * Smallest amount that can be charged, in minor units: 0.50 EUR. The description says "0.50 US or equivalent in charge
 * currency" (`POST /v1/payment_intents`, `amount`); the stand-in takes 50 minor units for every currency.
 */
const MINIMUM_AMOUNT = 50;
/** "The amount value supports up to eight digits" (same place). */
const MAXIMUM_AMOUNT = 99_999_999;

/** Refuses an amount that could not be charged, naming the parameter where there is one. */
export function checkAmount(amount: number, param?: string): void {
  const where = param === undefined ? {} : { param };
  if (amount < MINIMUM_AMOUNT) {
    throw new ProviderError(400, "The total amount due must add up to at least 0.50.", {
      code: "amount_too_small",
      ...where,
    });
  }
  if (amount > MAXIMUM_AMOUNT) {
    throw new ProviderError(400, "The total amount due must have at most eight digits.", {
      code: "amount_too_large",
      ...where,
    });
  }
}
