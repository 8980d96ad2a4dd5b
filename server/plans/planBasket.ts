import { Worker } from "node:worker_threads";
import { DomainError } from "#shared/domain/DomainError";
import type { BasketPlanAnswer, BasketPlanRequest } from "#shared/schemas/gauges/basketPlan";
import { tooOften } from "../http/rateLimits";
import type { PlanTask, PlanWord } from "./PlanTask";

/** So many baskets may wait for the one thread that plans them; who comes later is asked to come again. */
const mostWaiting = 16;
const comeAgainSeconds = 5;

type Answer = PlanWord | { crashed: string };

const waiting = new Map<number, (answer: Answer) => void>();
let thread: Worker | undefined;
let count = 0;

function startThread(): Worker {
  // Bundled, this is part of server/main.js with the thread's program beside it.
  const program = import.meta.url.endsWith(".ts") ? "./planWorkerFromSource.mjs" : "./planWorker.js";
  const started = new Worker(new URL(program, import.meta.url));
  started.on("message", (word: PlanWord) => {
    const answer = waiting.get(word.id);
    waiting.delete(word.id);
    answer?.(word);
    if (waiting.size === 0) started.unref();
  });
  // A thread that ran out of memory has proved nothing; the next basket starts a new one.
  const crash = (why: string) => {
    if (thread !== started) return;
    thread = undefined;
    for (const answer of waiting.values()) answer({ crashed: why });
    waiting.clear();
  };
  started.on("error", (error) => crash(String(error)));
  started.on("exit", (code) => crash(`the planning thread ended with ${code}`));
  return started;
}

function ask(basket: BasketPlanRequest): Promise<Answer> {
  thread ??= startThread();
  thread.ref();
  const task: PlanTask = { id: ++count, basket };
  return new Promise((answer) => {
    waiting.set(task.id, answer);
    thread?.postMessage(task);
  });
}

/**
 * The four best plans for a basket (see `solveBasket`), worked out in a thread of its own so that nobody else waits.
 *
 * Sizes:  up to 40 needs, 60 workshops and 400 offers are taken. Measured on two cores (seeded baskets, one offer in seven
 *         a kit of four): 8 needs x 10 workshops x 40 offers 0.2 to 0.5 s of processor time, 12 x 20 x 120 0.4 to 0.7 s,
 *         20 x 30 x 200 1.0 to 1.5 s; 40 x 60 x 400, the most, 1 to 10 s. A basket may take 20 s.
 * Errors: DomainError for ids that stand twice or name nothing, and where the best could not be proved in the time: then
 *         nothing is answered rather than something that may not be the best. `too-often` where too many wait.
 */
export async function planBasket(basket: BasketPlanRequest): Promise<BasketPlanAnswer> {
  if (waiting.size >= mostWaiting) throw tooOften(comeAgainSeconds);
  const word = await ask(basket);
  if ("plan" in word) return word.plan;
  if ("refusal" in word) throw new DomainError(word.refusal.field, word.refusal.words);
  throw new DomainError(
    "offers",
    "There are too many ways to fill this basket to be sure of the best in time. Give fewer needs, workshops or offers.",
    { cause: "crashed" in word ? word.crashed : word.notProved },
  );
}
