import { type Condition, conditionFacts, conditionsFor } from "#shared/domain/conditions";
import { type Instrument, instruments } from "#shared/domain/instruments";
import { type DimensionName, dimensionsOf, kindFacts, type PartKind, partKinds } from "#shared/domain/partKinds";
import { isWorkedOut } from "#shared/domain/writtenSize";
import type { SizeUnit } from "./formatSize";

/** A need as it is written into the measure strip. */
export type NeedValues = {
  kind: PartKind;
  lengths: Partial<Record<DimensionName, string>>;
  instrument: Instrument;
  condition: Condition;
  /** Slug of a mechanism family; empty for any. */
  family: string;
  shipTo: string;
  unit: SizeUnit;
  q: string;
};
export type NeedDefaults = { shipTo: string; unit: SizeUnit };

const oneOf = <T extends string>(all: readonly T[], text: string | null, otherwise: T): T =>
  all.find((one) => one === text) ?? otherwise;

/** Reads an address leniently: what cannot be read falls back, lengths are kept as they were written. */
export function readNeed(params: URLSearchParams, defaults: NeedDefaults): NeedValues {
  const kind = oneOf(partKinds, params.get("kind"), "idler-wheel");
  const lengths: NeedValues["lengths"] = {};
  for (const name of dimensionsOf(kind)) {
    const text = params.get(name)?.trim();
    if (text) lengths[name] = text;
  }
  const country = params.get("shipTo") ?? "";
  return {
    kind,
    lengths,
    instrument: oneOf(instruments, params.get("instrument"), "digital-caliper"),
    condition: oneOf(conditionsFor(kind), params.get("condition"), "sound"),
    family: params.get("family") ?? "",
    shipTo: /^[A-Z]{2}$/.test(country) ? country : defaults.shipTo,
    unit: params.has("unit") ? oneOf(["mm", "in"], params.get("unit"), "mm") : defaults.unit,
    q: params.get("q") ?? "",
  };
}

/** A need as the server is asked: where no part is left, without what cannot have been read from one. */
export function askable(values: NeedValues): NeedValues {
  if (conditionFacts[values.condition].hasReadings) return values;
  const kept = Object.entries(values.lengths).filter(([, text]) => text && isWorkedOut(text));
  return { ...values, lengths: Object.fromEntries(kept) };
}

/** The address of a need: only what was said, in the order in which it is said. */
export function needParams(values: NeedValues): URLSearchParams {
  const params = new URLSearchParams();
  const put = (name: string, value: string | undefined, otherwise = "") => {
    if (value && value !== otherwise) params.set(name, value);
  };
  const words = values.q.trim();
  const texts = dimensionsOf(values.kind).map((name) => [name, values.lengths[name]?.trim()] as const);
  if (texts.some(([, text]) => text) || values.family || !words) params.set("kind", values.kind);
  for (const [name, text] of texts) put(name, text);
  put("instrument", values.instrument, "digital-caliper");
  put("condition", values.condition, "sound");
  put("family", values.family);
  params.set("shipTo", values.shipTo);
  put("unit", values.unit, "mm");
  put("q", words);
  return params;
}

/** The parameters of a need alone, without sorting, filters and paging: what a part page takes over from a search. */
export function needOnly(params: URLSearchParams): URLSearchParams {
  const kept = new URLSearchParams(params);
  for (const name of ["sort", "offer", "material", "minChance", "cursor", "limit"]) kept.delete(name);
  return kept;
}

/** The dimension that the size rail runs along. */
export const primaryOf = (kind: PartKind): DimensionName => kindFacts[kind].primary;

/** Whether its length can be told from its pulleys, or from it lying flat: a belt of any kind. */
export const isBelt = (kind: PartKind): boolean => primaryOf(kind) === "insideCircumference";
