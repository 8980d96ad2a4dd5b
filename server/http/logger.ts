import { randomUUID } from "node:crypto";
import { type Logger, pino } from "pino";
import { pinoHttp } from "pino-http";

export function createLogger(level: string): Logger {
  return pino({ level, base: null, timestamp: pino.stdTimeFunctions.isoTime });
}

/** Logs each request by path without its query, and by status: no address, no mail, no body, no cookie, no name. */
export function requestLog(logger: Logger) {
  return pinoHttp({
    logger,
    genReqId: (_req, res) => {
      const id = randomUUID();
      res.setHeader("X-Request-Id", id);
      return id;
    },
    serializers: {
      req: (req: { id: string; method: string; url: string }) => ({
        id: req.id,
        method: req.method,
        path: req.url.split("?")[0],
      }),
      res: (res: { statusCode: number }) => ({ status: res.statusCode }),
    },
    customLogLevel: (_req, res, error) => (error || res.statusCode >= 500 ? "error" : "info"),
    autoLogging: { ignore: (req) => req.url === "/healthz" || (req.url ?? "").startsWith("/assets/") },
  });
}
