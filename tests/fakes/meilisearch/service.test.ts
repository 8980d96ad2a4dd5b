import { Meilisearch, MeilisearchRequestError } from "meilisearch";
import { describe, expect, it } from "vitest";
import { refusal, useSearchFake } from "./useSearchFake";

describe("the search fake as a service", () => {
  const search = useSearchFake();

  it("says it is there, and which version it speaks for", async () => {
    expect(await search.client.health()).toEqual({ status: "available" });
    expect((await search.client.getVersion()).pkgVersion).toMatch(/^1\./);
  });

  it("wants the key for all but health", async () => {
    const none = new Meilisearch({ host: search.fake.url });
    const wrong = new Meilisearch({ host: search.fake.url, apiKey: "other" });
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
    const task = await search.client.createIndex("parts", { primaryKey: "id" }).waitTask();
    expect(task).toMatchObject({ uid: 0, indexUid: "parts", status: "succeeded", type: "indexCreation", error: null });
    await search.client.createIndex("belts").waitTask();
    expect(await search.client.getIndex("parts")).toMatchObject({ uid: "parts", primaryKey: "id" });
    const list = await search.client.getRawIndexes({ limit: 1 });
    expect(list).toMatchObject({ results: [{ uid: "belts", primaryKey: null }], offset: 0, limit: 1, total: 2 });

    const again = await search.client.createIndex("parts").waitTask();
    expect(again).toMatchObject({ status: "failed", error: { code: "index_already_exists" } });
    expect(await refusal(search.client.createIndex("no spaces"))).toMatchObject({
      status: 400,
      code: "invalid_index_uid",
    });

    await search.client.deleteIndex("parts").waitTask();
    expect(await refusal(search.client.getIndex("parts"))).toMatchObject({
      status: 404,
      code: "index_not_found",
      message: "Index `parts` not found.",
    });
    expect(await search.client.deleteIndex("parts").waitTask()).toMatchObject({
      status: "failed",
      error: { code: "index_not_found" },
    });
  });

  it("keeps settings, fills them in and puts them back", async () => {
    const index = search.client.index("parts");
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
    const index = search.client.index("parts");
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

  it("lists tasks newest first, narrowed and in pages", async () => {
    await search.fill();
    await search.client.createIndex("other").waitTask();
    const all = await search.client.tasks.getTasks();
    expect(all.results.map(({ uid, status }) => [uid, status])).toEqual([
      [2, "succeeded"],
      [1, "succeeded"],
      [0, "succeeded"],
    ]);
    expect(await search.client.tasks.getTasks({ limit: 1, from: 1 })).toMatchObject({
      results: [{ uid: 1, type: "documentAdditionOrUpdate" }],
      total: 3,
      limit: 1,
      from: 1,
      next: 0,
    });
    const narrowed = await search.client.tasks.getTasks({ indexUids: ["parts"], types: ["settingsUpdate"] });
    expect(narrowed.results.map(({ uid }) => uid)).toEqual([0]);
    expect((await search.client.tasks.getTasks({ statuses: ["failed"] })).results).toEqual([]);
    expect(await refusal(search.client.tasks.getTask(99))).toMatchObject({ status: 404, code: "task_not_found" });
  });

  it("holds tasks back until told, in their order", async () => {
    search.fake.control.holdTasks();
    const index = search.client.index("parts");
    const first = await index.addDocuments([{ id: 1, title: "first" }]);
    const second = await index.addDocuments([{ id: 1, title: "second" }]);
    expect(first).toMatchObject({ taskUid: 0, status: "enqueued", indexUid: "parts" });
    expect(await search.client.tasks.getTask(second.taskUid)).toMatchObject({ status: "enqueued", startedAt: null });
    expect(await refusal(index.search("first"))).toMatchObject({ code: "index_not_found" });

    search.fake.control.releaseTasks();
    await search.client.tasks.waitForTask(second);
    expect(await index.getDocument(1)).toEqual({ id: 1, title: "second" });
  });

  it("has bad days on request: failing answers, broken connections, failing tasks", async () => {
    await search.fill();
    search.fake.control.failNext(1, { status: 503, code: "unavailable", message: "Back soon" });
    search.fake.control.failNext(1);
    expect(await refusal(search.client.index("parts").search(""))).toMatchObject({ status: 503, message: "Back soon" });
    expect(await refusal(search.client.index("parts").search(""))).toMatchObject({
      status: 500,
      code: "internal",
      type: "internal",
    });
    search.fake.control.failNext(1, "drop");
    await expect(search.client.index("parts").search("")).rejects.toBeInstanceOf(MeilisearchRequestError);
    expect(await search.found("flat")).toEqual([2]);

    search.fake.control.failNextTasks(1);
    const task = await search.client.index("parts").deleteAllDocuments().waitTask();
    expect(task).toMatchObject({ status: "failed", error: { code: "internal" } });
    expect(await search.found("flat")).toEqual([2]);

    search.fake.control.reset();
    expect(await refusal(search.client.index("parts").search(""))).toMatchObject({ code: "index_not_found" });
  });

  it("answers 404 for what it does not do", async () => {
    expect(await refusal(search.client.getStats())).toMatchObject({ status: 404, code: "not_found" });
  });
});
