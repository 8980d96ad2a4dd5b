/** A filter that cannot be read or run: what is wrong, and the characters of the filter it is about. */
export class FilterError extends Error {
  /** `start` and `end` count characters from 0; the message counts from 1, under a copy of the filter. */
  constructor(reason: string, input: string, start: number, end: number) {
    super(`${reason}\n${start + 1}:${end + 1} ${input}`);
  }
}
