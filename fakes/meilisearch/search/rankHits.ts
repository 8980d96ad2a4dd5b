import type { Doc } from "../documentValues";
import { compareByField } from "./compareByField";
import type { TermMatch } from "./matchTerms";
import type { Word } from "./WordList";

export type Hit = {
  doc: Doc;
  /** The terms that count for this document, in the order of the query. */
  matches: TermMatch[];
};

export type SortBy = { field: string; direction: "asc" | "desc" };
type Compare = (a: Hit, b: Hit) => number;

/** Words further apart than this count as this far. Source: Meilisearch documentation, "Data types", separators. */
const FARTHEST = 8;

/**
 * Sorts hits by the ranking rules, each deciding only what those before it left equal; at last the order of coming.
 * Without words to look for only `sort` and rules on fields apply. `words` is done before any other rule on words.
 * Source: Meilisearch documentation, "Built-in ranking rules" and "Custom ranking rules". How near, how far and how
 * much are this fake's plain sums, so order within what a rule finds nearly equal may differ from the service.
 */
export function rankHits(hits: readonly Hit[], rules: readonly string[], sort: readonly SortBy[]): Hit[] {
  const compares = orderOfRules(rules).map((rule) => compareBy(rule, sort));
  return [...hits].sort((a, b) => {
    for (const compare of compares) {
      const order = compare(a, b);
      if (order !== 0) return order;
    }
    return 0;
  });
}

function orderOfRules(rules: readonly string[]): string[] {
  const firstOnWords = rules.findIndex((rule) => Object.hasOwn(measures, rule));
  if (firstOnWords < 0) return [...rules];
  const before = rules.slice(0, firstOnWords);
  return [...before, "words", ...rules.slice(firstOnWords).filter((rule) => rule !== "words")];
}

function compareBy(rule: string, sort: readonly SortBy[]): Compare {
  if (rule === "sort") return chain(sort.map(({ field, direction }) => onDocs(compareByField(field, direction))));
  if (rule === "attribute") return chain([lowest(attributeRank), lowest(wordPosition)]);
  const measure = Object.hasOwn(measures, rule) ? measures[rule] : undefined;
  if (measure) return lowest(measure);
  const colon = rule.lastIndexOf(":");
  return onDocs(compareByField(rule.slice(0, colon), rule.endsWith(":asc") ? "asc" : "desc"));
}

const onDocs =
  (compare: (a: Doc, b: Doc) => number): Compare =>
  (a, b) =>
    compare(a.doc, b.doc);

const lowest =
  (measure: (hit: Hit) => number): Compare =>
  (a, b) =>
    measure(a) - measure(b);

const chain =
  (compares: Compare[]): Compare =>
  (a, b) =>
    compares.reduce((order, compare) => order || compare(a, b), 0);

const sum = (numbers: number[]) => numbers.reduce((total, n) => total + n, 0);

const attributeRank = ({ matches }: Hit) =>
  sum(matches.map(({ places }) => Math.min(...places.map((word) => word.rank))));

const wordPosition = ({ matches }: Hit) =>
  sum(matches.map(({ places }) => Math.min(...places.map((word) => word.position))));

/** The lower the better. */
const measures: Record<string, (hit: Hit) => number> = {
  words: ({ matches }) => -matches.length,
  typo: ({ matches }) => sum(matches.map(({ typos }) => typos)),
  proximity: ({ matches }) => sum(matches.slice(1).map((match, i) => nearest(matches[i]!.places, match.places))),
  attribute: attributeRank,
  attributeRank,
  wordPosition,
  exactness: ({ matches }) => -matches.filter(({ exact }) => exact).length,
};

function nearest(before: readonly Word[], after: readonly Word[]): number {
  const distances = before.flatMap((a) => after.filter((b) => b.field === a.field).map((b) => step(a, b)));
  return Math.min(FARTHEST, ...distances);
}

/** The wrong way round counts as one further. */
const step = (a: Word, b: Word) => (b.position >= a.position ? b.position - a.position : a.position - b.position + 1);
