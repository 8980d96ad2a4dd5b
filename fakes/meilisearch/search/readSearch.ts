import { z } from "zod";
import { ApiError, type ErrorCode } from "../ApiError";
import { covers } from "../documentValues";
import { checkFields } from "../filter/checkFields";
import type { FilterNode } from "../filter/FilterNode";
import { readFilter } from "../filter/readFilter";
import type { Settings } from "../Settings";
import type { SortBy } from "./rankHits";

const whole = z.int().min(0).optional();

/** Source: Meilisearch documentation, "Search", "Search parameters"; those not here are answered as unknown. */
const parameters = {
  q: z.string().nullish(),
  offset: whole,
  limit: whole,
  page: whole,
  hitsPerPage: whole,
  filter: z.unknown(),
  sort: z.array(z.string()).nullish(),
  attributesToRetrieve: z.array(z.string()).nullish(),
  attributesToSearchOn: z.array(z.string()).nullish(),
  matchingStrategy: z.enum(["last", "all", "frequency"]).optional(),
};
type Name = keyof typeof parameters;

export type Search = {
  q: string;
  filter: FilterNode | null;
  sort: SortBy[];
  retrieve: string[];
  /** null: all that are searchable. */
  searchOn: string[] | null;
  strategy: "last" | "all" | "frequency";
  paging: { kind: "window"; offset: number; limit: number } | { kind: "pages"; page: number; hitsPerPage: number };
};

/** Reads a search request against the index's settings. Errors: the documented code of the parameter at fault. */
export function readSearch(body: Record<string, unknown>, settings: Settings): Search {
  for (const name of Object.keys(body)) {
    if (Object.hasOwn(parameters, name)) continue;
    const expected = Object.keys(parameters).map((known) => `\`${known}\``);
    throw new ApiError("bad_request", `Unknown field \`${name}\`: expected one of ${expected.join(", ")}`);
  }
  const read = <N extends Name>(name: N) => readParameter(name, body[name]) as z.output<(typeof parameters)[N]>;
  const page = read("page");
  const hitsPerPage = read("hitsPerPage");
  const inPages = page !== undefined || hitsPerPage !== undefined;
  return {
    q: read("q") ?? "",
    filter: readCheckedFilter(body.filter, settings),
    sort: readSort(read("sort") ?? [], settings),
    retrieve: read("attributesToRetrieve") ?? ["*"],
    searchOn: readSearchOn(read("attributesToSearchOn") ?? null, settings),
    strategy: read("matchingStrategy") ?? "last",
    paging: inPages
      ? { kind: "pages", page: page ?? 1, hitsPerPage: hitsPerPage ?? 20 }
      : { kind: "window", offset: read("offset") ?? 0, limit: read("limit") ?? 20 },
  };
}

function readParameter(name: Name, value: unknown): unknown {
  const read = parameters[name].safeParse(value);
  if (read.success) return read.data;
  const code = `invalid_search_${name.replace(/[A-Z]/g, (c) => `_${c.toLowerCase()}`)}` as ErrorCode;
  throw new ApiError(code, `Invalid value at \`.${name}\`: ${read.error.issues[0]?.message ?? "not valid"}`);
}

function readCheckedFilter(filter: unknown, settings: Settings): FilterNode | null {
  try {
    const node = readFilter(filter);
    if (node) checkFields(node, settings.filterableAttributes);
    return node;
  } catch (error) {
    throw new ApiError("invalid_search_filter", error instanceof Error ? error.message : String(error));
  }
}

function readSort(expressions: string[], settings: Settings): SortBy[] {
  if (expressions.length > 0 && !settings.rankingRules.includes("sort")) {
    const message =
      "You must specify where `sort` is listed in the rankingRules setting to use the sort parameter at search time.";
    throw new ApiError("invalid_search_sort", message);
  }
  return expressions.map((expression) => {
    const [, field, direction] = /^(.+):(asc|desc)$/.exec(expression) ?? [];
    if (field === undefined || (direction !== "asc" && direction !== "desc")) {
      const message = `Invalid syntax for the sort parameter: expected expression ending by \`:asc\` or \`:desc\`, found \`${expression}\`.`;
      throw new ApiError("invalid_search_sort", message);
    }
    if (!covers(settings.sortableAttributes, field)) {
      const listed = settings.sortableAttributes.map((name) => `\`${name}\``).join(", ");
      const available = listed
        ? `Available sortable attributes are: ${listed}.`
        : "This index has no sortable attributes.";
      throw new ApiError("invalid_search_sort", `Attribute \`${field}\` is not sortable. ${available}`);
    }
    return { field, direction };
  });
}

function readSearchOn(fields: string[] | null, settings: Settings): string[] | null {
  if (fields === null || fields.includes("*")) return null;
  const stranger = fields.find((field) => !covers(settings.searchableAttributes, field));
  if (stranger !== undefined) {
    throw new ApiError("invalid_search_attributes_to_search_on", `Attribute \`${stranger}\` is not searchable.`);
  }
  return fields;
}
