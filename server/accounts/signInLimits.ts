import type { Limit } from "../http/endpoint";
import type { RateLimits } from "../http/rateLimits";

/**
 * What slows guessing (OWASP ASVS 5.0.0, 6.1.1 and 6.3.1): tries by address of the caller, and failures by account.
 * A right password is never refused for good: the account limit is lifted by a reset through mail, and runs out by
 * itself within a day.
 */
export const signInLimits = {
  perAddress: { name: "sign-in-address", points: 20, perSeconds: 60 },
  perAccount: { name: "sign-in-account", points: 10, perSeconds: 15 * 60 },
  perAccountDay: { name: "sign-in-account-day", points: 100, perSeconds: 24 * 3600 },
  signUp: { name: "sign-up", points: 5, perSeconds: 3600 },
  resetPerAddress: { name: "reset-address", points: 10, perSeconds: 3600 },
  resetPerAccount: { name: "reset-account", points: 3, perSeconds: 3600 },
} satisfies Record<string, Limit>;

const accountKey = (email: string) => email.trim().toLowerCase();

/** Counts a try against the account; throws `too-often` when there were too many. */
export async function spendAccountTry(limits: RateLimits, email: string): Promise<void> {
  await limits.take(signInLimits.perAccount, accountKey(email));
  await limits.take(signInLimits.perAccountDay, accountKey(email));
}

/** Forgets the tries of an account after a right password. */
export async function forgiveAccount(limits: RateLimits, email: string): Promise<void> {
  await limits.forget(signInLimits.perAccount, accountKey(email));
  await limits.forget(signInLimits.perAccountDay, accountKey(email));
}
