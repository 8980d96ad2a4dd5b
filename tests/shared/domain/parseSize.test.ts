import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { longestLengthMm, parseLength } from "#shared/domain/length";
import { type ParsedSize, parseSize } from "#shared/domain/parseSize";
import { isWorkedOut, sizeLimits } from "#shared/domain/writtenSize";

function read(text: string, defaultUnit: "mm" | "in" = "mm"): Extract<ParsedSize, { ok: true }> {
  const parsed = parseSize(text, defaultUnit);
  if (!parsed.ok) throw new Error(`${text}: ${parsed.problem}`);
  return parsed;
}
function problemOf(text: string, defaultUnit: "mm" | "in" = "mm"): string {
  const parsed = parseSize(text, defaultUnit);
  if (parsed.ok) throw new Error(`${text} was read as ${parsed.echo}`);
  return parsed.problem;
}

describe("a size of one reading", () => {
  it.each(["44.1", '1-47/64"', "1,736 in", "750 thou", "3/16"])("is what parseLength reads in %s", (text) => {
    const length = parseLength(text, "mm");
    if (!length.ok) throw new Error(length.problem);
    const { mm, roundedToMm, echo } = length;
    expect(read(text)).toEqual({ ok: true, mm, readingsMm: [mm], roundedToMm, echo });
  });

  it.each(["", "   ", "wide", "-4", "0", "1,234", "5 ft"])("is refused in the words of parseLength: %j", (text) => {
    expect(parseSize(text, "mm")).toEqual(parseLength(text, "mm"));
  });
});

describe("several readings", () => {
  it.each([
    ["44.1; 44.0; 44.2", "mm", [44.1, 44, 44.2], 44.1, "3 readings, mean 44.10 mm"],
    ["44,1;44,0 mm ;  44,2", "mm", [44.1, 44, 44.2], 44.1, "3 readings, mean 44.10 mm"],
    ["44.1\n44.0\r\n44.2\n", "mm", [44.1, 44, 44.2], 44.1, "3 readings, mean 44.10 mm"],
    ["3.543; 3.546", "mm", [3.543, 3.546], 3.5445, "2 readings, mean 3.545 mm"],
    ["1.736; 1.734", "in", [44.0944, 44.0436], 44.069, "2 readings, mean 1.735 in = 44.07 mm"],
    ["44.1 mm; 1.736 in", "in", [44.1, 44.0944], 44.0972, "2 readings, mean 44.10 mm"],
    ["44.1 mm; 1.736", "in", [44.1, 44.0944], 44.0972, "2 readings, mean 44.10 mm"],
  ] as const)("are read each on its own: %j", (text, unit, readings, mean, echo) => {
    const size = read(text, unit);
    if (!("readingsMm" in size)) throw new Error("was read as worked out");
    expect(size.readingsMm).toHaveLength(readings.length);
    for (const [i, mm] of readings.entries()) expect(size.readingsMm[i]).toBeCloseTo(mm, 12);
    expect(size.mm).toBeCloseTo(mean, 12);
    expect(size).toMatchObject({ roundedToMm: 0, echo });
  });

  it("count the coarsest rounding", () => {
    // 1 in = 25.4 mm: a sixteenth is 1.5875 mm, coarser than the 64th before it.
    expect(read("1-47/64; 1-12/16; 1.736 in")).toMatchObject({ roundedToMm: 1.5875 });
  });

  it("may be written on: what is empty is no reading", () => {
    expect(read("44.1; ")).toEqual(read("44.1"));
    expect(read("44.1;; 44.0;")).toEqual(read("44.1; 44.0"));
    expect(problemOf(" ; ")).toContain("Write a length");
  });

  it.each([
    ["44.1; x; 44.2", "Reading 2: “x” does not begin with a number"],
    ["44.1; 44.0; -4", "Reading 3: A length cannot be negative."],
    ["1,234; 1.2", "Reading 1: “1,234” can be 1.234 mm or 1234 mm"],
    ["44.1, 44.0, 44.2", "cannot be read as a number"],
    ["44.1 + 44.0", "is not a unit"],
    ["44.1; 4.41", "4.41 mm and 44.1 mm are too far apart for one size"],
    [
      Array(sizeLimits.readings + 1)
        .fill("44")
        .join(";"),
      "at most 12 readings",
    ],
    ["4".repeat(sizeLimits.characters + 1), "too long for one size"],
  ])("are refused in words that name the one that is wrong: %j", (text, words) => {
    expect(problemOf(text)).toContain(words);
  });

  it("are not taken for inches where only the last names millimetres", () => {
    expect(problemOf("44.1; 44.0; 44.2 mm", "in")).toContain("write the unit after each");
  });

  it("are as many as may be", () => {
    const twelve = read(Array(sizeLimits.readings).fill("44.1").join(";"));
    expect(twelve).toMatchObject({ mm: 44.1, echo: "12 readings, mean 44.10 mm" });
  });
});

