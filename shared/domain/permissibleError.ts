import { DomainError } from "./DomainError";
import { type Instrument, instrumentFacts } from "./instruments";

type ErrorOptions = {
  /** An inside size (bore): callipers measure it with their inside jaws. */
  inside?: boolean;
  /** A rule or tape laid with its end surface, not a line, at the edge. */
  fromEnd?: boolean;
};
export type PermissibleError = { plusMinusMm: number; source: string };

const noSource = "common practice, no source";
const fromMicrometres = (micrometres: number) => micrometres / 1000;

function fineCalliper(sizeMm: number): PermissibleError {
  if (sizeMm <= 100) return { plusMinusMm: fromMicrometres(20), source: "DIN 862" };
  if (sizeMm <= 600) return { plusMinusMm: fromMicrometres(30), source: "DIN 862" };
  const further = Math.ceil((sizeMm - 600) / 400);
  return { plusMinusMm: fromMicrometres(30 + 10 * further), source: `DIN 862 carried on over 600 mm, ${noSource}` };
}

function coarseCalliper(sizeMm: number): PermissibleError {
  if (sizeMm <= 300) return { plusMinusMm: fromMicrometres(50), source: "DIN 862" };
  const further = Math.ceil((sizeMm - 300) / 100);
  const source = sizeMm <= 400 ? "DIN 862" : `DIN 862 carried on over 400 mm, ${noSource}`;
  return { plusMinusMm: fromMicrometres(50 + 10 * further), source };
}

function micrometer(sizeMm: number): PermissibleError {
  const source = sizeMm <= 150 ? "DIN 863-1" : `DIN 863-1 carried on over 150 mm, ${noSource}`;
  return { plusMinusMm: fromMicrometres(3 + Math.ceil(sizeMm / 50)), source };
}

function classTwoRule(sizeMm: number, fromEnd: boolean): PermissibleError {
  const startedMetres = Math.ceil(sizeMm / 1000);
  const micrometres = 300 + 200 * startedMetres + (fromEnd ? 200 : 0);
  return { plusMinusMm: fromMicrometres(micrometres), source: "class II, UK SI 2016/1153 Schedule 1I Table 1" };
}

function ofScale(instrument: Instrument, sizeMm: number, fromEnd: boolean): PermissibleError {
  switch (instrument) {
    case "digital-caliper":
      return fineCalliper(sizeMm);
    case "dial-caliper":
      return { ...fineCalliper(sizeMm), source: "as a 0.02 mm vernier of DIN 862 (dial: from memory)" };
    case "vernier-caliper":
      return coarseCalliper(sizeMm);
    case "micrometer":
      return micrometer(sizeMm);
    case "steel-rule":
    case "tape-measure":
      return classTwoRule(sizeMm, fromEnd);
    case "printed-gauge":
      return { plusMinusMm: 0.25 + 0.002 * sizeMm, source: noSource };
    case "string":
      return { plusMinusMm: 1 + 0.005 * sizeMm, source: noSource };
  }
}

/**
 * The maximum permissible error (+/-) of a good instrument of its sort at a size, in millimetres.
 *
 * Limits: sizes above 0; where a standard's table ends its steps are carried on and `source` says so.
 * Source: DIN 862 (callipers; 20 um more with inside jaws), DIN 863-1 (micrometers), and for rules and tapes class II of
 *         UK SI 2016/1153 Schedule 1I Table 1: 0.3 + 0.2 L mm, L in metres rounded up, 0.2 more from an end surface.
 *         Printed gauges and string: common practice, no source.
 */
export function permissibleError(
  instrument: Instrument,
  sizeMm: number,
  { inside = false, fromEnd = false }: ErrorOptions = {},
): PermissibleError {
  if (!(sizeMm > 0) || !Number.isFinite(sizeMm)) throw new DomainError("sizeMm", "A size is more than zero.");
  const error = ofScale(instrument, sizeMm, fromEnd);
  if (!inside || !instrumentFacts[instrument].insideJaws) return error;
  const micrometres = Math.round(error.plusMinusMm * 1000) + 20;
  return { plusMinusMm: fromMicrometres(micrometres), source: `${error.source}, inside jaws` };
}
