/** What a workshop asks for a parcel to one zone, in minor units. */
export type PostageRate = { baseMinor: number; perItemMinor: number; freeOverMinor: number | null };

/**
 * Postage of one parcel, in minor units: base + per item x pieces; nothing where the parts reach the free limit.
 *
 * Limits: `pieces` a positive integer, `partsMinor` the price of all pieces.
 */
export function postageOf(rate: PostageRate, { pieces, partsMinor }: { pieces: number; partsMinor: number }): number {
  if (rate.freeOverMinor !== null && partsMinor >= rate.freeOverMinor) return 0;
  return rate.baseMinor + rate.perItemMinor * pieces;
}