describe("a size that was worked out", () => {
  it.each([
    ["532 ± 8 mm", "mm", 532, 8, "532 ± 8 mm"],
    ["532 +/- 8 mm", "mm", 532, 8, "532 ± 8 mm"],
    ["532 mm +- 8", "mm", 532, 8, "532 ± 8 mm"],
    ["532 mm +- 8", "in", 532, 8, "532 ± 8 mm"],
    ["532 \u00b1 8", "mm", 532, 8, "532 ± 8 mm"],
    ["532 + / \u2212 8,5 mm", "mm", 532, 8.5, "532 ± 8.5 mm"],
    ["532mm±8mm;", "mm", 532, 8, "532 ± 8 mm"],
    ["20.9 ± 0.3 in", "mm", 530.86, 7.62, "20.9 ± 0.3 in = 530.86 ± 7.62 mm"],
    ["20.9 ± 0.3", "in", 530.86, 7.62, "20.9 ± 0.3 in = 530.86 ± 7.62 mm"],
    ["20-7/8 ± ¼ in", "mm", 530.225, 6.35, "20-7/8 ± 1/4 in = 530.23 ± 6.35 mm"],
    ["53.2 ± 0.8 cm", "in", 532, 8, "53.2 ± 0.8 cm = 532.00 ± 8.00 mm"],
    ["532 mm ± 0.3 in", "mm", 532, 7.62, "532 mm ± 0.3 in = 532.00 ± 7.62 mm"],
  ] as const)("is read with its half width: %j, %s", (text, unit, mm, plusMinusMm, echo) => {
    const size = read(text, unit);
    if (!("plusMinusMm" in size)) throw new Error("was read as measured");
    expect(size.mm).toBeCloseTo(mm, 12);
    expect(size.plusMinusMm).toBeCloseTo(plusMinusMm, 12);
    expect(size.echo).toBe(`worked out as ${echo}`);
    expect(isWorkedOut(text)).toBe(true);
  });

  it.each([
    ["532 ±", "After ±: Write a length"],
    ["± 8", "Before ±: Write a length"],
    ["532 ± 0 mm", "After ±: A length must be more than zero."],
    ["532 ± 532", "smaller than the size"],
    ["532 ± 53 cm ± 1", "one ± only"],
    ["532 ± 8 %", "After ±: “%” is not a unit"],
    ["532 furlongs ± 8 mm", "Before ±: “furlongs” is not a unit"],
    ["532 ± 8; 530 ± 8", "stands alone"],
    ["532 ± 8; 530", "stands alone"],
  ])("is refused in words: %j", (text, words) => expect(problemOf(text)).toContain(words));
});

describe("parseSize", () => {
  it("answers every text without throwing, and gives only sizes from 0 to 10 m", () => {
    fc.assert(
      fc.property(
        fc.oneof(fc.string({ unit: "binary" }), fc.stringMatching(/^[\d ,.;/±+\-½"mi]{0,30}$/)),
        fc.constantFrom("mm" as const, "in" as const),
        (text, defaultUnit) => {
          const parsed = parseSize(text, defaultUnit);
          expect(parsed.ok || parsed.problem.length > 10).toBe(true);
          if (!parsed.ok) return;
          expect(parsed.mm).toBeGreaterThan(0);
          expect(parsed.mm).toBeLessThanOrEqual(longestLengthMm);
          if ("plusMinusMm" in parsed) {
            expect(parsed.plusMinusMm).toBeGreaterThan(0);
            expect(parsed.plusMinusMm).toBeLessThan(parsed.mm);
          } else {
            expect(parsed.mm).toBeGreaterThanOrEqual(Math.min(...parsed.readingsMm));
            expect(parsed.mm).toBeLessThanOrEqual(Math.max(...parsed.readingsMm));
          }
        },
      ),
      { numRuns: 1000, seed: 532 },
    );
  });

  it("gives the same mean whatever the order of the readings", () => {
    const tenths = fc.array(fc.integer({ min: 400, max: 480 }), { minLength: 2, maxLength: sizeLimits.readings });
    fc.assert(
      fc.property(tenths, (values) => {
        const texts = values.map((tenth) => (tenth / 10).toFixed(1));
        const [one, other] = [read(texts.join("; ")), read([...texts].reverse().join(";"))];
        expect(other.mm).toBeCloseTo(one.mm, 12);
        expect(other.echo).toBe(one.echo);
      }),
      { numRuns: 100, seed: 44 },
    );
  });
});
