import type { z } from "zod";
import { ProviderError } from "./ProviderError";

/** `["line_items", 0, "price"]` as the provider writes it: `line_items[0][price]`. */
const nameOf = ([first, ...rest]: readonly PropertyKey[]) =>
  String(first ?? "") + rest.map((part) => `[${String(part)}]`).join("");

function refusalOf(issue: z.core.$ZodIssue): ProviderError {
  const param = nameOf(issue.path);
  if (issue.code === "unrecognized_keys") {
    const unknown = nameOf([...issue.path, issue.keys[0] ?? ""]);
    return new ProviderError(400, `Received unknown parameter: ${unknown}`, {
      code: "parameter_unknown",
      param: unknown,
    });
  }
  if (issue.code !== "custom" && issue.input === undefined) {
    return new ProviderError(400, `Missing required param: ${param}.`, { code: "parameter_missing", param });
  }
  if (issue.code === "invalid_value") {
    const allowed = issue.values.map(String).join(", ");
    return new ProviderError(400, `Invalid ${param}: must be one of ${allowed}`, { param });
  }
  const code: unknown = issue.code === "custom" ? issue.params?.code : undefined;
  return new ProviderError(400, `${issue.message} (${param})`, {
    param,
    ...(typeof code === "string" ? { code } : {}),
  });
}

/**
 * The parameters of a request, checked against the table and turned from text into values.
 * Unknown names come first, as the provider reports them; throws a 400 `ProviderError`.
 */
export function readParameters<Schema extends z.ZodType>(schema: Schema, raw: unknown): z.output<Schema> {
  const read = schema.safeParse(raw, { reportInput: true });
  if (read.success) return read.data;
  const { issues } = read.error;
  throw refusalOf(issues.find((issue) => issue.code === "unrecognized_keys") ?? issues[0]!);
}
