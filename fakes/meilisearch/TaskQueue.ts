import { ApiError, type ErrorBody } from "./ApiError";

type TaskStatus = "enqueued" | "processing" | "succeeded" | "failed" | "canceled";
export const taskStatuses: readonly string[] = [
  "enqueued",
  "processing",
  "succeeded",
  "failed",
  "canceled",
] satisfies TaskStatus[];

export type TaskType =
  | "documentAdditionOrUpdate"
  | "documentDeletion"
  | "settingsUpdate"
  | "indexCreation"
  | "indexDeletion";

/** A piece of work as the service shows it. */
export type Task = {
  uid: number;
  batchUid: number | null;
  indexUid: string | null;
  status: TaskStatus;
  type: TaskType;
  canceledBy: number | null;
  details: Record<string, unknown>;
  error: ErrorBody | null;
  /** ISO 8601 duration, as are the service's. */
  duration: string | null;
  enqueuedAt: string;
  startedAt: string | null;
  finishedAt: string | null;
};

/** Does the work; what it gives is added to the task's details. */
type Work = () => Record<string, unknown> | undefined;

/** Writes wait here and are done one after the other, after the answer that announced them. */
export class TaskQueue {
  readonly tasks: Task[] = [];
  #waiting: { task: Task; work: Work }[] = [];
  #held = false;
  #scheduled = false;
  #failures: ApiError[] = [];

  constructor(private readonly now: () => Date) {}

  enqueue(indexUid: string, type: TaskType, details: Record<string, unknown>, work: Work): Task {
    const task: Task = {
      uid: this.tasks.length,
      batchUid: null,
      indexUid,
      status: "enqueued",
      type,
      canceledBy: null,
      details,
      error: null,
      duration: null,
      enqueuedAt: this.now().toISOString(),
      startedAt: null,
      finishedAt: null,
    };
    this.tasks.push(task);
    this.#waiting.push({ task, work });
    this.#schedule();
    return task;
  }

  get(uid: number): Task {
    const task = this.tasks[uid];
    if (!task) throw new ApiError("task_not_found", `Task \`${uid}\` not found.`);
    return task;
  }

  hold(): void {
    this.#held = true;
  }

  release(): void {
    this.#held = false;
    this.#schedule();
  }

  /** The next `count` tasks end as failed without doing anything. */
  failNext(count: number, error: ApiError): void {
    for (let i = 0; i < count; i += 1) this.#failures.push(error);
  }

  #schedule(): void {
    if (this.#scheduled) return;
    this.#scheduled = true;
    setImmediate(() => {
      this.#scheduled = false;
      while (!this.#held) {
        const next = this.#waiting.shift();
        if (!next) return;
        this.#run(next.task, next.work);
      }
    });
  }

  #run(task: Task, work: Work): void {
    const started = this.now();
    task.startedAt = started.toISOString();
    task.batchUid = task.uid;
    try {
      const failure = this.#failures.shift();
      if (failure) throw failure;
      Object.assign(task.details, work());
      task.status = "succeeded";
    } catch (error) {
      task.status = "failed";
      task.error = asApiError(error).toBody();
    }
    const finished = this.now();
    task.finishedAt = finished.toISOString();
    task.duration = `PT${(finished.getTime() - started.getTime()) / 1000}S`;
  }
}

const asApiError = (error: unknown) =>
  error instanceof ApiError ? error : new ApiError("internal", error instanceof Error ? error.message : String(error));
