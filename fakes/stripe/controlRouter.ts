import express, { type Request, type Response, type Router } from "express";
import { z } from "zod";
import type { StripeFakeControl } from "./createControl";
import { ProviderError } from "./ProviderError";

const SessionId = z.strictObject({ sessionId: z.string() });
const Webhooks = z.strictObject({
  mode: z.enum(["send", "hold", "drop"]).optional(),
  delayMs: z.number().int().min(0).optional(),
  copies: z.number().int().min(1).max(100).optional(),
  order: z.enum(["as-made", "reversed", "shuffled"]).optional(),
  signature: z.enum(["valid", "forged", "stale"]).optional(),
  twinEvents: z.boolean().optional(),
});
const Trouble = z.strictObject({
  kind: z.enum(["fail", "fail-kept", "hang-after-commit", "cut-after-commit", "hold"]),
  times: z.number().int().min(1).optional(),
  on: z.string().optional(),
});

/** The controls over HTTP, as JSON: reading by GET, acting by POST. For the demo and for tests in other processes. */
export function controlRouter(control: StripeFakeControl): Router {
  const router = express.Router();
  router.use(express.json());
  const act = <Schema extends z.ZodType>(
    path: string,
    schema: Schema,
    run: (input: z.output<Schema>) => unknown | Promise<unknown>,
  ) =>
    router.post(path, async (req: Request, res: Response) => {
      res.json((await run(schema.parse(req.body ?? {}))) ?? {});
    });

  router.get("/events", (req, res) => {
    const { type } = req.query;
    res.json(control.events(typeof type === "string" ? type : undefined));
  });
  router.get("/attempts", (_req, res) => {
    res.json(control.attempts());
  });
  router.get("/held", (_req, res) => {
    res.json(control.held());
  });
  act("/webhooks", Webhooks, (change) => control.setWebhooks(change));
  act("/deliver", z.strictObject({ eventIds: z.array(z.string()).optional() }), ({ eventIds }) =>
    control.deliver(eventIds),
  );
  act("/redeliver", z.strictObject({ eventId: z.string() }), ({ eventId }) => control.redeliver(eventId));
  act("/settled", z.strictObject({}), () => control.settled());
  act("/trouble", Trouble, (trouble) => control.trouble(trouble));
  act("/release-requests", z.strictObject({}), () => control.releaseRequests());
  act("/pay", SessionId, ({ sessionId }) => control.pay(sessionId));
  act("/decline", SessionId, ({ sessionId }) => control.decline(sessionId));
  act("/refunds", z.strictObject({ status: z.enum(["succeeded", "pending"]) }), ({ status }) =>
    control.setRefunds(status),
  );
  act(
    "/settle-refund",
    z.strictObject({ refundId: z.string(), status: z.enum(["succeeded", "failed"]) }),
    ({ refundId, status }) => control.settleRefund(refundId, status),
  );
  act("/advance-clock", z.strictObject({ seconds: z.number().min(0) }), ({ seconds }) => control.advanceClock(seconds));
  act("/reset", z.strictObject({}), () => control.reset());

  router.use((_req, res) => {
    res.status(404).json({ error: { message: "There is no such control." } });
  });
  router.use((error: unknown, _req: Request, res: Response, _next: express.NextFunction) => {
    const status = error instanceof ProviderError ? error.status : 400;
    res.status(status).json({ error: { message: error instanceof Error ? error.message : "Not understood." } });
  });
  return router;
}
