import { covers } from "../documentValues";
import type { FilterableAttribute } from "../Settings";
import { FilterError } from "./FilterError";
import type { FilterNode } from "./FilterNode";

/**
 * Refuses a filter on a field the index was not told to filter by, or by an operator that was switched off for it.
 * Source: Meilisearch documentation, "Error codes", invalid_search_filter; "Filterable attributes" for the
 * object form, where comparisons are off unless asked for.
 */
export function checkFields(node: FilterNode, filterable: readonly FilterableAttribute[]): void {
  if (node.kind === "and" || node.kind === "or") {
    for (const part of node.parts) checkFields(part, filterable);
    return;
  }
  if (node.kind === "not") {
    checkFields(node.part, filterable);
    return;
  }

  const { name, start, end } = node.field;
  const rule = filterable.find((attribute) => covers(patternsOf(attribute), name));
  if (rule === undefined) {
    const listed = filterable.flatMap(patternsOf).map((pattern) => `\`${pattern}\``);
    const available = listed.length > 0 ? `are: ${listed.join(", ")}` : "list is empty";
    const reason = `Attribute \`${name}\` is not filterable. Available filterable attribute patterns ${available}.`;
    throw new FilterError(reason, node.input, start, end);
  }
  const feature = neededFeature(node);
  if (feature && typeof rule !== "string" && !rule.features.filter[feature]) {
    const reason = `The filter uses ${feature} on \`${name}\`, which its filterable attribute rule does not allow.`;
    throw new FilterError(reason, node.input, start, end);
  }
}

const patternsOf = (attribute: FilterableAttribute) =>
  typeof attribute === "string" ? [attribute] : attribute.attributePatterns;

function neededFeature(node: Exclude<FilterNode, { kind: "and" | "or" | "not" }>): "equality" | "comparison" | null {
  if (node.kind === "in") return "equality";
  if (node.kind === "between") return "comparison";
  if (node.kind !== "compare") return null;
  return node.operator === "=" || node.operator === "!=" ? "equality" : "comparison";
}
