import pg from "pg";
import { createMailer } from "./adapters/Mailer";
import { createPaymentProvider } from "./adapters/PaymentProvider";
import { PhotoStore } from "./adapters/PhotoStore";
import type { Config } from "./config";
import { connect } from "./db/connect";
import { createLogger } from "./http/logger";
import { RateLimits } from "./http/rateLimits";
import type { Services } from "./Services";
import { createSearchEngine } from "./search/createSearchEngine";

/** Everything that the server works with, from its settings. */
export function createServices(config: Config): Services {
  const logger = createLogger(config.logLevel);
  const pool = new pg.Pool({ connectionString: config.databaseUrl, max: 8 });
  const lost = (error: Error) => logger.warn({ err: error }, "an idle database connection failed");
  pool.on("error", lost);
  pool.on("connect", (client) => client.on("error", lost));
  return {
    config,
    logger,
    sequelize: connect(config.databaseUrl),
    pool,
    // Tests sign in and search far more often than anybody would from one address.
    limits: new RateLimits(pool, config.mode === "test" ? 1000 : 1),
    payments: createPaymentProvider(config.stripe),
    search: createSearchEngine(config, logger),
    mailer: createMailer(config.mail),
    photos: new PhotoStore(config.dataDir),
  };
}

/** Lets go of every connection. */
export async function closeServices({ sequelize, pool, mailer }: Services): Promise<void> {
  mailer.close();
  await Promise.all([sequelize.close(), pool.end()]);
}
