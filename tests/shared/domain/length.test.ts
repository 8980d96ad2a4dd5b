import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { formatLength, longestLengthMm, otherUnit, type ParsedLength, parseLength } from "#shared/domain/length";
import unitCases from "../../reference/units.json";

function read(text: string, defaultUnit: "mm" | "in" = "mm"): Extract<ParsedLength, { ok: true }> {
  const parsed = parseLength(text, defaultUnit);
  if (!parsed.ok) throw new Error(`${text}: ${parsed.problem}`);
  return parsed;
}
function problemOf(text: string, defaultUnit: "mm" | "in" = "mm"): string {
  const parsed = parseLength(text, defaultUnit);
  if (parsed.ok) throw new Error(`${text} was read as ${parsed.echo}`);
  return parsed.problem;
}

describe("parseLength against the reference cases", () => {
  const lengths = unitCases.filter((c) => c.expected.mm !== undefined && c.inputs.text !== undefined);
  it("has cases to check", () => expect(lengths.length).toBe(8));
  it.each(lengths.map((c) => [c.inputs.text!, c.expected.mm!, c.id] as const))("%s is %d mm (%s)", (text, mm) => {
    expect(Math.abs(read(text).mm - mm)).toBeLessThanOrEqual(1e-9);
  });
  it("refuses the reference's tape speed, which is no length", () => {
    expect(problemOf(unitCases.find((c) => c.id === "unit-09-speed")!.inputs.text!)).toContain("“ips” is not a unit");
  });
});

describe("parseLength", () => {
  // mm and resolution follow from 1 in = 25.4 mm exactly (international yard and pound agreement, 1959).
  it.each([
    ["44.1", "mm", 44.1, 0.1, "mm", "44.1 mm"],
    ["44,1 mm", "mm", 44.1, 0.1, "mm", "44.1 mm"],
    ["44", "mm", 44, 1, "mm", "44 mm"],
    ["4.00", "mm", 4, 0.01, "mm", "4.00 mm"],
    ["1.736 in", "mm", 44.0944, 0.0254, "in", "1.736 in = 44.09 mm"],
    ["1.736", "in", 44.0944, 0.0254, "in", "1.736 in = 44.09 mm"],
    ['1-47/64"', "mm", 44.053125, 0.396875, "in", "1-47/64 in = 44.05 mm"],
    ["1-47/64 in", "mm", 44.053125, 0.396875, "in", "1-47/64 in = 44.05 mm"],
    ["1 – 47⁄64 ″", "mm", 44.053125, 0.396875, "in", "1-47/64 in = 44.05 mm"],
    ["3/16", "in", 4.7625, 1.5875, "in", "3/16 in = 4.76 mm"],
    ["3/16", "mm", 4.7625, 1.5875, "in", "3/16 in = 4.76 mm (a fraction without a unit is read as inches)"],
    ["47/32 inch", "mm", 37.30625, 0.79375, "in", "47/32 in = 37.31 mm"],
    ["750 thou", "mm", 19.05, 0.0254, "thou", "750 thou = 19.05 mm"],
    ["139.5 mil", "mm", 3.5433, 0.00254, "thou", "139.5 thou = 3.543 mm"],
    ["4.41 cm", "mm", 44.1, 0.1, "cm", "4.41 cm = 44.1 mm"],
    ["0.62 m", "mm", 620, 10, "m", "0.62 m = 620 mm"],
    ["10 m", "mm", 10_000, 1000, "m", "10 m = 10000 mm"],
    ["30 µm", "mm", 0.03, 0.001, "um", "30 um = 0.030 mm"],
    ["7½”", "mm", 190.5, 12.7, "in", "7-1/2 in = 190.50 mm"],
    ["7-½ in", "mm", 190.5, 12.7, "in", "7-1/2 in = 190.50 mm"],
    ["⅞ inches", "mm", 22.225, 3.175, "in", "7/8 in = 22.23 mm"],
    ["4½ mm", "mm", 4.5, 0.5, "mm", "4-1/2 mm = 4.50 mm"],
    ["1/3 in", "mm", 25.4 / 3, 25.4 / 3, "in", "1/3 in = 8.47 mm"],
    [".103 in.", "mm", 2.6162, 0.0254, "in", "0.103 in = 2.62 mm"],
    ["1''", "mm", 25.4, 25.4, "in", "1 in = 25.40 mm"],
    ["1.73438 IN", "mm", 44.053252, 0.000254, "in", "1.73438 in = 44.0533 mm"],
    ["ø44.1", "mm", 44.1, 0.1, "mm", "44.1 mm"],
    ["⌀ 44.1 mm", "mm", 44.1, 0.1, "mm", "44.1 mm"],
    ["Ø 1 3/4 in", "mm", 44.45, 6.35, "in", "1-3/4 in = 44.45 mm"],
    ["OD 44.1mm", "mm", 44.1, 0.1, "mm", "44.1 mm"],
    ["O.D.: 44.1", "mm", 44.1, 0.1, "mm", "44.1 mm"],
    ["dia. 44.1 mm", "mm", 44.1, 0.1, "mm", "44.1 mm"],
    ["44.1 mm dia", "mm", 44.1, 0.1, "mm", "44.1 mm"],
    ["\u00a044.1\u202fmm \t", "mm", 44.1, 0.1, "mm", "44.1 mm"],
    ["1,234.5", "mm", 1234.5, 0.1, "mm", "1234.5 mm"],
    ["1.234,5", "mm", 1234.5, 0.1, "mm", "1234.5 mm"],
    ["1 234,5 mm", "mm", 1234.5, 0.1, "mm", "1234.5 mm"],
    ["1.234", "mm", 1.234, 0.001, "mm", "1.234 mm"],
    // Read as thousands these would be over 10 m, so only one reading is left, and the echo says which.
    ["1,736 in", "mm", 44.0944, 0.0254, "in", "1.736 in = 44.09 mm"],
    ["44,105", "mm", 44.105, 0.001, "mm", "44.105 mm"],
    ["0,125 in", "mm", 3.175, 0.0254, "in", "0.125 in = 3.18 mm"],
  ] as const)("reads %s with %s as default", (text, defaultUnit, mm, resolutionMm, unit, echo) => {
    const parsed = read(text, defaultUnit);
    expect(parsed.mm).toBeCloseTo(mm, 12);
    expect(parsed.resolutionMm).toBeCloseTo(resolutionMm, 12);
    expect({ unit: parsed.unit, echo: parsed.echo }).toEqual({ unit, echo });
  });

  it("offers both readings of a comma before three digits, and guesses neither", () => {
    expect(problemOf("1,234")).toBe("“1,234” can be 1.234 mm or 1234 mm. Write 1.234 or 1234.");
    expect(problemOf("1,234 thou")).toContain("1.234 thou or 1234 thou");
    expect(problemOf("2,500 mm")).toContain("2.500 mm or 2500 mm");
  });

  it.each([
    ["", "Write a length"],
    ["   ", "Write a length"],
    ["mm", "does not begin with a number"],
    ["NaN", "does not begin with a number"],
    ["Infinity", "does not begin with a number"],
    ["ø", "Write a length"],
    ["-4", "negative"],
    ["− 4 mm", "negative"],
    ["0", "more than zero"],
    ["0.000 in", "more than zero"],
    ["0/4 in", "more than zero"],
    ["1/0 in", "below the line"],
    ["1 9/8 in", "not less than one"],
    ["10001 mm", "over 10 m"],
    ["400 in", "over 10 m"],
    ["1,234,567", "over 10 m"],
    ["1/3", "needs a unit"],
    ["44.1.2", "cannot be read"],
    ["3-4 mm", "cannot be read"],
    ["1.5 1/2 in", "cannot be read"],
    ["1/2/3 in", "cannot be read"],
    ["44 100 5", "cannot be read"],
    ["4.4e1", "“e1” is not a unit"],
    ["44 x 4", "is not a unit"],
    ["44 furlongs", "is not a unit"],
    ["5 ft", "Feet"],
    [`1' 6"`, "Feet"],
    ["4".repeat(41), "too long"],
    ["4 ".repeat(5000), "too long"],
  ])("refuses %j in plain words", (text, words) => expect(problemOf(text)).toContain(words));

  it("answers every text without throwing, and reads only sizes from 0 to 10 m", () => {
    fc.assert(
      fc.property(
        fc.oneof(fc.string({ unit: "binary" }), fc.stringMatching(/^[\d ,./\-½"a-z]{0,24}$/)),
        fc.constantFrom("mm" as const, "in" as const),
        (text, defaultUnit) => {
          const parsed = parseLength(text, defaultUnit);
          expect(parsed.ok || parsed.problem.length > 10).toBe(true);
          if (!parsed.ok) return;
          expect(parsed.mm).toBeGreaterThan(0);
          expect(parsed.mm).toBeLessThanOrEqual(longestLengthMm);
          expect(parsed.resolutionMm).toBeGreaterThan(0);
        },
      ),
      { numRuns: 500, seed: 44 },
    );
  });

  it("reads back its own echo to the same length", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 20 }), fc.integer({ min: 1, max: 63 }), (whole, above) => {
        const parsed = read(`${whole} ${above}/64 in`);
        expect(read(parsed.echo.split(" = ")[0]!).mm).toBe(parsed.mm);
      }),
      { seed: 45 },
    );
  });
});

