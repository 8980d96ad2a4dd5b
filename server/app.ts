import { existsSync } from "node:fs";
import { join } from "node:path";
import express, { type Express } from "express";
import { pendingMigrations } from "./db/migrate";
import { AppError } from "./errors/AppError";
import { answerError, answerNotFound } from "./errors/answerError";
import { compressed } from "./http/compressed";
import { requestLog } from "./http/logger";
import { mountEndpoints } from "./http/mountEndpoints";
import { describeInterface } from "./http/openapi";
import { readableInterface } from "./http/readableInterface";
import { securityHeaders } from "./http/securityHeaders";
import { sessions } from "./http/session";
import { signedIn } from "./http/signedIn";
import { endpointsOf } from "./routes/endpointsOf";
import { webhookRouter } from "./routes/webhooks";
import type { Services } from "./Services";

/** The whole HTTP side: API, health, photos and the built client where `clientDir` has one. */
export function createApp(services: Services, { clientDir }: { clientDir?: string } = {}): Express {
  const { config, logger, sequelize, pool, limits } = services;
  const endpoints = endpointsOf(services);
  const description = describeInterface(endpoints);
  const app = express();
  app.disable("x-powered-by");
  app.set("trust proxy", config.trustProxy);
  app.set("query parser", "simple");

  app.use(requestLog(logger));
  app.use(compressed());
  const payOrigin = config.stripe.apiUrl ? new URL(config.stripe.apiUrl).origin : "https://checkout.stripe.com";
  app.use(securityHeaders({ secure: config.secureCookies, payOrigin }));

  app.get("/healthz", (_req, res) => {
    res.json({ status: "up" });
  });
  app.get("/readyz", async (_req, res) => {
    const waiting = await pendingMigrations(sequelize).catch((cause: unknown) => {
      throw new AppError("unavailable", "The database does not answer", { cause });
    });
    if (waiting.length > 0) throw new AppError("unavailable", `Migrations are waiting: ${waiting.join(", ")}`);
    res.json({ status: "ready" });
  });

  const api = express.Router();
  api.use((_req, res, next) => {
    res.set("Cache-Control", "no-store");
    next();
  });
  api.use("/webhooks", webhookRouter(services));
  api.get("/openapi.json", (_req, res) => {
    res.json(description);
  });
  api.use(express.json({ limit: "100kb", strict: true }));
  api.use(sessions({ pool, secret: config.sessionSecret, secure: config.secureCookies }), signedIn());
  api.use(mountEndpoints(endpoints, limits));
  api.use(answerNotFound);
  app.use("/api/v1", api);
  app.get("/api/docs", readableInterface(endpoints));
  app.use("/api", answerNotFound);

  app.use(
    "/photos",
    express.static(services.photos.folder, { immutable: true, maxAge: "365d", index: false, redirect: false }),
    answerNotFound,
  );

  if (clientDir && existsSync(join(clientDir, "index.html"))) {
    app.use(
      "/assets",
      express.static(join(clientDir, "assets"), { immutable: true, maxAge: "365d", index: false }),
      answerNotFound,
    );
    app.use(express.static(clientDir, { index: false, dotfiles: "ignore", maxAge: "1h" }));
    app.get("/{*path}", (req, res, next) => {
      if (/\.[a-z0-9]+$/i.test(req.path) || req.path.includes("/.")) return next();
      res.set("Cache-Control", "no-cache").sendFile("index.html", { root: clientDir });
    });
  }
  app.use(answerNotFound);
  app.use(answerError);
  return app;
}
