import { rubberTolerance, type ToleranceClass } from "./rubberTolerance";

/** What a workshop states of one dimension: its nominal and, where it says so, +/- in mm or a class of ISO 3302-1. */
export type StatedSize = { nominalMm: number; plusMinusMm?: number; toleranceClass?: ToleranceClass };

export type PartTolerance = {
  plusMinusMm: number;
  basis: "stated" | "class" | "assumed";
  toleranceClass?: ToleranceClass;
};

/** The class taken where a workshop states neither tolerance nor class; always shown as assumed. */
export const assumedClass: ToleranceClass = "M3";

/**
 * The tolerance of a stated size, in mm: as stated, else by its class, else by the assumed class M3.
 * Classes are taken for fixed dimensions (ISO 3302-1): a listing does not say where the mould parts.
 */
export function partTolerance({ nominalMm, plusMinusMm, toleranceClass }: StatedSize): PartTolerance {
  if (plusMinusMm !== undefined) return { plusMinusMm, basis: "stated" };
  const taken = toleranceClass ?? assumedClass;
  return {
    plusMinusMm: rubberTolerance(taken, nominalMm, "fixed").plusMinusMm,
    basis: toleranceClass ? "class" : "assumed",
    toleranceClass: taken,
  };
}
