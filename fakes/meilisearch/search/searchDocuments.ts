import { covers, type Doc, pickFields } from "../documentValues";
import { matchesFilter } from "../filter/matchesFilter";
import type { SearchIndex } from "../SearchIndex";
import { matchTerms, type TermMatch } from "./matchTerms";
import { type Hit, rankHits } from "./rankHits";
import { readQuery, type Term } from "./readQuery";
import type { Search } from "./readSearch";

export type SearchAnswer = { hits: Doc[]; query: string; processingTimeMs: number } & (
  | { offset: number; limit: number; estimatedTotalHits: number }
  | { page: number; hitsPerPage: number; totalHits: number; totalPages: number }
);

/**
 * Finds, ranks and cuts to the page asked for. No page reaches beyond `maxTotalHits`, and no total says more.
 * Source: Meilisearch documentation, "Search" ("Response", "Offset", "Number of results per page").
 */
export function searchDocuments(index: SearchIndex, search: Search): SearchAnswer {
  const { settings } = index;
  const ranked = rankHits(findHits(index, search), settings.rankingRules, search.sort);
  const reachable = ranked.slice(0, settings.pagination.maxTotalHits);
  const show = (hits: Hit[]) =>
    hits.map(({ doc }) => pickFields(pickFields(doc, settings.displayedAttributes), search.retrieve));
  const about = { query: search.q, processingTimeMs: 0 };

  if (search.paging.kind === "window") {
    const { offset, limit } = search.paging;
    const hits = show(reachable.slice(offset, offset + limit));
    return { hits, ...about, offset, limit, estimatedTotalHits: reachable.length };
  }
  const { page, hitsPerPage } = search.paging;
  const totalPages = hitsPerPage === 0 ? 0 : Math.ceil(reachable.length / hitsPerPage);
  const hits = page === 0 ? [] : show(reachable.slice((page - 1) * hitsPerPage, page * hitsPerPage));
  return { hits, ...about, page, hitsPerPage, totalHits: reachable.length, totalPages };
}

function findHits(index: SearchIndex, search: Search): Hit[] {
  const { filter } = search;
  const docs = [...index.documents.values()].filter((doc) => filter === null || matchesFilter(filter, doc));
  const { terms, excluded } = readQuery(search.q, index.settings.typoTolerance);

  const allowed = docs.filter((doc) => excluded.length === 0 || matchIn(index, search, doc, excluded).every((m) => !m));
  if (terms.length === 0) return allowed.map((doc) => ({ doc, matches: [] }));

  const found = allowed.map((doc) => ({ doc, matches: matchIn(index, search, doc, terms) }));
  const firstToKeep = orderOfKeeping(found, terms.length, search.strategy);
  return found.flatMap(({ doc, matches }) => {
    const missing = firstToKeep.findIndex((term) => !matches[term]);
    const kept = missing < 0 ? firstToKeep : firstToKeep.slice(0, missing);
    if (search.strategy === "all" ? missing >= 0 : kept.length === 0) return [];
    const counting = [...kept].sort((a, b) => a - b).flatMap((term) => matches[term] ?? []);
    return [{ doc, matches: counting }];
  });
}

function matchIn(index: SearchIndex, { searchOn }: Search, doc: Doc, terms: Term[]): (TermMatch | null)[] {
  const list = index.wordsOf(doc);
  const narrowed = searchOn ? { words: list.words.filter(({ field }) => covers(searchOn, field)) } : list;
  return matchTerms(terms, narrowed, index.settings.typoTolerance);
}

/**
 * Terms by number, those given up last first: "last" gives up from the end of the query, "frequency" the most common.
 * Source: Meilisearch documentation, "Search", "Matching strategy".
 */
function orderOfKeeping(found: { matches: unknown[] }[], count: number, strategy: Search["strategy"]): number[] {
  const terms = Array.from({ length: count }, (_, i) => i);
  if (strategy !== "frequency") return terms;
  const frequency = terms.map((term) => found.filter(({ matches }) => matches[term]).length);
  return terms.sort((a, b) => frequency[a]! - frequency[b]! || a - b);
}
