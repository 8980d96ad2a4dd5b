import { parentPort } from "node:worker_threads";
import { DomainError } from "#shared/domain/DomainError";
import { NotProved } from "./NotProved";
import type { PlanTask, PlanWord } from "./PlanTask";
import { solveBasket } from "./solveBasket";

/** How long one basket may take, all its plans together. */
const secondsAllowed = 20;

async function answer({ id, basket }: PlanTask): Promise<PlanWord> {
  const started = performance.now();
  const secondsLeft = () => Math.max(0.05, secondsAllowed - (performance.now() - started) / 1000);
  try {
    return { id, plan: await solveBasket(basket, secondsLeft) };
  } catch (error) {
    if (error instanceof DomainError) return { id, refusal: { field: error.field, words: error.words } };
    if (error instanceof NotProved) return { id, notProved: error.message };
    throw error;
  }
}

// One at a time: solving does not wait for anything, and two would only slow each other down.
let last: Promise<unknown> = Promise.resolve();
parentPort?.on("message", (task: PlanTask) => {
  last = last.then(async () => parentPort?.postMessage(await answer(task)));
});
