import connectPgSimple from "connect-pg-simple";
import type { RequestHandler } from "express";
import session from "express-session";
import type { Pool } from "pg";
import type { Role } from "#shared/schemas/session";

const minutes = 60_000;
const days = 24 * 60 * minutes;

/** How long a session lives without use, and at all (NIST SP 800-63B-4, section 2, for the ceiling of 30 days). */
export const sessionLife: Record<Role, { idleMs: number; absoluteMs: number }> = {
  restorer: { idleMs: 14 * days, absoluteMs: 30 * days },
  workshop: { idleMs: 14 * days, absoluteMs: 30 * days },
  administrator: { idleMs: 15 * minutes, absoluteMs: 480 * minutes },
};

/** Sessions in PostgreSQL; the cookie carries the id alone. */
export function sessions({ pool, secret, secure }: { pool: Pool; secret: string; secure: boolean }): RequestHandler {
  const PgStore = connectPgSimple(session);
  return session({
    store: new PgStore({ pool, tableName: "sessions", createTableIfMissing: false, pruneSessionInterval: 15 * 60 }),
    name: secure ? "__Host-idlewright" : "idlewright",
    secret,
    resave: false,
    saveUninitialized: false,
    rolling: false,
    cookie: { httpOnly: true, secure, sameSite: "lax", path: "/", maxAge: sessionLife.restorer.absoluteMs },
  });
}
