import { runMigrations as migrateQueue } from "graphile-worker";
import type { Sequelize } from "sequelize";
import { SequelizeStorage, Umzug } from "umzug";
import { migrations } from "./migrations";

function migratorOf(sequelize: Sequelize) {
  return new Umzug({
    migrations: migrations.map(({ name, up, down }) => {
      const run = (sql: string) =>
        sequelize.transaction(async (transaction) => {
          await sequelize.query("SET LOCAL lock_timeout = '5s'", { transaction });
          await sequelize.query(sql, { transaction });
        });
      return { name, up: () => run(up), down: () => run(down) };
    }),
    storage: new SequelizeStorage({ sequelize, modelName: "migrations" }),
    logger: undefined,
  });
}

/** Brings the schema and the job queue's own up to date. Running it twice does nothing the second time. */
export async function migrate(sequelize: Sequelize, databaseUrl: string): Promise<string[]> {
  const done = await migratorOf(sequelize).up();
  await migrateQueue({ connectionString: databaseUrl });
  return done.map(({ name }) => name);
}

/** Takes every step back, newest first; for tests of the way back. */
export async function migrateDown(sequelize: Sequelize): Promise<string[]> {
  return (await migratorOf(sequelize).down({ to: 0 })).map(({ name }) => name);
}

/** Names of migrations that this program knows and the database has not seen. */
export async function pendingMigrations(sequelize: Sequelize): Promise<string[]> {
  return (await migratorOf(sequelize).pending()).map(({ name }) => name);
}
