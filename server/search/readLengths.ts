import { parseLength } from "#shared/domain/length";
import { dimensionNames } from "#shared/domain/partKinds";
import type { FieldError } from "#shared/problems";
import type { NeedQuery } from "#shared/schemas/need";
import { AppError } from "../errors/AppError";
import type { Reading } from "./needDimension";

/** One field or several that are not right, each in words; the first of them is also the whole's. */
export function refused(errors: readonly FieldError[], cause?: unknown): AppError {
  return new AppError("invalid-request", errors[0]?.detail, { errors: [...errors], cause });
}

/** The lengths of a query as they were written. Errors: `invalid-request` with a pointer for each that is not clear. */
export function readLengths(query: NeedQuery): Reading[] {
  const readings: Reading[] = [];
  const errors: FieldError[] = [];
  for (const dimension of dimensionNames) {
    const text = query[dimension];
    if (text === undefined) continue;
    const parsed = parseLength(text, query.unit);
    if (parsed.ok) {
      const { mm, roundedToMm, echo } = parsed;
      readings.push({ dimension, text, mm, roundedToMm, echo });
    } else errors.push({ pointer: `#/${dimension}`, detail: parsed.problem });
  }
  if (errors.length > 0) throw refused(errors);
  return readings;
}
