import express, { type ErrorRequestHandler, type Express, type RequestHandler } from "express";
import { ApiError, type ErrorBody } from "./ApiError";
import { documentRoutes } from "./routes/documentRoutes";
import { indexRoutes } from "./routes/indexRoutes";
import { searchRoutes } from "./routes/searchRoutes";
import { settingsRoutes } from "./routes/settingsRoutes";
import { taskRoutes } from "./routes/taskRoutes";
import type { World } from "./World";

/** A bad day: an answer to give instead of the right one, or "drop" to break the connection off. */
export type Failure = ({ status: number } & ErrorBody) | "drop";

/** Bytes a request may have. The service takes about 100 MB; a fake in tests that gets a fifth has met a mistake. */
const LARGEST_BODY = 20 * 1024 * 1024;

/** The service's HTTP API, as far as it is published and this project needs it. */
export function createMeilisearchApp(
  world: World,
  apiKey: string | undefined,
  takeFailure: () => Failure | undefined,
): Express {
  const app = express();
  app.disable("x-powered-by");
  app.disable("etag");
  app.use(failing(takeFailure));
  app.get("/health", (_req, res) => {
    res.json({ status: "available" });
  });
  app.use(authorized(apiKey));
  app.get("/version", (_req, res) => {
    res.json({ commitSha: "fake", commitDate: "2026-01-01T00:00:00Z", pkgVersion: "1.47.0" });
  });
  app.use(jsonOnly, express.json({ limit: LARGEST_BODY, strict: false }));
  app.use(indexRoutes(world), settingsRoutes(world), documentRoutes(world), searchRoutes(world), taskRoutes(world));
  app.use((req) => {
    throw new ApiError("not_found", `${req.method} ${req.path} is not part of this fake.`);
  });
  app.use(answerErrors);
  return app;
}

function failing(takeFailure: () => Failure | undefined): RequestHandler {
  return (req, res, next) => {
    const failure = takeFailure();
    if (!failure) return next();
    if (failure === "drop") return void req.socket.destroy();
    const { status, ...body } = failure;
    res.status(status).json(body);
  };
}

/** Source: Meilisearch documentation, "Basic security" and "Error codes". */
function authorized(apiKey: string | undefined): RequestHandler {
  return (req, _res, next) => {
    if (apiKey === undefined) return next();
    const [, key] = /^Bearer (.+)$/.exec(req.get("authorization") ?? "") ?? [];
    if (key === undefined) {
      const message = "The Authorization header is missing. It must use the bearer authorization method.";
      throw new ApiError("missing_authorization_header", message);
    }
    if (key !== apiKey) throw new ApiError("invalid_api_key", "The provided API key is invalid.");
    next();
  };
}

const jsonOnly: RequestHandler = (req, _res, next) => {
  if (!["POST", "PUT", "PATCH"].includes(req.method)) return next();
  const type = req.get("content-type");
  const allowed = "The accepted value for the Content-Type header here is: `application/json`";
  if (type === undefined) throw new ApiError("missing_content_type", `A Content-Type header is missing. ${allowed}`);
  if (!req.is("application/json")) {
    throw new ApiError("invalid_content_type", `The Content-Type \`${type}\` is invalid. ${allowed}`);
  }
  if (req.get("content-length") === "0") throw new ApiError("missing_payload", "A json payload is missing.");
  next();
};

const answerErrors: ErrorRequestHandler = (error: unknown, _req, res, _next) => {
  const known = error instanceof ApiError ? error : fromParser(error);
  res.status(known.status).json(known.toBody());
};

/** What express's body parser found wrong, which it tells by `type`. */
function fromParser(error: unknown): ApiError {
  const { type, message } = error as { type?: unknown; message?: unknown };
  if (type === "entity.too.large") {
    return new ApiError("payload_too_large", `The provided payload reached the size limit: ${LARGEST_BODY} bytes.`);
  }
  if (type === "entity.parse.failed") {
    return new ApiError("malformed_payload", `The \`json\` payload provided is malformed. ${String(message)}`);
  }
  return new ApiError("internal", String(message ?? error));
}
