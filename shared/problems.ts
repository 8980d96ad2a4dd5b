/** Every problem that the interface can answer with: its status and title (RFC 9457). */
export const problems = {
  "malformed-request": { status: 400, title: "The request could not be read" },
  "not-signed-in": { status: 401, title: "Sign in first" },
  "wrong-credentials": { status: 401, title: "The address or the password is not right" },
  "not-allowed": { status: 403, title: "Your role does not allow this" },
  "stale-page": { status: 403, title: "This page has gone stale: load it again" },
  "not-found": { status: 404, title: "There is nothing here" },
  "method-not-allowed": { status: 405, title: "This address does not do that" },
  "wrong-state": { status: 409, title: "Its state does not allow that now" },
  "changed-meanwhile": { status: 409, title: "It was changed in another place" },
  "already-exists": { status: 409, title: "It is there already" },
  "out-of-stock": { status: 409, title: "Not enough of it is left" },
  "total-changed": { status: 409, title: "The total is no longer what you were shown" },
  "not-shipped-there": { status: 409, title: "A workshop does not ship to that country" },
  "empty-basket": { status: 409, title: "The basket is empty" },
  "verify-first": { status: 403, title: "Confirm your e-mail address first" },
  "too-large": { status: 413, title: "That is too large" },
  "unsupported-media-type": { status: 415, title: "Send JSON" },
  "invalid-request": { status: 422, title: "Some of the request is not valid" },
  "too-often": { status: 429, title: "Too many tries: wait a little" },
  "payment-unreachable": { status: 503, title: "The payment service does not answer: nothing was charged" },
  unavailable: { status: 503, title: "Idlewright is busy: try again in a moment" },
  internal: { status: 500, title: "Something went wrong here" },
} as const;
export type ProblemName = keyof typeof problems;

export type FieldError = { pointer: string; detail: string };

/** `application/problem+json` as sent. */
export type Problem = {
  type: string;
  title: string;
  status: number;
  detail: string;
  errors?: FieldError[];
};

export const problemType = (name: ProblemName): string => `/problems/${name}`;
