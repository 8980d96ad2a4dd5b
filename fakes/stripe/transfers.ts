import type Stripe from "stripe";
import { addBalanceTransaction, readBalance } from "./balance";
import { page } from "./lists";
import { missing, ProviderError } from "./ProviderError";
import type { CreateTransfer, CreateTransferReversal } from "./parameters";
import type { World } from "./World";

/** The transfer with this id, or the provider's 404. */
export function findTransfer(world: World, id: string): Stripe.Transfer {
  const transfer = world.store.transfers.get(id);
  if (!transfer) throw missing("transfer", id, "transfer");
  return transfer;
}

/** Reversals of a transfer, the newest first. */
export const reversalsOf = (world: World, id: string): Stripe.TransferReversal[] =>
  [...world.store.transferReversals.values()].filter(({ transfer }) => transfer === id).reverse();

/** A transfer from a charge needs no settled balance but no more than the charge; any other needs the money there. */
function checkFunds(world: World, { amount, currency, source_transaction }: CreateTransfer): void {
  if (source_transaction === undefined) {
    const available = readBalance(world).available.find((entry) => entry.currency === currency)?.amount ?? 0;
    if (available < amount) {
      throw new ProviderError(400, "You have insufficient available funds for this transfer.", {
        code: "balance_insufficient",
      });
    }
    return;
  }
  const charge = world.store.charges.get(source_transaction);
  if (!charge?.paid) throw missing("charge", source_transaction, "source_transaction");
  const used = [...world.store.transfers.values()]
    .filter((transfer) => transfer.source_transaction === charge.id)
    .reduce((sum, transfer) => sum + transfer.amount - transfer.amount_reversed, 0);
  if (used + amount > charge.amount) {
    throw new ProviderError(400, `Transfers using this charge cannot add up to more than ${charge.amount}.`, {
      param: "amount",
    });
  }
}

/** `POST /v1/transfers`: from the platform's balance to a connected account. */
export function createTransfer(world: World, params: CreateTransfer): Stripe.Transfer {
  if (!/^acct_\w+$/.test(params.destination)) throw missing("destination", params.destination, "destination");
  checkFunds(world, params);
  const { amount, currency } = params;
  const id = world.newId("tr");
  const charge = world.store.charges.get(params.source_transaction ?? "");
  const settled = world.store.balanceTransactions.get(String(charge?.balance_transaction));
  const movement = addBalanceTransaction(world, {
    amount: -amount,
    // Drawn from a charge, the money leaves when the charge's own money has come.
    availableOn: Math.max(world.now(), settled?.available_on ?? 0),
    currency,
    source: id,
    type: "transfer",
  });
  const transfer: Stripe.Transfer = {
    id,
    object: "transfer",
    amount,
    amount_reversed: 0,
    balance_transaction: movement.id,
    created: world.now(),
    currency,
    description: params.description ?? null,
    destination: params.destination,
    destination_payment: world.newId("py"),
    livemode: false,
    metadata: params.metadata ?? {},
    reversals: page([], {}, `/v1/transfers/${id}/reversals`),
    reversed: false,
    source_transaction: params.source_transaction ?? null,
    source_type: "card",
    transfer_group: params.transfer_group ?? charge?.transfer_group ?? null,
  };
  world.store.transfers.set(id, transfer);
  world.emit("transfer.created", transfer);
  return transfer;
}

/** `POST /v1/transfers/{id}/reversals`: part or all of what is left, as often as something is left. */
export function createTransferReversal(
  world: World,
  transferId: string,
  params: CreateTransferReversal,
): Stripe.TransferReversal {
  const transfer = findTransfer(world, transferId);
  const left = transfer.amount - transfer.amount_reversed;
  const amount = params.amount ?? left;
  if (left === 0 || amount > left) {
    throw new ProviderError(400, `Only ${left} is left to reverse on transfer ${transferId}.`, { param: "amount" });
  }
  const id = world.newId("trr");
  const movement = { amount, currency: transfer.currency, source: transferId, type: "transfer_refund" } as const;
  const reversal: Stripe.TransferReversal = {
    id,
    object: "transfer_reversal",
    amount,
    balance_transaction: addBalanceTransaction(world, movement).id,
    created: world.now(),
    currency: transfer.currency,
    destination_payment_refund: null,
    metadata: params.metadata ?? {},
    source_refund: null,
    transfer: transferId,
  };
  world.store.transferReversals.set(id, reversal);
  const previous = { amount_reversed: transfer.amount_reversed, reversed: transfer.reversed };
  transfer.amount_reversed += amount;
  transfer.reversed = transfer.amount_reversed === transfer.amount;
  transfer.reversals = page(reversalsOf(world, transferId), {}, transfer.reversals.url);
  world.emit("transfer.reversed", transfer, previous);
  return reversal;
}
