/** The kinds of error that the provider's description names (schema `api_errors`, property `type`). */
type ErrorType = "api_error" | "card_error" | "idempotency_error" | "invalid_request_error";

interface ErrorDetail {
  readonly code?: string;
  readonly param?: string;
  readonly type?: ErrorType;
}

/** An answer other than 2xx, in the provider's shape: `{error: {type, message, code?, param?}}`. */
export class ProviderError extends Error {
  readonly type: ErrorType;
  readonly code: string | undefined;
  readonly param: string | undefined;

  constructor(
    readonly status: number,
    message: string,
    { code, param, type = "invalid_request_error" }: ErrorDetail = {},
  ) {
    super(message);
    this.name = "ProviderError";
    this.type = type;
    this.code = code;
    this.param = param;
  }

  /** What goes over the wire; absent fields are left out. */
  get body(): { error: { type: ErrorType; message: string; code?: string; param?: string } } {
    return {
      error: {
        type: this.type,
        message: this.message,
        ...(this.code === undefined ? {} : { code: this.code }),
        ...(this.param === undefined ? {} : { param: this.param }),
      },
    };
  }
}

/** 404 for an object that is not there; `param` is the name that the path gives it in the description. */
export function missing(kind: string, id: string, param: string): ProviderError {
  return new ProviderError(404, `No such ${kind}: '${id}'`, { code: "resource_missing", param });
}
