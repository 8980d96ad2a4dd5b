import type { Evidence, PartSummary } from "#shared/schemas/part";
import type { SearchItem } from "#shared/schemas/search";
import type { Ranked } from "../search/rankCandidates";
import { presentFit } from "./presentFit";

/** A ranked part as it stands in a row of results. `severalPoints` has the fit say for which service point it holds. */
export function presentSearchItem(
  { row, seller, assessed, landedMinor, shippingMinor }: Ranked,
  { part, evidence, severalPoints }: { part: PartSummary; evidence: Evidence; severalPoints: boolean },
): SearchItem {
  return {
    part,
    workshop: seller.summary,
    fit: assessed && presentFit(assessed.fit, severalPoints ? (assessed.target.point?.name ?? null) : null),
    kitLineId: row.kitLineId,
    landedMinor,
    shippingMinor,
    currency: row.currency,
    evidence,
  };
}
