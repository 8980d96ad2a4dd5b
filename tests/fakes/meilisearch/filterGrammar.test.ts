import { describe, expect, it } from "vitest";
import { checkFields } from "#fakes/meilisearch/filter/checkFields";
import { matchesFilter } from "#fakes/meilisearch/filter/matchesFilter";
import { readFilter } from "#fakes/meilisearch/filter/readFilter";

const docs = [
  {
    id: "wheel",
    kind: "idler wheel",
    price: 12.5,
    tags: ["Rubber", "new"],
    size: { outer: 44.1, bore: 4 },
    note: null,
    sold: false,
  },
  {
    id: "belt",
    kind: "belt",
    price: 8,
    tags: [],
    size: { outer: 90, bore: null },
    note: "",
    sold: true,
    made: "2004-06-01",
  },
  { id: "ring", kind: "NOT", price: "12.5", tags: ['ring\'s "best"', 7], parts: [{ bore: 3 }, { bore: 6 }], note: {} },
  { id: "bare", kind: "back\\slash", "odd.name": "dotted" },
];

/** Ids that a filter takes, in the order above. */
function ids(filter: unknown): string[] {
  const node = readFilter(filter);
  return docs.filter((doc) => node === null || matchesFilter(node, doc)).map(({ id }) => id);
}

describe("a filter takes", () => {
  it.each<[filter: unknown, expected: string]>([
    // equality
    ["kind = belt", "belt"],
    ["kind=belt", "belt"],
    ["kind = BELT", "belt"],
    ["kind = 'idler wheel'", "wheel"],
    ['kind = "Idler Wheel"', "wheel"],
    ["kind != belt", "wheel ring bare"],
    ["price = 12.5", "wheel ring"],
    ["price = 12.50", "wheel"],
    ["price != 8", "wheel ring bare"],
    ["sold = true", "belt"],
    ["tags = rubber", "wheel"],
    ["tags = 7", "ring"],
    ["note = null", ""],
    ['note = ""', "belt"],
    // quotes and escapes
    ["tags = 'ring\\'s \"best\"'", "ring"],
    ['tags = "ring\'s \\"best\\""', "ring"],
    ['kind = "back\\\\slash"', "bare"],
    ["kind = 'NOT'", "ring"],
    ["'kind' = belt", "belt"],
    // comparisons: a number is compared with numbers only, anything else with strings only
    ["price > 8", "wheel"],
    ["price >= 8", "wheel belt"],
    ["price < 12.5", "belt"],
    ["price <= 12.5", "wheel belt"],
    ["price > -1", "wheel belt"],
    ["price >= 8e0", "wheel belt"],
    ["made > 2004-01-01", "belt"],
    ["made < '2004-01-01'", ""],
    ["kind > 5", ""],
    ["kind > c", "wheel ring"],
    // ranges
    ["price 8 TO 12", "belt"],
    ["size.outer 44.1 TO 90", "wheel belt"],
    ["NOT price 8 TO 12", "wheel ring bare"],
    // nested names and lists of objects
    ["size.bore = 4", "wheel"],
    ["parts.bore = 6", "ring"],
    ["parts.bore 4 TO 5", ""],
    ["odd.name = dotted", "bare"],
    // lists
    ["id IN [belt, 'ring', \"bare\"]", "belt ring bare"],
    ["id IN [belt,]", "belt"],
    ["id IN []", ""],
    ["id NOT IN [belt, ring]", "wheel bare"],
    ["NOT id IN [belt, ring]", "wheel bare"],
    ["price IN [8, 12.5]", "wheel belt ring"],
    // presence
    ["note EXISTS", "wheel belt ring"],
    ["note NOT EXISTS", "bare"],
    ["NOT note EXISTS", "bare"],
    ["size.bore EXISTS", "wheel belt"],
    ["note IS NULL", "wheel"],
    ["note IS NOT NULL", "belt ring bare"],
    ["size.bore IS NULL", "belt"],
    ["note IS EMPTY", "belt ring"],
    ["tags IS EMPTY", "belt"],
    ["tags IS NOT EMPTY", "wheel ring bare"],
    ["kind STARTS WITH Idler", "wheel"],
    ["kind NOT STARTS WITH 'idler w'", "belt ring bare"],
    // joining: NOT before AND before OR
    ["id = belt OR id = wheel AND price > 100", "belt"],
    ["(id = belt OR id = wheel) AND price > 10", "wheel"],
    ["NOT id = belt AND NOT id = wheel", "ring bare"],
    ["NOT (id = belt OR id = wheel)", "ring bare"],
    ["NOT NOT id = belt", "belt"],
    ["((id = belt))", "belt"],
    ["(id=belt)OR(id=ring)", "belt ring"],
    ["id = belt\n  AND\n  price = 8", "belt"],
    // lists of expressions: AND outside, OR inside
    [["id != ring", "price >= 8"], "wheel belt"],
    [[["id = belt", "id = ring"], "price = 8"], "belt"],
    [[["id = belt OR id = bare", "id = ring"]], "belt ring bare"],
    // nothing to filter by
    ["", "wheel belt ring bare"],
    ["  ", "wheel belt ring bare"],
    [[], "wheel belt ring bare"],
    [[[], ""], "wheel belt ring bare"],
    [null, "wheel belt ring bare"],
  ])("%j -> %s", (filter, expected) => {
    expect(ids(filter).join(" ")).toBe(expected);
  });
});

