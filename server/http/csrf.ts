import { randomBytes, timingSafeEqual } from "node:crypto";
import type { Request } from "express";
import type {} from "express-session";
import { AppError } from "../errors/AppError";

declare module "express-session" {
  interface SessionData {
    csrfToken: string;
    startedAt: number;
    lastSeenAt: number;
    basketId: string;
    userAgent: string;
  }
}

/** The token of this session, made when it is first asked for. */
export function csrfTokenOf(req: Request): string {
  req.session.csrfToken ??= randomBytes(32).toString("base64url");
  return req.session.csrfToken;
}

function sameText(a: string, b: string): boolean {
  const [left, right] = [Buffer.from(a), Buffer.from(b)];
  return left.length === right.length && timingSafeEqual(left, right);
}

/**
 * Refuses an unsafe call that does not come from one of our own pages: the token of the session must come in the
 * header (synchroniser token), and where the browser says who asks, it must be us (Fetch Metadata, Origin).
 */
export function requireOwnPage(req: Request): void {
  const site = req.get("sec-fetch-site");
  if (site && site !== "same-origin" && site !== "none") throw new AppError("stale-page");
  const origin = req.get("origin");
  if (origin && (!URL.canParse(origin) || new URL(origin).host !== req.get("host"))) throw new AppError("stale-page");
  const expected = req.session.csrfToken;
  if (!expected || !sameText(req.get("x-csrf-token") ?? "", expected)) throw new AppError("stale-page");
}
