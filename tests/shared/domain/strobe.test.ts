import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { barsPerMinuteFor, isExact, strobe, strobeDrift, strobeLimits, strobeRings } from "#shared/domain/strobe";
import cases from "../../reference/strobe.json";

type Tolerance = { abs?: number; rel?: number };
type Case = {
  id: string;
  inputs: Record<string, number | string | undefined>;
  expected: Record<string, unknown>;
  tolerance: Tolerance;
};

const rpmOf = (text: number | string | undefined) => {
  const [over = Number.NaN, under = 1] = String(text).split("/").map(Number);
  return over / under;
};
const field = (run: () => unknown): string => {
  try {
    run();
  } catch (error) {
    if (error instanceof DomainError) return error.field;
    throw error;
  }
  return "no error";
};
const expectNear = (actual: number, expected: unknown, { abs, rel }: Tolerance) => {
  expect(typeof expected).toBe("number");
  expect(Math.abs(actual - Number(expected))).toBeLessThanOrEqual(abs ?? (rel ?? 0) * Math.abs(Number(expected)));
};

describe("reference cases of the stroboscope", () => {
  const told: Case[] = cases;
  const counts = told.filter(({ expected }) => "true_rpm" in expected);
  it("are all here", () => expect([told.length, counts.length]).toEqual([12, 9]));

  it.each(counts)("$id: what a ring of so many bars shows", ({ inputs, expected, tolerance }) => {
    const wanted = { mainsHz: Number(inputs.mains_hz), rpm: rpmOf(inputs.target_rpm) };
    const shown = strobeDrift({ ...wanted, bars: Number(inputs.bars), barsPerMinute: 0 });
    expectNear(shown.rpm, expected.true_rpm, tolerance);
    expectNear(shown.errorPercent, expected.error_vs_target_pct, tolerance);
    const nearest = strobe(wanted);
    // 134 bars are the second best for 45 rpm at 50 Hz.
    if (inputs.bars === 134) expect(nearest.bars).toBe(133);
    else {
      expect(nearest.bars).toBe(inputs.bars);
      expectNear(nearest.shownRpm, expected.true_rpm, tolerance);
      expectNear(nearest.errorPercent, expected.error_vs_target_pct, tolerance);
    }
  });

  it("strobe-10: an exact ring for 45 rpm at 50 Hz, three bars per flash", () => {
    const [nearest, exact, ...rest] = strobeRings({ mainsHz: 50, rpm: 45 });
    expect(nearest?.bars).toBe(133);
    expect(exact).toMatchObject({ bars: 400, barsPerFlash: 3, shownRpm: 45, errorPercent: 0 });
    expect(rest).toEqual([]);
  });

  it("strobe-11: bars that creep tell the true speed", () => {
    const { rpm, errorPercent } = strobeDrift({ mainsHz: 60, rpm: 100 / 3, bars: 216, barsPerMinute: 5 });
    expect(rpm).toBeCloseTo(33.3564814815, 9);
    expect(errorPercent).toBeCloseTo(0.0694444444444, 9);
  });

  it("strobe-12 (from memory): 0.3 % at 60 Hz is 21.6 bars a minute on any ring", () => {
    expect(barsPerMinuteFor(60, 0.3)).toBeCloseTo(21.6, 9);
    for (const rpm of [50 / 3, 100 / 3, 45]) {
      const { bars } = strobe({ mainsHz: 60, rpm });
      expect(strobeDrift({ mainsHz: 60, rpm, bars, barsPerMinute: 21.6 }).errorPercent).toBeCloseTo(0.3, 9);
    }
  });
});

