import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { barSteps, layOutDisc } from "#shared/drawing/sheets/discLayout";
import { papers } from "#shared/drawing/sheets/papers";
import { strobeDisc, strobeSheet } from "#shared/drawing/sheets/strobeSheet";

const refusal = (run: () => unknown) => {
  try {
    run();
  } catch (error) {
    if (error instanceof DomainError) return error.field;
    throw error;
  }
  return "no refusal";
};
const disc = { mainsHz: 50, speeds: [100 / 3, 45, 78], spindleMm: 7.2, radiusMm: 90 };

describe("layOutDisc", () => {
  it("puts the rings with most bars outside, clear of each other, the edge and the hole", () => {
    const { rings } = layOutDisc(disc);
    expect(rings.map(({ bars }) => bars)).toEqual([400, 180, 133, 77]);
    for (const [i, { innerMm, outerMm }] of rings.entries()) {
      expect(outerMm).toBeGreaterThan(innerMm);
      // Room for the label, 2.7 mm high, outside each ring.
      expect((rings[i - 1]?.innerMm ?? disc.radiusMm) - outerMm).toBeGreaterThan(3.5);
    }
    expect(rings.at(-1)?.innerMm).toBeGreaterThan(disc.spindleMm / 2 + 9);
  });

  it("has bars as wide as the gaps, one for each", () => {
    const [ring] = layOutDisc({ ...disc, mainsHz: 60, speeds: [45] }).rings;
    expect(ring?.bars).toBe(160);
    if (ring) expect(barSteps(ring, 0, 0).filter(([verb]) => verb === "Z").length).toBe(160);
  });

  it("refuses more rings than the room beside the hole holds", () => {
    const speeds = [60, 61, 62, 63, 64, 65, 66, 67, 68];
    expect(() => layOutDisc({ ...disc, speeds, spindleMm: 40 })).toThrow(
      /rings of these speeds do not fit: choose fewer/,
    );
  });

  it("draws a speed that is asked for twice once", () => {
    expect(layOutDisc({ ...disc, mainsHz: 60, speeds: [45, 45] }).rings.length).toBe(1);
  });

  it.each([
    ["mainsHz", { mainsHz: Number.NaN }],
    ["spindleMm", { spindleMm: Number.NaN }],
    ["spindleMm", { spindleMm: 40.1 }],
    ["speeds", { speeds: [Infinity] }],
    ["speeds", { speeds: [1] }],
  ])("refuses a wrong %s", (field, change) => {
    expect(refusal(() => layOutDisc({ ...disc, ...change }))).toBe(field);
  });
});

describe("strobeSheet", () => {
  const number = fc.double({ min: 0.5, max: 1200, noNaN: true });
  it("draws or refuses whatever is asked, and draws inside the page", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(50, 60, 10, 400, 16.7),
        fc.array(fc.oneof(fc.constantFrom(50 / 3, 100 / 3, 45, 78, 90, 36), number), { minLength: 1, maxLength: 6 }),
        fc.double({ min: 1, max: 40, noNaN: true }),
        fc.constantFrom("a4", "letter"),
        (mainsHz, speeds, spindleMm, paper) => {
          const input = { mainsHz, speeds, spindleMm, paper };
          const refused = refusal(() => strobeSheet(input));
          expect(["no refusal", "speeds"]).toContain(refused);
          if (refused === "speeds") return;
          const { radiusMm, rings } = strobeDisc(input);
          expect(2 * radiusMm).toBeLessThan(papers[paper].widthMm - 20);
          for (const { bars, innerMm, outerMm } of rings) {
            expect(outerMm - innerMm).toBeGreaterThanOrEqual(2 - 1e-9);
            expect((Math.PI * (innerMm + outerMm)) / 2 / bars).toBeGreaterThanOrEqual(0.3);
          }
          for (const item of strobeSheet(input).pages[0]?.items ?? []) {
            if (item.type !== "words") continue;
            expect(item.x).toBeGreaterThan(10);
            expect(item.y).toBeGreaterThan(10);
            expect(item.y).toBeLessThan(papers[paper].heightMm - 10);
          }
        },
      ),
      { numRuns: 60, seed: 3 },
    );
  });
});
