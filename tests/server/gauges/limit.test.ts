import { randomUUID } from "node:crypto";
import type { Request } from "express";
import { afterAll, beforeAll, expect, it } from "vitest";
import { RateLimits } from "#server/http/rateLimits";
import { endpointsOf } from "#server/routes/endpointsOf";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

it("allows an address 1,200 calls of all gauges together in a minute, whoever is signed in", async () => {
  const limits = new RateLimits(site.services.pool);
  const gauges = endpointsOf(site.services).filter(({ limit }) => limit?.name === "gauges");
  expect(gauges).toHaveLength(13);
  const people = [null, { id: randomUUID(), role: "restorer" as const, workshopId: null }];
  const from = { ip: "192.0.2.7" } as Request;
  for (let n = 0; n < 1200; n += 1) await limits.spend(gauges[n % gauges.length]!, people[n % 2] ?? null, from);
  for (const actor of people) {
    await expect(limits.spend(gauges[0]!, actor, from)).rejects.toMatchObject({
      problem: "too-often",
      options: { retryAfterSeconds: expect.any(Number) },
    });
  }
  await limits.spend(gauges[0]!, null, { ip: "192.0.2.8" } as Request);
});
