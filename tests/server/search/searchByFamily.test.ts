import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { connect } from "#server/db/connect";
import { FitReport } from "#server/models/FitReport";
import { createSearchEngine } from "#server/search/createSearchEngine";
import { readNeed } from "#server/search/readNeed";
import { searchParts } from "#server/search/searchParts";
import { NeedQuery } from "#shared/schemas/need";
import { SearchQuery } from "#shared/schemas/search";
import { createTestDatabase } from "#tests/support/database";
import { buildPart, buildUser } from "#tests/support/factories";
import { buildFamily } from "./builders";

let close: () => Promise<void>;
let points: Awaited<ReturnType<typeof buildFamily>>["points"];
beforeAll(async () => {
  const database = await createTestDatabase();
  const sequelize = connect(database.url);
  close = async () => {
    await sequelize.close();
    await database.drop();
  };
  ({ points } = await buildFamily({
    slug: "two-idlers",
    name: "Two Idlers",
    points: [
      { name: "small idler", sizes: { outsideDiameter: [30, 29.5, 30.5], bore: [3, 2.96, 3.06] } },
      {
        name: "large idler",
        sizes: { outsideDiameter: [44, 43.5, 44.5], bore: [4, 3.96, 4.06], treadWidth: [6, 5, 7] },
      },
      { name: "drive belt", kind: "flat-belt", sizes: { insideCircumference: [300, 292, 304] } },
    ],
  }));
});
afterAll(() => close());

const engine = createSearchEngine({ meili: undefined });
const search = (query: object) => searchParts(engine, SearchQuery.parse({ family: "two-idlers", ...query }));
const need = (query: object) => readNeed(NeedQuery.parse({ family: "two-idlers", ...query }));

describe("a need on a family", () => {
  it("takes bands and sizes from the register, where something was measured and where not", async () => {
    const { need: shown, targets } = await need({ kind: "idler-wheel", outsideDiameter: "43.8" });
    expect(targets.map(({ point }) => point?.name)).toEqual(["large idler"]);
    expect(shown.family).toEqual({ slug: "two-idlers", name: "Two Idlers" });
    const [diameter, bore, width] = shown.dimensions;
    expect(shown.dimensions).toHaveLength(3);
    expect(diameter).toMatchObject({
      text: "43.8",
      asNewMm: 43.8,
      lowerMm: 43.5,
      upperMm: 44.5,
      bandFrom: "service-point",
    });
    expect(bore).toMatchObject({ text: null, asFoundMm: null, asNewMm: 4, standardUncertaintyMm: 0, lowerMm: 3.96 });
    expect(width).toMatchObject({ dimension: "treadWidth", bandFrom: "service-point" });
    expect(diameter!.basis.at(-1)).toBe("The large idler of the Two Idlers accepts 43.50 to 44.50 mm (register).");
    expect(bore!.basis[0]).toContain("Not measured: the large idler of the Two Idlers takes a bore of 4.00 mm");
  });

  it("stands by the register for a worn part, as far as wear can go", async () => {
    const worn = await need({ kind: "idler-wheel", outsideDiameter: "42.6" });
    expect(worn.need.dimensions[0]).toMatchObject({ bandFrom: "service-point", lowerMm: 43.5 });
  });

  it("does not use a register that the measurement speaks against, and says so", async () => {
    const { need: shown, targets } = await need({ kind: "idler-wheel", outsideDiameter: "38.0", bore: "4.0" });
    expect(targets).toHaveLength(1);
    expect(targets[0]!.point).toBeNull();
    expect(shown.dimensions.map(({ bandFrom }) => bandFrom)).toEqual(["common-practice", "common-practice"]);
    expect(shown.dimensions[0]!.basis.at(-1)).toContain("its band is not used: check the family");
    expect(shown.dimensions[1]!.basis.at(-1)).not.toContain("check the family");
  });

  it("moves the register's band along the rail", async () => {
    const { need: shown, targets } = await need({ kind: "idler-wheel", outsideDiameter: "44.0", estimateMm: 44.3 });
    expect(targets).toHaveLength(1);
    expect(shown.dimensions[0]!.asNewMm).toBe(44.3);
    expect(shown.dimensions[0]!.lowerMm).toBeCloseTo(43.8, 9);
    expect(shown.dimensions[0]!.upperMm).toBeCloseTo(44.8, 9);
    expect(shown.dimensions[0]!.bandFrom).toBe("service-point");
  });
});

describe("a search on a family", () => {
  it("assesses each part against every service point of the kind and keeps the best, saying which", async () => {
    const small = await buildPart({ sizes: { outsideDiameter: [30, 0.05], bore: [3.01, 0.01] } });
    const large = await buildPart({ sizes: { outsideDiameter: [44, 0.05], bore: [4.01, 0.01] } });
    const belt = await buildPart({ kind: "flat-belt", sizes: { insideCircumference: [298, 0.5] } });
    await buildPart({ sizes: { outsideDiameter: [44, 0.05], bore: [3, 0.01] } });

    const wheels = await search({ kind: "idler-wheel" });
    expect(new Set(wheels.items.map(({ part }) => part.id))).toEqual(new Set([small.id, large.id]));
    const reasons = new Map(wheels.items.map(({ part, fit }) => [part.id, fit?.reason]));
    expect(reasons.get(small.id)).toMatch(/^As small idler: /);
    expect(reasons.get(large.id)).toMatch(/^As large idler: /);

    const all = await search({});
    expect(new Set(all.items.map(({ part }) => part.id))).toEqual(new Set([small.id, large.id, belt.id]));
    expect(all.need).toMatchObject({ kind: null, dimensions: [] });
    expect(all.rail).toBeNull();

    const measured = await search({ outsideDiameter: "30.0" });
    expect(measured.items.map(({ part }) => part.id)).toEqual([small.id]);
    expect(measured.need.kind).toBe("idler-wheel");
    expect(measured.items[0]!.fit!.reason).not.toContain("As small idler");
  });

  it("counts restorers who fitted a part to the same family", async () => {
    const part = await buildPart({ sizes: { outsideDiameter: [44.1, 0.05], bore: [4, 0.01] } });
    const [one, other] = [await buildUser(), await buildUser()];
    await FitReport.create({ partId: part.id, servicePointId: points[1]!.id, userId: one.id, outcome: "fitted" });
    await FitReport.create({ partId: part.id, servicePointId: points[0]!.id, userId: one.id, outcome: "fitted" });
    await FitReport.create({ partId: part.id, servicePointId: null, userId: other.id, outcome: "fitted" });
    const found = await search({ kind: "idler-wheel", outsideDiameter: "44.1" });
    const evidence = found.items.find(({ part: { id } }) => id === part.id)?.evidence;
    expect(evidence).toMatchObject({ fitted: 3, sentence: "1 restorer fitted this to the same family" });
    const anywhere = await searchParts(
      engine,
      SearchQuery.parse({ kind: "idler-wheel", outsideDiameter: "44.1", bore: "4.00" }),
    );
    expect(anywhere.items.find(({ part: { id } }) => id === part.id)?.evidence.sentence).toBe(
      "2 restorers fitted this",
    );
  });
});
