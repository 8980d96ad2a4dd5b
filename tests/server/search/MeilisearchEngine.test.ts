import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { startMeilisearchFake } from "#fakes/meilisearch/startMeilisearchFake";
import { connect } from "#server/db/connect";
import { Statement } from "#server/db/Statement";
import { selectPrepared } from "#server/db/selectPrepared";
import { Part } from "#server/models/Part";
import { MeilisearchEngine } from "#server/search/MeilisearchEngine";
import { PostgresSearchEngine } from "#server/search/PostgresSearchEngine";
import { createTestDatabase } from "#tests/support/database";
import { buildPart } from "#tests/support/factories";

let close: () => Promise<void>;
let fake: Awaited<ReturnType<typeof startMeilisearchFake>>;
let part: Part;
let failures: string[];
beforeAll(async () => {
  const database = await createTestDatabase();
  const sequelize = connect(database.url);
  fake = await startMeilisearchFake({ apiKey: "key" });
  close = async () => {
    await fake.close();
    await sequelize.close();
    await database.drop();
  };
  part = await buildPart({ searchText: "grey idler" });
});
afterAll(() => close());

function engineAt(url: string) {
  failures = [];
  const logger = { warn: ({ err }: { err: Error }) => failures.push(err.name) };
  return new MeilisearchEngine({ url, apiKey: "key" }, new PostgresSearchEngine(), logger);
}
/** Ids of the parts that the engine finds by a word. */
async function found(engine: MeilisearchEngine): Promise<string[]> {
  const { of, select: give } = await engine.candidates({ sought: [], words: "grey", limit: 10 });
  expect(of).toBe("parts");
  const statement = new Statement();
  const rows = await selectPrepared<{ id: string }>(give(statement), statement);
  return rows.map(({ id }) => id);
}

describe("the Meilisearch engine", () => {
  it("fills an empty index when it is first used", async () => {
    const engine = engineAt(fake.url);
    expect(await found(engine)).toEqual([part.id]);
    expect(failures).toEqual([]);
  });

  it("lets the database answer while the service does not, and says so", async () => {
    const engine = engineAt(fake.url);
    await found(engine);
    fake.control.failNext(1, { status: 503 });
    expect(await found(engine)).toEqual([part.id]);
    expect(failures).toEqual(["MeilisearchApiError"]);
    fake.control.failNext(1, "drop");
    expect(await found(engine)).toEqual([part.id]);
    expect(failures).toEqual(["MeilisearchApiError", "MeilisearchRequestError"]);
  });

  it("tries its settings again after a failure at the start", async () => {
    const engine = engineAt(fake.url);
    fake.control.failNext(1);
    await found(engine);
    expect(failures).toHaveLength(1);
    await found(engine);
    expect(failures).toHaveLength(1);
  });

  it("fails the job where a write fails, so that it is tried again", async () => {
    const engine = engineAt(fake.url);
    await engine.index([part.id]);
    fake.control.failNextTasks(1);
    await expect(engine.index([part.id])).rejects.toThrow("The task was made to fail");
    await engine.index([part.id]);
  });

  it("takes a part out of the index that is no longer published, and sizes that it no longer has", async () => {
    const engine = engineAt(fake.url);
    const gone = await buildPart({ searchText: "grey wheel" });
    await engine.index([gone.id]);
    expect(await found(engine)).toHaveLength(2);
    await Part.update({ state: "retired" }, { where: { id: gone.id } });
    await engine.index([gone.id]);
    expect(await found(engine)).toEqual([part.id]);
  });
});
