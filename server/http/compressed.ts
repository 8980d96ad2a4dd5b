import compression from "compression";
import type { RequestHandler } from "express";

/**
 * Compresses what is worth it, but no answer of the session's: one that carries a secret beside words of the asker
 * would tell the secret by its length (BREACH, 2013).
 */
export const compressed = (): RequestHandler =>
  compression({
    filter: (req, res) => !req.originalUrl.startsWith("/api/v1/auth/") && compression.filter(req, res),
  });
