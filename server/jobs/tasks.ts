import type { Task } from "graphile-worker";
import type { Services } from "../Services";
import type { Jobs } from "./addJob";

type Work<Name extends keyof Jobs> = (services: Services, payload: Jobs[Name]) => Promise<void>;

/** What each job does. A job may run again after a crash, so each is safe to repeat. */
const work: { [Name in keyof Jobs]?: Work<Name> } = {};

/** The jobs as the queue's runner takes them. */
export function tasksOf(services: Services): Record<string, Task> {
  return Object.fromEntries(
    Object.entries(work).map(([name, run]) => [
      name,
      (payload: unknown) => (run as Work<keyof Jobs>)(services, payload as Jobs[keyof Jobs]),
    ]),
  );
}
