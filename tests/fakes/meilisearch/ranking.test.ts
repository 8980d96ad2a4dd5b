import { describe, expect, it } from "vitest";
import { SearchIndex } from "#fakes/meilisearch/SearchIndex";
import { defaultSettings, type Settings } from "#fakes/meilisearch/Settings";
import { readSearch } from "#fakes/meilisearch/search/readSearch";
import { searchDocuments } from "#fakes/meilisearch/search/searchDocuments";

/** Ids in the order found; documents are given by their title, or whole, and numbered from 1. */
function order(documents: (string | object)[], body: Record<string, unknown>, settings: Partial<Settings> = {}) {
  const index = new SearchIndex("parts", "id", new Date(0));
  index.setSettings({ ...defaultSettings, ...settings });
  const docs = documents.map((doc, i) => ({ id: i + 1, ...(typeof doc === "string" ? { title: doc } : doc) }));
  index.add(docs, false, null);
  return searchDocuments(index, readSearch(body, index.settings)).hits.map(({ id }) => id);
}

/** Only the one rule, so that no other decides. */
const by = (rule: string, ...more: string[]) => ({
  rankingRules: [rule, ...more],
  searchableAttributes: ["title", "story"],
});

describe("each ranking rule by itself", () => {
  it.each<[rule: string, q: string, documents: (string | object)[], expected: number[]]>([
    ["words", "idler wheel", ["idler", "wheel idler"], [2, 1]],
    ["typo", "pulley", ["pully", "pulley"], [2, 1]],
    ["proximity", "idler wheel", ["idler of a wheel", "wheel idler", "idler wheel"], [3, 2, 1]],
    ["proximity", "idler wheel", [{ title: "idler", story: "wheel" }, "idler a b c d wheel"], [2, 1]],
    ["attributeRank", "belt", [{ title: "x", story: "belt" }, { title: "x belt" }], [2, 1]],
    ["wordPosition", "belt", [{ title: "x belt" }, { title: "x", story: "belt" }], [2, 1]],
    ["attribute", "belt", [{ story: "belt" }, { title: "x belt" }, { title: "belt" }], [3, 2, 1]],
    ["exactness", "caps", ["capstan", "caps"], [2, 1]],
    [
      "price:desc",
      "belt",
      [
        { title: "belt", price: 1 },
        { title: "belt", price: 2 },
      ],
      [2, 1],
    ],
  ])("%s, for %j", (rule, q, documents, expected) => {
    expect(order(documents, { q }, by(rule))).toEqual(expected);
    expect(order(documents, { q }, { ...by("title:asc"), rankingRules: [] }).sort()).toEqual([...expected].sort());
  });

  it("takes words before any other rule on words, wherever it is listed, and in its place among the others", () => {
    const documents = [
      { title: "pulley", price: 1 },
      { title: "pully wheel", price: 2 },
    ];
    expect(order(documents, { q: "pulley wheel" }, by("typo"))).toEqual([2, 1]);
    expect(order(documents, { q: "pulley wheel" }, by("price:asc", "typo"))).toEqual([1, 2]);
  });
});

describe("sorting by a field", () => {
  const sortable = { sortableAttributes: ["v"] };
  const values = [{ v: "b" }, { v: 10 }, {}, { v: "A" }, { v: 9 }, { v: [1, 50] }];

  it("puts numbers before strings and what has neither last, both ways; of lists the end that comes first", () => {
    expect(order(values, { sort: ["v:asc"] }, sortable)).toEqual([6, 5, 2, 4, 1, 3]);
    expect(order(values, { sort: ["v:desc"] }, sortable)).toEqual([6, 2, 5, 1, 4, 3]);
  });

  it("takes the second field where the first is equal", () => {
    const documents = [
      { v: 1, w: 1 },
      { v: 1, w: 2 },
      { v: 0, w: 0 },
    ];
    const both = { sortableAttributes: ["v", "w"] };
    expect(order(documents, { sort: ["v:desc", "w:desc"] }, both)).toEqual([2, 1, 3]);
  });
});

describe("what is found", () => {
  it("gives up terms from the end, or the most common first, or none", () => {
    const documents = ["belt", "belt flat", "belt flat", "round", "round belt"];
    const q = "belt round";
    expect(order(documents, { q, matchingStrategy: "last" }, by("words"))).toEqual([5, 1, 2, 3]);
    expect(order(documents, { q, matchingStrategy: "frequency" }, by("words"))).toEqual([5, 4]);
    expect(order(documents, { q, matchingStrategy: "all" }, by("words"))).toEqual([5]);
  });

  it("forgives no typing error in attributes told so, nor at all when switched off", () => {
    const documents = [{ title: "pulley" }, { story: "pulley" }];
    const typo = (change: object) => ({
      ...by("words"),
      typoTolerance: { ...defaultSettings.typoTolerance, ...change },
    });
    expect(order(documents, { q: "puley" })).toEqual([1, 2]);
    expect(order(documents, { q: "puley" }, typo({ disableOnAttributes: ["title"] }))).toEqual([2]);
    expect(order(documents, { q: "puley" }, typo({ enabled: false }))).toEqual([]);
    expect(order(["anyway"], { q: "any way" })).toEqual([1]);
    expect(order(["anyway"], { q: "any way" }, typo({ enabled: false }))).toEqual([]);
  });

  it("is looked for in the searchable attributes only, also below them, and never across two values", () => {
    const document = { title: "x", story: "belt", maker: { name: "Orlop" }, tags: ["idler", "wheel"] };
    expect(order([document], { q: "belt" }, { searchableAttributes: ["title"] })).toEqual([]);
    expect(order([document], { q: "orlop" }, { searchableAttributes: ["maker"] })).toEqual([1]);
    expect(order([document], { q: '"idler wheel"' })).toEqual([]);
    expect(order([document], { q: "wheel" })).toEqual([1]);
  });
});
