import { conditionFacts } from "#shared/domain/conditions";
import { dimensionsOf } from "#shared/domain/partKinds";
import { type NeedValues, primaryOf } from "../../lib/needParams";

/**
 * A belt gauge with what the strip knows already, to be given back with the length that it finds. The one that measures
 * a sample takes the readings along; the one that works from the pulleys has no use for them.
 */
export function gaugeAddress(gauge: "belt-route" | "belt-sample", values: NeedValues): string {
  const { kind, lengths, instrument, condition, family, shipTo, unit } = values;
  const isSample = gauge === "belt-sample";
  const params = new URLSearchParams({ kind });
  for (const name of dimensionsOf(kind)) {
    const text = lengths[name]?.trim();
    if (text && (isSample || name !== primaryOf(kind))) params.set(name, text);
  }
  if (isSample) params.set("instrument", instrument);
  if (isSample && conditionFacts[condition].hasReadings) params.set("condition", condition);
  if (family) params.set("family", family);
  params.set("shipTo", shipTo);
  params.set("unit", unit);
  return `/gauges/${gauge}?${params}`;
}
