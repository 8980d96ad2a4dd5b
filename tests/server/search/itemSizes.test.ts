import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { connect } from "#server/db/connect";
import { select } from "#server/db/select";
import { MeasuredDimension } from "#server/models/MeasuredDimension";
import { MeasuredItem } from "#server/models/MeasuredItem";
import { dimensionNames } from "#shared/domain/partKinds";
import { createTestDatabase } from "#tests/support/database";
import { buildPart } from "#tests/support/factories";
import { buildRandomParts } from "./randomParts";

let close: () => Promise<void>;
beforeAll(async () => {
  const database = await createTestDatabase();
  const sequelize = connect(database.url);
  close = async () => {
    await sequelize.close();
    await database.drop();
  };
});
afterAll(() => close());

type Row = { primary_um: number | null; nominals_um: (number | null)[]; half_widths_um: (number | null)[] };
async function copyOf(itemId: string): Promise<Row> {
  const rows = await select<Row>(
    "SELECT primary_um, nominals_um, half_widths_um FROM measured_items WHERE id = $itemId::uuid",
    { itemId },
  );
  return rows[0]!;
}
const at = (values: readonly (number | null)[]) =>
  Object.fromEntries(dimensionNames.flatMap((name, i) => (values[i] == null ? [] : [[name, values[i]]])));

describe("the copy of sizes that search reads", () => {
  it("follows what is put in, changed and taken out", async () => {
    const part = await buildPart({ sizes: { outsideDiameter: [44, 0.2], bore: [4, 0.01] } });
    const item = await MeasuredItem.findOne({ where: { partId: part.id }, rejectOnEmpty: true });
    const first = await copyOf(item.id);
    expect(first.nominals_um).toHaveLength(dimensionNames.length);
    expect(first.primary_um).toBe(44_000);
    expect(at(first.nominals_um)).toEqual({ outsideDiameter: 44_000, bore: 4_000 });
    expect(at(first.half_widths_um)).toEqual({ outsideDiameter: 200, bore: 10 });

    await MeasuredDimension.update({ nominalUm: 45_000 }, { where: { itemId: item.id, dimension: "outsideDiameter" } });
    await MeasuredDimension.update({ dimension: "treadWidth" }, { where: { itemId: item.id, dimension: "bore" } });
    const second = await copyOf(item.id);
    expect(second.primary_um).toBe(45_000);
    expect(at(second.nominals_um)).toEqual({ outsideDiameter: 45_000, treadWidth: 4_000 });

    await MeasuredDimension.destroy({ where: { itemId: item.id, dimension: "treadWidth" } });
    expect(at((await copyOf(item.id)).half_widths_um)).toEqual({ outsideDiameter: 200 });
  });

  it("says the same as the sizes themselves for every item of a market", async () => {
    await buildRandomParts(60, 11);
    const [row] = await select<{ items: number; sizes: number; wrong: number }>(`
      SELECT count(DISTINCT i.id)::integer AS items, count(m.item_id)::integer AS sizes,
        count(*) FILTER (WHERE m.nominal_um IS DISTINCT FROM i.nominals_um[t.place]
          OR m.half_width_um IS DISTINCT FROM i.half_widths_um[t.place]
          OR (t.name = i.primary_dimension AND m.nominal_um IS DISTINCT FROM i.primary_um))::integer AS wrong
      FROM measured_items i
        CROSS JOIN unnest(ARRAY[${dimensionNames.map((name) => `'${name}'`).join(", ")}]) WITH ORDINALITY AS t (name, place)
        LEFT JOIN measured_dimensions m ON m.item_id = i.id AND m.dimension = t.name`);
    expect(row!.items).toBeGreaterThan(60);
    expect(row!.sizes).toBeGreaterThan(150);
    expect(row!.wrong).toBe(0);
  });
});
