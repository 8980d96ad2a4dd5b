import { QueryTypes } from "sequelize";
import { afterAll, beforeAll, expect, it } from "vitest";
import { connect } from "#server/db/connect";
import { migrate, migrateDown, pendingMigrations } from "#server/db/migrate";
import { createTestDatabase } from "#tests/support/database";

let database: Awaited<ReturnType<typeof createTestDatabase>>;
let sequelize: ReturnType<typeof connect>;
beforeAll(async () => {
  database = await createTestDatabase();
  sequelize = connect(database.url);
});
afterAll(async () => {
  await sequelize.close();
  await database.drop();
});

const columns = () =>
  sequelize.query(
    `SELECT table_name, column_name, data_type, is_nullable FROM information_schema.columns
     WHERE table_schema = 'public' ORDER BY 1, 2`,
    { type: QueryTypes.SELECT },
  );
const constraints = () =>
  sequelize.query(
    `SELECT conname, pg_get_constraintdef(oid) AS body FROM pg_constraint WHERE connamespace = 'public'::regnamespace ORDER BY 1`,
    { type: QueryTypes.SELECT },
  );

it("go up, all the way down, and up again to the same schema", async () => {
  expect(await pendingMigrations(sequelize)).toEqual([]);
  const before = [await columns(), await constraints()];
  await migrateDown(sequelize);
  const left = await sequelize.query("SELECT tablename FROM pg_tables WHERE schemaname = 'public'", {
    type: QueryTypes.SELECT,
  });
  expect(left).toEqual([{ tablename: "migrations" }]);
  await migrate(sequelize, database.url);
  expect([await columns(), await constraints()]).toEqual(before);
});
