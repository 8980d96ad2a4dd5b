import type { OrderLine } from "#shared/schemas/order";
import type { OrderLine as OrderLineRow } from "../models/OrderLine";

/** A part of a parcel, as it was listed when bought. */
export function presentOrderLine(line: OrderLineRow): OrderLine {
  const { id, partId, title, forNeed, quantity, unitMinor, lineMinor, taxMinor, madeToSize } = line;
  const { kind, dimensions } = line.listing;
  return { id, partId, title, kind, dimensions, forNeed, quantity, unitMinor, lineMinor, taxMinor, madeToSize };
}
