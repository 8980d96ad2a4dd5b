import { Logger, type Runner, run } from "graphile-worker";
import type { Services } from "../Services";
import { tasksOf } from "./tasks";

/** Works through the queue until stopped. A job that fails is tried again later, up to its limit. */
export function startWorker(services: Services): Promise<Runner> {
  const { pool, logger, config } = services;
  return run({
    pgPool: pool,
    taskList: tasksOf(services),
    concurrency: 4,
    pollInterval: 2_000,
    noHandleSignals: true,
    schema: "graphile_worker",
    logger: new Logger(() => (level, message) => {
      if (level === "error" || level === "warning") logger.warn({ job: message }, "job queue");
      else if (config.logLevel === "debug") logger.debug({ job: message }, "job queue");
    }),
  });
}
