import { ProviderError } from "./ProviderError";

/** An answer as first given; what a repeated request gets again, byte for byte. */
export interface Answer {
  readonly status: number;
  readonly body: string;
  readonly requestId: string;
}

interface Entry {
  readonly fingerprint: string;
  readonly since: number;
  answer: Answer | null;
}

/** "Keys ... can be removed from the system automatically after they're at least 24 hours old", in seconds. */
const KEPT_FOR = 24 * 60 * 60;

/**
 * Idempotency as documented (https://docs.stripe.com/api/idempotent_requests): the first status and body are kept once
 * the work has begun, failures included, and given again. Nothing is kept when the parameters fail validation or when
 * another request holds the key. After 24 hours a key counts as new.
 */
export class IdempotencyKeys {
  readonly #entries = new Map<string, Entry>();

  /** Claims a key (null: do the work) or gives the earlier answer. `now` in seconds. Throws 400 or 409. */
  claim(key: string, fingerprint: string, now: number): Answer | null {
    if (key.length > 255) {
      throw new ProviderError(400, "Idempotency keys can be at most 255 characters long.");
    }
    const entry = this.#entries.get(key);
    if (!entry || (entry.answer && now - entry.since >= KEPT_FOR)) {
      this.#entries.set(key, { fingerprint, since: now, answer: null });
      return null;
    }
    if (!entry.answer) {
      throw new ProviderError(409, "There is currently another in-progress request using this Idempotent Key.", {
        code: "idempotency_key_in_use",
      });
    }
    if (entry.fingerprint !== fingerprint) {
      throw new ProviderError(
        400,
        "Keys for idempotent requests can only be used with the same parameters they were first used with.",
        { type: "idempotency_error" },
      );
    }
    return entry.answer;
  }

  keep(key: string, answer: Answer): void {
    const entry = this.#entries.get(key);
    if (entry) entry.answer = answer;
  }

  release(key: string): void {
    this.#entries.delete(key);
  }
}
