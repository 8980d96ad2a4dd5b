import type Stripe from "stripe";
import type { World } from "./World";

/** Seconds until a charge's money can be used. The stand-in's own assumption: 7 days. */
export const SETTLING_TIME = 7 * 24 * 60 * 60;

/**
 * What the provider keeps of a charge, in minor units: 1.5 % rounded half up, plus 25.
 * The stand-in's own assumption, not the provider's price list. Not given back on refund.
 */
export const feeOf = (amount: number): number => Math.floor((amount * 15 + 500) / 1000) + 25;

interface Entry {
  readonly amount: number;
  readonly currency: string;
  readonly source: string;
  readonly type: Stripe.BalanceTransaction.Type;
  readonly description?: string | null;
  readonly fee?: number;
  /** Whole seconds since 1970; at once unless given. */
  readonly availableOn?: number;
}

/** Writes one movement of the platform's balance: positive comes in, negative goes out. */
export function addBalanceTransaction(world: World, entry: Entry): Stripe.BalanceTransaction {
  const fee = entry.fee ?? 0;
  const availableOn = entry.availableOn ?? world.now();
  const transaction: Stripe.BalanceTransaction = {
    id: world.newId("txn"),
    object: "balance_transaction",
    amount: entry.amount,
    available_on: availableOn,
    balance_type: "payments",
    created: world.now(),
    currency: entry.currency,
    description: entry.description ?? null,
    exchange_rate: null,
    fee,
    fee_details:
      fee === 0
        ? []
        : [
            {
              amount: fee,
              application: null,
              currency: entry.currency,
              description: "Stand-in fee",
              type: "stripe_fee",
            },
          ],
    net: entry.amount - fee,
    reporting_category: entry.type,
    source: entry.source,
    status: availableOn > world.now() ? "pending" : "available",
    type: entry.type,
  };
  world.store.balanceTransactions.set(transaction.id, transaction);
  return transaction;
}

function sums(transactions: readonly Stripe.BalanceTransaction[], currencies: readonly string[]) {
  return currencies.map((currency) => {
    const amount = transactions
      .filter((transaction) => transaction.currency === currency)
      .reduce((sum, { net }) => sum + net, 0);
    return { amount, currency, source_types: { card: amount } };
  });
}

/** `GET /v1/balance`: nets of all movements, by currency, split by whether their time has come. EUR is always there. */
export function readBalance(world: World): Stripe.Balance {
  const all = [...world.store.balanceTransactions.values()];
  const currencies = [...new Set(["eur", ...all.map(({ currency }) => currency)])];
  const inState = (status: string) =>
    sums(
      all.filter((transaction) => transaction.status === status),
      currencies,
    );
  return { object: "balance", available: inState("available"), livemode: false, pending: inState("pending") };
}
