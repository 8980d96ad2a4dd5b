import type { ErrorRequestHandler, RequestHandler } from "express";
import { ConnectionAcquireTimeoutError, ConnectionError, DatabaseError, UniqueConstraintError } from "sequelize";
import { type Problem, type ProblemName, problems, problemType } from "#shared/problems";
import { AppError } from "./AppError";

type Thrown = { type?: string; status?: number; statusCode?: number };

/** SQLSTATE of a statement that waited too long, of a lost lock, and of what was tried again in vain: come back later. */
const busy = new Set(["57014", "55P03", "40001", "40P01"]);
const sqlState = (error: unknown) =>
  error instanceof DatabaseError ? (error.parent as Error & { code?: string }).code : undefined;

/** Errors of libraries, known by class or code, as our own. */
function named(error: unknown): AppError {
  if (error instanceof AppError) return error;
  if (error instanceof UniqueConstraintError) return new AppError("already-exists", undefined, { cause: error });
  if (error instanceof ConnectionAcquireTimeoutError || error instanceof ConnectionError) {
    return new AppError("unavailable", undefined, { cause: error });
  }
  if (busy.has(sqlState(error) ?? "")) return new AppError("unavailable", undefined, { cause: error });
  const { type, status, statusCode } = (error ?? {}) as Thrown;
  const byType: Record<string, ProblemName> = {
    "entity.parse.failed": "malformed-request",
    "entity.too.large": "too-large",
    "encoding.unsupported": "unsupported-media-type",
    "charset.unsupported": "unsupported-media-type",
  };
  const known = type ? byType[type] : undefined;
  if (known) return new AppError(known, undefined, { cause: error });
  const code = status ?? statusCode;
  // What Express and its readers blame on the caller: a bad escape in the address, a body cut short.
  if (code && code >= 400 && code < 500) return new AppError("malformed-request", undefined, { cause: error });
  return new AppError("internal", undefined, { cause: error });
}

/** Every error as `application/problem+json` (RFC 9457). What has no name is logged and says nothing. */
export const answerError: ErrorRequestHandler = (thrown, req, res, next) => {
  const error = named(thrown);
  const { status, title } = problems[error.problem];
  if (status >= 500) req.log?.error({ err: error.options.cause ?? error }, "request failed");
  if (res.headersSent) return next(thrown);
  if (error.options.retryAfterSeconds) res.set("Retry-After", String(error.options.retryAfterSeconds));
  const problem: Problem = {
    type: problemType(error.problem),
    title,
    status,
    detail:
      error.problem === "internal"
        ? `Something went wrong here. Nothing you typed is lost; say number ${req.id} when you report it.`
        : error.detail,
    ...(error.options.errors ? { errors: error.options.errors } : {}),
  };
  res.status(status).type("application/problem+json").send(JSON.stringify(problem));
};

export const answerNotFound: RequestHandler = () => {
  throw new AppError("not-found");
};
