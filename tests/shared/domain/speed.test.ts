import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import type { SpeedInput } from "#shared/domain/driveTrain";
import { slipOfMotor } from "#shared/domain/motorSpeed";
import { type NominalSpeed, nominalSpeeds, recordSpeeds, tapeSpeeds } from "#shared/domain/nominalSpeeds";
import { type SpeedResult, solveSpeed } from "#shared/domain/speed";
import { isWithinLimit, speedError } from "#shared/domain/speedError";
import { speedLimits } from "#shared/domain/speedLimits";

const seed = { seed: 20_003 };
const motor = { mainsHz: 50, poles: 4, slipPercent: 4 };
const rim = { drive: "rim", ...motor, stepDiameter: 6, rimDiameter: 260 } as const;
const stepped = {
  drive: "stepped-idler",
  ...motor,
  stepDiameter: 8,
  idlerLargeDiameter: 50,
  idlerSmallDiameter: 25,
  rimDiameter: 200,
} as const;
const belt = { drive: "belt", ...motor, pulleyDiameter: 12, drivenDiameter: 150, beltThickness: 1 } as const;
const capstan = {
  drive: "capstan",
  ...motor,
  stages: [
    { driver: 10, driven: 60, beltThickness: 0.5 },
    { driver: 30, driven: 35 },
  ],
  capstanDiameter: 8,
} as const;
const drives: SpeedInput[] = [rim, stepped, belt, capstan];

function refusal(input: unknown): DomainError {
  try {
    solveSpeed(input as SpeedInput);
  } catch (error) {
    if (error instanceof DomainError) return error;
    throw error;
  }
  throw new Error("It was not refused.");
}

const diameter = fc.double({ min: 0.1, max: 5000, noNaN: true });
const thickness = fc.double({ min: 0, max: 50, noNaN: true });
const motors = fc.record({
  mainsHz: fc.double({ min: 10, max: 400, noNaN: true }),
  poles: fc.integer({ min: 1, max: 24 }).map((pairs) => 2 * pairs),
  slipPercent: fc.double({ min: 0, max: 99.9, noNaN: true }),
});
const stages = fc.array(fc.record({ driver: diameter, driven: diameter, beltThickness: thickness }), {
  minLength: 1,
  maxLength: 8,
});
const recordTarget = fc.constantFrom(...recordSpeeds);
const anyDrive: fc.Arbitrary<SpeedInput> = fc
  .tuple(motors, fc.array(diameter, { minLength: 4, maxLength: 4 }))
  .chain(([turning, [a, b, c, d]]) =>
    fc.oneof(
      recordTarget.map((target) => ({ drive: "rim" as const, ...turning, target, stepDiameter: a!, rimDiameter: b! })),
      recordTarget.map((target) => ({
        drive: "stepped-idler" as const,
        ...turning,
        target,
        stepDiameter: a!,
        idlerLargeDiameter: b!,
        idlerSmallDiameter: c!,
        rimDiameter: d!,
      })),
      fc.tuple(recordTarget, thickness).map(([target, beltThickness]) => ({
        drive: "belt" as const,
        ...turning,
        target,
        pulleyDiameter: a!,
        drivenDiameter: b!,
        beltThickness,
      })),
      fc.tuple(fc.constantFrom(...tapeSpeeds), stages).map(([target, chain]) => ({
        drive: "capstan" as const,
        ...turning,
        target,
        stages: chain,
        capstanDiameter: a!,
      })),
    ),
  );
/** What the motor drives first, and the belt on it. */
function firstOf(input: SpeedInput): [mm: number, thickness: number] {
  if (input.drive === "belt") return [input.pulleyDiameter, input.beltThickness];
  if (input.drive === "capstan") return [input.stages[0]!.driver, input.stages[0]!.beltThickness ?? 0];
  return [input.stepDiameter, 0];
}
/** Thick belts on tiny pulleys have no other mains: refused, and tested below. */
function hasOtherMains(input: SpeedInput): boolean {
  const [mm, thickness] = firstOf(input);
  return (mm + thickness) * input.mainsHz > thickness * 60 * 1.000001;
}
const solvable = anyDrive.filter(hasOtherMains);

