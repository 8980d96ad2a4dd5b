import type Stripe from "stripe";
import { matches, newestFirst, page, within } from "./lists";
import { missing } from "./ProviderError";
import type { ListEvents } from "./parameters";
import type { StoredEvent } from "./Store";
import type { World } from "./World";

/** "List events, going back up to 30 days" (the description of `GET /v1/events`), in seconds. */
const KEPT_FOR = 30 * 24 * 60 * 60;

/** The event with this id, or the provider's 404. */
export function findEvent(world: World, id: string): StoredEvent {
  const event = world.store.events.get(id);
  if (!event) throw missing("event", id, "id");
  return event;
}

/** A type is named in full or by a wildcard at its end: `charge.*`. */
const named = (pattern: string, type: string) =>
  pattern.endsWith("*") ? type.startsWith(pattern.slice(0, -1)) : pattern === type;

/** `GET /v1/events`; `delivery_success=false` gives those that a webhook endpoint has not yet accepted. */
export function listEvents(world: World, params: ListEvents): Stripe.ApiList<StoredEvent> {
  const { type, types, delivery_success, created } = params;
  const found = newestFirst(world.store.events).filter(
    (event) =>
      event.created > world.now() - KEPT_FOR &&
      within(event.created, created) &&
      matches(delivery_success, event.pending_webhooks === 0) &&
      (type === undefined || named(type, event.type)) &&
      (types === undefined || types.some((one) => named(one, event.type))),
  );
  return page(found, params, "/v1/events");
}
