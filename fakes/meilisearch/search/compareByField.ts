import { type Doc, leaves, valuesAt } from "../documentValues";

/**
 * Orders documents by a field: numbers before strings, documents without either last, whichever the direction.
 * Strings go by their letters in lower case; of a list the smallest counts going up, the largest going down.
 * Source: Meilisearch documentation, "Sort search results".
 */
export function compareByField(field: string, direction: "asc" | "desc"): (a: Doc, b: Doc) => number {
  return (a, b) => {
    const one = sortValue(a, field, direction);
    const other = sortValue(b, field, direction);
    if (one === null || other === null) return Number(one === null) - Number(other === null);
    if (typeof one !== typeof other) return typeof one === "number" ? -1 : 1;
    return direction === "asc" ? order(one, other) : order(other, one);
  };
}

function sortValue(doc: Doc, field: string, direction: "asc" | "desc"): number | string | null {
  const values = leaves(valuesAt(doc, field));
  const numbers = values.filter((value) => typeof value === "number");
  const strings = values.filter((value) => typeof value === "string").map((value) => value.toLowerCase());
  const candidates: (number | string)[] = numbers.length > 0 ? numbers : strings;
  const sorted = [...candidates].sort(order);
  return (direction === "asc" ? sorted[0] : sorted.at(-1)) ?? null;
}

const order = (a: number | string, b: number | string) => (a < b ? -1 : a > b ? 1 : 0);
