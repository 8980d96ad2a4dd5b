import type Stripe from "stripe";
import { addBalanceTransaction } from "./balance";
import { missing, ProviderError } from "./ProviderError";
import type { CreateRefund } from "./parameters";
import type { World } from "./World";

/** The refund with this id, or the provider's 404. */
export function findRefund(world: World, id: string): Stripe.Refund {
  const refund = world.store.refunds.get(id);
  if (!refund) throw missing("refund", id, "refund");
  return refund;
}

function chargeToRefund(world: World, params: CreateRefund): Stripe.Charge {
  const { charges, paymentIntents } = world.store;
  if ((params.charge === undefined) === (params.payment_intent === undefined)) {
    throw new ProviderError(400, "One of the following params should be provided: `payment_intent` or `charge`.", {
      code: "parameter_missing",
    });
  }
  if (params.charge !== undefined) {
    const charge = charges.get(params.charge);
    if (!charge) throw missing("charge", params.charge, "charge");
    return charge;
  }
  const intent = paymentIntents.get(params.payment_intent!);
  if (!intent) throw missing("payment_intent", params.payment_intent!, "payment_intent");
  const charge = charges.get(String(intent.latest_charge));
  if (!charge?.paid) {
    throw new ProviderError(400, `This PaymentIntent (${intent.id}) does not have a successful charge to refund.`, {
      code: "payment_intent_unexpected_state",
      param: "payment_intent",
    });
  }
  return charge;
}

function amountToRefund(charge: Stripe.Charge, asked: number | undefined): number {
  const left = charge.amount_captured - charge.amount_refunded;
  if (!charge.paid) throw new ProviderError(400, `Charge ${charge.id} was not successful and cannot be refunded.`);
  if (left === 0) {
    throw new ProviderError(400, `Charge ${charge.id} has already been refunded.`, { code: "charge_already_refunded" });
  }
  const amount = asked ?? left;
  if (amount > left) {
    throw new ProviderError(400, `Refund amount (${amount}) is greater than unrefunded amount on charge (${left})`, {
      param: "amount",
    });
  }
  return amount;
}

/**
 * `POST /v1/refunds`: part or all of what is left of a charge, as often as something is left. The provider's fee is kept.
 * `status` is "succeeded", or "pending" when the stand-in is told that refunds take time.
 */
export function createRefund(world: World, params: CreateRefund, status: "succeeded" | "pending"): Stripe.Refund {
  const charge = chargeToRefund(world, params);
  const amount = amountToRefund(charge, params.amount);
  const id = world.newId("re");
  const movement = { amount: -amount, currency: charge.currency, source: id, type: "refund" } as const;
  const refund: Stripe.Refund = {
    id,
    object: "refund",
    amount,
    balance_transaction: addBalanceTransaction(world, movement).id,
    charge: charge.id,
    created: world.now(),
    currency: charge.currency,
    customer: null,
    customer_account: null,
    destination_details: { card: { type: "refund" }, type: "card" },
    metadata: params.metadata ?? {},
    payment_intent: charge.payment_intent,
    payment_method: charge.payment_method,
    reason: params.reason ?? null,
    receipt_number: null,
    source_transfer_reversal: null,
    status,
    transfer_reversal: null,
  };
  world.store.refunds.set(id, refund);

  const previous = { amount_refunded: charge.amount_refunded, refunded: charge.refunded };
  charge.amount_refunded += amount;
  charge.refunded = charge.amount_refunded === charge.amount;
  world.emit("refund.created", refund);
  world.emit("charge.refunded", charge, previous);
  return refund;
}

/** `POST /v1/refunds/{refund}`: an empty value removes its key. */
export function updateRefund(
  world: World,
  id: string,
  metadata: Readonly<Record<string, string>> | undefined,
): Stripe.Refund {
  const refund = findRefund(world, id);
  const previous = { metadata: refund.metadata };
  const merged = Object.entries({ ...refund.metadata, ...metadata }).filter(([, value]) => value !== "");
  refund.metadata = Object.fromEntries(merged);
  world.emit("refund.updated", refund, previous);
  return refund;
}

/** A pending refund comes to its end. A failed one gives its amount back to the balance and to the charge. */
export function settleRefund(world: World, id: string, status: "succeeded" | "failed"): Stripe.Refund {
  const refund = findRefund(world, id);
  if (refund.status !== "pending") throw new ProviderError(400, `Refund ${id} is ${refund.status}, not pending.`);
  refund.status = status;
  if (status === "failed") {
    const { amount, currency } = refund;
    const back = addBalanceTransaction(world, { amount, currency, source: id, type: "refund_failure" });
    refund.failure_balance_transaction = back.id;
    refund.failure_reason = "expired_or_canceled_card";
    const charge = world.store.charges.get(String(refund.charge))!;
    charge.amount_refunded -= amount;
    charge.refunded = false;
  }
  world.emit("refund.updated", refund, { status: "pending" });
  return refund;
}