describe("a filter is refused, with the place, for", () => {
  it.each<[filter: unknown, reason: string]>([
    ["kind", "Was expecting an operation"],
    ["kind =", "Was expecting a value but instead got nothing.\n7:7 kind ="],
    ["= belt", "Was expecting a value but instead got `=`.\n1:2 = belt"],
    [
      "kind = belt price = 8",
      "Found unexpected characters at the end of the filter: `price = 8`.*\n13:18 kind = belt price = 8",
    ],
    ["kind = belt AND", "Was expecting a value but instead got nothing."],
    ["kind = AND", "Was expecting a value but instead got `AND`, which is a reserved keyword.*\n8:11 kind = AND"],
    ["OR = belt", "`OR`, which is a reserved keyword"],
    ["kind == belt", "Was expecting a value but instead got `=`."],
    ["kind = 'belt", "is missing the following closing delimiter: `'`.\n8:13"],
    ["(kind = belt", "is missing the following closing delimiter: `)`.\n1:2"],
    ["kind = belt)", "Found unexpected characters at the end of the filter: `)`"],
    ["kind IN belt", "Expected `[` after `IN` keyword.\n9:13"],
    ["kind IN [belt", "Expected matching `]`"],
    ["kind IN [belt ring]", "Expected only comma-separated field names inside `IN[..]` but instead found `ring`."],
    ["kind IN [belt, OR]", "but instead found `OR`."],
    ["kind IN [,]", "but instead found `,`."],
    ["price 8 TO", "Was expecting a value but instead got nothing."],
    ["price 8 9", "Was expecting an operation"],
    ["kind IS", "Was expecting an operation"],
    ["kind IS OLD", "Was expecting an operation .* at `OLD`.\n9:12"],
    ["kind NOT = belt", "Was expecting an operation .* at `= belt`"],
    ["kind STARTS belt", "Was expecting an operation"],
    ["kind CONTAINS elt", "Using `CONTAINS` in a filter requires an experimental feature"],
    ["_geoRadius(1, 2, 3)", "`_geoRadius` is a reserved keyword"],
    ["kind = ★", "Was expecting a value but instead got `★`."],
    ["kind ! belt", "Was expecting a value but instead got `!`."],
    [`${"(".repeat(300)}a = b${")".repeat(300)}`, "maximum depth"],
    [5, "expected String, Array, found: 5"],
    [[5], "expected String, [String], found: 5"],
    [[[["a = b"]]], 'expected String, found: ["a = b"]'],
  ])("%j", (filter, reason) => {
    const pattern = reason.split(".*").map((part) => part.replace(/[[\]().^$*+?|{}\\]/g, "\\$&"));
    expect(() => readFilter(filter)).toThrow(new RegExp(pattern.join("[\\s\\S]*")));
  });
});

describe("filtering is allowed only on the attributes told", () => {
  const check = (filter: string, filterable: Parameters<typeof checkFields>[1]) => () => {
    checkFields(readFilter(filter)!, filterable);
  };
  const granular = (filter: { equality: boolean; comparison: boolean }) => [
    { attributePatterns: ["price"], features: { facetSearch: false, filter } },
  ];

  it.each([
    ["price = 1", ["price"]],
    ["size.bore = 4", ["size"]],
    ["size.bore = 4", ["size.bore"]],
    ["size.bore = 4", ["size.*"]],
    ["anything = 4", ["*"]],
  ])("%s with %j", (filter, filterable) => {
    expect(check(filter, filterable)).not.toThrow();
  });

  it("names what there is", () => {
    expect(check("price = 1 AND NOT (kind = a OR sizes = 2)", ["price", "kind", "size"])).toThrow(
      "Attribute `sizes` is not filterable. Available filterable attribute patterns are: `price`, `kind`, `size`.\n32:37 price",
    );
    expect(check("price = 1", [])).toThrow("Attribute `price` is not filterable.");
    expect(check("size = 1", ["size.bore"])).toThrow("Attribute `size` is not filterable.");
  });

  it("keeps to the operators a rule allows", () => {
    expect(check("price = 1", granular({ equality: true, comparison: false }))).not.toThrow();
    expect(check("price > 1", granular({ equality: true, comparison: false }))).toThrow("comparison on `price`");
    expect(check("price 1 TO 2", granular({ equality: true, comparison: false }))).toThrow("comparison on `price`");
    expect(check("price IN [1]", granular({ equality: false, comparison: true }))).toThrow("equality on `price`");
    expect(check("price EXISTS", granular({ equality: false, comparison: false }))).not.toThrow();
  });
});
