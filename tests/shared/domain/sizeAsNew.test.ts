import { describe, expect, it } from "vitest";
import { estimateAsNew } from "#shared/domain/asNew";
import { conditionsFor } from "#shared/domain/conditions";
import { DomainError } from "#shared/domain/DomainError";
import { type ParsedSize, parseSize } from "#shared/domain/parseSize";
import { sizeAsNew } from "#shared/domain/sizeAsNew";

const wheel = {
  kind: "idler-wheel",
  dimension: "outsideDiameter",
  instrument: "digital-caliper",
  condition: "glazed",
} as const;
const belt = {
  kind: "flat-belt",
  dimension: "insideCircumference",
  instrument: "steel-rule",
  condition: "missing",
} as const;

function size(text: string): Extract<ParsedSize, { ok: true }> {
  const parsed = parseSize(text, "mm");
  if (!parsed.ok) throw new Error(parsed.problem);
  return parsed;
}
function refusal(run: () => unknown): DomainError {
  try {
    run();
  } catch (error) {
    if (error instanceof DomainError) return error;
    throw error;
  }
  throw new Error("was not refused");
}

describe("sizeAsNew of readings", () => {
  it("is what estimateAsNew makes of them", () => {
    const { asFound, ...estimate } = estimateAsNew({ ...wheel, readingsMm: [44.03, 44.05, 44.07], resolutionMm: 0 });
    expect(sizeAsNew(size("44.03; 44.05; 44.07"), wheel)).toEqual({ ...estimate, asFoundMm: asFound.valueMm });
    expect(estimate.basis[0]).toContain("Mean of 3 readings with a digital calliper");
  });

  it("shows a flat spot, and reckons from the highest reading", () => {
    const { flatSpot, asFoundMm, asNew, basis } = sizeAsNew(size("44.00; 43.70; 44.00"), {
      ...wheel,
      condition: "sound",
    });
    expect(flatSpot).toBe(true);
    expect(asFoundMm).toBeCloseTo(43.9, 12);
    expect(asNew.valueMm).toBeCloseTo(44, 12);
    expect(basis.join(" ")).toContain("The readings differ by 0.30 mm");
  });

  it("counts the rounding of a fraction", () => {
    const { asNew } = sizeAsNew(size("1-47/64 in"), wheel);
    expect((2 * asNew.standardUncertaintyMm).toFixed(2)).toBe("0.29");
  });

  it.each(["melted", "missing"] as const)("is refused for a %s part, with the way out", (condition) => {
    const { field, words } = refusal(() => sizeAsNew(size("532"), { ...belt, condition }));
    expect(field).toBe("condition");
    expect(words).toContain(`A ${condition} part has no size left to measure`);
    expect(words).toContain("like 532 ± 8 mm");
  });

  it("names a condition that the kind cannot be in before all else", () => {
    const felt = { ...belt, kind: "clutch-felt", dimension: "thickness", condition: "melted" } as const;
    expect(refusal(() => sizeAsNew(size("3"), felt)).words).toContain("do not become melted");
  });
});

describe("sizeAsNew of a size that was worked out", () => {
  it("takes it as it stands: u = a / sqrt 3 (JCGM 100:2008 4.3.7), nothing as found, no correction", () => {
    const { asFoundMm, asNew, flatSpot, basis } = sizeAsNew(size("532 ± 8 mm"), belt);
    expect(asFoundMm).toBeNull();
    expect(asNew.valueMm).toBe(532);
    expect(asNew.standardUncertaintyMm).toBeCloseTo(4.618802, 6);
    expect(flatSpot).toBe(false);
    expect(basis).toEqual([
      "Worked out as 532 ± 8 mm, not measured: no correction.",
      "Anything within ±8.00 mm is held for equally likely: standard uncertainty 4.62 mm (JCGM 100:2008 4.3.7).",
    ]);
  });

  it("does not ask what the part looks like, nor with what it was measured", () => {
    const all = conditionsFor("flat-belt").map((condition) => sizeAsNew(size("532 ± 8 mm"), { ...belt, condition }));
    for (const one of all) expect(one).toEqual(all[0]);
    expect(sizeAsNew(size("532 ± 8 mm"), { ...belt, instrument: "string" })).toEqual(all[0]);
  });

  it.each([
    ["a size that the kind has not", { ...belt, dimension: "bore" }, "dimension"],
    ["a condition that the kind cannot be in", { ...belt, condition: "flat-spotted" }, "condition"],
  ] as const)("refuses %s", (_name, circumstances, field) => {
    expect(refusal(() => sizeAsNew(size("532 ± 8 mm"), circumstances)).field).toBe(field);
  });
});
