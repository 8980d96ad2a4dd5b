import pg from "pg";
import { Sequelize } from "sequelize";
import { initModels } from "../models/initModels";

// Money and counts are bigint in the database and stay below 2^53 by their constraints: read them as numbers.
pg.types.setTypeParser(pg.types.builtins.INT8, (text) => {
  const value = Number(text);
  if (!Number.isSafeInteger(value)) throw new RangeError(`${text} is beyond what a number holds exactly`);
  return value;
});

/** One pool of connections with the models on it. Nothing is sent to the database before the first query. */
export function connect(databaseUrl: string, { poolSize = 10 }: { poolSize?: number } = {}): Sequelize {
  const sequelize = new Sequelize(databaseUrl, {
    dialect: "postgres",
    logging: false,
    pool: { max: poolSize, min: 0, acquire: 10_000, idle: 10_000 },
    dialectOptions: {
      statement_timeout: 5_000,
      idle_in_transaction_session_timeout: 10_000,
      application_name: "idlewright",
    },
    define: { underscored: true, timestamps: true },
  });
  initModels(sequelize);
  return sequelize;
}
