import express, { type Request, type Response, type Router } from "express";
import { declineSession, paySession } from "./payments";
import { openPage, statusPage } from "./payPage";
import { payStyle } from "./payStyle";
import { catchUp } from "./sessions";
import type { World } from "./World";

/** Forms here redirect to the shop, so `form-action` is left open. */
const POLICY = "default-src 'none'; style-src 'self'; base-uri 'none'; frame-ancestors 'none'";

const withId = (address: string | null, id: string) => address?.replaceAll("{CHECKOUT_SESSION_ID}", id) ?? null;

/** The hosted payment page: plain forms, no script. */
export function payRouter(world: World): Router {
  const router = express.Router();
  router.use((_req, res, next) => {
    res.set({
      "content-security-policy": POLICY,
      "cache-control": "no-store",
      "referrer-policy": "no-referrer",
      "x-content-type-options": "nosniff",
    });
    next();
  });

  /** The session if it can still be paid; otherwise answers why not, with `ifPaid` as the status of a paid one. */
  function openOrTell(req: Request, res: Response, ifPaid: number) {
    catchUp(world);
    const session = world.store.sessions.get(String(req.params.session));
    if (!session) {
      res.status(404).send(statusPage("No such payment", "This address does not belong to any payment.", null));
      return null;
    }
    if (session.status === "complete") {
      const onward = withId(session.success_url, session.id);
      res.status(ifPaid).send(statusPage("Already paid", "This order has been paid. It is not charged again.", onward));
      return null;
    }
    if (session.status === "expired") {
      const message = "The time to pay this order has run out. Nothing was paid. Order again to get a new payment.";
      res.status(410).send(statusPage("Payment expired", message, withId(session.cancel_url, session.id)));
      return null;
    }
    return session;
  }

  router.get("/pay.css", (_req, res) => {
    res.type("css").send(payStyle);
  });
  router.get("/pay/:session", (req, res) => {
    const session = openOrTell(req, res, 200);
    if (!session) return;
    const refused = Boolean(world.store.paymentIntents.get(String(session.payment_intent))?.last_payment_error);
    res.send(openPage(session, world.store.lineItems.get(session.id) ?? [], refused));
  });
  router.post("/pay/:session/pay", (req, res) => {
    const session = openOrTell(req, res, 409);
    if (!session) return;
    paySession(world, session.id);
    res.redirect(303, withId(session.success_url, session.id)!);
  });
  router.post("/pay/:session/decline", (req, res) => {
    const session = openOrTell(req, res, 409);
    if (!session) return;
    declineSession(world, session.id);
    res.redirect(303, `/pay/${session.id}`);
  });
  router.post("/pay/:session/leave", (req, res) => {
    const session = openOrTell(req, res, 409);
    if (!session) return;
    res.redirect(303, withId(session.cancel_url, session.id) ?? `/pay/${session.id}`);
  });
  router.use((_req, res) => {
    res.status(404).send(statusPage("Nothing here", "This address belongs to no page of the payment stand-in.", null));
  });
  return router;
}
