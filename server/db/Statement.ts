/** A statement under way: its text comes from this program alone, what was asked for goes in as parameters. */
export class Statement {
  readonly bind: Record<string, unknown> = {};
  #count = 0;

  /** The name of a new parameter with this value, as it stands in the text. */
  param(value: unknown): string {
    const name = `p${this.#count++}`;
    this.bind[name] = value;
    return `$${name}`;
  }
}
