import type { Request } from "express";
import type { Pool } from "pg";
import { RateLimiterPostgres, RateLimiterRes } from "rate-limiter-flexible";
import { AppError } from "../errors/AppError";
import type { Actor } from "../policies/Actor";
import type { Endpoint, Limit } from "./endpoint";

const everyday: Limit = { name: "everyday", points: 600, perSeconds: 60 };

/**
 * Limits that hold across processes, counted in PostgreSQL.
 *
 * Each call is counted under its endpoint's own limit, or the everyday one, by signed-in user or else by address.
 * Errors: `too-often` with the seconds to wait. Where the counter itself fails the call goes on: a limit that is
 * down must not close the shop.
 */
export class RateLimits {
  readonly #limiters = new Map<string, RateLimiterPostgres>();

  constructor(
    private readonly pool: Pool,
    private readonly factor = 1,
  ) {}

  async spend(endpoint: Endpoint, actor: Actor | null, req: Request): Promise<void> {
    await this.take(endpoint.limit ?? everyday, actor ? `user:${actor.id}` : `address:${req.ip}`);
  }

  /** Counts one use of a limit under a key; throws when it is used up. */
  async take(limit: Limit, key: string): Promise<void> {
    try {
      await this.#limiter(limit).consume(key);
    } catch (error) {
      if (!(error instanceof RateLimiterRes)) return;
      const seconds = Math.max(1, Math.ceil(error.msBeforeNext / 1000));
      throw new AppError("too-often", `Too many tries. Wait ${seconds} seconds and try again.`, {
        retryAfterSeconds: seconds,
      });
    }
  }

  /** Forgets what was counted under a key, for example after a right password. */
  async forget(limit: Limit, key: string): Promise<void> {
    await this.#limiter(limit).delete(key);
  }

  #limiter(limit: Limit): RateLimiterPostgres {
    const known = this.#limiters.get(limit.name);
    if (known) return known;
    const limiter = new RateLimiterPostgres({
      storeClient: this.pool,
      storeType: "pool",
      tableName: "rate_limits",
      tableCreated: true,
      keyPrefix: limit.name,
      points: Math.ceil(limit.points * this.factor),
      duration: limit.perSeconds,
    });
    this.#limiters.set(limit.name, limiter);
    return limiter;
  }
}
