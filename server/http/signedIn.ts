import type { RequestHandler } from "express";
import passport from "passport";
import { User } from "../models/User";
import { Workshop } from "../models/Workshop";
import type { Actor } from "../policies/Actor";
import { sessionLife } from "./session";

/** How fresh `lastSeenAt` is kept; finer would write a session row on every request. */
const touchEveryMs = 60_000;

/** The person of a session, read anew on each request so that a disabled account is out at once. */
async function actorById(id: string): Promise<Actor | null> {
  const user = await User.findByPk(id);
  if (!user || user.disabledAt) return null;
  const workshop = user.role === "workshop" ? await Workshop.findOne({ where: { ownerId: id } }) : null;
  return { id: user.id, role: user.role, workshopId: workshop?.id ?? null };
}

passport.serializeUser<string>((user, done) => done(null, user.id));
passport.deserializeUser<string>((id, done) => {
  actorById(id).then(
    (actor) => done(null, actor ?? false),
    (error: unknown) => done(error),
  );
});

/** Ends a session that has outlived its role's limits, by the server's clock. */
const outlived: RequestHandler = (req, _res, next) => {
  const actor = req.user;
  if (!actor) return next();
  const now = Date.now();
  const { idleMs, absoluteMs } = sessionLife[actor.role];
  const { startedAt = 0, lastSeenAt = 0 } = req.session;
  if (now - startedAt > absoluteMs || now - lastSeenAt > idleMs) {
    req.logout((error: unknown) => next(error));
    return;
  }
  if (now - lastSeenAt > touchEveryMs) req.session.lastSeenAt = now;
  next();
};

/** Puts the signed-in person on the request, if there is one. */
export function signedIn(): RequestHandler[] {
  return [passport.session(), outlived];
}
