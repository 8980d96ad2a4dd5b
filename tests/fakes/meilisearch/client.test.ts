import { Meilisearch, MeilisearchApiError, MeilisearchRequestError } from "meilisearch";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
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

describe("the search fake, asked by the service's own client", () => {
  let fake: Awaited<ReturnType<typeof startMeilisearchFake>>;
  let client: Meilisearch;

  beforeEach(async () => {
    fake = await startMeilisearchFake({ apiKey: KEY });
    client = new Meilisearch({ host: fake.url, apiKey: KEY, defaultWaitOptions: { interval: 1 } });
  });
  afterEach(() => fake.close());

  const fill = async () => {
    const index = client.index<Record<string, unknown>>("parts");
    await index
      .updateSettings({
        searchableAttributes: ["title", "story"],
        filterableAttributes: ["kind", "price", "offer"],
        sortableAttributes: ["price", "title"],
      })
      .waitTask();
    await index.addDocuments(parts, { primaryKey: "id" }).waitTask();
    return index;
  };

  const refusal = async (request: Promise<unknown>) => {
    const error = await request.then(
      () => null,
      (reason: unknown) => reason,
    );
    if (!(error instanceof MeilisearchApiError)) throw error ?? new Error("It was not refused");
    return { status: error.response.status, ...error.cause };
  };

  const found = async (q: string, options: object = {}) => {
    const { hits } = await client.index("parts").search(q, options);
    return hits.map(({ id }) => id);
  };

  it("says it is there, and which version it speaks for", async () => {
    expect(await client.health()).toEqual({ status: "available" });
    expect((await client.getVersion()).pkgVersion).toMatch(/^1\./);
  });

  it("wants the key for all but health", async () => {
    const none = new Meilisearch({ host: fake.url });
    const wrong = new Meilisearch({ host: fake.url, apiKey: "other" });
    expect(await none.isHealthy()).toBe(true);
    expect(await refusal(none.getIndexes())).toEqual({
      status: 401,
      message: "The Authorization header is missing. It must use the bearer authorization method.",
      code: "missing_authorization_header",
      type: "auth",
      link: "https://docs.meilisearch.com/errors#missing_authorization_header",
    });
    expect(await refusal(wrong.index("parts").search(""))).toMatchObject({
      status: 403,
      code: "invalid_api_key",
      type: "auth",
    });
  });

  it("makes, shows, lists and deletes indexes", async () => {
    const task = await client.createIndex("parts", { primaryKey: "id" }).waitTask();
    expect(task).toMatchObject({ uid: 0, indexUid: "parts", status: "succeeded", type: "indexCreation", error: null });
    await client.createIndex("belts").waitTask();
    expect(await client.getIndex("parts")).toMatchObject({ uid: "parts", primaryKey: "id" });
    const list = await client.getRawIndexes({ limit: 1 });
    expect(list).toMatchObject({ results: [{ uid: "belts", primaryKey: null }], offset: 0, limit: 1, total: 2 });

    const again = await client.createIndex("parts").waitTask();
    expect(again).toMatchObject({ status: "failed", error: { code: "index_already_exists" } });
    expect(await refusal(client.createIndex("no spaces"))).toMatchObject({ status: 400, code: "invalid_index_uid" });

    await client.deleteIndex("parts").waitTask();
    expect(await refusal(client.getIndex("parts"))).toMatchObject({
      status: 404,
      code: "index_not_found",
      message: "Index `parts` not found.",
    });
    expect(await client.deleteIndex("parts").waitTask()).toMatchObject({
      status: "failed",
      error: { code: "index_not_found" },
    });
  });

  it("keeps settings, fills them in and puts them back", async () => {
    const index = client.index("parts");
    await index.updateSettings({ filterableAttributes: ["kind"], pagination: { maxTotalHits: 2 } }).waitTask();
    await index.updateTypoTolerance({ minWordSizeForTypos: { oneTypo: 4 } }).waitTask();
    await index.updateSortableAttributes(["price"]).waitTask();
    expect(await index.getSettings()).toMatchObject({
      searchableAttributes: ["*"],
      filterableAttributes: ["kind"],
      sortableAttributes: ["price"],
      rankingRules: ["words", "typo", "proximity", "attributeRank", "sort", "wordPosition", "exactness"],
      pagination: { maxTotalHits: 2 },
      typoTolerance: { enabled: true, minWordSizeForTypos: { oneTypo: 4, twoTypos: 9 } },
    });

    await index
      .updateSettings({ filterableAttributes: null, typoTolerance: { minWordSizeForTypos: { oneTypo: null } } })
      .waitTask();
    await index.resetPagination().waitTask();
    expect(await index.getSettings()).toMatchObject({
      filterableAttributes: [],
      pagination: { maxTotalHits: 1000 },
      typoTolerance: { minWordSizeForTypos: { oneTypo: 5, twoTypos: 9 } },
    });
  });

  it("refuses settings that can never work", async () => {
    const index = client.index("parts");
    expect(await refusal(index.updateRankingRules(["words", "luck"]))).toMatchObject({
      status: 400,
      code: "invalid_settings_ranking_rules",
    });
    expect(await refusal(index.updateRankingRules(["attribute", "wordPosition"]))).toMatchObject({
      code: "invalid_settings_ranking_rules",
    });
    expect(
      await refusal(index.updateTypoTolerance({ minWordSizeForTypos: { oneTypo: 9, twoTypos: 5 } })),
    ).toMatchObject({ code: "invalid_settings_typo_tolerance" });
    expect(await refusal(index.updatePagination({ maxTotalHits: -1 }))).toMatchObject({
      code: "invalid_settings_pagination",
    });
    expect(await refusal(index.updateSettings({ synonyms: { tyre: ["tire"] } }))).toMatchObject({
      status: 400,
      code: "bad_request",
    });
  });

  it("adds, replaces, updates and gets documents", async () => {
    const index = await fill();
    const replaced = await index.addDocuments([{ id: 1, title: "New" }]).waitTask();
    expect(replaced.details).toMatchObject({ receivedDocuments: 1, indexedDocuments: 1 });
    await index
      .updateDocuments([
        { id: 2, price: 10 },
        { id: 5, title: "Fifth" },
      ])
      .waitTask();

    expect(await index.getDocument(1)).toEqual({ id: 1, title: "New" });
    expect(await index.getDocument(2, { fields: ["price", "offer.quality"] })).toEqual({
      price: 10,
      offer: { quality: "new" },
    });
    const page = await index.getDocuments({ offset: 1, limit: 2, fields: ["id"] });
    expect(page).toEqual({ results: [{ id: 2 }, { id: 3 }], offset: 1, limit: 2, total: 5 });
    const cheap = await index.getDocuments({ filter: "price < 15", fields: ["id"] });
    expect(cheap).toMatchObject({ results: [{ id: 2 }], total: 1 });
    expect(await refusal(index.getDocument(99))).toMatchObject({ status: 404, code: "document_not_found" });
    expect(await refusal(index.getDocuments({ filter: "title = x" }))).toMatchObject({
      status: 400,
      code: "invalid_document_filter",
    });
  });

  it("deletes documents by id, by ids, by filter, and all", async () => {
    const index = await fill();
    const left = async () => (await index.getDocuments({ fields: ["id"] })).results.map(({ id }) => id);

    expect((await index.deleteDocument(1).waitTask()).details).toMatchObject({ providedIds: 1, deletedDocuments: 1 });
    expect((await index.deleteDocuments([2, 77]).waitTask()).details).toMatchObject({
      providedIds: 2,
      deletedDocuments: 1,
    });
    expect(await left()).toEqual([3, 4]);

    const byFilter = await index.deleteDocuments({ filter: "kind = tyre" }).waitTask();
    expect(byFilter.details).toMatchObject({ deletedDocuments: 1, originalFilter: '"kind = tyre"' });
    expect(await left()).toEqual([3]);

    const unfilterable = await index.deleteDocuments({ filter: "title = x" }).waitTask();
    expect(unfilterable).toMatchObject({ status: "failed", error: { code: "invalid_document_filter" } });
    expect(await refusal(index.deleteDocuments({ filter: "kind =" }))).toMatchObject({
      code: "invalid_document_filter",
    });
    expect(await refusal(index.deleteDocuments({ filter: "" }))).toMatchObject({ code: "missing_document_filter" });

    await index.deleteAllDocuments().waitTask();
    expect(await left()).toEqual([]);
  });

  it("finds the primary key itself, and takes a batch whole or not at all", async () => {
    await client
      .index("a")
      .addDocuments([{ partId: "p-1", title: "x" }])
      .waitTask();
    expect(await client.index("a").fetchPrimaryKey()).toBe("partId");

    const outcome = async (documents: Record<string, unknown>[]) =>
      (await client.index("b").addDocuments(documents).waitTask()).error?.code;
    expect(await outcome([{ title: "x" }])).toBe("index_primary_key_no_candidate_found");
    expect(await outcome([{ partId: 1, id: 2 }])).toBe("index_primary_key_multiple_candidates_found");
    expect(await outcome([{ id: 1 }, { id: "with space" }])).toBe("invalid_document_id");
    expect(await outcome([{ id: 1 }, { title: "x" }])).toBe("missing_document_id");
    expect((await client.index("b").getDocuments()).total).toBe(0);
  });

  it("searches words, best first: all words, fewer errors, nearer, the more important attribute, earlier", async () => {
    await fill();
    expect(await found("idler wheel")).toEqual([1, 2]);
    expect(await found("wheel")).toEqual([3, 1, 2]);
    expect(await found("rubber wheel", { matchingStrategy: "all" })).toEqual([3]);
    expect(await found("wheel rubber plain", { matchingStrategy: "last" })).toEqual([3, 1, 2]);
    expect(await found("plain capstan wheel")).toEqual([4, 3]);
    expect(await found("capstna")).toEqual([4]);
    expect(await found("cap")).toEqual([4]);
    expect(await found("cap ")).toEqual([]);
    expect(await found('"idler wheel"')).toEqual([1, 2]);
    expect(await found('"wheel idler"')).toEqual([]);
    expect(await found("wheel -belt")).toEqual([3, 1]);
    expect(await found("wheel", { attributesToSearchOn: ["story"] })).toEqual([2]);
    expect(await found("cap stan tyre", { matchingStrategy: "all" })).toEqual([4]);
    expect(await found("nothing")).toEqual([]);
  });

  it("filters, sorts and shows what was asked for", async () => {
    const index = await fill();
    const answer = await index.search("", {
      filter: ["kind = idler-wheel OR price EXISTS", "offer.quality = new"],
      sort: ["price:asc"],
      attributesToRetrieve: ["id", "offer.quality"],
    });
    expect(answer).toEqual({
      hits: [
        { id: 2, offer: { quality: "new" } },
        { id: 1, offer: { quality: "new" } },
      ],
      query: "",
      processingTimeMs: 0,
      offset: 0,
      limit: 20,
      estimatedTotalHits: 2,
    });
    expect(await found("", { sort: ["price:desc"] })).toEqual([3, 1, 2, 4]);
    expect(await found("", { sort: ["price:asc"] })).toEqual([2, 1, 3, 4]);
    expect(await found("wheel", { sort: ["price:asc"] })).toEqual([1, 3, 2]);
    await index.updateRankingRules(["sort", "words", "title:desc"]).waitTask();
    expect(await found("wheel", { sort: ["price:asc"] })).toEqual([2, 1, 3]);
    expect(await found("")).toEqual([3, 1, 2, 4]);
    await index.updateDisplayedAttributes(["title"]).waitTask();
    expect((await index.search("capstan")).hits).toEqual([{ title: "Capstan tyre" }]);
  });

  it("pages by offset or by number, never past the most it may reach", async () => {
    const index = await fill();
    expect(await index.search("", { offset: 1, limit: 2 })).toMatchObject({
      hits: [{ id: 2 }, { id: 3 }],
      offset: 1,
      limit: 2,
      estimatedTotalHits: 4,
    });
    const paged = await index.search("", { page: 2, hitsPerPage: 3 });
    expect(paged).toMatchObject({ hits: [{ id: 4 }], page: 2, hitsPerPage: 3, totalHits: 4, totalPages: 2 });
    expect(paged).not.toHaveProperty("estimatedTotalHits");
    expect(await index.search("", { hitsPerPage: 0 })).toMatchObject({ hits: [], totalHits: 4, totalPages: 0 });

    await index.updatePagination({ maxTotalHits: 2 }).waitTask();
    expect(await index.search("", { limit: 10 })).toMatchObject({
      estimatedTotalHits: 2,
      hits: [{ id: 1 }, { id: 2 }],
    });
    expect(await index.search("", { offset: 2 })).toMatchObject({ hits: [] });
  });

  it.each<[options: object, code: string, message: string]>([
    [{ filter: "title = x" }, "invalid_search_filter", "Attribute `title` is not filterable."],
    [{ filter: "kind = " }, "invalid_search_filter", "Was expecting a value but instead got nothing."],
    [{ filter: 4 }, "invalid_search_filter", "expected String, Array"],
    [{ sort: ["kind:asc"] }, "invalid_search_sort", "Attribute `kind` is not sortable."],
    [{ sort: ["price"] }, "invalid_search_sort", "expected expression ending by `:asc` or `:desc`"],
    [{ limit: -1 }, "invalid_search_limit", "limit"],
    [{ offset: 1.5 }, "invalid_search_offset", "offset"],
    [{ hitsPerPage: "many" }, "invalid_search_hits_per_page", "hitsPerPage"],
    [{ matchingStrategy: "first" }, "invalid_search_matching_strategy", "matchingStrategy"],
    [{ attributesToSearchOn: ["price"] }, "invalid_search_attributes_to_search_on", "`price` is not searchable"],
    [{ rainbow: true }, "bad_request", "Unknown field `rainbow`"],
  ])("refuses a search with %j", async (options, code, message) => {
    const index = await fill();
    const error = await refusal(index.search("", options));
    expect(error).toMatchObject({
      status: 400,
      code,
      type: "invalid_request",
      link: `https://docs.meilisearch.com/errors#${code}`,
    });
    expect(error.message).toContain(message);
  });

  it("lists tasks newest first, narrowed and in pages", async () => {
    await fill();
    await client.createIndex("other").waitTask();
    const all = await client.tasks.getTasks();
    expect(all.results.map(({ uid, status }) => [uid, status])).toEqual([
      [2, "succeeded"],
      [1, "succeeded"],
      [0, "succeeded"],
    ]);
    expect(await client.tasks.getTasks({ limit: 1, from: 1 })).toMatchObject({
      results: [{ uid: 1, type: "documentAdditionOrUpdate" }],
      total: 3,
      limit: 1,
      from: 1,
      next: 0,
    });
    const narrowed = await client.tasks.getTasks({ indexUids: ["parts"], types: ["settingsUpdate"] });
    expect(narrowed.results.map(({ uid }) => uid)).toEqual([0]);
    expect((await client.tasks.getTasks({ statuses: ["failed"] })).results).toEqual([]);
    expect(await refusal(client.tasks.getTask(99))).toMatchObject({ status: 404, code: "task_not_found" });
  });

  it("holds tasks back until told, in their order", async () => {
    fake.control.holdTasks();
    const index = client.index("parts");
    const first = await index.addDocuments([{ id: 1, title: "first" }]);
    const second = await index.addDocuments([{ id: 1, title: "second" }]);
    expect(first).toMatchObject({ taskUid: 0, status: "enqueued", indexUid: "parts" });
    expect(await client.tasks.getTask(second.taskUid)).toMatchObject({ status: "enqueued", startedAt: null });
    expect(await refusal(index.search("first"))).toMatchObject({ code: "index_not_found" });

    fake.control.releaseTasks();
    await client.tasks.waitForTask(second);
    expect(await index.getDocument(1)).toEqual({ id: 1, title: "second" });
  });

  it("has bad days on request: failing answers, broken connections, failing tasks", async () => {
    await fill();
    fake.control.failNext(1, { status: 503, code: "unavailable", message: "Back soon" });
    fake.control.failNext(1);
    expect(await refusal(client.index("parts").search(""))).toMatchObject({ status: 503, message: "Back soon" });
    expect(await refusal(client.index("parts").search(""))).toMatchObject({
      status: 500,
      code: "internal",
      type: "internal",
    });
    fake.control.failNext(1, "drop");
    await expect(client.index("parts").search("")).rejects.toBeInstanceOf(MeilisearchRequestError);
    expect(await found("flat")).toEqual([2]);

    fake.control.failNextTasks(1);
    const task = await client.index("parts").deleteAllDocuments().waitTask();
    expect(task).toMatchObject({ status: "failed", error: { code: "internal" } });
    expect(await found("flat")).toEqual([2]);

    fake.control.reset();
    expect(await refusal(client.index("parts").search(""))).toMatchObject({ code: "index_not_found" });
  });

  it.each<[init: RequestInit, status: number, code: string]>([
    [{ body: "[{]", headers: { "Content-Type": "application/json" } }, 400, "malformed_payload"],
    [{ body: '["x"]', headers: { "Content-Type": "application/json" } }, 400, "malformed_payload"],
    [{ body: "id\n1", headers: { "Content-Type": "text/plain" } }, 415, "invalid_content_type"],
    [{ headers: { "Content-Type": "application/json" } }, 400, "missing_payload"],
    [{}, 415, "missing_content_type"],
    [
      {
        body: JSON.stringify([{ id: 1, text: "x".repeat(21 * 1024 * 1024) }]),
        headers: { "Content-Type": "application/json" },
      },
      413,
      "payload_too_large",
    ],
  ])("refuses documents sent badly (case %#)", async (init, status, code) => {
    const headers = { ...init.headers, Authorization: `Bearer ${KEY}` };
    const res = await fetch(`${fake.url}/indexes/parts/documents`, { method: "POST", ...init, headers });
    expect([res.status, ((await res.json()) as { code: string }).code]).toEqual([status, code]);
  });

  it("answers 404 for what it does not do", async () => {
    expect(await refusal(client.getStats())).toMatchObject({ status: 404, code: "not_found" });
  });
});
