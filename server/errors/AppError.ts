import { type FieldError, type ProblemName, problems } from "#shared/problems";

/** A problem with a name: what a command throws and the error handler answers. */
export class AppError extends Error {
  constructor(
    readonly problem: ProblemName,
    readonly detail: string = problems[problem].title,
    readonly options: { errors?: FieldError[]; cause?: unknown; retryAfterSeconds?: number } = {},
  ) {
    super(detail, { cause: options.cause });
    this.name = "AppError";
  }
}
