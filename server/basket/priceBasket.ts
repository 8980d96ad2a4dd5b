import { countryName } from "#shared/domain/countries";
import { shareOut, taxIncluded } from "#shared/domain/money";
import { type PostageRate, postageOf } from "#shared/domain/postage";
import type { Part } from "../models/Part";
import type { Workshop } from "../models/Workshop";
import { largestPaymentMinor, marketCurrency } from "./marketCurrency";

type PricedPart = Pick<
  Part,
  "id" | "title" | "priceMinor" | "currency" | "stockOnHand" | "stockReserved" | "leadDays" | "madeToSize" | "state"
>;
type PricedWorkshop = Pick<Workshop, "id" | "name" | "state" | "dispatchDays" | "commissionBasisPoints">;

export type WantedLine<P extends PricedPart = Part> = {
  part: P;
  quantity: number;
  forNeed: string | null;
  /** Pieces of it that the same buyer's unpaid orders hold. */
  heldAlready: number;
};

/** What one workshop asks for sending to one country. */
export type Terms<W extends PricedWorkshop = Workshop> = {
  workshop: W;
  /** Null where it does not ship there. */
  postage: (PostageRate & { currency: string }) | null;
  /** 0 where it is not registered for tax there. */
  taxRateBasisPoints: number;
};

/** Why a line cannot be bought as it stands: a short name for the program, words for the buyer. */
export type LineProblem = { name: "not-sold" | "short" | "other-currency" | "too-dear"; words: string };

export type PricedLine<P extends PricedPart = Part> = WantedLine<P> & {
  unitMinor: number;
  lineMinor: number;
  taxMinor: number;
  problem: LineProblem | null;
};

export type PricedParcel<P extends PricedPart = Part, W extends PricedWorkshop = Workshop> = {
  workshop: W;
  lines: PricedLine<P>[];
  partsMinor: number;
  shippingMinor: number;
  taxMinor: number;
  taxRateBasisPoints: number;
  totalMinor: number;
  commissionMinor: number;
  leavesInDays: number;
  problem: string | null;
};

export type Totals = { partsMinor: number; shippingMinor: number; taxMinor: number; totalMinor: number };

const sum = (amounts: readonly number[]) => amounts.reduce((total, amount) => total + amount, 0);

/** Amounts of several parcels together. */
export function totalsOf(parcels: readonly Totals[]): Totals {
  return {
    partsMinor: sum(parcels.map(({ partsMinor }) => partsMinor)),
    shippingMinor: sum(parcels.map(({ shippingMinor }) => shippingMinor)),
    taxMinor: sum(parcels.map(({ taxMinor }) => taxMinor)),
    totalMinor: sum(parcels.map(({ totalMinor }) => totalMinor)),
  };
}

function problemOf(
  { part, quantity, heldAlready }: WantedLine<PricedPart>,
  workshop: PricedWorkshop,
): LineProblem | null {
  if (part.state !== "published" || workshop.state !== "admitted") {
    return { name: "not-sold", words: "This is no longer sold: take it out of the basket" };
  }
  if (part.currency !== marketCurrency) {
    return {
      name: "other-currency",
      words: `This is sold in ${part.currency}; only ${marketCurrency} can be paid yet`,
    };
  }
  if (part.priceMinor * quantity > largestPaymentMinor) {
    return { name: "too-dear", words: "This is more than can be paid at once: take fewer" };
  }
  const left = part.stockOnHand === null ? null : part.stockOnHand - part.stockReserved;
  if (left === null || left >= quantity) return null;
  if (heldAlready > 0) {
    return { name: "short", words: `Your own unpaid order holds ${heldAlready} of it: pay or cancel that order first` };
  }
  return { name: "short", words: left > 0 ? `Only ${left} left: take fewer` : "None is left at the moment" };
}

/** The marketplace's share of a sale: basis points of the parts, without postage; halves rounded up. */
export function commissionOf(partsMinor: number, basisPoints: number): number {
  return Math.floor((partsMinor * basisPoints + 5_000) / 10_000);
}

function priceParcel<P extends PricedPart, W extends PricedWorkshop>(
  { workshop, postage, taxRateBasisPoints }: Terms<W>,
  wanted: readonly WantedLine<P>[],
  shipTo: string,
): PricedParcel<P, W> {
  const lines = wanted.map((line) => ({ ...line, problem: problemOf(line, workshop) }));
  const bought = lines.filter(({ problem }) => problem === null);
  const amounts = bought.map(({ part, quantity }) => part.priceMinor * quantity);
  const partsMinor = sum(amounts);
  const usable = postage?.currency === marketCurrency ? postage : null;
  const pieces = sum(bought.map(({ quantity }) => quantity));
  const shippingMinor = usable && pieces > 0 ? postageOf(usable, { pieces, partsMinor }) : 0;
  const totalMinor = partsMinor + shippingMinor;
  const taxMinor = taxIncluded(totalMinor, taxRateBasisPoints);
  // Postage carries its own share of the tax, so that the lines never say more than the goods bear.
  const taxes = partsMinor > 0 ? shareOut(taxMinor, [...amounts, shippingMinor]) : [];
  const taxOf = new Map(bought.map(({ part }, index) => [part.id, taxes[index] ?? 0]));
  return {
    workshop,
    lines: lines.map((line) => ({
      ...line,
      unitMinor: line.part.priceMinor,
      lineMinor: line.part.priceMinor * line.quantity,
      taxMinor: taxOf.get(line.part.id) ?? 0,
    })),
    partsMinor,
    shippingMinor,
    taxMinor,
    taxRateBasisPoints,
    totalMinor,
    commissionMinor: commissionOf(partsMinor, workshop.commissionBasisPoints),
    leavesInDays: workshop.dispatchDays + Math.max(0, ...lines.map(({ part }) => part.leadDays)),
    problem: usable ? null : `${workshop.name} does not ship to ${countryName(shipTo)}`,
  };
}

/**
 * What a basket costs, parcel by parcel, in minor units of the market's currency.
 *
 * Shape:  each entry is one workshop's terms with the lines wanted of it. Prices and postage are what the buyer pays:
 *         tax is contained in them, on parts and postage alike.
 * Limits: a line with a problem is shown and not counted, in no sum; a parcel that cannot be sent costs no postage.
 */
export function priceBasket<P extends PricedPart, W extends PricedWorkshop>(
  parcels: readonly { terms: Terms<W>; lines: readonly WantedLine<P>[] }[],
  shipTo: string,
): Totals & { parcels: PricedParcel<P, W>[] } {
  const priced = parcels.map(({ terms, lines }) => priceParcel(terms, lines, shipTo));
  return { parcels: priced, ...totalsOf(priced) };
}
