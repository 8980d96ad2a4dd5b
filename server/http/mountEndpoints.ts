import { type Request, type Response, Router } from "express";
import { z } from "zod";
import type { FieldError } from "#shared/problems";
import { AppError } from "../errors/AppError";
import type { Actor } from "../policies/Actor";
import { requireOwnPage } from "./csrf";
import type { Endpoint, FileAnswer } from "./endpoint";
import { plainWords } from "./plainWords";
import type { RateLimits } from "./rateLimits";

/** JSON pointer (RFC 6901) to where in the request a schema found something wrong. */
const pointerOf = (path: readonly PropertyKey[]) =>
  `#${path.map((step) => `/${String(step).replaceAll("~", "~0").replaceAll("/", "~1")}`).join("")}`;

/** Where an issue lies; a field that is not known here is named itself. */
const placesOf = (issue: z.core.$ZodIssue): PropertyKey[][] =>
  issue.code === "unrecognized_keys" ? issue.keys.map((key) => [...issue.path, key]) : [issue.path];

/** A refusal names at most so many fields, however many are wrong. */
const mostErrors = 50;

/** What a schema found wrong, as the fields of a 422. */
export const fieldErrors = (error: z.ZodError, at: readonly string[] = []): FieldError[] =>
  error.issues
    .flatMap((issue) =>
      placesOf(issue).map((path) => ({ pointer: pointerOf([...at, ...path]), detail: issue.message })),
    )
    .slice(0, mostErrors);

function read(schema: z.ZodType | undefined, input: unknown): unknown {
  if (!schema) return undefined;
  const result = schema.safeParse(input, { error: plainWords });
  if (result.success) return result.data;
  throw new AppError("invalid-request", "Some of the request is not valid: see the fields named", {
    errors: fieldErrors(result.error),
    cause: result.error,
  });
}

function readParams(schema: z.ZodType | undefined, input: unknown): unknown {
  if (!schema) return undefined;
  const result = schema.safeParse(input);
  // An address that cannot exist is an address with nothing there.
  if (!result.success) throw new AppError("not-found");
  return result.data;
}

/** Who is signed in, or null. */
export function actorOf(req: Request): Actor | null {
  return req.user ?? null;
}

/** Sends the file of an endpoint that gives one, to be looked at in the browser and kept under its name. */
function sendFile(type: string, { name, content }: FileAnswer, res: Response): void {
  res.status(200).type(type).set("Content-Disposition", `inline; filename="${name}"`).send(content);
}

async function serve(endpoint: Endpoint, limits: RateLimits, req: Request, res: Response): Promise<void> {
  const actor = actorOf(req);
  await limits.spend(endpoint, actor, req);
  if (endpoint.access !== "anyone") {
    if (!actor) throw new AppError("not-signed-in");
    if (endpoint.access !== "signed-in" && !endpoint.access.includes(actor.role)) throw new AppError("not-allowed");
  }
  if (endpoint.method !== "get" && !endpoint.pure) requireOwnPage(req);

  const answer = await endpoint.run({
    actor,
    params: readParams(endpoint.params, req.params),
    query: read(endpoint.query, req.query),
    body: read(endpoint.body, req.body),
    now: new Date(),
    req,
    res,
  });

  if (endpoint.file) return sendFile(endpoint.file, answer as FileAnswer, res);
  if (!endpoint.answer) {
    res.status(204).end();
    return;
  }
  const parsed = endpoint.answer.safeParse(answer);
  if (!parsed.success) throw new Error(`answer of ${endpoint.path}: ${z.prettifyError(parsed.error)}`);
  res.status(endpoint.status ?? 200).json(parsed.data);
}

/** A router that serves the endpoints given, and answers 405 where only the method is wrong. */
export function mountEndpoints(endpoints: readonly Endpoint[], limits: RateLimits): Router {
  const router = Router({ caseSensitive: true, strict: true });
  for (const endpoint of endpoints) {
    router[endpoint.method](endpoint.path, (req, res) => serve(endpoint, limits, req, res));
  }
  for (const path of new Set(endpoints.map((endpoint) => endpoint.path))) {
    const methods = endpoints.filter((endpoint) => endpoint.path === path).map(({ method }) => method.toUpperCase());
    router.all(path, (_req, res) => {
      res.set("Allow", methods.join(", "));
      throw new AppError("method-not-allowed");
    });
  }
  return router;
}
