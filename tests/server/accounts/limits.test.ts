import { afterAll, beforeAll, expect, it } from "vitest";
import { forgiveAccount, signInLimits, spendAccountTry } from "#server/accounts/signInLimits";
import { AppError } from "#server/errors/AppError";
import { RateLimits } from "#server/http/rateLimits";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

it("ASVS 6.3.1: slows guessing at one account, whatever its spelling, and forgives after a right password", async () => {
  const limits = new RateLimits(site.services.pool);
  for (let n = 0; n < signInLimits.perAccount.points; n++) await spendAccountTry(limits, "Guess@example.org");
  const refused = await spendAccountTry(limits, "guess@example.org ").catch((error: unknown) => error);
  expect(refused).toBeInstanceOf(AppError);
  expect((refused as AppError).problem).toBe("too-often");
  expect((refused as AppError).options.retryAfterSeconds).toBeGreaterThan(0);

  await spendAccountTry(limits, "other@example.org");
  await forgiveAccount(limits, "guess@example.org");
  await spendAccountTry(limits, "guess@example.org");
});

it("lets calls through where the counter itself is down", async () => {
  const broken = new RateLimits({ query: () => Promise.reject(new Error("down")) } as never);
  await expect(broken.take(signInLimits.perAccount, "x")).resolves.toBeUndefined();
});
