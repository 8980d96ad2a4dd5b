import type Stripe from "stripe";
import { missing, ProviderError } from "./ProviderError";
import { cancelIntent } from "./paymentIntents";
import type { World } from "./World";

/** The session with this id, or the provider's 404. */
export function findSession(world: World, id: string): Stripe.Checkout.Session {
  const session = world.store.sessions.get(id);
  if (!session) throw missing("checkout.session", id, "session");
  return session;
}

function close(world: World, session: Stripe.Checkout.Session): void {
  session.status = "expired";
  session.url = null;
  world.emit("checkout.session.expired", session);
  const intent = world.store.paymentIntents.get(String(session.payment_intent));
  if (intent) cancelIntent(world, intent, "automatic");
}

/** `POST /v1/checkout/sessions/{session}/expire`: only from `open`. */
export function expireSession(world: World, id: string): Stripe.Checkout.Session {
  const session = findSession(world, id);
  if (session.status !== "open") {
    throw new ProviderError(
      400,
      `Only Checkout Sessions with a status in ["open"] can be expired. This Checkout Session has a status of \`${session.status}\`.`,
    );
  }
  close(world, session);
  return session;
}

/** What time alone does: sessions expire, money becomes available. Called before anything looks. */
export function catchUp(world: World): void {
  for (const session of world.store.sessions.values()) {
    if (session.status === "open" && session.expires_at <= world.now()) close(world, session);
  }
  for (const entry of world.store.balanceTransactions.values()) {
    if (entry.status === "pending" && entry.available_on <= world.now()) entry.status = "available";
  }
}
