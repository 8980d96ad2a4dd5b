import type { SearchEngine } from "../adapters/SearchEngine";
import type { Config } from "../config";
import { MeilisearchEngine, type Warns } from "./MeilisearchEngine";
import { PostgresSearchEngine } from "./PostgresSearchEngine";

/** The engine that the settings ask for: PostgreSQL, or Meilisearch where its address is set. */
export function createSearchEngine({ meili }: Pick<Config, "meili">, logger?: Warns): SearchEngine {
  const database = new PostgresSearchEngine();
  return meili ? new MeilisearchEngine(meili, database, logger) : database;
}
