/** The one currency that buyers are charged in for now (ISO 4217). It still stands beside every amount. */
export const marketCurrency = "EUR";

/** The payment provider takes at most eight digits: this many minor units at once (its published description, `amount`). */
export const largestPaymentMinor = 99_999_999;
