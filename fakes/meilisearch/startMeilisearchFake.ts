import { once } from "node:events";
import type { AddressInfo } from "node:net";
import { ApiError, type ErrorCode } from "./ApiError";
import { createMeilisearchApp, type Failure } from "./createMeilisearchApp";
import { World } from "./World";

type MeilisearchControl = {
  /** The next `count` requests fail: with this answer (500 `internal` unless told), or by a broken connection. */
  failNext(count: number, failure?: { status?: number; code?: string; message?: string } | "drop"): void;
  /** Writes are accepted and stay "enqueued" until `releaseTasks`. */
  holdTasks(): void;
  releaseTasks(): void;
  /** The next `count` tasks end as failed without effect. */
  failNextTasks(count: number, error?: { code?: ErrorCode; message?: string }): void;
  /** Forgets every index and its documents; tasks stay on record. */
  reset(): void;
};

export type MeilisearchFake = {
  url: string;
  control: MeilisearchControl;
  close(): Promise<void>;
};

export type MeilisearchFakeOptions = {
  /** 0 takes a free port. */
  port?: number;
  /** Without one, everybody may do everything, as with the service started without a master key. */
  apiKey?: string;
  now?: () => Date;
};

/** A search engine in memory that speaks the published HTTP API of Meilisearch, on loopback. */
export async function startMeilisearchFake(options: MeilisearchFakeOptions = {}): Promise<MeilisearchFake> {
  const { port = 0, apiKey, now = () => new Date() } = options;
  const world = new World(now);
  const failures: Failure[] = [];
  const server = createMeilisearchApp(world, apiKey, () => failures.shift()).listen(port, "127.0.0.1");
  await once(server, "listening");

  return {
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    control: {
      failNext: (count, failure = {}) => {
        for (let i = 0; i < count; i += 1) failures.push(failure === "drop" ? failure : asFailure(failure));
      },
      holdTasks: () => world.tasks.hold(),
      releaseTasks: () => world.tasks.release(),
      failNextTasks: (count, { code = "internal", message = "The task was made to fail." } = {}) =>
        world.tasks.failNext(count, new ApiError(code, message)),
      reset: () => world.indexes.clear(),
    },
    close: async () => {
      server.closeAllConnections();
      await new Promise<void>((resolve) => server.close(() => resolve()));
    },
  };
}

function asFailure({ status = 500, code = "internal", message = "The request was made to fail." }): Failure {
  const type = status >= 500 ? "internal" : status === 401 || status === 403 ? "auth" : "invalid_request";
  return { status, message, code, type, link: `https://docs.meilisearch.com/errors#${code}` };
}
