/** A statement under way: its text comes from this program alone, what was asked for goes in as parameters. */
export class Statement {
  readonly values: unknown[] = [];

  /** The place of a new parameter with this value, as it stands in the text: `$1`, `$2` and so on. */
  param(value: unknown): string {
    this.values.push(value);
    return `$${this.values.length}`;
  }
}
