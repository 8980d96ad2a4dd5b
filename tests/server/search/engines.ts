import { startMeilisearchFake } from "#fakes/meilisearch/startMeilisearchFake";
import type { SearchEngine } from "#server/adapters/SearchEngine";
import { createSearchEngine } from "#server/search/createSearchEngine";

/** Both engines, each with what it needs to run; the same tests go over both. */
export const engines: readonly [
  name: string,
  start: () => Promise<{ engine: SearchEngine; stop: () => Promise<void> }>,
][] = [
  ["PostgreSQL", async () => ({ engine: createSearchEngine({ meili: undefined }), stop: async () => undefined })],
  [
    "Meilisearch",
    async () => {
      const apiKey = "a key of the tests";
      const fake = await startMeilisearchFake({ apiKey });
      // An engine that fell back on the database would pass without being tried.
      const logger = {
        warn: ({ err }: { err: Error }) => {
          throw err;
        },
      };
      return { engine: createSearchEngine({ meili: { url: fake.url, apiKey } }, logger), stop: () => fake.close() };
    },
  ],
];
