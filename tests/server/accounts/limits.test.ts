import { afterAll, beforeAll, expect, it } from "vitest";
import { forgiveAccount, signInLimits, spendAccountTry } from "#server/accounts/signInLimits";
import { AppError } from "#server/errors/AppError";
import { RateLimits } from "#server/http/rateLimits";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
let limits: RateLimits;
beforeAll(async () => {
  site = await startTestSite();
  limits = new RateLimits(site.services.pool);
});
afterAll(() => site.close());

async function refusalOf(work: Promise<void>): Promise<AppError> {
  const error = await work.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  expect(error).toBeInstanceOf(AppError);
  expect((error as AppError).problem).toBe("too-often");
  return error as AppError;
}

async function fail(email: string, times: number): Promise<void> {
  for (let n = 0; n < times; n++) await spendAccountTry(limits, email);
}

it("ASVS 6.3.1: closes an account for a quarter of an hour after ten failures, whatever its spelling", async () => {
  await fail("Guess@example.org", signInLimits.perAccount.points);
  const refusal = await refusalOf(spendAccountTry(limits, "guess@example.org "));
  expect(refusal.options.retryAfterSeconds).toBe(15 * 60);
  await spendAccountTry(limits, "other@example.org");
  await forgiveAccount(limits, "guess@example.org");
  await spendAccountTry(limits, "guess@example.org");
});

it("closes it for twice as long the next time", async () => {
  const email = "twice@example.org";
  await fail(email, signInLimits.perAccount.points);
  await refusalOf(spendAccountTry(limits, email));
  // The quarter of an hour passes: what was counted is forgotten, that it was closed is not.
  await limits.forget(signInLimits.perAccount, email);
  await fail(email, signInLimits.perAccount.points);
  expect((await refusalOf(spendAccountTry(limits, email))).options.retryAfterSeconds).toBe(30 * 60);
});

it("ASVS 6.1.1: asks for a new password by mail after a hundred failures in a row, and that forgives", async () => {
  const email = "row@example.org";
  for (let n = 0; n < signInLimits.inARow.points; n++) await limits.count(signInLimits.inARow, email);
  expect((await refusalOf(spendAccountTry(limits, email))).message).toMatch(/by mail/);
  await forgiveAccount(limits, email);
  await spendAccountTry(limits, email);
});

it("lets calls through where the counter itself is down", async () => {
  const broken = new RateLimits({ query: () => Promise.reject(new Error("down")) } as never);
  await expect(broken.take(signInLimits.perAccount, "x")).resolves.toBeUndefined();
});
