import { Meilisearch, MeilisearchApiError } from "meilisearch";
import { afterEach, beforeEach } from "vitest";
import { startMeilisearchFake } from "#fakes/meilisearch/startMeilisearchFake";

const KEY = "a-key-for-tests";

const parts = [
  {
    id: 1,
    title: "Idler wheel, grooved",
    kind: "idler-wheel",
    price: 14.5,
    offer: { quality: "new" },
    story: "turns slowly",
  },
  { id: 2, title: "Flat belt", kind: "belt", price: 9, offer: { quality: "new" }, story: "goes with any idler wheel" },
  {
    id: 3,
    title: "Wheel of hard rubber",
    kind: "idler-wheel",
    price: 22,
    offer: { quality: "recovered" },
    story: "plain",
  },
  { id: 4, title: "Capstan tyre", kind: "tyre", offer: { quality: "recovered" }, story: "plain" },
];

/** A fresh search fake for each test, and the service's own client to ask it with. */
export function useSearchFake() {
  let fake: Awaited<ReturnType<typeof startMeilisearchFake>>;
  let client: Meilisearch;

  beforeEach(async () => {
    fake = await startMeilisearchFake({ apiKey: KEY });
    client = new Meilisearch({ host: fake.url, apiKey: KEY, defaultWaitOptions: { interval: 1 } });
  });
  afterEach(() => fake.close());

  return {
    key: KEY,
    get fake() {
      return fake;
    },
    get client() {
      return client;
    },
    /** Four parts in the index "parts", filtered by kind, price and offer, sorted by price and title. */
    async fill() {
      const index = client.index<Record<string, unknown>>("parts");
      const settings = {
        searchableAttributes: ["title", "story"],
        filterableAttributes: ["kind", "price", "offer"],
        sortableAttributes: ["price", "title"],
      };
      await index.updateSettings(settings).waitTask();
      await index.addDocuments(parts, { primaryKey: "id" }).waitTask();
      return index;
    },
    async found(q: string, options: object = {}) {
      const { hits } = await client.index("parts").search(q, options);
      return hits.map(({ id }) => id);
    },
  };
}

/** The error a request is refused with; fails when it is not refused, or not by an answer. */
export async function refusal(request: Promise<unknown>) {
  const error = await request.then(
    () => null,
    (reason: unknown) => reason,
  );
  if (!(error instanceof MeilisearchApiError)) throw error ?? new Error("It was not refused");
  return { status: error.response.status, ...error.cause };
}
