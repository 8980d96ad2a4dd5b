import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import speeds from "../../reference/speed.json";
import strobes from "../../reference/strobe.json";
import { answered, casesOf, expectNear } from "./referenceCases";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

type Speed = {
  motorRpm: number;
  outputRpm: number;
  tapeSpeedMmPerS: number;
  errorPercent: number;
  errorCents: number;
  otherMains: { mainsHz: number; stepDiameterMm: number };
};
const asked = (body: object) => answered<Speed>(site, "speed", body);
/** A motor that turns at just so many rpm, up to 1500; what belts lose by slipping is counted here as well. */
const motorOf = (rpm: number) => ({ mainsHz: 50, poles: 4, slipPercent: (1500 - rpm) / 15 });
const rimDrive = (body: object) => asked({ drive: "rim", stepDiameter: 6, rimDiameter: 260, ...body });

describe("speeds", () => {
  it.each(casesOf(speeds, "motor-01", "motor-02", "motor-03", "motor-04", "motor-05", "motor-08"))(
    "%s",
    async (_id, { inputs, expected, tolerance }) => {
      const motor = { mainsHz: inputs.mains_hz, poles: inputs.poles };
      const { motorRpm: synchronous } = await rimDrive({ ...motor, slipPercent: 0 });
      if (expected.synchronous_rpm !== undefined) expectNear(synchronous, expected.synchronous_rpm, tolerance);
      const { motorRpm } = await rimDrive({ ...motor, slipPercent: 100 * Number(inputs.slip ?? 0) });
      expectNear(motorRpm, expected.rotor_rpm ?? expected.synchronous_rpm, tolerance);
    },
  );

  it.each(casesOf(speeds, "rim-01", "rim-02"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const { outputRpm } = await rimDrive({
      ...motorOf(Number(inputs.motor_rpm)),
      stepDiameter: inputs.step_diameter,
      rimDiameter: inputs.rim_diameter,
      idlerDiameter: inputs.idler_diameter,
    });
    expectNear(outputRpm, expected.platter_rpm, tolerance);
  });

  it.each(casesOf(speeds, "rim-04"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const { outputRpm } = await asked({
      drive: "stepped-idler",
      ...motorOf(Number(inputs.motor_rpm)),
      stepDiameter: inputs.shaft_diameter,
      idlerLargeDiameter: inputs.idler_driven_diameter,
      idlerSmallDiameter: inputs.idler_driving_diameter,
      rimDiameter: inputs.rim_diameter,
    });
    expectNear(outputRpm, expected.platter_rpm, tolerance);
  });

  it.each(casesOf(speeds, "bdrive-01", "bdrive-02", "bdrive-03", "bdrive-04", "bdrive-06", "bdrive-07"))(
    "%s",
    async (_id, { inputs, expected, tolerance }) => {
      const figure = (name: string, usual = 0) => Number(inputs[name] ?? usual);
      const stages = [["d1", "d2"] as const, ["d3", "d4"] as const]
        .filter(([driver]) => inputs[driver] !== undefined)
        .map(([driver, driven]) => ({
          driver: figure(driver),
          driven: figure(driven),
          beltThickness: figure("belt_thickness"),
        }));
      const kept = (1 - figure("slip_pct_each") / 100) ** stages.length * (1 - figure("slip_pct") / 100);
      const motor = motorOf(figure("driver_rpm") * kept);
      const { outputRpm } = await asked({ drive: "capstan", ...motor, stages, capstanDiameter: 8 });
      expectNear(outputRpm, expected.output_rpm, tolerance);
      if (stages.length > 1) return;
      const belt = await asked({
        drive: "belt",
        ...motor,
        pulleyDiameter: figure("d1"),
        drivenDiameter: figure("d2"),
        beltThickness: figure("belt_thickness"),
      });
      expectNear(belt.outputRpm, expected.output_rpm, tolerance);
    },
  );

  it.each(casesOf(speeds, "capstan-01", "capstan-02", "capstan-03", "capstan-05"))(
    "%s",
    async (_id, { inputs, expected, tolerance }) => {
      const capstanDiameter = Number(inputs.diameter_mm ?? Number(inputs.diameter_in) * 25.4);
      const stages = [{ driver: 20, driven: 20 }];
      const target = ({ 15: "15", 3.75: "3 3/4" } as Record<string, string>)[String(inputs.tape_speed_in_per_s)];
      const rpm = Number(inputs.rpm ?? 300);
      const { outputRpm, tapeSpeedMmPerS, errorPercent } = await asked({
        drive: "capstan",
        ...motorOf(rpm),
        stages,
        capstanDiameter,
        target,
      });
      if (target) expectNear(outputRpm / (1 + errorPercent / 100), expected.rpm, tolerance);
      else {
        expectNear(tapeSpeedMmPerS / 25.4, expected.tape_speed_in_per_s, tolerance);
        if (expected.tape_speed_mm_per_s) expectNear(tapeSpeedMmPerS, expected.tape_speed_mm_per_s, tolerance);
      }
    },
  );

  it.each(casesOf(speeds, "err-01", "err-02"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const stepDiameter = Number(inputs.actual) / 1.5;
    const found = await rimDrive({ ...motorOf(1500), stepDiameter, rimDiameter: 1000, target: "33 1/3" });
    expectNear(found.errorPercent, expected.error_pct, tolerance);
    expectNear(found.errorCents, expected.cents, tolerance);
  });

  it.each(casesOf(speeds, "err-06"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const capstanDiameter = (Number(inputs.actual) * 10 * 60) / (Math.PI * 300);
    const body = { drive: "capstan", ...motorOf(300), stages: [{ driver: 20, driven: 20 }], capstanDiameter };
    const found = await asked({ ...body, target: "7 1/2" });
    expectNear(found.errorPercent, expected.error_pct, tolerance);
    expectNear(found.errorCents, expected.cents, tolerance);
  });

  it.each(casesOf(speeds, "mains-01", "mains-02"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const { otherMains } = await rimDrive({
      ...motorOf(1440),
      mainsHz: inputs.from_hz,
      stepDiameter: inputs.sleeve_diameter,
    });
    expect(otherMains.mainsHz).toBe(inputs.to_hz);
    expectNear(otherMains.stepDiameterMm, expected.sleeve_diameter, tolerance);
  });

  it.each(casesOf(speeds, "mains-03"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const { otherMains } = await asked({
      drive: "belt",
      ...motorOf(1440),
      mainsHz: inputs.from_hz,
      pulleyDiameter: inputs.pulley_diameter,
      drivenDiameter: 150,
      beltThickness: inputs.belt_thickness,
    });
    expectNear(otherMains.stepDiameterMm, expected.pulley_diameter, tolerance);
  });

  it.each(casesOf(speeds, "mains-04", "mains-05"))("%s", async (_id, { inputs, expected, tolerance }) => {
    // Built for its target at one frequency, run at the other.
    const at = (mainsHz: unknown, stepDiameter: number) =>
      rimDrive({ mainsHz, poles: 4, slipPercent: 0, stepDiameter, target: "45" });
    const { outputRpm } = await at(inputs.built_for_hz, 6);
    const found = await at(inputs.run_on_hz, (6 * 45) / outputRpm);
    expectNear(found.errorPercent, expected.error_pct, tolerance);
    expectNear(found.errorCents, expected.cents, tolerance);
  });

  const rings = casesOf(strobes, ...Array.from({ length: 8 }, (_, i) => `strobe-0${i + 1}`));
  it.each(rings)("%s", async (_id, { inputs, expected, tolerance }) => {
    const [above = 0, below = 1] = String(inputs.target_rpm).split("/").map(Number);
    const ring = await answered<{ bars: number; shownRpm: number; errorPercent: number }>(site, "strobe", {
      mainsHz: inputs.mains_hz,
      rpm: above / below,
    });
    expect(ring.bars).toBe(inputs.bars);
    expectNear(ring.shownRpm, expected.true_rpm, tolerance);
    expectNear(ring.errorPercent, expected.error_vs_target_pct, tolerance);
  });

  it.each(casesOf(strobes, "strobe-10"))("%s", async (_id, { inputs, expected }) => {
    const ring = await answered<{ bars: number }>(site, "strobe", { mainsHz: inputs.mains_hz, rpm: inputs.target_rpm });
    expect(ring.bars).toBe(expected.nearest_integer);
  });
});
