import { createHmac } from "node:crypto";
import type { StoredEvent } from "./Store";
import type { World } from "./World";

/** How webhooks behave; `NORMAL` is a good day. */
export interface WebhookBehaviour {
  /** `send`: at once. `hold`: kept until told to deliver. `drop`: never sent (the event still exists). */
  mode: "send" | "hold" | "drop";
  /** Wait before the first try, in ms of the stand-in's clock. */
  delayMs: number;
  /** How often each event is delivered. */
  copies: number;
  /** Order among the events of one change. */
  order: "as-made" | "reversed" | "shuffled";
  /** `forged`: signed with another secret. `stale`: signed an hour ago. */
  signature: "valid" | "forged" | "stale";
  /** Every change is told by two Event objects with different ids. */
  twinEvents: boolean;
}

const NORMAL: WebhookBehaviour = {
  mode: "send",
  delayMs: 0,
  copies: 1,
  order: "as-made",
  signature: "valid",
  twinEvents: false,
};

/** One try to deliver; `status` is null when nobody answered. */
export interface DeliveryAttempt {
  readonly eventId: string;
  readonly type: string;
  readonly status: number | null;
  readonly delivered: boolean;
}

interface Delivery {
  readonly event: StoredEvent;
  readonly tries: number;
  readonly dueMs: number;
}

interface SenderOptions {
  readonly world: World;
  readonly url: string | undefined;
  readonly secret: string;
  /** Real time for signatures, which the receiver compares with its own clock. */
  readonly wallClock: () => Date;
}

/** Waits between tries, in ms; after the last the event stays undelivered. */
const RETRY_AFTER_MS = [1_000, 5_000, 30_000, 120_000, 600_000];
const ANSWER_WITHIN_MS = 10_000;
const SHORTEST_TIMER_MS = 20;
const LONGEST_TIMER_MS = 60_000;

/** Signed delivery of events: one after the other, with bounded retries. A receiver that is down never throws here. */
export class WebhookSender {
  readonly attempts: DeliveryAttempt[] = [];
  behaviour: WebhookBehaviour = { ...NORMAL };
  readonly #options: SenderOptions;
  #batch: StoredEvent[] = [];
  #held: StoredEvent[] = [];
  #due: Delivery[] = [];
  #running: Promise<void> | null = null;
  #timer: NodeJS.Timeout | undefined;
  #closed = false;

  constructor(options: SenderOptions) {
    this.#options = options;
    options.world.webhookEndpoints = options.url === undefined ? 0 : 1;
    options.world.onEvent = (event) => this.#accept(event);
  }

  get held(): readonly StoredEvent[] {
    return this.#held;
  }

  change(change: Partial<WebhookBehaviour>): void {
    this.behaviour = { ...this.behaviour, ...change };
    this.#options.world.twinEvents = this.behaviour.twinEvents;
  }

  /** Back to a good day. What is held stays held. */
  reset(): void {
    this.change(NORMAL);
  }

  /** The events of one change arrive in the same turn and are put in order together once it has ended. */
  #accept(event: StoredEvent): void {
    if (this.#options.url === undefined || this.#closed) return;
    this.#batch.push(event);
    if (this.#batch.length === 1) queueMicrotask(() => this.#dispatch());
  }

  #dispatch(): void {
    const { mode, delayMs, copies } = this.behaviour;
    const batch = this.#ordered(this.#batch);
    this.#batch = [];
    if (mode === "hold") this.#held.push(...batch);
    if (mode !== "send") return;
    const dueMs = this.#options.world.nowMs() + delayMs;
    for (let copy = 0; copy < copies; copy++) {
      this.#due.push(...batch.map((event) => ({ event, tries: 0, dueMs })));
    }
    this.pump();
  }

