import type { Request, Response } from "express";
import passport from "passport";
import { AppError } from "../errors/AppError";
import type { Actor } from "../policies/Actor";

/** Checks address and password; gives who it is, or throws `wrong-credentials` without saying which was wrong. */
export function authenticate(req: Request, res: Response): Promise<Actor> {
  return new Promise((resolve, reject) => {
    const answer = (error: unknown, actor: Actor | false | undefined) => {
      if (error) reject(error);
      else if (actor) resolve(actor);
      else
        reject(
          new AppError(
            "wrong-credentials",
            "The address or the password is not right. Nothing else is told, on purpose.",
          ),
        );
    };
    passport.authenticate("local", { session: false }, answer)(req, res, reject);
  });
}

/** Starts a session of its own for this person: a new id, so that one known before sign-in is worth nothing. */
export async function startSession(req: Request, actor: Actor, now: Date): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    req.logIn(actor, (error: unknown) => (error ? reject(error) : resolve()));
  });
  req.session.startedAt = now.getTime();
  req.session.lastSeenAt = now.getTime();
  req.session.userAgent = (req.get("user-agent") ?? "").slice(0, 200);
}

/** Ends this session; its cookie is dead at once. */
export function endSession(req: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    req.session.destroy((error: unknown) => (error ? reject(error) : resolve()));
  });
}
