import { describe, expect, it } from "vitest";
import { refusal, useSearchFake } from "./useSearchFake";

describe("searching the search fake", () => {
  const search = useSearchFake();

  it("searches words, best first: all words, fewer errors, nearer, the more important attribute, earlier", async () => {
    await search.fill();
    expect(await search.found("idler wheel")).toEqual([1, 2]);
    expect(await search.found("wheel")).toEqual([3, 1, 2]);
    expect(await search.found("rubber wheel", { matchingStrategy: "all" })).toEqual([3]);
    expect(await search.found("wheel rubber plain", { matchingStrategy: "last" })).toEqual([3, 1, 2]);
    expect(await search.found("plain capstan wheel")).toEqual([4, 3]);
    expect(await search.found("capstna")).toEqual([4]);
    expect(await search.found("cap")).toEqual([4]);
    expect(await search.found("cap ")).toEqual([]);
    expect(await search.found('"idler wheel"')).toEqual([1, 2]);
    expect(await search.found('"wheel idler"')).toEqual([]);
    expect(await search.found("wheel -belt")).toEqual([3, 1]);
    expect(await search.found("wheel", { attributesToSearchOn: ["story"] })).toEqual([2]);
    expect(await search.found("cap stan tyre", { matchingStrategy: "all" })).toEqual([4]);
    expect(await search.found("nothing")).toEqual([]);
  });

  it("filters, sorts and shows what was asked for", async () => {
    const index = await search.fill();
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
    expect(await search.found("", { sort: ["price:desc"] })).toEqual([3, 1, 2, 4]);
    expect(await search.found("", { sort: ["price:asc"] })).toEqual([2, 1, 3, 4]);
    expect(await search.found("wheel", { sort: ["price:asc"] })).toEqual([1, 3, 2]);
    await index.updateRankingRules(["sort", "words", "title:desc"]).waitTask();
    expect(await search.found("wheel", { sort: ["price:asc"] })).toEqual([2, 1, 3]);
    expect(await search.found("")).toEqual([3, 1, 2, 4]);
    await index.updateDisplayedAttributes(["title"]).waitTask();
    expect((await index.search("capstan")).hits).toEqual([{ title: "Capstan tyre" }]);
  });

  it("pages by offset or by number, never past the most it may reach", async () => {
    const index = await search.fill();
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
    const index = await search.fill();
    const error = await refusal(index.search("", options));
    expect(error).toMatchObject({
      status: 400,
      code,
      type: "invalid_request",
      link: `https://docs.meilisearch.com/errors#${code}`,
    });
    expect(error.message).toContain(message);
  });
});
