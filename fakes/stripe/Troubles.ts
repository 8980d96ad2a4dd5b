/**
 * A bad day for the next requests:
 * - `fail`: 500 before anything is done or kept; a retry is new.
 * - `fail-kept`: 500 as the outcome of the work, kept under its idempotency key; a retry gets it again.
 * - `hang-after-commit`: the work is done and kept, but no answer ever comes.
 * - `cut-after-commit`: the work is done and kept, then the connection is cut.
 * - `hold`: the work waits, its key in use, until `release()`.
 */
export interface RequestTrouble {
  readonly kind: "fail" | "fail-kept" | "hang-after-commit" | "cut-after-commit" | "hold";
  /** How many requests it meets; 1 unless given. */
  readonly times?: number;
  /** Only these requests, as in `POST /v1/refunds` (names in a path as in `/v1/refunds/:refund`); all unless given. */
  readonly on?: string;
}

/** Troubles that are still to come, in the order they were asked for. */
export class Troubles {
  #pending: { kind: RequestTrouble["kind"]; left: number; on: string | undefined }[] = [];
  #waiting: (() => void)[] = [];

  add({ kind, times = 1, on }: RequestTrouble): void {
    this.#pending.push({ kind, left: times, on });
  }

  /** Uses up one trouble of these kinds that is meant for this request. */
  take(request: string, ...kinds: RequestTrouble["kind"][]): RequestTrouble["kind"] | null {
    const found = this.#pending.find(
      ({ kind, left, on }) => left > 0 && kinds.includes(kind) && (on === undefined || on === request),
    );
    if (!found) return null;
    found.left -= 1;
    this.#pending = this.#pending.filter(({ left }) => left > 0);
    return found.kind;
  }

  /** Waits until `release()`. */
  wait(): Promise<void> {
    return new Promise((resolve) => {
      this.#waiting.push(resolve);
    });
  }

  /** How many requests are being held. */
  get held(): number {
    return this.#waiting.length;
  }

  release(): void {
    const waiting = this.#waiting;
    this.#waiting = [];
    for (const proceed of waiting) proceed();
  }

  clear(): void {
    this.#pending = [];
    this.release();
  }
}
