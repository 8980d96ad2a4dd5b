import { describe, expect, it } from "vitest";
import { driveTrain, type SpeedInput } from "#shared/domain/driveTrain";
import { parseLength } from "#shared/domain/length";
import { motorSpeed, slipOfMotor } from "#shared/domain/motorSpeed";
import { nominalSpeeds, recordSpeeds, tapeSpeeds, true78 } from "#shared/domain/nominalSpeeds";
import { settingSizes } from "#shared/domain/settingSizes";
import { solveSpeed } from "#shared/domain/speed";
import { isWithinLimit, speedError } from "#shared/domain/speedError";
import { speedLimits } from "#shared/domain/speedLimits";
import cases from "../../reference/speed.json";

type Value = number | string | boolean | readonly (number | string)[];
type Inputs = Record<string, Value | undefined>;
type Answer = Record<string, Value | undefined>;
type Case = { id: string; topic: string; inputs: Inputs; expected: Answer; tolerance: { abs?: number; rel?: number } };

const number = (value: Value | undefined): number => {
  const [above, below = 1] = String(value).split("/").map(Number);
  return above! / below;
};
/** A motor that turns at just so many rpm, up to 1500. */
const motorOf = (rpm: Value | undefined) => ({ mainsHz: 50, poles: 4, slipPercent: (1500 - number(rpm)) / 15 });
const named = (names: readonly string[], value: Value) =>
  names.find((name) => Math.abs(number(name.split(" ")[0]) + number(name.split(" ")[1] ?? 0) - number(value)) < 1e-9);
const neededFor = (input: SpeedInput, field: string) =>
  solveSpeed(input).sizes.find((size) => size.field === field)?.neededMm;

/** What belts and rubber lose in each stage is counted in the motor's slip: the product is the same. */
function chain(inputs: Inputs): SpeedInput {
  const { driver_rpm, d1, d2, d3, d4, slip_pct_each = 0, slip_pct = 0, belt_thickness: thickness } = inputs;
  const pairs =
    d3 === undefined
      ? [[d1, d2 ?? 100]]
      : [
          [d1, d2],
          [d3, d4],
        ];
  const kept = (1 - number(slip_pct_each) / 100) ** pairs.length * (1 - number(slip_pct) / 100);
  const stages = pairs.map(([driver, driven]) => ({
    driver: number(driver),
    driven: number(driven),
    beltThickness: thickness === undefined ? undefined : number(thickness),
  }));
  return { drive: "capstan", ...motorOf(number(driver_rpm) * kept), stages, capstanDiameter: 8 };
}

function rim(inputs: Inputs): Answer {
  const motor = motorOf(inputs.motor_rpm);
  const stepDiameter = number(inputs.step_diameter ?? inputs.shaft_diameter ?? 6);
  const common = { ...motor, stepDiameter, rimDiameter: number(inputs.rim_diameter) };
  const stepFor = (rpm: Value) =>
    neededFor({ drive: "rim", ...common, target: named(recordSpeeds, rpm) as "45" }, "stepDiameter")!;
  if (inputs.idler_driven_diameter !== undefined) {
    const solved = solveSpeed({
      drive: "stepped-idler",
      ...common,
      idlerLargeDiameter: number(inputs.idler_driven_diameter),
      idlerSmallDiameter: number(inputs.idler_driving_diameter),
    });
    return { platter_rpm: solved.outputRpm, idler_rpm: solved.shaftRpm[1] };
  }
  const idlerDiameter = inputs.idler_diameter === undefined ? undefined : number(inputs.idler_diameter);
  const solved = solveSpeed({ drive: "rim", ...common, idlerDiameter });
  return {
    platter_rpm: solved.outputRpm,
    speed_change_pct: solved.sizes[0]!.percentPerHundredthMm,
    ...(inputs.target_rpm !== undefined && { step_diameter: stepFor("33.333333333333336") }),
    ...(Array.isArray(inputs.targets_rpm) && {
      step_diameters: inputs.targets_rpm.map((rpm: Value) => stepFor(number(rpm))),
    }),
  };
}

function belt(inputs: Inputs): Answer {
  const input = chain(inputs);
  const { outputRpm } = solveSpeed(input);
  const sizes = settingSizes(driveTrain(input), number(inputs.output_rpm ?? 1) / outputRpm);
  const bare = solveSpeed(chain({ ...inputs, belt_thickness: undefined })).outputRpm;
  return { output_rpm: outputRpm, output_rpm_ignoring_thickness: bare, d2: sizes[1]!.neededMm };
}

function capstan(inputs: Inputs): Answer {
  const inches = inputs.diameter_in === undefined ? undefined : number(inputs.diameter_in) * 25.4;
  const capstanDiameter = inches ?? number(inputs.diameter_mm ?? 5);
  const speed = inputs.tape_speed_in_per_s ?? number(inputs.tape_speed_cm_per_s ?? 0) / 2.54;
  const target = named(tapeSpeeds, speed) as "15" | undefined;
  const stages = [{ driver: 20, driven: 20 }];
  const input: SpeedInput = { drive: "capstan", ...motorOf(inputs.rpm ?? 300), stages, capstanDiameter, target };
  const { outputRpm, tapeSpeedMmPerS, errorPercent = 0 } = solveSpeed(input);
  const inPerS = tapeSpeedMmPerS! / 25.4;
  return {
    rpm: outputRpm / (1 + errorPercent / 100),
    tape_speed_mm_per_s: tapeSpeedMmPerS,
    tape_speed_in_per_s: inPerS,
    change_in_per_s: inPerS - 15,
    diameter_mm: neededFor(input, "capstanDiameter"),
  };
}

