import type Stripe from "stripe";
import { findEvent } from "./events";
import { declineSession, paySession } from "./payments";
import { settleRefund } from "./refunds";
import type { StoredEvent } from "./Store";
import { catchUp } from "./sessions";
import type { RequestTrouble, Troubles } from "./Troubles";
import type { DeliveryAttempt, WebhookBehaviour, WebhookSender } from "./WebhookSender";
import type { World } from "./World";

/** What tests and the demo can make happen. Nothing of this exists at the real provider. */
export interface StripeFakeControl {
  /** Events so far, oldest first; of one type if given. */
  events(type?: string): readonly StoredEvent[];
  /** Every try to deliver a webhook so far. */
  attempts(): readonly DeliveryAttempt[];
  /** Events that `hold` keeps back, in the order they would be sent. */
  held(): readonly StoredEvent[];
  /** Changes how webhooks behave from the next event on; gives the whole behaviour. */
  setWebhooks(change: Partial<WebhookBehaviour>): WebhookBehaviour;
  /** Delivers these events now, in this order and as often as named; all that are held unless given. No retries. */
  deliver(eventIds?: readonly string[]): Promise<DeliveryAttempt[]>;
  /** Delivers one event again. */
  redeliver(eventId: string): Promise<DeliveryAttempt>;
  /** Resolves once all webhooks that are due now have been tried. */
  settled(): Promise<void>;
  /** A bad day for the next API requests. */
  trouble(trouble: RequestTrouble): void;
  /** How many API requests `hold` is keeping. */
  heldRequests(): number;
  /** Lets held API requests go on. */
  releaseRequests(): void;
  /** The buyer pays. Rejects unless the session is open. Webhooks follow; wait for them with `settled()`. */
  pay(sessionId: string): Promise<Stripe.Checkout.Session>;
  /** The card is refused. Rejects unless the session is open. */
  decline(sessionId: string): Promise<Stripe.Checkout.Session>;
  /** What new refunds start as: `succeeded` (normal) or `pending`. */
  setRefunds(status: "succeeded" | "pending"): void;
  /** Ends a pending refund. */
  settleRefund(refundId: string, status: "succeeded" | "failed"): Promise<Stripe.Refund>;
  /** Moves the stand-in's clock on: sessions expire, money becomes available, delayed webhooks and retries go out. */
  advanceClock(seconds: number): void;
  /** Back to a good day for requests, refunds and webhooks. Objects, events and held events stay. */
  reset(): void;
}

interface ControlOptions {
  readonly world: World;
  readonly sender: WebhookSender;
  readonly troubles: Troubles;
  readonly refunds: { status: "succeeded" | "pending" };
}

export function createControl({ world, sender, troubles, refunds }: ControlOptions): StripeFakeControl {
  const copy = <Value>(value: Value): Value => JSON.parse(JSON.stringify(value));
  return {
    events: (type) => [...world.store.events.values()].filter((event) => type === undefined || event.type === type),
    attempts: () => sender.attempts,
    held: () => sender.held,
    setWebhooks(change) {
      sender.change(change);
      return sender.behaviour;
    },
    deliver: (ids) => sender.deliver(ids?.map((id) => findEvent(world, id)) ?? sender.held),
    async redeliver(id) {
      const [attempt] = await sender.deliver([findEvent(world, id)]);
      return attempt!;
    },
    settled: () => sender.settled(),
    trouble: (trouble) => troubles.add(trouble),
    heldRequests: () => troubles.held,
    releaseRequests: () => troubles.release(),
    async pay(id) {
      catchUp(world);
      return copy(paySession(world, id));
    },
    async decline(id) {
      catchUp(world);
      return copy(declineSession(world, id));
    },
    setRefunds(status) {
      refunds.status = status;
    },
    settleRefund: async (id, status) => copy(settleRefund(world, id, status)),
    advanceClock(seconds) {
      world.moveClock(seconds);
      catchUp(world);
      sender.pump();
    },
    reset() {
      sender.reset();
      troubles.clear();
      refunds.status = "succeeded";
    },
  };
}
