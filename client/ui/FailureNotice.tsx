import { ApiProblem } from "../lib/ApiProblem";
import { OfflineError } from "../lib/OfflineError";
import { Notice } from "./Notice";

type Props = {
  error: Error;
  /** What could not be done: "The parts could not be fetched". */
  what: string;
  /** What is safe: "What you measured is still in the address." */
  kept?: string;
  onRetry?: () => void;
};

/** A failed query in words: nobody answered, too many tries, or what the server said. */
export function FailureNotice({ error, what, kept, onRetry }: Props) {
  const offline = error instanceof OfflineError;
  const wait = error instanceof ApiProblem ? error.retryAfterSeconds : null;
  return (
    <Notice tone="wrong" title={offline ? "No connection" : what} onRetry={onRetry}>
      <p>
        {offline ? `${what}: ${error.message}` : error.message}
        {wait !== null && ` Wait ${wait} ${wait === 1 ? "second" : "seconds"}.`}
      </p>
      {kept && <p className="text-soft">{kept}</p>}
    </Notice>
  );
}
