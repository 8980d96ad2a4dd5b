import { describe, expect, it } from "vitest";
import { refusal, useSearchFake } from "./useSearchFake";

describe("the search fake's documents", () => {
  const search = useSearchFake();

  it("adds, replaces, updates and gets documents", async () => {
    const index = await search.fill();
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
    const index = await search.fill();
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
    await search.client
      .index("a")
      .addDocuments([{ partId: "p-1", title: "x" }])
      .waitTask();
    expect(await search.client.index("a").fetchPrimaryKey()).toBe("partId");

    const outcome = async (documents: Record<string, unknown>[]) =>
      (await search.client.index("b").addDocuments(documents).waitTask()).error?.code;
    expect(await outcome([{ title: "x" }])).toBe("index_primary_key_no_candidate_found");
    expect(await outcome([{ partId: 1, id: 2 }])).toBe("index_primary_key_multiple_candidates_found");
    expect(await outcome([{ id: 1 }, { id: "with space" }])).toBe("invalid_document_id");
    expect(await outcome([{ id: 1 }, { title: "x" }])).toBe("missing_document_id");
    expect((await search.client.index("b").getDocuments()).total).toBe(0);
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
    const headers = { ...init.headers, Authorization: `Bearer ${search.key}` };
    const res = await fetch(`${search.fake.url}/indexes/parts/documents`, { method: "POST", ...init, headers });
    expect([res.status, ((await res.json()) as { code: string }).code]).toEqual([status, code]);
  });
});
