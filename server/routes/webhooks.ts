import express, { Router } from "express";
import Stripe from "stripe";
import { receivePaymentEvent } from "../commands/receivePaymentEvent";
import { AppError } from "../errors/AppError";
import type { Services } from "../Services";

/**
 * Calls that other services make to us. The payment provider signs the bytes that it sends, so they are read raw;
 * what it says is kept and answered at once, and applied by a job.
 */
export function webhookRouter({ payments, config }: Services): Router {
  const router = Router({ caseSensitive: true, strict: true });
  router.post("/stripe", express.raw({ type: () => true, limit: "512kb" }), async (req, res) => {
    const body: unknown = req.body;
    const signature = req.get("stripe-signature") ?? "";
    let event: Stripe.Event;
    try {
      if (!Buffer.isBuffer(body)) throw new AppError("malformed-request", "There is nothing in this call");
      event = payments.webhooks.constructEvent(body, signature, config.stripe.webhookSecret);
    } catch (cause) {
      const forged = cause instanceof Stripe.errors.StripeSignatureVerificationError;
      req.log.warn({ event: "webhook-refused", forged }, "a payment event was refused");
      throw new AppError("malformed-request", "The signature does not belong to this call, or is too old", { cause });
    }
    await receivePaymentEvent(event);
    res.json({ received: true });
  });
  router.all("/stripe", (_req, res) => {
    res.set("Allow", "POST");
    throw new AppError("method-not-allowed");
  });
  return router;
}
