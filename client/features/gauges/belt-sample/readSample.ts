import { type BeltSample, type BeltSampleInput, beltSampleFacts, estimateBeltSample } from "#shared/domain/beltSample";
import { DomainError } from "#shared/domain/DomainError";
import { parseLength } from "#shared/domain/length";
import { meanOf, standardDeviation } from "#shared/domain/uncertainty";
import type { BeltSampleState } from "./beltSampleState";

export type Sample = { input: BeltSampleInput; result: BeltSample; meanMm: number; scatterMm: number };
/** By field: "readings.0", "thickness". */
export type SampleErrors = Record<string, string>;

/** From what was written to the belt that it tells of; `sample` is null while a field is wrong, and `errors` says which. */
export function readSample(state: BeltSampleState): { sample: Sample | null; errors: SampleErrors } {
  const { method, instrument, condition, unit } = state;
  const errors: SampleErrors = {};
  const written = state.readings.flatMap((text, i) =>
    text.trim() === "" ? [] : [{ i, read: parseLength(text, unit) }],
  );
  if (written.length === 0) errors["readings.0"] = "Write a reading, like 262 mm.";
  const readingsMm: number[] = [];
  let resolutionMm = 0;
  for (const { i, read } of written) {
    if (!read.ok) {
      errors[`readings.${i}`] = read.problem;
      continue;
    }
    readingsMm.push(read.mm);
    resolutionMm = Math.max(resolutionMm, read.roundedToMm);
  }
  const thickness = state.thickness.trim() === "" ? null : parseLength(state.thickness, unit);
  if (thickness && !thickness.ok) errors.thickness = thickness.problem;
  if (!thickness && beltSampleFacts[method].perThickness > 0) {
    errors.thickness = "This way of measuring needs the belt's thickness.";
  }
  if (Object.keys(errors).length > 0) return { sample: null, errors };

  const thicknessMm = thickness?.ok ? thickness.mm : 0;
  const input: BeltSampleInput = { method, readingsMm, thicknessMm, instrument, condition, resolutionMm };
  try {
    const result = estimateBeltSample(input);
    return { sample: { input, result, meanMm: meanOf(readingsMm), scatterMm: standardDeviation(readingsMm) }, errors };
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    const [field, index] = error.field.split("/");
    if (field === "thicknessMm") return { sample: null, errors: { thickness: error.words } };
    return { sample: null, errors: { [`readings.${written[Number(index ?? 0)]?.i ?? 0}`]: error.words } };
  }
}
