import fc from "fast-check";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { SearchEngine } from "#server/adapters/SearchEngine";
import { connect } from "#server/db/connect";
import { select } from "#server/db/select";
import { readNeed } from "#server/search/readNeed";
import { searchParts } from "#server/search/searchParts";
import { assessFit } from "#shared/domain/fit";
import { type DimensionName, dimensionsOf, kindFacts, type PartKind } from "#shared/domain/partKinds";
import { SearchQuery } from "#shared/schemas/search";
import { createTestDatabase } from "#tests/support/database";
import { engines } from "./engines";
import { buildRandomParts, middleOf, triedKinds } from "./randomParts";

type Item = {
  part: string;
  kind: PartKind;
  material: string | null;
  words: string;
  sizes: Record<string, [nominalUm: number, halfWidthUm: number]>;
};
let items: Item[];

/** Every published item, without any index or window: what the search must agree with. */
const everyItem = () =>
  select<Item>(`
    SELECT p.id AS part, i.kind, p.material, p.search_text AS words, (SELECT json_object_agg(m.dimension, json_build_array(m.nominal_um, m.half_width_um))
      FROM measured_dimensions m WHERE m.item_id = i.id) AS sizes
    FROM measured_items i JOIN parts p ON p.id = i.part_id JOIN workshops w ON w.id = p.workshop_id
    WHERE p.state = 'published' AND w.state = 'admitted'`);

/** The best chance of each part that reaches the least, by going over all of them. */
async function scan(query: SearchQuery): Promise<Map<string, number>> {
  const { targets } = await readNeed(query);
  const best = new Map<string, number>();
  for (const item of items) {
    if (query.material && item.material !== query.material) continue;
    if (query.q && !item.words.includes(query.q)) continue;
    const part = Object.fromEntries(
      Object.entries(item.sizes).map(([name, [nominal, half]]) => [
        name,
        { nominalMm: nominal / 1000, plusMinusMm: half / 1000 },
      ]),
    );
    for (const { kind, need, bands } of targets) {
      const fit = kind === item.kind ? assessFit({ kind, need, bands, part }) : null;
      if (fit && fit.chance >= (query.minChance ?? 0.2)) {
        best.set(item.part, Math.max(best.get(item.part) ?? 0, fit.chance));
      }
    }
  }
  return best;
}

async function everyPage(engine: SearchEngine, query: SearchQuery) {
  const found: { id: string; chance: number }[] = [];
  let total = 0;
  for (let cursor: string | undefined; ; ) {
    const answer = await searchParts(engine, { ...query, cursor });
    found.push(...answer.items.map(({ part, fit }) => ({ id: part.id, chance: fit?.chance ?? -1 })));
    total = answer.total;
    if (answer.nextCursor === null) return { found, total };
    cursor = answer.nextCursor;
  }
}

const readingFor = (dimension: DimensionName) =>
  fc.integer({ min: -40, max: 40 }).map((off) => (middleOf(dimension) * (1 + off / 500)).toFixed(2));
const lengthFor = (dimension: DimensionName) =>
  fc.oneof(
    { arbitrary: readingFor(dimension), weight: 4 },
    {
      arbitrary: fc.array(readingFor(dimension), { minLength: 2, maxLength: 3 }).map((readings) => readings.join("; ")),
      weight: 1,
    },
    { arbitrary: readingFor(dimension).map((size) => `${size} ± ${(Number(size) / 100).toFixed(3)}`), weight: 1 },
  );

const queries = fc.constantFrom(...triedKinds).chain((kind) => {
  const { primary } = kindFacts[kind];
  return fc.record({
    kind: fc.oneof({ arbitrary: fc.constant(kind), weight: 4 }, { arbitrary: fc.constant(undefined), weight: 1 }),
    lengths: fc
      .subarray([...dimensionsOf(kind)], { minLength: 1 })
      .chain((names) => fc.record(Object.fromEntries(names.map((name) => [name, lengthFor(name)])))),
    instrument: fc.constantFrom("digital-caliper" as const, "steel-rule" as const, "string" as const),
    condition: fc.constantFrom("sound" as const, "hardened" as const, "swollen" as const),
    minChance: fc.constantFrom(undefined, 0, 0.0001, 0.05, 0.5, 0.9, 1),
    material: fc.constantFrom(undefined, undefined, "NBR" as const),
    q: fc.constantFrom(undefined, undefined, undefined, "grey"),
    estimateMm: fc.option(
      fc.double({ min: 0.97, max: 1.03, noNaN: true }).map((by) => by * middleOf(primary)),
      {
        nil: undefined,
        freq: 5,
      },
    ),
    sort: fc.constantFrom("fit" as const, "price" as const, "dispatch" as const),
    limit: fc.constantFrom(15, 50),
  });
});

describe.each(engines)("measured search by %s", (_name, start) => {
  let database: Awaited<ReturnType<typeof createTestDatabase>>;
  let running: Awaited<ReturnType<typeof start>>;
  let sequelize: ReturnType<typeof connect>;

  beforeAll(async () => {
    database = await createTestDatabase();
    sequelize = connect(database.url);
    running = await start();
    await buildRandomParts(240, 7);
    items = await everyItem();
  });
  afterAll(async () => {
    await running.stop();
    await sequelize.close();
    await database.drop();
  });

  it("finds just what a scan of every part finds, with the same chances, over all pages", async () => {
    let fits = 0;
    await fc.assert(
      fc.asyncProperty(queries, async ({ lengths, kind, estimateMm, ...rest }) => {
        const query = SearchQuery.parse({ ...rest, ...lengths, kind, estimateMm: kind && estimateMm });
        const expected = await scan(query);
        const { found, total } = await everyPage(running.engine, query);
        fits += found.length;
        expect(new Map(found.map(({ id, chance }) => [id, chance]))).toEqual(expected);
        expect(found).toHaveLength(expected.size);
        expect(total).toBe(expected.size);
      }),
      { numRuns: 80, seed: 20261201 },
    );
    // The market is close enough to the queries that the comparison is not between empty sets.
    expect(fits).toBeGreaterThan(500);
  }, 60_000);
});
