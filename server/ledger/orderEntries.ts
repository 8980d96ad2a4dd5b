import type { Order } from "../models/Order";
import type { Parcel } from "../models/Parcel";
import type { Entry } from "./bookTransaction";

/** An order is paid: the provider holds the money, we hold each workshop's share for it and keep the commission. */
export function paidEntries(order: Order, parcels: readonly Parcel[]): Entry[] {
  const { currency } = order;
  const commission = parcels.reduce((sum, { commissionMinor }) => sum + commissionMinor, 0);
  return [
    { account: "provider-balance", amountMinor: order.totalMinor, currency },
    ...parcels.map(({ workshopId, totalMinor, commissionMinor }) => ({
      account: "workshop-held" as const,
      workshopId,
      amountMinor: commissionMinor - totalMinor,
      currency,
    })),
    { account: "commission", amountMinor: -commission, currency },
  ];
}

/** A payment came for an order that cannot be carried out: the money is owed back. */
export const owedBackEntries = ({ totalMinor, currency }: Order): Entry[] => [
  { account: "provider-balance", amountMinor: totalMinor, currency },
  { account: "refunds", amountMinor: -totalMinor, currency },
];

/** What was owed back has gone back. */
export const paidBackEntries = ({ totalMinor, currency }: Order): Entry[] => [
  { account: "refunds", amountMinor: totalMinor, currency },
  { account: "provider-balance", amountMinor: -totalMinor, currency },
];
