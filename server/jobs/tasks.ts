import type { Task } from "graphile-worker";
import { applyPaymentEvent } from "../commands/applyPaymentEvent";
import { expireOrder } from "../commands/expireOrder";
import { refundOrder } from "../commands/refundOrder";
import { sendMail } from "../commands/sendMail";
import type { Services } from "../Services";
import type { Jobs } from "./addJob";

/** `lastTry` is true where the queue will not try again. */
type Work<Name extends keyof Jobs> = (
  services: Services,
  payload: Jobs[Name],
  attempt: { lastTry: boolean },
) => Promise<void>;

/** What each job does. A job may run again after a crash, so each is safe to repeat. */
const work: { [Name in keyof Jobs]?: Work<Name> } = {
  sendMail: (services, { mailId }, { lastTry }) => sendMail(services, mailId, { lastTry }),
  expireOrder: (services, { orderId }) => expireOrder(services, orderId),
  applyPaymentEvent: (services, { eventId }) => applyPaymentEvent(services, eventId),
  indexParts: ({ search }, { partIds }) => search.index(partIds),
  refundOrder: (services, { orderId, reason }) => refundOrder(services, orderId, reason),
};

/** The jobs as the queue's runner takes them. */
export function tasksOf(services: Services): Record<string, Task> {
  return Object.fromEntries(
    Object.entries(work).map(([name, run]) => [
      name,
      (payload: unknown, { job }) =>
        (run as Work<keyof Jobs>)(services, payload as Jobs[keyof Jobs], {
          lastTry: job.attempts >= job.max_attempts,
        }),
    ]),
  );
}
