import { type Condition, conditionFacts, conditionsFor } from "#shared/domain/conditions";
import { type Instrument, instruments } from "#shared/domain/instruments";
import { parseLength } from "#shared/domain/length";
import { type DimensionName, dimensionsOf, kindFacts, type PartKind, partKinds } from "#shared/domain/partKinds";
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

/** The address of a need: only what was said, in the order in which it is said. */
export function needParams(values: NeedValues): URLSearchParams {
  const params = new URLSearchParams();
  const put = (name: string, value: string | undefined, otherwise = "") => {
    if (value && value !== otherwise) params.set(name, value);
  };
  const words = values.q.trim();
  const measured = conditionFacts[values.condition].hasReadings;
  const texts = dimensionsOf(values.kind).map((name) => [name, values.lengths[name]?.trim()] as const);
  const anySize = measured && texts.some(([, text]) => text);
  if (anySize || values.family || !words) params.set("kind", values.kind);
  if (measured) for (const [name, text] of texts) put(name, text);
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

/** Another unit to read in, without changing what any length means: bare numbers get their unit written out. */
export function withUnit(params: URLSearchParams, from: SizeUnit, to: SizeUnit): URLSearchParams {
  const next = new URLSearchParams(params);
  for (const kind of partKinds) {
    for (const name of dimensionsOf(kind)) {
      const text = next.get(name);
      if (!text) continue;
      const [now, then] = [parseLength(text, from), parseLength(text, to)];
      if (now.ok && !(then.ok && then.mm === now.mm)) next.set(name, `${text.trim()} ${from}`);
    }
  }
  next.set("unit", to);
  return next;
}

/** The dimension that the size rail runs along. */
export const primaryOf = (kind: PartKind): DimensionName => kindFacts[kind].primary;
