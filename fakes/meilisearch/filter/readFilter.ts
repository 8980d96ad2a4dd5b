import type { FilterNode } from "./FilterNode";
import { parseFilter } from "./parseFilter";

/**
 * The `filter` parameter: an expression, or a list of them joined by AND, in which an inner list is joined by OR.
 * Gives null when there is nothing to filter by.
 *
 * Errors: FilterError from the expressions; Error for any other shape, three levels of lists included.
 * Source: Meilisearch documentation, "Filter expression reference", "Creating filter expressions with arrays".
 */
export function readFilter(filter: unknown): FilterNode | null {
  if (filter === undefined || filter === null) return null;
  if (typeof filter === "string") return parseFilter(filter);
  if (!Array.isArray(filter)) throw invalid("String, Array", filter);
  return join("and", filter.map(readInner));
}

function readInner(part: unknown): FilterNode | null {
  if (typeof part === "string") return parseFilter(part);
  if (!Array.isArray(part)) throw invalid("String, [String]", part);
  return join(
    "or",
    part.map((inner) => {
      if (typeof inner !== "string") throw invalid("String", inner);
      return parseFilter(inner);
    }),
  );
}

function join(kind: "and" | "or", parts: (FilterNode | null)[]): FilterNode | null {
  const present = parts.filter((part) => part !== null);
  const [only] = present;
  if (!only) return null;
  return present.length === 1 ? only : { kind, parts: present };
}

const invalid = (expected: string, found: unknown) =>
  new Error(`Invalid syntax for the filter parameter: \`expected ${expected}, found: ${JSON.stringify(found)}\`.`);
