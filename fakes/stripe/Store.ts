import type Stripe from "stripe";

/** Every kind of object that the stand-in keeps and that an event may carry. */
export type StoredObject =
  | Stripe.BalanceTransaction
  | Stripe.Charge
  | Stripe.Checkout.Session
  | Stripe.PaymentIntent
  | Stripe.Refund
  | Stripe.Transfer
  | Stripe.TransferReversal;

/** An event as sent and listed. The SDK's own type is a union per event type, which cannot be built generically. */
export interface StoredEvent {
  readonly id: string;
  readonly object: "event";
  readonly api_version: string;
  readonly created: number;
  readonly data: { readonly object: unknown; readonly previous_attributes?: Record<string, unknown> };
  readonly livemode: false;
  pending_webhooks: number;
  readonly request: Stripe.Event.Request | null;
  readonly type: Stripe.Event.Type;
}

/** All state of the stand-in, in memory. Maps keep the order of making, oldest first. */
export class Store {
  readonly sessions = new Map<string, Stripe.Checkout.Session>();
  readonly lineItems = new Map<string, Stripe.LineItem[]>();
  /** `payment_intent_data` of a session, kept until its PaymentIntent is made. */
  readonly intentData = new Map<string, Partial<Stripe.PaymentIntent>>();
  readonly paymentIntents = new Map<string, Stripe.PaymentIntent>();
  readonly charges = new Map<string, Stripe.Charge>();
  readonly refunds = new Map<string, Stripe.Refund>();
  readonly balanceTransactions = new Map<string, Stripe.BalanceTransaction>();
  readonly transfers = new Map<string, Stripe.Transfer>();
  readonly transferReversals = new Map<string, Stripe.TransferReversal>();
  readonly events = new Map<string, StoredEvent>();

  /** The object with this id, whatever its kind: what `expand` puts in an id's place. */
  find(id: string): StoredObject | undefined {
    const kinds: ReadonlyMap<string, StoredObject>[] = [
      this.sessions,
      this.paymentIntents,
      this.charges,
      this.refunds,
      this.balanceTransactions,
      this.transfers,
      this.transferReversals,
    ];
    return kinds.map((kind) => kind.get(id)).find((found) => found !== undefined);
  }
}
