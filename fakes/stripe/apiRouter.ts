import { timingSafeEqual } from "node:crypto";
import express, { type Request, type Response, type Router } from "express";
import { type Endpoint, endpoints } from "./endpoints";
import { type Answer, IdempotencyKeys } from "./IdempotencyKeys";
import { ProviderError } from "./ProviderError";
import { catchUp } from "./sessions";
import type { Troubles } from "./Troubles";
import { API_VERSION, type World } from "./World";

interface ApiOptions {
  readonly world: World;
  readonly apiKey: string;
  readonly troubles: Troubles;
  readonly refundStatus: () => "succeeded" | "pending";
}

/** The key as a bearer token or as the user name of basic authentication. */
function keyOf(req: Request): string | null {
  const [scheme, value] = (req.get("authorization") ?? "").split(" ");
  if (!value) return null;
  if (scheme?.toLowerCase() === "bearer") return value;
  return Buffer.from(value, "base64").toString("utf8").split(":")[0] ?? null;
}

function checkKey(given: string | null, right: string): void {
  if (given === null) throw new ProviderError(401, "You did not provide an API key.");
  const [a, b] = [Buffer.from(given), Buffer.from(right)];
  if (a.length !== b.length || !timingSafeEqual(a, b)) {
    throw new ProviderError(401, `Invalid API Key provided: ${given.slice(0, 8)}***`);
  }
}

const brokenDown = () =>
  new ProviderError(500, "The payment stand-in was told to fail this request.", { type: "api_error" });

function answerOf(requestId: string, work: () => unknown): Answer {
  try {
    return { status: 200, body: JSON.stringify(work()), requestId };
  } catch (error) {
    if (!(error instanceof ProviderError)) throw error;
    return { status: error.status, body: JSON.stringify(error.body), requestId };
  }
}

function send(res: Response, { status, body }: Answer): void {
  res.status(status).type("application/json").send(body);
}

/** Parameters with their names in order, so that the same request always reads the same. */
const fingerprintOf = (req: Request, params: unknown) =>
  `${req.method} ${req.path} ${JSON.stringify(params, (_, value) =>
    value !== null && typeof value === "object" && !Array.isArray(value)
      ? Object.fromEntries(Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)))
      : value,
  )}`;

/** The provider's HTTP API under `/v1`. */
export function apiRouter({ world, apiKey, troubles, refundStatus }: ApiOptions): Router {
  const router = express.Router();
  const keys = new IdempotencyKeys();

  async function perform(endpoint: Endpoint, req: Request, res: Response, requestId: string): Promise<void> {
    const name = `${endpoint.method} ${endpoint.path}`;
    if (troubles.take(name, "fail")) {
      res.set("stripe-should-retry", "true");
      throw brokenDown();
    }
    const raw = { ...req.query, ...(endpoint.method === "POST" ? (req.body as object | undefined) : {}) };
    const key = endpoint.method === "POST" ? req.get("idempotency-key") : undefined;
    if (key !== undefined) {
      res.set("idempotency-key", key);
      const earlier = keys.claim(key, fingerprintOf(req, raw), world.now());
      if (earlier) {
        res.set({ "idempotent-replayed": "true", "original-request": earlier.requestId });
        if (earlier.status >= 500) res.set("stripe-should-retry", "false");
        send(res, earlier);
        return;
      }
    }

    let work: () => unknown;
    try {
      work = endpoint.prepare(world, req.params as Record<string, string>, raw);
    } catch (error) {
      if (key !== undefined) keys.release(key);
      throw error;
    }
    if (troubles.take(name, "hold")) await troubles.wait();
    const broken = troubles.take(name, "fail-kept") !== null;
    const answer = answerOf(requestId, () => {
      if (broken) throw brokenDown();
      catchUp(world);
      world.cause = { id: requestId, idempotency_key: key ?? null };
      try {
        return work();
      } finally {
        world.cause = null;
      }
    });
    if (key !== undefined) keys.keep(key, answer);
    if (answer.status >= 500) res.set("stripe-should-retry", "false");

    const silence = troubles.take(name, "hang-after-commit", "cut-after-commit");
    if (silence === "cut-after-commit") res.destroy();
    else if (silence === null) send(res, answer);
  }

  router.use((req, res, next) => {
    res.locals.requestId = world.newId("req", 14);
    res.set({ "request-id": res.locals.requestId, "stripe-version": req.get("stripe-version") ?? API_VERSION });
    checkKey(keyOf(req), apiKey);
    next();
  });
  router.use(express.urlencoded({ extended: true, limit: "1mb", parameterLimit: 10_000 }));
  for (const endpoint of endpoints(refundStatus)) {
    const method = endpoint.method === "GET" ? "get" : "post";
    router[method](endpoint.path.replace(/^\/v1/, ""), (req, res) =>
      perform(endpoint, req, res, res.locals.requestId as string),
    );
  }
  router.use((req) => {
    throw new ProviderError(404, `Unrecognized request URL (${req.method}: ${req.originalUrl.split("?")[0]}).`);
  });
  router.use((error: unknown, _req: Request, res: Response, _next: express.NextFunction) => {
    const known =
      error instanceof ProviderError
        ? error
        : isClientError(error)
          ? new ProviderError(400, "The request body could not be read.")
          : new ProviderError(500, "The payment stand-in has a fault of its own.", { type: "api_error" });
    if (known.status === 401) res.set("www-authenticate", 'Basic realm="Payment stand-in"');
    res.status(known.status).json(known.body);
  });
  return router;
}

/** Errors of the body parser carry the status they deserve. */
const isClientError = (error: unknown): boolean =>
  error instanceof Error && "status" in error && typeof error.status === "number" && error.status < 500;
