import { type AcceptedBand, defaultBand } from "#shared/domain/acceptedBands";
import { conformanceProbability } from "#shared/domain/conformance";
import { traitsOf } from "#shared/domain/dimensionTraits";
import { longestLengthMm, parseLength } from "#shared/domain/length";
import { rubberTolerance, type ToleranceClass, toleranceClasses } from "#shared/domain/rubberTolerance";
import { rectangular } from "#shared/domain/uncertainty";
import type { SizeUnit } from "../../../lib/formatSize";
import type { ToleranceState } from "./toleranceState";

export type ClassAt = {
  name: ToleranceClass;
  plusMinusMm: number;
  /** That a part of this class lies in the band; null without one. */
  chance: number | null;
};
export type ClassesAt = {
  nominalMm: number;
  needMm: number;
  classes: ClassAt[];
  /** The row of the table: over, up to and including; null for the percentages. */
  range: [over: number, upTo: number | null];
  band: AcceptedBand | null;
  /** A hole or a loop: the rubber lies outside of the size. */
  isInside: boolean;
};
export type ToleranceErrors = Partial<Record<"size" | "need", string>>;

function readSize(text: string, unit: SizeUnit): { mm?: number; error?: string } {
  const read = parseLength(text, unit);
  if (!read.ok) return { error: read.problem };
  if (!(read.mm >= 0.01)) return { error: `From 0.01 up to ${longestLengthMm} mm.` };
  return { mm: read.mm };
}

/** What every class means for what was written; `result` is null while a field is wrong, and `errors` says which. */
export function classesAt(
  state: ToleranceState,
  unit: SizeUnit,
): { result: ClassesAt | null; errors: ToleranceErrors } {
  const { place, mould } = state;
  const size = readSize(state.size, unit);
  const need = place && state.need.trim() ? readSize(state.need, unit) : size;
  if (size.mm === undefined || need.mm === undefined) {
    const errors = {
      ...(size.error && { size: size.error }),
      ...(need !== size && need.error && { need: need.error }),
    };
    return { result: null, errors };
  }
  const [nominalMm, needMm] = [size.mm, need.mm];
  const band = place && defaultBand(place.kind, place.dimension, needMm);
  const classes = toleranceClasses.map((name) => {
    const { plusMinusMm } = rubberTolerance(name, nominalMm, mould);
    return {
      name,
      plusMinusMm,
      chance: band && conformanceProbability(nominalMm, rectangular(plusMinusMm), band),
    };
  });
  const { range } = rubberTolerance("M1", nominalMm, mould);
  const isInside =
    place !== null && (traitsOf(place.kind, place.dimension).inside || place.dimension === "insideCircumference");
  return { result: { nominalMm, needMm, classes, range, band, isInside }, errors: {} };
}
