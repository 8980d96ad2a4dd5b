import { z } from "zod";

/*
 * Building blocks for the parameter table. Everything arrives as strings from form encoding; a failed check carries
 * the provider's error code in `params.code` (https://docs.stripe.com/error-codes).
 */

const refusal = (code: string | undefined, message: (input: unknown) => string) => ({
  error: (issue: { input?: unknown }) => message(issue.input),
  params: { code },
});

/** Text of 1 to `max` characters. An empty string means "unset" to the provider, which a creation cannot do. */
export const text = (max = 5000) =>
  z
    .string()
    .refine(
      (value) => value !== "",
      refusal("parameter_invalid_empty", () => "You passed an empty string. It cannot be unset here."),
    )
    .refine(
      (value) => value.length <= max,
      refusal(undefined, () => `Invalid string: at most ${max} characters are allowed`),
    );

/** A whole number in [min, max]. */
export const integer = (min = 0, max = Number.MAX_SAFE_INTEGER) =>
  z
    .string()
    .refine(
      (value) => /^-?\d{1,15}$/.test(value),
      refusal("parameter_invalid_integer", (input) => `Invalid integer: ${String(input)}`),
    )
    .transform(Number)
    .refine(
      (value) => value >= min && value <= max,
      refusal("parameter_invalid_integer", () => `This value must be from ${min} to ${max}`),
    );

export const flag = () => z.enum(["true", "false"]).transform((value) => value === "true");

/** A list of at most `max` items. */
export const list = <Item extends z.ZodType>(item: Item, max = 100) => z.array(item).max(max);

/** Limits from https://docs.stripe.com/api/metadata: 50 keys of up to 40 characters, values of up to 500. */
export const metadata = () =>
  z.preprocess(
    (value) => (value === "" ? {} : value),
    z.record(z.string().max(40), z.string().max(500)).refine(
      (pairs) => Object.keys(pairs).length <= 50,
      refusal(undefined, () => "Metadata can hold at most 50 keys"),
    ),
  );

/** An absolute http(s) address of up to 5000 characters; `{CHECKOUT_SESSION_ID}` may stand in it. */
export const address = () =>
  text(5000).refine(
    (value) => /^https?:\/\//.test(value) && URL.canParse(value.replaceAll("{CHECKOUT_SESSION_ID}", "cs")),
    refusal("url_invalid", () => "Not a valid URL"),
  );

const currencies = new Set(Intl.supportedValuesOf("currency").map((code) => code.toLowerCase()));

/** An ISO 4217 code in lower case. */
export const currency = () =>
  z
    .string()
    .transform((value) => value.toLowerCase())
    .refine(
      (value) => currencies.has(value),
      refusal(undefined, (input) => `Invalid currency: ${String(input)}`),
    );

/** Described by the provider but not acted out here: refused aloud, so that nobody relies on it in silence. */
export const notPlayed = () =>
  z
    .custom<never>(
      () => false,
      refusal(undefined, () => "The payment stand-in does not act out this parameter"),
    )
    .optional();

/** `created` as an exact second or as bounds. */
export const created = () =>
  z.preprocess(
    (value) => (typeof value === "string" ? { gte: value, lte: value } : value),
    z.strictObject({
      gt: integer().optional(),
      gte: integer().optional(),
      lt: integer().optional(),
      lte: integer().optional(),
    }),
  );

/** Parameters that every list takes. */
export const paging = {
  limit: integer(1, 100).optional(),
  starting_after: text().optional(),
  ending_before: text().optional(),
};

export const expand = list(text(), 20).optional();
