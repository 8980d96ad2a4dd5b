import { afterAll, beforeAll, expect, it } from "vitest";
import { Basket } from "#server/models/Basket";
import { buildPart, buildUser, testPassword } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { visitor } from "#tests/support/visitor";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

it("says that it is busy where a row stays locked for longer than a statement may wait", async () => {
  const { sequelize } = site.services;
  const [user, part] = [await buildUser(), await buildPart()];
  const someone = await visitor(site);
  await someone.signIn(user.email, testPassword);
  await someone.put(`/basket/lines/${part.id}`, { quantity: 1 }).expect(200);
  // The row is held until the call has waited as long as a statement may.
  await sequelize.transaction(async (transaction) => {
    await Basket.findOne({ where: { userId: user.id }, transaction, lock: transaction.LOCK.UPDATE });
    const res = await someone.put(`/basket/lines/${part.id}`, { quantity: 2 });
    expect(res.status).toBe(503);
    expect(res.body.type).toBe("/problems/unavailable");
  });
});
