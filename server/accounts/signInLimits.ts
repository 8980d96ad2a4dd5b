import { AppError } from "../errors/AppError";
import type { Limit } from "../http/endpoint";
import { type RateLimits, tooOften } from "../http/rateLimits";

/**
 * What slows guessing (OWASP ASVS 5.0.0, 6.1.1 and 6.3.1): tries by the caller's address, and failures by account. Ten
 * failures in a quarter of an hour close an account for that long, the next ten for twice that, and so on; a hundred in
 * a row ask for a new password by mail. So nobody is locked out for good: whoever reads the mail can set a password at
 * any time, and that forgives everything.
 */
export const signInLimits = {
  perAddress: { name: "sign-in-address", points: 20, perSeconds: 60 },
  perAccount: { name: "sign-in-account", points: 10, perSeconds: 15 * 60 },
  closings: { name: "sign-in-closings", points: 100, perSeconds: 24 * 3600 },
  inARow: { name: "sign-in-row", points: 100, perSeconds: 0 },
  signUp: { name: "sign-up", points: 5, perSeconds: 3600 },
  resetPerAddress: { name: "reset-address", points: 10, perSeconds: 3600 },
  resetPerAccount: { name: "reset-account", points: 3, perSeconds: 3600 },
} satisfies Record<string, Limit>;

const accountKey = (email: string) => email.trim().toLowerCase();

/** Counts a try against the account; throws `too-often` when there were too many. */
export async function spendAccountTry(limits: RateLimits, email: string): Promise<void> {
  const key = accountKey(email);
  const { perAccount, closings, inARow } = signInLimits;
  const row = await limits.count(inARow, key);
  if (limits.isOver(inARow, row.used)) {
    throw new AppError("too-often", "Too many tries failed in a row: set a new password by mail", {
      retryAfterSeconds: 3600,
    });
  }
  const { used, seconds } = await limits.count(perAccount, key);
  if (!limits.isOver(perAccount, used)) return;
  if (limits.isOver(perAccount, used - 1)) throw tooOften(seconds);
  // The first refusal of a closing: each closing of the day lasts twice as long as the one before.
  const closing = await limits.count(closings, key);
  const closedFor = perAccount.perSeconds * 2 ** Math.min(closing.used - 1, 6);
  await limits.block(perAccount, key, closedFor);
  throw tooOften(closedFor);
}

/** Forgets the tries of an account: after a right password, and after a new one was set by mail. */
export async function forgiveAccount(limits: RateLimits, email: string): Promise<void> {
  const key = accountKey(email);
  const { perAccount, closings, inARow } = signInLimits;
  await Promise.all([perAccount, closings, inARow].map((limit) => limits.forget(limit, key)));
}
