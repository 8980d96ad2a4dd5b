import { afterAll, beforeAll, expect, it } from "vitest";
import type { Role } from "#shared/schemas/session";
import { buildUser, testPassword } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { visitor } from "#tests/support/visitor";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

const minute = 60_000;
const day = 24 * 60 * minute;

/** Signs in, makes the session as old as told, and says whether it still holds. */
async function holdsAfter(role: Role, { idleMs, ageMs }: { idleMs: number; ageMs: number }): Promise<boolean> {
  const user = await buildUser({ role });
  const someone = await visitor(site);
  await someone.signIn(user.email, testPassword);
  await site.services.pool.query(
    `UPDATE sessions SET sess = (sess::jsonb || jsonb_build_object('lastSeenAt', $2::bigint, 'startedAt', $3::bigint))::json
     WHERE sess #>> '{passport,user}' = $1`,
    [user.id, Date.now() - idleMs, Date.now() - ageMs],
  );
  return (await someone.get("/auth/session")).body.user !== null;
}

it.each<[Role, string, { idleMs: number; ageMs: number }, boolean]>([
  ["restorer", "13 days unused", { idleMs: 13 * day, ageMs: 13 * day }, true],
  ["restorer", "over 14 days unused", { idleMs: 14 * day + minute, ageMs: 14 * day + minute }, false],
  ["workshop", "29 days old, in use", { idleMs: minute, ageMs: 29 * day }, true],
  ["workshop", "over 30 days old, in use", { idleMs: minute, ageMs: 30 * day + minute }, false],
  ["administrator", "14 minutes unused", { idleMs: 14 * minute, ageMs: 14 * minute }, true],
  ["administrator", "over 15 minutes unused", { idleMs: 16 * minute, ageMs: 16 * minute }, false],
  ["administrator", "over 8 hours old, in use", { idleMs: minute, ageMs: 481 * minute }, false],
])("ASVS 7.3: the session of a %s %s", async (role, _how, age, holds) => {
  expect(await holdsAfter(role, age)).toBe(holds);
});
