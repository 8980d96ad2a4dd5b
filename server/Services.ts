import type { Pool } from "pg";
import type { Logger } from "pino";
import type { Sequelize } from "sequelize";
import type { Mailer } from "./adapters/Mailer";
import type { PaymentProvider } from "./adapters/PaymentProvider";
import type { PhotoStore } from "./adapters/PhotoStore";
import type { SearchEngine } from "./adapters/SearchEngine";
import type { Config } from "./config";
import type { RateLimits } from "./http/rateLimits";

/** What routes and jobs work with: made once at the start, by `createServices`, and handed on. */
export type Services = {
  config: Config;
  logger: Logger;
  sequelize: Sequelize;
  /** Plain connections for libraries that bring their own SQL: sessions, limits, jobs. */
  pool: Pool;
  limits: RateLimits;
  payments: PaymentProvider;
  search: SearchEngine;
  mailer: Mailer;
  photos: PhotoStore;
};
