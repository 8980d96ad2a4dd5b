import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { connect } from "#server/db/connect";
import { inTransaction } from "#server/db/inTransaction";
import { FitClaim } from "#server/models/FitClaim";
import { Part } from "#server/models/Part";
import { writeSearchTexts } from "#server/search/partSearchText";
import { searchParts } from "#server/search/searchParts";
import { SearchQuery } from "#shared/schemas/search";
import { createTestDatabase } from "#tests/support/database";
import { buildPart, buildWorkshop } from "#tests/support/factories";
import { buildFamily, buildKit } from "./builders";
import { engines } from "./engines";

describe.each(engines)("words by %s", (_name, start) => {
  let stop: () => Promise<void>;
  let running: Awaited<ReturnType<typeof start>>;
  let roller: Part;
  let wheel: Part;
  let belt: Part;
  let kit: Part;

  beforeAll(async () => {
    const database = await createTestDatabase();
    const sequelize = connect(database.url);
    running = await start();
    stop = async () => {
      await running.stop();
      await sequelize.close();
      await database.drop();
    };
    const { points } = await buildFamily({
      slug: "ørsted-two".replace("ø", "o"),
      name: "Ørsted Two",
      points: [{ name: "platter idler", sizes: {} }],
    });
    const workshop = await buildWorkshop({ name: "Müller Gummi" });
    roller = await buildPart({ title: "Capstan roller, firm", kind: "pinch-roller", material: "polyurethane" });
    wheel = await buildPart({ title: "Platter wheel", workshopId: workshop.id, material: "NBR" });
    belt = await buildPart({ title: "Take-up belt 9,5 mm wide", kind: "flat-belt" });
    kit = (await buildKit({ title: "Rebuild box", lines: [{ outsideDiameter: 44 }] })).part;
    await FitClaim.create({ partId: wheel.id, servicePointId: points[0]!.id, evidence: "fitted-here" });
    const partIds = [roller, wheel, belt, kit].map(({ id }) => id);
    await inTransaction((transaction) => writeSearchTexts(partIds, transaction));
    await running.engine.index(partIds);
  });
  afterAll(() => stop());

  const found = async (query: object) => {
    const { items, total } = await searchParts(running.engine, SearchQuery.parse(query));
    expect(total).toBe(items.length);
    return new Set(items.map(({ part }) => part.id));
  };
  const just = (...parts: Part[]) => new Set(parts.map(({ id }) => id));

  it.each([
    ["a word of the title", "capstan", () => [roller]],
    ["a kind", "idler wheel", () => [wheel, kit]],
    ["a material in other words", "nitrile", () => [wheel]],
    ["a workshop, without its accent", "muller", () => [wheel]],
    ["a family that it is claimed to fit", "orsted", () => [wheel]],
    ["the same with its own letter", "Ørsted two", () => [wheel]],
    ["a line of a kit", "box wheel", () => [kit]],
    ["words in any order, with capitals and signs", "ROLLER; capstan!", () => [roller]],
    ["a number as it was written", "9,5 mm", () => [belt]],
    ["the beginning of the last word", "capstan rol", () => [roller]],
    ["a word with a hyphen", "take-up", () => [belt]],
    ["idle words beside others", "a roller for the capstan", () => [roller]],
  ])("finds %s", async (_what, q, parts) => {
    expect(await found({ q })).toEqual(just(...parts()));
  });

  it.each([
    ["two letters swapped", "capstna", () => [roller]],
    ["a letter too many", "capsttan", () => [roller]],
    ["a letter missing", "roler capstan", () => [roller]],
    ["a wrong letter", "plattar", () => [wheel]],
    ["two slips in a long word", "polyurethnae firm", () => [roller]],
  ])("forgives %s", async (_what, q, parts) => {
    expect(await found({ q })).toEqual(just(...parts()));
  });

  it.each([
    ["words of two different parts", "capstan platter"],
    ["two slips in a short word", "cpastna"],
    ["a word that nobody uses", "gramophone"],
    ["an ending without its beginning", "apstan"],
    ["nothing but idle words", "for the"],
  ])("finds nothing by %s", async (_what, q) => {
    expect(await found({ q })).toEqual(new Set());
  });

  it("keeps fit out of it where nothing was measured", async () => {
    const { items, rail, nearMisses } = await searchParts(running.engine, SearchQuery.parse({ q: "wheel" }));
    expect(items.map(({ fit, kitLineId }) => [fit, kitLineId])).toEqual([
      [null, null],
      [null, null],
    ]);
    expect(rail).toBeNull();
    expect(nearMisses).toEqual([]);
  });

  it("combines words with sizes and with a kind", async () => {
    expect(await found({ q: "wheel", kind: "idler-wheel", outsideDiameter: "44.0" })).toEqual(just(wheel, kit));
    expect(await found({ q: "platter", kind: "idler-wheel", outsideDiameter: "44.0" })).toEqual(just(wheel));
    expect(await found({ q: "platter", kind: "idler-wheel", outsideDiameter: "50.0" })).toEqual(new Set());
    expect(await found({ q: "belt", kind: "flat-belt" })).toEqual(just(belt));
    expect(await found({ q: "belt", kind: "idler-wheel" })).toEqual(new Set());
  });

  it("shows nothing that was taken away, even before the index hears of it", async () => {
    await Part.update({ state: "hidden" }, { where: { id: roller.id } });
    expect(await found({ q: "capstan" })).toEqual(new Set());
    await running.engine.index([roller.id]);
    expect(await found({ q: "capstan" })).toEqual(new Set());
    await Part.update({ state: "published" }, { where: { id: roller.id } });
    await running.engine.index([roller.id]);
    expect(await found({ q: "capstan" })).toEqual(just(roller));
  });

  it("learns the words of a part when it is indexed", async () => {
    await Part.update({ searchText: "flywheel ring" }, { where: { id: belt.id } });
    await running.engine.index([belt.id]);
    expect(await found({ q: "flywhele" })).toEqual(just(belt));
  });
});
