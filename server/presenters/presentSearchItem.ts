import type { Evidence, PartSummary, WorkshopSummary } from "#shared/schemas/part";
import type { SearchItem } from "#shared/schemas/search";
import { explainFit } from "../search/assessRow";
import type { Ranked } from "../search/rankCandidates";
import { presentFit } from "./presentFit";

/** A ranked part as it stands in a row of results. `severalPoints` has the fit say for which service point it holds. */
export function presentSearchItem(
  { row, assessed }: Ranked,
  beside: { part: PartSummary; workshop: WorkshopSummary; evidence: Evidence; severalPoints: boolean },
): SearchItem {
  const { severalPoints, ...shown } = beside;
  const pointName = severalPoints ? (assessed?.target.point?.name ?? null) : null;
  return {
    ...shown,
    fit: assessed && presentFit(explainFit(row, assessed.target), pointName),
    kitLineId: row.kitLineId,
    landedMinor: row.landedMinor,
    shippingMinor: row.shippingMinor,
    currency: row.currency,
  };
}
