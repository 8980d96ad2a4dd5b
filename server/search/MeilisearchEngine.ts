import { type EnqueuedTaskPromise, type Index, Meilisearch, MeilisearchError } from "meilisearch";
import type { CandidateQuery, Candidates, SearchEngine } from "../adapters/SearchEngine";
import { select } from "../db/select";
import { edgeFields, type MeiliDocument, meiliDocuments } from "./meiliDocument";
import { meiliFilter } from "./meiliFilter";
import { soughtWords } from "./wordQuery";

const indexName = "idlewright-items";
const batch = 1000;
const mostHits = 100_000;

const settings = {
  searchableAttributes: ["words"],
  filterableAttributes: ["id", "part", "kind", "alone", ...edgeFields],
  // Ranking is ours, so the service need only know which documents have all the words.
  rankingRules: ["words", "typo"],
  pagination: { maxTotalHits: mostHits },
};

/** What is told of a failure that was got round. */
export type Warns = { warn(fields: { err: Error }, words: string): void };

const listed = (of: Candidates["of"], ids: readonly string[]): Candidates => ({
  of,
  select: (statement) => `SELECT unnest(${statement.param(ids)}::uuid[]) AS id`,
});

/** Waits for a write to be done. Errors: what the service says went wrong. */
async function done(task: EnqueuedTaskPromise): Promise<void> {
  const { status, error } = await task.waitTask();
  if (status !== "succeeded") throw new MeilisearchError(error?.message ?? `A search task ended as ${status}`);
}

/**
 * Candidates from Meilisearch, whose index the `indexParts` job keeps up.
 *
 * Where the service does not answer, `database` does, with the same answers; that is logged.
 */
export class MeilisearchEngine implements SearchEngine {
  readonly #index: Index<MeiliDocument>;
  #ready: Promise<void> | undefined;

  constructor(
    { url, apiKey }: { url: string; apiKey?: string },
    private readonly database: SearchEngine,
    private readonly logger?: Warns,
  ) {
    const client = new Meilisearch({
      host: url,
      apiKey,
      timeout: 3_000,
      defaultWaitOptions: { interval: 20, timeout: 60_000 },
    });
    this.#index = client.index<MeiliDocument>(indexName);
  }

  async candidates(query: CandidateQuery): Promise<Candidates> {
    try {
      await this.#prepared();
      return await this.#search(query);
    } catch (error) {
      if (!(error instanceof MeilisearchError)) throw error;
      this.logger?.warn({ err: error }, "the search service failed: the database searched instead");
      return this.database.candidates(query);
    }
  }

  async index(partIds: readonly string[]): Promise<void> {
    await this.database.index(partIds);
    await this.#prepared();
    for (let start = 0; start < partIds.length; start += batch) await this.#write(partIds.slice(start, start + batch));
  }

  /** Settings in place and, where the index is empty, every published part in it: once a process, tried again on failure. */
  #prepared(): Promise<void> {
    this.#ready ??= this.#prepare().catch((error: unknown) => {
      this.#ready = undefined;
      throw error;
    });
    return this.#ready;
  }

  async #prepare(): Promise<void> {
    await done(this.#index.updateSettings(settings));
    if ((await this.#index.getDocuments({ limit: 1, fields: ["id"] })).total > 0) return;
    const parts = await select<{ id: string }>("SELECT id FROM parts WHERE state = 'published' ORDER BY id");
    for (let start = 0; start < parts.length; start += batch) {
      await this.#write(parts.slice(start, start + batch).map(({ id }) => id));
    }
  }

  /** New documents go in before old ones leave, so that no part is ever missing in between. */
  async #write(partIds: readonly string[]): Promise<void> {
    const documents = await meiliDocuments(partIds);
    if (documents.length > 0) await done(this.#index.addDocuments(documents, { primaryKey: "id" }));
    const quoted = (ids: readonly string[]) => ids.map((id) => `"${id}"`).join(", ");
    const kept = documents.length > 0 ? ` AND id NOT IN [${quoted(documents.map(({ id }) => id))}]` : "";
    await done(this.#index.deleteDocuments({ filter: `part IN [${quoted(partIds)}]${kept}` }));
  }

  async #search({ sought, words, limit }: CandidateQuery): Promise<Candidates> {
    const typed = words === null ? null : soughtWords(words).join(" ");
    // Nothing to look for is everything to the service; here it is nothing.
    if (typed === "") return listed("parts", []);
    const { hits } = await this.#index.search(typed, {
      filter: meiliFilter(sought),
      matchingStrategy: "all",
      limit: Math.min(limit, mostHits),
      attributesToRetrieve: ["item", "part"],
    });
    return sought.length > 0
      ? listed(
          "items",
          hits.flatMap(({ item }) => item ?? []),
        )
      : listed(
          "parts",
          hits.map(({ part }) => part),
        );
  }
}
