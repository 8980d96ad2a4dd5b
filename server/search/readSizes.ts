import { parseSize } from "#shared/domain/parseSize";
import { dimensionNames } from "#shared/domain/partKinds";
import type { FieldError } from "#shared/problems";
import type { NeedQuery } from "#shared/schemas/need";
import { AppError } from "../errors/AppError";
import type { WrittenDimension } from "./needDimension";

/** One field or several that are not right, each in words; the first of them is also the whole's. */
export function refused(errors: readonly FieldError[], cause?: unknown): AppError {
  return new AppError("invalid-request", errors[0]?.detail, { errors: [...errors], cause });
}

/** The sizes of a query as they were written. Errors: `invalid-request` with a pointer for each that is not clear. */
export function readSizes(query: NeedQuery): WrittenDimension[] {
  const sizes: WrittenDimension[] = [];
  const errors: FieldError[] = [];
  for (const dimension of dimensionNames) {
    const text = query[dimension];
    if (text === undefined) continue;
    const size = parseSize(text, query.unit);
    if (size.ok) sizes.push({ dimension, text, size });
    else errors.push({ pointer: `#/${dimension}`, detail: size.problem });
  }
  if (errors.length > 0) throw refused(errors);
  return sizes;
}
