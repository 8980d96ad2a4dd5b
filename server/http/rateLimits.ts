import type { Request } from "express";
import type { Pool } from "pg";
import { RateLimiterPostgres, RateLimiterRes } from "rate-limiter-flexible";
import { AppError } from "../errors/AppError";
import type { Actor } from "../policies/Actor";
import type { Endpoint, Limit } from "./endpoint";

/** One person's calls; an address may stand for many people behind it. */
const everyday = {
  user: { name: "everyday-user", points: 120, perSeconds: 60 },
  address: { name: "everyday-address", points: 600, perSeconds: 60 },
} satisfies Record<string, Limit>;

const told = ({ consumedPoints, msBeforeNext }: RateLimiterRes) => ({
  used: consumedPoints,
  seconds: msBeforeNext > 0 ? Math.ceil(msBeforeNext / 1000) : 0,
});

/** The refusal of a limit that is used up. */
export const tooOften = (seconds: number): AppError =>
  new AppError("too-often", `Too many tries. Wait ${Math.max(1, seconds)} seconds and try again.`, {
    retryAfterSeconds: Math.max(1, seconds),
  });

/**
 * Limits that hold across processes, counted in PostgreSQL.
 *
 * Each call is counted under its endpoint's own limit, or the everyday one, by signed-in user or else by address
 * (by address alone where the limit says so).
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
    const limit: Limit = endpoint.limit ?? (actor ? everyday.user : everyday.address);
    await this.take(limit, actor && limit.by !== "address" ? `user:${actor.id}` : `address:${req.ip}`);
  }

  /** Counts one use of a limit under a key; throws when it is used up. */
  async take(limit: Limit, key: string): Promise<void> {
    const { used, seconds } = await this.count(limit, key);
    if (this.isOver(limit, used)) throw tooOften(seconds);
  }

  /** Whether so many uses are more than the limit allows. */
  isOver(limit: Limit, used: number): boolean {
    return used > this.#pointsOf(limit);
  }

  /** Counts one use, and gives how many there were and the seconds until they are forgotten (0: not by themselves). */
  async count(limit: Limit, key: string): Promise<{ used: number; seconds: number }> {
    try {
      return told(await this.#limiter(limit).consume(key));
    } catch (error) {
      return error instanceof RateLimiterRes ? told(error) : { used: 0, seconds: 0 };
    }
  }

  /** Refuses a key for some time, whatever was counted. */
  async block(limit: Limit, key: string, seconds: number): Promise<void> {
    await this.#limiter(limit).block(key, seconds);
  }

  /** Forgets what was counted under a key, for example after a right password. */
  async forget(limit: Limit, key: string): Promise<void> {
    await this.#limiter(limit).delete(key);
  }

  #pointsOf({ points }: Limit): number {
    return Math.ceil(points * this.factor);
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
      points: this.#pointsOf(limit),
      duration: limit.perSeconds,
    });
    this.#limiters.set(limit.name, limiter);
    return limiter;
  }
}