function motor(inputs: Inputs): Answer {
  const turning = { mainsHz: number(inputs.mains_hz), poles: number(inputs.poles) };
  const motorRpm = number(inputs.rotor_rpm ?? 1);
  const slip_pct = slipOfMotor({ ...turning, motorRpm });
  return {
    synchronous_rpm: motorSpeed({ ...turning, slipPercent: 0 }),
    rotor_rpm: motorSpeed({ ...turning, slipPercent: 100 * number(inputs.slip ?? 0) }),
    slip: slip_pct / 100,
    slip_pct,
  };
}

function error(inputs: Inputs): Answer {
  // err-01 and err-02 give 100 / 3 to twelve digits, and say so.
  const rated = inputs.rated === 33.3333333333 ? 100 / 3 : number(inputs.rated ?? 1);
  const actual = inputs.cents === undefined ? number(inputs.actual) : 2 ** (number(inputs.cents) / 1200);
  const { errorPercent, errorCents } = speedError(actual, rated);
  return {
    error_pct: errorPercent,
    cents: errorCents,
    semitones: errorCents / 100,
    ratio: 1 + errorPercent / 100,
  };
}

function mains(inputs: Inputs): Answer {
  const at = (hz: Value | undefined, step: Value = 6) =>
    ({ drive: "rim", ...motorOf(1440), mainsHz: number(hz), stepDiameter: number(step), rimDiameter: 260 }) as const;
  if (inputs.built_for_hz !== undefined) {
    const built = solveSpeed(at(inputs.built_for_hz)).outputRpm;
    const { errorPercent, errorCents } = speedError(solveSpeed(at(inputs.run_on_hz)).outputRpm, built);
    return { error_pct: errorPercent, cents: errorCents };
  }
  const { pulley_diameter, belt_thickness } = inputs;
  const belted = pulley_diameter !== undefined && {
    drive: "belt" as const,
    pulleyDiameter: number(pulley_diameter),
    drivenDiameter: 150,
    beltThickness: number(belt_thickness),
  };
  const from = at(inputs.from_hz, inputs.sleeve_diameter);
  const { otherMains } = solveSpeed(belted ? { ...from, ...belted } : from);
  expect(otherMains.mainsHz).toBe(inputs.to_hz);
  return { sleeve_diameter: otherMains.stepDiameterMm, pulley_diameter: otherMains.stepDiameterMm };
}

function nominal(inputs: Inputs): Answer {
  // Tape speeds that nothing here runs at are checked as lengths: the same inch.
  const cmPerS = (inches: string | number) => {
    const known = tapeSpeeds.find((name) => name === inches);
    const read = parseLength(String(inches), "in");
    return known ? nominalSpeeds[known] / 10 : read.ok ? read.mm / 10 : Number.NaN;
  };
  const rpm: Record<string, number> = {
    "16": nominalSpeeds["16 2/3"],
    "33": nominalSpeeds["33 1/3"],
    "45": nominalSpeeds["45"],
    "78@60Hz": true78[0].rpm,
    "78@50Hz": true78[1].rpm,
  };
  return {
    ...(Array.isArray(inputs.in_per_s) && { cm_per_s: inputs.in_per_s.map(cmPerS) }),
    ...(Array.isArray(inputs.names) && { rpm: inputs.names.map((name: string) => rpm[name]!) }),
    seconds_per_rev: 60 / nominalSpeeds["33 1/3"],
    rev_per_s: nominalSpeeds["33 1/3"] / 60,
  };
}

function limits(inputs: Inputs): Answer {
  const { errorPercent } = speedError(number(inputs.actual), number(inputs.rated));
  const source = /IEC 60098|DIN 45500.4|DIN 45500.3|studio/.exec(String(inputs.rule))![0];
  const words = {
    "DIN 45500-3": "DIN 45500 part 3",
    "DIN 45500-4": "Blatt 4",
    studio: "forum",
    "IEC 60098": "IEC 60098",
  };
  const limit = speedLimits.find((one) => one.source.includes(words[source as keyof typeof words]))!;
  expect([limit.lowerPercent, limit.upperPercent]).toEqual([inputs.lower_pct, inputs.upper_pct]);
  return { error_pct: errorPercent, within: isWithinLimit(errorPercent, limit) };
}

const topics: Record<string, [count: number, answer: (inputs: Inputs) => Answer]> = {
  motor_speed: [8, motor],
  rim_drive: [6, rim],
  belt_drive_speed: [7, belt],
  capstan_speed: [5, capstan],
  speed_error: [8, error],
  mains_conversion: [5, mains],
  nominal_speeds: [3, nominal],
  speed_limits: [7, limits],
};

describe.each(Object.entries(topics))("reference cases of %s", (topic, [count, answer]) => {
  const known = (cases as unknown as Case[]).filter((one) => one.topic === topic);
  it("has them all", () => expect(known).toHaveLength(count));

  it.each(known.map((one) => [one.id, one] as const))("%s", (_id, { inputs, expected, tolerance }) => {
    const found = answer(inputs);
    for (const [name, wanted] of Object.entries(expected)) {
      if (typeof wanted === "boolean") expect(found[name], name).toBe(wanted);
      else {
        const each = (value: Value | undefined) => (Array.isArray(value) ? value : [value]).map(number);
        const [wantedEach, foundEach] = [each(wanted), each(found[name])];
        expect(foundEach, name).toHaveLength(wantedEach.length);
        for (const [i, value] of wantedEach.entries()) {
          const allowed = tolerance.abs ?? tolerance.rel! * Math.abs(value);
          // Printed to twelve digits: the last of them is worth half a unit.
          expect(Math.abs(foundEach[i]! - value), `${name}: ${foundEach[i]}`).toBeLessThanOrEqual(allowed + 1e-12);
        }
      }
    }
  });
});
