import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { rubberTolerance, type ToleranceClass, toleranceClasses } from "#shared/domain/rubberTolerance";
import cases from "../../reference/iso3302.json";
import table from "../../reference/iso3302Table.json";

describe("rubberTolerance", () => {
  const moulded = cases.filter((c) => c.inputs.tolerance_class.startsWith("M"));
  it("has the moulded cases", () => expect(moulded.length).toBe(12));
  it.each(
    moulded.map((c) => [c.id, c.inputs.nominal_mm, c.inputs.tolerance_class, c.inputs.dimension_kind, c] as const),
  )("%s: %d mm %s %s (ISO 3302-1:2014 Table 1)", (_id, nominal, toleranceClass, kind, { expected }) => {
    const dimension = kind === "C" ? "closure" : "fixed";
    const { plusMinusMm } = rubberTolerance(toleranceClass as ToleranceClass, nominal, dimension);
    expect(plusMinusMm).toBeCloseTo(expected.plus_minus_mm, 9);
  });

  const columns = toleranceClasses.flatMap((name) => [
    [name, "fixed", `${name}_F`] as const,
    [name, "closure", `${name}_C`] as const,
  ]);
  it.each(columns)(
    "%s %s: every row of the table, at both its ends, and the percentages over 160 mm",
    (name, dimension, column) => {
      const at = table.columns.indexOf(column);
      for (const row of table.rows) {
        const [above, upTo] = [row[0]!, row[1]!];
        for (const nominal of [above + 1e-9, (above + upTo) / 2, upTo]) {
          expect(rubberTolerance(name, nominal, dimension)).toMatchObject({
            plusMinusMm: row[at],
            range: [above, upTo],
          });
        }
      }
      const percent = table.over_160_pct[column as keyof typeof table.over_160_pct];
      for (const nominal of [160.001, 200, 1234.5]) {
        expect(rubberTolerance(name, nominal, dimension).plusMinusMm).toBeCloseTo((nominal * percent) / 100, 9);
      }
    },
  );
  it("leaves no gap between the rows, from 0 to 160 mm", () => {
    expect(table.rows.map(([above]) => above)).toEqual([0, ...table.rows.slice(0, -1).map(([, upTo]) => upTo)]);
    expect(table.rows.at(-1)?.[1]).toBe(160);
  });

  it("says which row was used: above the first bound, up to and including the second", () => {
    expect(rubberTolerance("M2", 4, "fixed").range).toEqual([0, 4]);
    expect(rubberTolerance("M2", 4.01, "fixed").range).toEqual([4, 6.3]);
    expect(rubberTolerance("M2", 160, "fixed").range).toEqual([100, 160]);
    expect(rubberTolerance("M2", 161, "fixed")).toEqual({
      plusMinusMm: 0.805,
      class: "M2",
      range: [160, null],
      source: "ISO 3302-1:2014 Table 1",
    });
  });

  it("is never finer for a coarser class, nor for a closure dimension", () => {
    for (const nominal of [1, 5, 8, 12, 20, 30, 50, 80, 130, 300]) {
      const fixed = toleranceClasses.map((name) => rubberTolerance(name, nominal, "fixed").plusMinusMm);
      const closure = toleranceClasses.map((name) => rubberTolerance(name, nominal, "closure").plusMinusMm);
      expect(fixed).toEqual([...fixed].sort((a, b) => a - b));
      for (const [i, plusMinus] of closure.entries()) expect(plusMinus).toBeGreaterThanOrEqual(fixed[i]!);
    }
  });

  it.each([0, -4, Number.NaN])("refuses a nominal of %d", (nominal) => {
    expect(() => rubberTolerance("M3", nominal, "fixed")).toThrow(DomainError);
  });
});