describe("formatLength", () => {
  it.each([
    [44.053125, "mm", undefined, "44.05 mm"],
    [44.053125, "in", undefined, "1.734 in"],
    [44.053125, "cm", undefined, "4.405 cm"],
    [3.5306, "thou", undefined, "139.0 thou"],
    [0.03, "um", undefined, "30 µm"],
    [44.055, "mm", 2, "44.06 mm"],
    [1.005, "mm", 2, "1.01 mm"],
    [-0.001, "mm", 2, "0.00 mm"],
    [-0.35, "mm", 2, "-0.35 mm"],
    [44, "mm", 0, "44 mm"],
    [1e-9, "mm", 2, "0.00 mm"],
  ] as const)("%d in %s with %s decimals is %s", (mm, unit, decimals, text) => {
    expect(formatLength(mm, unit, { decimals })).toBe(text);
  });

  it("refuses what is no number", () => expect(() => formatLength(Number.NaN, "mm")).toThrow(DomainError));

  it("loses no micrometre from mm to inches and back", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 9_999_000 }), (micrometres) => {
        const written = formatLength(micrometres / 1000, "in", { decimals: 5 });
        expect(Math.round(read(written).mm * 1000)).toBe(micrometres);
      }),
      { numRuns: 2000, seed: 46 },
    );
  });
});

it("otherUnit turns to the other system", () => {
  expect([otherUnit("mm"), otherUnit("cm"), otherUnit("in"), otherUnit("thou")]).toEqual(["in", "in", "mm", "mm"]);
});