  #ordered(events: readonly StoredEvent[]): StoredEvent[] {
    const { order } = this.behaviour;
    if (order === "reversed") return [...events].reverse();
    if (order === "as-made") return [...events];
    const { random } = this.#options.world;
    return events
      .map((event) => ({ event, rank: random() }))
      .sort((a, b) => a.rank - b.rank)
      .map(({ event }) => event);
  }

  /** Sends whatever is due by the stand-in's clock. */
  pump(): void {
    this.#running ??= this.#drain().finally(() => {
      this.#running = null;
      if (this.#nextDue()) this.pump();
      else this.#arm();
    });
  }

  /** Resolves when nothing that is due now is left. Retries and delays that lie ahead are not waited for. */
  async settled(): Promise<void> {
    await Promise.resolve();
    while (this.#running || this.#batch.length > 0) await (this.#running ?? Promise.resolve());
  }

  /** The delivery that has been due longest; among equals the first that was queued. */
  #nextDue(): Delivery | null {
    if (this.#closed) return null;
    return this.#due
      .filter(({ dueMs }) => dueMs <= this.#options.world.nowMs())
      .reduce<Delivery | null>((first, one) => (first && first.dueMs <= one.dueMs ? first : one), null);
  }

  async #drain(): Promise<void> {
    for (let next = this.#nextDue(); next; next = this.#nextDue()) {
      this.#due.splice(this.#due.indexOf(next), 1);
      const { delivered } = await this.#try(next.event);
      const wait = RETRY_AFTER_MS[next.tries];
      if (delivered || wait === undefined) continue;
      this.#due.push({ event: next.event, tries: next.tries + 1, dueMs: this.#options.world.nowMs() + wait });
    }
  }

  #arm(): void {
    clearTimeout(this.#timer);
    if (this.#closed || this.#due.length === 0) return;
    const earliest = Math.min(...this.#due.map(({ dueMs }) => dueMs)) - this.#options.world.nowMs();
    const wait = Math.min(Math.max(earliest, SHORTEST_TIMER_MS), LONGEST_TIMER_MS);
    this.#timer = setTimeout(() => this.pump(), wait).unref();
  }

  /** Delivers these events now, once each per mention and in this order, whatever the mode; no retries. */
  async deliver(events: readonly StoredEvent[]): Promise<DeliveryAttempt[]> {
    this.#held = this.#held.filter((event) => !events.includes(event));
    const attempts: DeliveryAttempt[] = [];
    for (const event of events) attempts.push(await this.#try(event));
    return attempts;
  }

  async #try(event: StoredEvent): Promise<DeliveryAttempt> {
    const status = await this.#post(JSON.stringify(event, null, 2));
    const delivered = status !== null && status >= 200 && status < 300;
    if (delivered) event.pending_webhooks = 0;
    const attempt = { eventId: event.id, type: event.type, status, delivered };
    this.attempts.push(attempt);
    return attempt;
  }

  async #post(payload: string): Promise<number | null> {
    const { url } = this.#options;
    if (url === undefined) return null;
    try {
      const response = await fetch(url, {
        method: "POST",
        headers: { "content-type": "application/json; charset=utf-8", "stripe-signature": this.#sign(payload) },
        body: payload,
        redirect: "manual",
        signal: AbortSignal.timeout(ANSWER_WITHIN_MS),
      });
      await response.arrayBuffer();
      return response.status;
    } catch {
      return null;
    }
  }

  /** `t=<seconds>,v1=<HMAC-SHA256 of "t.payload">`, the scheme that the SDK's `Webhooks.js` verifies. */
  #sign(payload: string): string {
    const { signature } = this.behaviour;
    const age = signature === "stale" ? 3600 : 0;
    const secret = signature === "forged" ? `${this.#options.secret}-forged` : this.#options.secret;
    const time = Math.floor(this.#options.wallClock().getTime() / 1000) - age;
    return `t=${time},v1=${createHmac("sha256", secret).update(`${time}.${payload}`).digest("hex")}`;
  }

  close(): void {
    this.#closed = true;
    clearTimeout(this.#timer);
  }
}
