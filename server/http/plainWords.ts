import type { z } from "zod";

const nouns: Record<string, string> = {
  number: "a number",
  int: "a whole number",
  string: "a text",
  boolean: "true or false",
  array: "a list",
  object: "its fields as a JSON object",
  record: "its fields as a JSON object",
};

function wrongType(expected: string, input: unknown): string {
  const noun = nouns[expected] ?? "something else";
  if (input === undefined || input === null) return `This is missing. Give ${noun}.`;
  if (typeof input === "number" && !Number.isFinite(input)) return "This number is too large.";
  if ((expected === "number" || expected === "int") && typeof input === "string") {
    return `Give ${noun} alone, without quotes and without a unit.`;
  }
  return `Give ${noun} here.`;
}

const choice = (values: readonly unknown[]) =>
  values.length === 1 ? `Give “${String(values[0])}” here.` : `Choose one of: ${values.map(String).join(", ")}.`;

/** "entries" or "characters" of what is counted; nothing for a number. */
const counted = (origin: string) => ({ array: " entries", string: " characters" })[origin] ?? "";

/**
 * What is wrong with a field, for somebody who repairs machines: said where the schema has no words of its own.
 * Undefined leaves it to the schema language.
 */
export const plainWords: z.core.$ZodErrorMap = (issue) => {
  switch (issue.code) {
    case "invalid_type":
      return wrongType(issue.expected, issue.input);
    case "invalid_value":
      return choice(issue.values);
    case "invalid_union":
      return Array.isArray(issue.options) ? choice(issue.options) : undefined;
    case "too_big":
      return `At most ${issue.maximum}${counted(issue.origin)}.`;
    case "too_small":
      if (issue.origin === "string" && issue.minimum === 1) return "This is empty.";
      return `${issue.inclusive ? "At least" : "More than"} ${issue.minimum}${counted(issue.origin)}.`;
    case "unrecognized_keys":
      return "Nothing of this name is known here.";
    default:
      return undefined;
  }
};
