import pg from "pg";
import type { SearchQuery } from "#shared/schemas/search";
import type { SearchEngine } from "../adapters/SearchEngine";
import { connect } from "../db/connect";
import { migrate } from "../db/migrate";
import { Part } from "../models/Part";
import { createSearchEngine } from "../search/createSearchEngine";
import { rankedParts, searchParts } from "../search/searchParts";
import { benchQueries } from "./benchQueries";
import { fillMarket } from "./fillMarket";
import { fullScan } from "./fullScan";
import { percentile } from "./percentile";

const queriesOfEach = 100;
const scansOfEach = 3;

async function timed<T>(work: () => Promise<T>): Promise<{ ms: number; result: T }> {
  const start = performance.now();
  const result = await work();
  return { ms: performance.now() - start, result };
}

/**
 * The parts and sizes of these ids, as plainly as SQL can fetch them: what a search of the same rows is held against.
 * Of a part what its model reads, which leaves out the words as they are indexed.
 */
async function bareFetch(pool: pg.Pool, partIds: readonly string[]): Promise<void> {
  const columns = Object.values(Part.getAttributes()).map(({ field }) => field);
  await Promise.all([
    pool.query(`SELECT ${columns.join(", ")} FROM parts WHERE id = ANY($1::uuid[])`, [partIds]),
    pool.query(
      `SELECT i.part_id, i.kit_line_id, m.* FROM measured_items i JOIN measured_dimensions m ON m.item_id = i.id
       WHERE i.part_id = ANY($1::uuid[])`,
      [partIds],
    ),
  ]);
}

type Figures = { search: number[]; bare: number[]; page: number[]; found: number[]; ranked: number[] };

async function measure(engine: SearchEngine, pool: pg.Pool, queries: readonly SearchQuery[]): Promise<Figures> {
  const figures: Figures = { search: [], bare: [], page: [], found: [], ranked: [] };
  for (const [n, query] of queries.entries()) {
    const { fitting, missing } = await rankedParts(engine, query);
    // What the answer speaks of: what fits, and what lies beside it on the rail or only just misses.
    const ids = [...new Set([...fitting, ...missing].map(({ row }) => row.partId))];
    const shown = fitting.slice(0, query.limit).map(({ row }) => row.partId);
    const runs = {
      search: () => timed(() => searchParts(engine, query)),
      bare: () => timed(() => bareFetch(pool, ids)),
      page: () => timed(() => bareFetch(pool, shown)),
    };
    // In turns, so that whatever else the machine does falls on all alike.
    const order = (["search", "bare", "page"] as const).toSorted((a, b) => ((a.length + n) % 3) - ((b.length + n) % 3));
    for (const name of order) figures[name].push((await runs[name]()).ms);
    figures.found.push(fitting.length);
    figures.ranked.push(ids.length);
  }
  return figures;
}

const ms = (value: number) => `${value.toFixed(1)} ms`.padStart(10);
const times = (value: number) => `${value.toFixed(1)} x`.padStart(8);

function line(name: string, { search, bare, page, found, ranked }: Figures): string {
  const [p50, p99] = [50, 99].map((p) => ({
    search: percentile(search, p),
    bare: percentile(bare, p),
    page: percentile(page, p),
  })) as [Record<"search" | "bare" | "page", number>, Record<"search" | "bare" | "page", number>];
  const cells = [
    String(percentile(found, 50)).padStart(6),
    String(percentile(ranked, 50)).padStart(7),
    ms(p50.search),
    ms(p99.search),
    ms(p50.bare),
    ms(p99.bare),
    times(p50.search / p50.bare),
    times(p99.search / p99.bare),
    times(p50.search / p50.page),
  ];
  return `${name.padEnd(18)}${cells.join("")}`;
}

/**
 * Measures search over a market of generated parts in a scratch database, filled if empty, and prints it beside the bare SQL that
 * fetches all parts ranked with their sizes, beside the same for the one page that is shown, and beside a full scan.
 */
export async function searchBench(databaseUrl: string, parts: number, print: (line: string) => void): Promise<void> {
  const sequelize = connect(databaseUrl);
  const pool = new pg.Pool({ connectionString: databaseUrl, max: 4 });
  try {
    await migrate(sequelize, databaseUrl);
    if ((await Part.count()) === 0) {
      const filled = await timed(() => fillMarket(databaseUrl, parts));
      print(`filled in ${(filled.ms / 1000).toFixed(0)} s`);
    }
    print(`${await Part.count()} parts; ${queriesOfEach} searches of each sort\n`);
    const engine = createSearchEngine({ meili: undefined });
    const sorts = benchQueries(queriesOfEach);
    // The first of each are for the program and the database to get warm.
    for (const [, queries] of sorts) await measure(engine, pool, queries.slice(0, 10));
    print(
      `${"".padEnd(18)} found ranked search p50       p99  bare p50       p99     p50     p99  p50 to the bare fetch of a page`,
    );
    for (const [name, queries] of sorts) print(line(name, await measure(engine, pool, queries)));

    const [, oneDimension] = sorts[0]!;
    const scans: number[] = [];
    for (const query of oneDimension.slice(0, scansOfEach)) scans.push((await timed(() => fullScan(query))).ms);
    print(`\nA full scan for one dimension, with the same ranking: ${ms(percentile(scans, 50)).trim()}`);
  } finally {
    await pool.end();
    await sequelize.close();
  }
}
