import { type Doc, isObject, leaves, valuesAt } from "../documentValues";
import type { Comparison, FilterNode } from "./FilterNode";

/**
 * Whether a document fits a filter. In a list of values, one fitting value is enough.
 *
 * `=` ignores the case of strings and never finds null; `!=` and `NOT` take every document the plain form leaves.
 * A bound that is a number is compared with numbers only, any other bound with strings only, case ignored.
 * Source: Meilisearch documentation, "Filter expression reference".
 */
export function matchesFilter(node: FilterNode, doc: Doc): boolean {
  switch (node.kind) {
    case "and":
      return node.parts.every((part) => matchesFilter(part, doc));
    case "or":
      return node.parts.some((part) => matchesFilter(part, doc));
    case "not":
      return !matchesFilter(node.part, doc);
    case "exists":
      return valuesAt(doc, node.field.name).length > 0;
    case "isNull":
      return valuesAt(doc, node.field.name).some((value) => value === null);
    case "isEmpty":
      return valuesAt(doc, node.field.name).some(isEmpty);
    case "in":
      return node.values.some((value) => some(doc, node.field.name, (leaf) => equals(leaf, value)));
    case "between":
      return some(doc, node.field.name, (leaf) => compare(leaf, ">=", node.low) && compare(leaf, "<=", node.high));
    case "startsWith":
      return some(doc, node.field.name, (leaf) => text(leaf)?.startsWith(fold(node.value)) ?? false);
    case "compare":
      if (node.operator === "!=") return !some(doc, node.field.name, (leaf) => equals(leaf, node.value));
      return some(doc, node.field.name, (leaf) => compare(leaf, node.operator, node.value));
  }
}

const some = (doc: Doc, field: string, fits: (leaf: unknown) => boolean) => leaves(valuesAt(doc, field)).some(fits);

function isEmpty(value: unknown): boolean {
  if (value === "") return true;
  if (Array.isArray(value)) return value.length === 0;
  return isObject(value) && Object.keys(value).length === 0;
}

function equals(leaf: unknown, value: string): boolean {
  if (typeof leaf === "number") return leaf === asNumber(value);
  return text(leaf) === fold(value);
}

function compare(leaf: unknown, operator: Comparison, bound: string): boolean {
  if (operator === "=") return equals(leaf, bound);
  const number = asNumber(bound);
  if (number !== null) return typeof leaf === "number" && holds(leaf, operator, number);
  return typeof leaf === "string" && holds(fold(leaf), operator, fold(bound));
}

function holds<T extends number | string>(a: T, operator: Comparison, b: T): boolean {
  if (operator === ">") return a > b;
  if (operator === ">=") return a >= b;
  return operator === "<" ? a < b : a <= b;
}

/** What `=` and `STARTS WITH` read: strings, and booleans by name. */
function text(leaf: unknown): string | null {
  if (typeof leaf === "string") return fold(leaf);
  return typeof leaf === "boolean" ? String(leaf) : null;
}

const fold = (value: string) => value.toLowerCase();

/** Decimal numbers as JSON and the service write them; NaN and infinity are words (same source, "Data types"). */
function asNumber(value: string): number | null {
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(value) ? Number(value) : null;
}
