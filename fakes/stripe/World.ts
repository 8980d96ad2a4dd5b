import type Stripe from "stripe";
import { Store, type StoredEvent, type StoredObject } from "./Store";

/** API version that events are written in: the one that SDK 23.1.0 pins (its `esm/apiVersion.js`). */
export const API_VERSION = "2026-10-28.endive";

const ID_LETTERS = "0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz";

interface WorldOptions {
  /** Time as the stand-in's own clock starts from; `advanceClock` adds to it. */
  readonly clock: () => Date;
  /** Chance in [0, 1), used for ids and for shuffling. */
  readonly random: () => number;
}

/** State, time and chance, handed to every operation. */
export class World {
  readonly store = new Store();
  /** Address that hosted pages are reached at, without a trailing slash; set once the server listens. */
  publicUrl = "";
  /** The API call being carried out, or null when a page, the clock or the controls act. */
  cause: Stripe.Event.Request | null = null;
  /** Number of webhook endpoints an event starts out owing a delivery to: 0 or 1. */
  webhookEndpoints = 0;
  /** Bad day: every change is told by two Event objects with different ids. */
  twinEvents = false;
  onEvent: (event: StoredEvent) => void = () => {};
  readonly random: () => number;
  readonly #clock: () => Date;
  #aheadMs = 0;

  constructor({ clock, random }: WorldOptions) {
    this.#clock = clock;
    this.random = random;
  }

  /** Milliseconds since 1970. */
  nowMs(): number {
    return this.#clock().getTime() + this.#aheadMs;
  }

  /** Whole seconds since 1970, the unit of every time in the provider's API. */
  now(): number {
    return Math.floor(this.nowMs() / 1000);
  }

  moveClock(seconds: number): void {
    this.#aheadMs += seconds * 1000;
  }

  newId(prefix: string, length = 24): string {
    const letters = Array.from({ length }, () => ID_LETTERS[Math.floor(this.random() * ID_LETTERS.length)]);
    return `${prefix}_${letters.join("")}`;
  }

  /** Records what happened, with the object as it is now, and hands the event on for delivery. */
  emit(type: Stripe.Event.Type, object: StoredObject, previous?: Record<string, unknown>): void {
    for (let copies = this.twinEvents ? 2 : 1; copies > 0; copies--) {
      const event: StoredEvent = {
        id: this.newId("evt"),
        object: "event",
        api_version: API_VERSION,
        created: this.now(),
        data: {
          object: JSON.parse(JSON.stringify(object)),
          ...(previous === undefined ? {} : { previous_attributes: previous }),
        },
        livemode: false,
        pending_webhooks: this.webhookEndpoints,
        request: this.cause,
        type,
      };
      this.store.events.set(event.id, event);
      this.onEvent(event);
    }
  }
}
