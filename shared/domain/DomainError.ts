/**
 * A question that the computation cannot answer, with the field that makes it so.
 *
 * `field` is a path into the argument, its steps parted by slashes: "condition", "readingsMm/2", "need/bore/valueMm".
 * `words` are plain and complete, fit to be shown beside that field.
 */
export class DomainError extends Error {
  override readonly name = "DomainError";

  constructor(
    readonly field: string,
    readonly words: string,
    options?: ErrorOptions,
  ) {
    super(`${field}: ${words}`, options);
  }
}
