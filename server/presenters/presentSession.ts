import type { Request } from "express";
import type { Session } from "#shared/schemas/session";
import type { Config } from "../config";
import { demoAccounts } from "../demo/demoAccounts";
import { csrfTokenOf } from "../http/csrf";
import { User } from "../models/User";

/** Who is signed in, the token that unsafe calls carry, and in demo mode the accounts to try. */
export async function presentSession(req: Request, config: Config): Promise<Session> {
  const user = req.user ? await User.findByPk(req.user.id) : null;
  return {
    user: user && {
      id: user.id,
      email: user.email,
      displayName: user.displayName,
      role: user.role,
      emailVerified: user.emailVerifiedAt !== null,
    },
    csrfToken: csrfTokenOf(req),
    ...(config.mode === "demo" ? { demoAccounts: [...demoAccounts] } : {}),
  };
}
