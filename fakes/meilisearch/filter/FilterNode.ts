export type Comparison = "=" | "!=" | ">" | ">=" | "<" | "<=";

/** A field as written, with where it stands in the filter, for errors about it. */
export type Field = { name: string; start: number; end: number };

/** A filter taken apart. `input` is the text the field positions belong to. */
export type FilterNode =
  | { kind: "and"; parts: FilterNode[] }
  | { kind: "or"; parts: FilterNode[] }
  | { kind: "not"; part: FilterNode }
  | { kind: "compare"; input: string; field: Field; operator: Comparison; value: string }
  | { kind: "between"; input: string; field: Field; low: string; high: string }
  | { kind: "in"; input: string; field: Field; values: string[] }
  | { kind: "startsWith"; input: string; field: Field; value: string }
  | { kind: "exists" | "isNull" | "isEmpty"; input: string; field: Field };
