import { type FieldError, type Problem, type ProblemName, problemType } from "#shared/problems";

/** A refusal of the server, as it sent it (RFC 9457). Screens branch on `is(name)`, never on words. */
export class ApiProblem extends Error {
  override readonly name = "ApiProblem";
  readonly status: number;
  readonly title: string;
  readonly type: string;
  readonly errors: readonly FieldError[];
  /** Seconds to wait before another try; null where the server does not say. */
  readonly retryAfterSeconds: number | null;

  constructor(problem: Problem, retryAfterSeconds: number | null = null) {
    super(problem.detail || problem.title);
    this.status = problem.status;
    this.title = problem.title;
    this.type = problem.type;
    this.errors = problem.errors ?? [];
    this.retryAfterSeconds = retryAfterSeconds;
  }

  is(name: ProblemName): boolean {
    return this.type === problemType(name);
  }
}