/** The input with one size changed, by its path. */
function withSize(input: SpeedInput, field: string, mm: number): SpeedInput {
  const copy = structuredClone(input) as unknown as Record<string, unknown>;
  const steps = field.split("/");
  const last = steps.pop()!;
  const owner = steps.reduce((value, step) => value[step] as Record<string, unknown>, copy);
  owner[last] = mm;
  return copy as SpeedInput;
}
const speedOf = (result: SpeedResult) => result.tapeSpeedMmPerS ?? result.outputRpm;
const near = (value: number, wanted: number, part = 1e-9) =>
  expect(Math.abs(value / wanted - 1), `${value} for ${wanted}`).toBeLessThan(part);

describe("solveSpeed", () => {
  it("turns a plain idler the same whatever its size, and says that it cancels", () => {
    fc.assert(
      fc.property(diameter, diameter, (one, other) => {
        const [first, second] = [one, other].map((idlerDiameter) => solveSpeed({ ...rim, idlerDiameter }));
        expect(first).toEqual(second);
        expect(first!.cancels).toEqual(["idlerDiameter"]);
      }),
      seed,
    );
  });

  it("names the sizes that set the speed by their paths in the request", () => {
    expect(solveSpeed(rim).sets).toEqual(["stepDiameter", "rimDiameter"]);
    const treads = ["stepDiameter", "idlerLargeDiameter", "idlerSmallDiameter", "rimDiameter"];
    expect(solveSpeed(stepped)).toMatchObject({ sets: treads, cancels: [] });
    expect(solveSpeed(belt).sets).toEqual(["pulleyDiameter", "drivenDiameter", "beltThickness"]);
    expect(solveSpeed({ ...belt, beltThickness: 0 }).sets).toEqual(["pulleyDiameter", "drivenDiameter"]);
    const first = ["stages/0/driver", "stages/0/driven", "stages/0/beltThickness"];
    expect(solveSpeed(capstan).sets).toEqual([...first, "stages/1/driver", "stages/1/driven", "capstanDiameter"]);
  });

  it("goes twice as fast with twice the step, and half as fast with twice the rim", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 2500, noNaN: true }), (mm) => {
        const at = (sizes: { stepDiameter?: number; rimDiameter?: number }) =>
          solveSpeed({ ...rim, ...sizes }).outputRpm;
        near(at({ stepDiameter: 2 * mm }), 2 * at({ stepDiameter: mm }), 1e-14);
        near(at({ rimDiameter: 2 * mm }), at({ rimDiameter: mm }) / 2, 1e-14);
      }),
      seed,
    );
  });

  it("is a rim drive where the stepped idler has no step, the belt no thickness, the capstan one bare stage", () => {
    const { outputRpm } = solveSpeed(rim);
    near(
      solveSpeed({ ...rim, drive: "stepped-idler", idlerLargeDiameter: 40, idlerSmallDiameter: 40 }).outputRpm,
      outputRpm,
    );
    const thin = { ...belt, pulleyDiameter: 6, drivenDiameter: 260, beltThickness: 0 };
    expect(solveSpeed(thin).outputRpm).toBe(outputRpm);
    const bare = solveSpeed({ ...capstan, stages: [{ driver: 6, driven: 260 }] });
    expect(bare.outputRpm).toBe(outputRpm);
    near(bare.tapeSpeedMmPerS!, (8 * Math.PI * outputRpm) / 60);
  });

  it("keeps the speed where the step for the other mains is put in there", () => {
    fc.assert(
      fc.property(solvable, (input) => {
        const here = solveSpeed(input);
        const { mainsHz, stepDiameterMm } = here.otherMains;
        // Beyond the bounds of a diameter there is a step to turn all the same, but nothing here to put it in.
        fc.pre(stepDiameterMm >= 0.1 && stepDiameterMm <= 5000);
        const there = withSize({ ...input, mainsHz }, here.sizes[0]!.field, stepDiameterMm);
        fc.pre(hasOtherMains(there));
        near(speedOf(solveSpeed(there)), speedOf(here), 1e-9);
      }),
      { ...seed, numRuns: 300 },
    );
  });

  it("is run from the other frequency of the two: 60 Hz below 55, else 50 Hz", () => {
    const other = (mainsHz: number) => solveSpeed({ ...rim, mainsHz }).otherMains.mainsHz;
    expect([10, 50, 54.9, 55, 60, 400].map(other)).toEqual([60, 60, 60, 50, 50, 50]);
  });

  it("hits the target with any one size changed to what it says", () => {
    fc.assert(
      fc.property(solvable, (input) => {
        const rated = nominalSpeeds[input.target as NominalSpeed];
        for (const { field, neededMm } of solveSpeed(input).sizes) {
          if (neededMm === undefined || neededMm < 0.1 || neededMm > 5000) continue;
          const changed = withSize(input, field, neededMm);
          if (hasOtherMains(changed)) near(speedOf(solveSpeed(changed)), rated, 1e-9);
        }
      }),
      { ...seed, numRuns: 300 },
    );
    const step = solveSpeed({ ...rim, target: "33 1/3" }).sizes[0]!.neededMm!;
    near(solveSpeed({ ...rim, stepDiameter: step }).outputRpm, 100 / 3);
  });

  it("tells the sensitivity of every size as a small change of it shows", () => {
    for (const input of drives) {
      const base = solveSpeed(input);
      for (const { field, mm, percentPerHundredthMm } of base.sizes) {
        const [up, down] = [0.001, -0.001].map((change) => speedOf(solveSpeed(withSize(input, field, mm + change))));
        const measured = ((up! - down!) / 0.002 / speedOf(base)) * 0.01 * 100;
        expect(Math.abs(measured - percentPerHundredthMm), field).toBeLessThan(1e-6);
      }
    }
  });

  it("gives error and cents only with a target, and echoes its name", () => {
    expect(Object.keys(solveSpeed(rim))).not.toEqual(expect.arrayContaining(["target"]));
    expect(solveSpeed(rim)).not.toHaveProperty("errorPercent");
    const solved = solveSpeed({ ...rim, target: "33 1/3" });
    expect(solved.target).toBe("33 1/3");
    near(solved.errorPercent!, ((1440 * 6) / 260 / (100 / 3) - 1) * 100, 1e-12);
    expect(solveSpeed({ ...capstan, target: "3 3/4" }).target).toBe("3 3/4");
  });

  it("refuses the speed of the other medium", () => {
    expect(refusal({ ...rim, target: "7 1/2" })).toMatchObject({ field: "target" });
    expect(refusal({ ...stepped, target: "15" }).words).toContain("33 1/3");
    expect(refusal({ ...capstan, target: "45" })).toMatchObject({ field: "target" });
    expect(refusal({ ...capstan, target: "45" }).words).toContain("7 1/2");
  });

  it("refuses a belt too thick for the other mains, naming the thickness", () => {
    expect(refusal({ ...belt, pulleyDiameter: 0.3, beltThickness: 2 })).toMatchObject({ field: "beltThickness" });
    const thick = [{ driver: 0.3, driven: 60, beltThickness: 2 }];
    expect(refusal({ ...capstan, stages: thick })).toMatchObject({ field: "stages/0/beltThickness" });
  });

  const hostile = [Number.NaN, Infinity, -Infinity, -1, 5e-324, 1e308, -5e-324];
  it.each([
    ...drives.flatMap((input) => solveSpeed(input).sizes.map(({ field }) => [input, field] as const)),
    ...(["mainsHz", "poles", "slipPercent"] as const).map((field) => [rim, field] as const),
    [rim, "idlerDiameter"] as const,
  ])("refuses hostile numbers on their own field, or answers in finite ones (%#: %s)", (input, field) => {
    for (const value of hostile) {
      const isFine = value === 5e-324 && /slip|Thickness/.test(field);
      if (isFine) expect(JSON.stringify(solveSpeed(withSize(input, field, value)))).not.toContain("null");
      else expect(refusal(withSize(input, field, value)).field).toBe(field);
    }
  });

  it.each([
    ["mainsHz", [9.99, 400.01]],
    ["poles", [0, 1, 3, 4.5, 50]],
    ["slipPercent", [100, 100.1, -0.1]],
    ["stepDiameter", [0, 0.09, 5000.1]],
    ["rimDiameter", [0, 5000.1]],
    ["idlerDiameter", [0, 5000.1]],
  ] as const)("refuses what lies outside: %s", (field, values) => {
    for (const value of values) expect(refusal({ ...rim, [field]: value })).toMatchObject({ field });
  });

  it("takes one to eight stages", () => {
    const chain = (count: number) => ({ ...capstan, stages: Array.from({ length: count }, () => capstan.stages[1]) });
    expect(solveSpeed(chain(8)).shaftRpm).toHaveLength(9);
    expect(refusal(chain(0))).toMatchObject({ field: "stages" });
    expect(refusal(chain(9))).toMatchObject({ field: "stages" });
    expect(refusal({ ...rim, drive: "hand" })).toMatchObject({ field: "drive" });
  });

  it("answers in finite numbers whatever lies within the bounds", () => {
    const numbers = (value: unknown): number[] =>
      typeof value === "number"
        ? [value]
        : value && typeof value === "object"
          ? Object.values(value).flatMap(numbers)
          : [];
    fc.assert(
      fc.property(solvable, (input) => {
        expect(numbers(solveSpeed(input)).every(Number.isFinite)).toBe(true);
      }),
      { ...seed, numRuns: 500 },
    );
    const least = Array.from({ length: 8 }, () => ({ driver: 0.1, driven: 5000 }));
    const crawling = solveSpeed({ ...capstan, slipPercent: 99.999999999999, stages: least, target: "15" });
    expect(numbers(crawling).every(Number.isFinite)).toBe(true);
    expect(crawling.outputRpm).toBeGreaterThan(0);
  });
});