describe("strobeRings", () => {
  it("adds no second ring where the nearest is exact, nor where none is near enough", () => {
    expect(strobeRings({ mainsHz: 60, rpm: 45 }).map(({ bars }) => bars)).toEqual([160]);
    expect(strobeRings({ mainsHz: 50, rpm: 78 }).map(({ bars }) => bars)).toEqual([77]);
    expect(strobeRings({ mainsHz: 60, rpm: 78 }).map(({ bars }) => bars)).toEqual([92]);
  });

  it("says how the bars creep at the speed that is wanted", () => {
    expect(strobe({ mainsHz: 50, rpm: 45 }).creepPerMinute).toBeCloseTo(-15, 9);
    expect(strobe({ mainsHz: 50, rpm: 78 }).creepPerMinute).toBeCloseTo(6, 9);
    expect(strobe({ mainsHz: 60, rpm: 78 }).creepPerMinute).toBeCloseTo(-24, 9);
  });

  const mains = fc.double({ min: 10, max: 400, noNaN: true });
  const speed = fc.double({ min: 1, max: 500, noNaN: true });
  it("never shows a speed further off than its neighbours, and agrees with its own drift", () => {
    fc.assert(
      fc.property(mains, speed, (mainsHz, rpm) => {
        for (const ring of strobeRings({ mainsHz, rpm })) {
          const { bars, barsPerFlash, shownRpm, errorPercent, creepPerMinute } = ring;
          const passing = 120 * mainsHz * barsPerFlash;
          // Nearest in bars: half a bar at most.
          expect(Math.abs(bars - passing / rpm)).toBeLessThanOrEqual(0.5);
          expect((bars * shownRpm) / passing).toBeCloseTo(1, 12);
          expect(errorPercent).toBeCloseTo(((shownRpm - rpm) / rpm) * 100, 9);
          if (barsPerFlash > 1) expect(isExact(ring)).toBe(true);
          if (Math.abs(creepPerMinute) > 60 * mainsHz) continue;
          const true_ = strobeDrift({ mainsHz, rpm, bars, barsPerFlash, barsPerMinute: creepPerMinute });
          expect(true_.rpm / rpm).toBeCloseTo(1, 9);
        }
      }),
    );
  });
});

describe("what the stroboscope refuses", () => {
  const hostile = [Number.NaN, Infinity, -Infinity, 0, -0, -50, 5e-324, 1e308];
  it.each(hostile)("%d as mains or speed", (value) => {
    expect(field(() => strobe({ mainsHz: value, rpm: 45 }))).toBe("mainsHz");
    expect(field(() => strobe({ mainsHz: 50, rpm: value }))).toBe("rpm");
    expect(field(() => strobeRings({ mainsHz: 50, rpm: value }))).toBe("rpm");
    expect(field(() => barsPerMinuteFor(value, 1))).toBe("mainsHz");
  });

  it("a speed that leaves one bar, just past the last that leaves two", () => {
    expect(field(() => strobe({ mainsHz: 10, rpm: 801 }))).toBe("rpm");
    expect(strobe({ mainsHz: 10, rpm: 800 }).bars).toBe(2);
  });

  it("the ends of its limits it takes, and a step outside it does not", () => {
    const { mainsHz, rpm } = strobeLimits;
    expect(strobe({ mainsHz: mainsHz.max, rpm: rpm.min }).bars).toBe(strobeLimits.bars.max);
    expect(strobe({ mainsHz: mainsHz.min, rpm: rpm.min }).bars).toBe(1200);
    expect(field(() => strobe({ mainsHz: 400.001, rpm: 45 }))).toBe("mainsHz");
    expect(field(() => strobe({ mainsHz: 50, rpm: 1000.1 }))).toBe("rpm");
  });

  it.each([
    ["bars", { bars: 1 }],
    ["bars", { bars: 180.5 }],
    ["bars", { bars: Number.NaN }],
    ["barsPerFlash", { barsPerFlash: 5 }],
    ["barsPerFlash", { barsPerFlash: 1.5 }],
    ["barsPerMinute", { barsPerMinute: 3001 }],
    ["barsPerMinute", { barsPerMinute: Number.NaN }],
    ["rpm", { rpm: 0 }],
    ["mainsHz", { mainsHz: 1e308 }],
  ])("a drift with a wrong %s", (name, change) => {
    const drift = { mainsHz: 50, rpm: 100 / 3, bars: 180, barsPerMinute: 0 };
    expect(field(() => strobeDrift({ ...drift, ...change }))).toBe(name);
  });
});
