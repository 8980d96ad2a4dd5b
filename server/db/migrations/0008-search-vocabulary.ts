import type { Migration } from "../Migration";

export const searchVocabulary: Migration = {
  name: "0008-search-vocabulary",
  up: `
    -- Every word that listings use: a word asked for that is not among them is taken for a typing error of those near it.
    CREATE TABLE search_vocabulary (word text PRIMARY KEY);
    -- Errors are looked up among a few thousand words instead of in the text of every part.
    DROP INDEX parts_search_trigrams;
  `,
  down: `
    CREATE INDEX parts_search_trigrams ON parts USING gin (search_text gin_trgm_ops);
    DROP TABLE search_vocabulary;
  `,
};