describe("slipOfMotor", () => {
  it("undoes the slip, and stands for a motor that keeps step", () => {
    expect(slipOfMotor({ mainsHz: 50, poles: 4, motorRpm: 1440 })).toBeCloseTo(4, 12);
    expect(slipOfMotor({ mainsHz: 50, poles: 4, motorRpm: 1500 })).toBe(0);
  });
  it.each([1500.1, 0, -5, Number.NaN, Infinity])("refuses %d rpm from four poles at 50 Hz", (motorRpm) => {
    expect(() => slipOfMotor({ mainsHz: 50, poles: 4, motorRpm })).toThrow("1500 rpm");
  });
});

describe("limits", () => {
  it.each(speedLimits.map((limit) => [`${limit.name}, ${limit.source}`, limit] as const))("%s", (_name, limit) => {
    for (const edge of [limit.lowerPercent, limit.upperPercent]) {
      const actual = (100 / 3) * (1 + edge / 100);
      expect(isWithinLimit(speedError(actual, 100 / 3).errorPercent, limit)).toBe(true);
      expect(isWithinLimit(edge + Math.sign(edge) * 1e-6, limit)).toBe(false);
    }
    expect(limit.lowerPercent).toBeLessThan(limit.upperPercent);
    expect(limit.source).not.toBe("");
  });

  it("takes 33 rpm as just -1 % of 33 1/3, though doubles put it outside", () => {
    const { errorPercent } = speedError(33, 100 / 3);
    expect(errorPercent).toBeLessThan(-1);
    expect(isWithinLimit(errorPercent, { lowerPercent: -1, upperPercent: 1.5 })).toBe(true);
  });
});
