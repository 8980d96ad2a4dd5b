import { DomainError } from "./DomainError";

/** Currencies whose minor unit is not a hundredth. Source: ISO 4217 list one. */
const exponents: Record<string, number> = Object.fromEntries([
  ..."BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX UYI VND VUV XAF XOF XPF".split(" ").map((code) => [code, 0]),
  ..."BHD IQD JOD KWD LYD OMR TND".split(" ").map((code) => [code, 3]),
  ..."CLF UYW".split(" ").map((code) => [code, 4]),
]);

function checkAmount(minor: number, field: string) {
  if (!Number.isSafeInteger(minor)) throw new DomainError(field, "An amount is a whole number of minor units.");
}

/** How many decimals a currency has (ISO 4217). Throws a DomainError on "currency" for what is not a code of three capitals. */
export function currencyExponent(currency: string): number {
  if (!/^[A-Z]{3}$/.test(currency)) throw new DomainError("currency", "A currency is a code of three capital letters.");
  return exponents[currency] ?? 2;
}

/**
 * The minor units that a decimal text with a point stands for: "12.34" EUR is 1234.
 * Throws a DomainError on "amount" for other texts, for more decimals than the currency has and for amounts too large.
 */
export function toMinor(amount: string, currency: string): number {
  const exponent = currencyExponent(currency);
  const [, sign = "", whole, places = ""] = /^(-?)(\d+)(?:\.(\d+))?$/.exec(amount) ?? [];
  if (whole === undefined) throw new DomainError("amount", "Write an amount like 12.34.");
  if (places.length > exponent) throw new DomainError("amount", `${currency} has at most ${exponent} decimals.`);
  const minor = Number(whole + places.padEnd(exponent, "0"));
  checkAmount(minor, "amount");
  return sign && minor !== 0 ? -minor : minor;
}

/** The weights, finite and not negative, as whole numbers in exactly the same proportion: doubles are halves of halves. */
function exactWeights(weights: readonly number[]): bigint[] {
  const parts = weights.map((weight) => {
    let [whole, halvings] = [weight, 0];
    while (!Number.isInteger(whole)) {
      whole *= 2;
      halvings += 1;
    }
    return { whole, halvings };
  });
  const most = Math.max(...parts.map(({ halvings }) => halvings));
  return parts.map(({ whole, halvings }) => BigInt(whole) << BigInt(most - halvings));
}

/**
 * Splits an amount by weights so that the shares sum to it exactly: largest remainder (Hare's method), ties to the earlier
 * item. A negative amount is split as its absolute value and negated, so that a refund mirrors the charge.
 *
 * Errors: DomainError on "totalMinor" (not whole), "weights/<index>" (negative or not finite), "weights" (nothing to share by).
 */
export function shareOut(totalMinor: number, weights: readonly number[]): number[] {
  checkAmount(totalMinor, "totalMinor");
  const wrong = weights.findIndex((weight) => !(weight >= 0 && weight <= Number.MAX_SAFE_INTEGER));
  if (wrong >= 0) throw new DomainError(`weights/${wrong}`, "A weight is zero or more.");
  if (totalMinor === 0) return weights.map(() => 0);
  if (weights.length === 0) throw new DomainError("weights", "There is nothing to share the amount by.");

  const exact = exactWeights(weights);
  const sum = exact.reduce((a, b) => a + b, 0n);
  if (sum === 0n) throw new DomainError("weights", "There is nothing to share the amount by.");
  const total = BigInt(Math.abs(totalMinor));
  const shares = exact.map((weight, index) => ({
    index,
    floor: (total * weight) / sum,
    remainder: (total * weight) % sum,
  }));
  const left = Number(total - shares.reduce((given, { floor }) => given + floor, 0n));
  const byRemainder = [...shares].sort((a, b) =>
    a.remainder === b.remainder ? a.index - b.index : a.remainder < b.remainder ? 1 : -1,
  );
  const raised = new Set(byRemainder.slice(0, left).map(({ index }) => index));
  return shares.map(({ index, floor }) => {
    const share = Number(floor) + (raised.has(index) ? 1 : 0);
    return totalMinor < 0 && share !== 0 ? -share : share;
  });
}

/**
 * The tax contained in a gross amount: gross * rate / (100 % + rate), halves rounded up; a refund mirrors the charge.
 * The rate is in basis points (1900 is 19 %), 0 to 10000. Errors: DomainError on "grossMinor" or "rateBasisPoints".
 */
export function taxIncluded(grossMinor: number, rateBasisPoints: number): number {
  checkAmount(grossMinor, "grossMinor");
  if (!Number.isInteger(rateBasisPoints) || rateBasisPoints < 0 || rateBasisPoints > 10_000) {
    throw new DomainError("rateBasisPoints", "A tax rate is a whole number of basis points from 0 to 10000.");
  }
  const rate = BigInt(rateBasisPoints);
  const divisor = 10_000n + rate;
  const tax = Number((2n * BigInt(Math.abs(grossMinor)) * rate + divisor) / (2n * divisor));
  return grossMinor < 0 && tax !== 0 ? -tax : tax;
}

/**
 * An amount as it is shown, with the currency's own decimals: "€38.90", "US$5.00", "JP¥1,234".
 * Errors: DomainError on "minor" or "currency".
 */
export function formatMoney(minor: number, currency: string, locale = "en-GB"): string {
  checkAmount(minor, "minor");
  const exponent = currencyExponent(currency);
  const digits = String(Math.abs(minor)).padStart(exponent + 1, "0");
  const point = digits.length - exponent;
  const decimal = `${minor < 0 ? "-" : ""}${digits.slice(0, point)}${exponent > 0 ? `.${digits.slice(point)}` : ""}`;
  const format = new Intl.NumberFormat(locale, {
    style: "currency",
    currency,
    minimumFractionDigits: exponent,
    maximumFractionDigits: exponent,
  });
  // As text, so that amounts beyond the digits of a double keep their last one.
  return format.format(decimal as Intl.StringNumericLiteral);
}
