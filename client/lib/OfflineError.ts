/** The server could not be reached at all: no answer, so nothing is known to have happened. */
export class OfflineError extends Error {
  override readonly name = "OfflineError";

  constructor(cause: unknown) {
    super("Idlewright cannot be reached. Look at your connection.", { cause });
  }
}
