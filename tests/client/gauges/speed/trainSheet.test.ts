import { describe, expect, it } from "vitest";
import type { SpeedInput } from "#shared/domain/driveTrain";
import { solveSpeed } from "#shared/domain/speed";
import { layoutTrain } from "../../../../client/features/gauges/speed/layoutTrain";
import { trainLabels } from "../../../../client/features/gauges/speed/trainLabels";
import { trainSheet } from "../../../../client/features/gauges/speed/trainSheet";

const motor = { mainsHz: 50, poles: 4, slipPercent: 4 };
const stage = (driver: number, driven: number, beltThickness = 0) => ({ driver, driven, beltThickness });
const drives: Record<string, SpeedInput> = {
  rim: { drive: "rim", ...motor, stepDiameter: 6.1, idlerDiameter: 40, rimDiameter: 260 },
  "rim outside": { drive: "rim", ...motor, stepDiameter: 30, idlerDiameter: 200, rimDiameter: 150 },
  stepped: {
    drive: "stepped-idler",
    ...motor,
    stepDiameter: 10,
    idlerLargeDiameter: 60,
    idlerSmallDiameter: 36,
    rimDiameter: 260,
  },
  belt: { drive: "belt", ...motor, pulleyDiameter: 12.5, drivenDiameter: 150, beltThickness: 1 },
  capstan: { drive: "capstan", ...motor, stages: [stage(10, 62, 0.5)], capstanDiameter: 7.6 },
  "eight stages": {
    drive: "capstan",
    ...motor,
    stages: [10, 12, 15, 20, 20, 30, 18, 10].map((driver, i) => stage(driver, driver * 1.4 + i, i % 2 ? 0 : 0.5)),
    capstanDiameter: 7.6,
  },
};
const sheetOf = (input: SpeedInput, width: number) => {
  const train = layoutTrain(input);
  const labels = trainLabels(input, solveSpeed(input), train, "mm");
  return { train, labels, sheet: trainSheet(train, labels, width) };
};

describe("the wheels", () => {
  const distance = (one: { x: number; y: number }, other: { x: number; y: number }) =>
    Math.hypot(one.x - other.x, one.y - other.y);
  const wheelsOf = (input: SpeedInput) => {
    const { wheels } = layoutTrain(input);
    return (field: string) => wheels.find((wheel) => wheel.field === field)!;
  };

  it("touch: the step the idler from outside, the idler the rim from inside", () => {
    const wheel = wheelsOf(drives.rim!);
    const [step, idler, rim] = ["stepDiameter", "idlerDiameter", "rimDiameter"].map(wheel);
    expect(distance(step!, idler!)).toBeCloseTo(step!.r + idler!.r, 9);
    expect(distance(idler!, rim!)).toBeCloseTo(rim!.r - idler!.r, 9);
    expect(distance(step!, rim!) + step!.r).toBeLessThan(rim!.r);
  });

  it("touch from outside where the platter has no room for the idler", () => {
    const wheel = wheelsOf(drives["rim outside"]!);
    const [idler, rim] = ["idlerDiameter", "rimDiameter"].map(wheel);
    expect(distance(idler!, rim!)).toBeCloseTo(rim!.r + idler!.r, 9);
  });

  it("touch with the right tread: the large one the step, the small one the rim", () => {
    const wheel = wheelsOf(drives.stepped!);
    const [step, large, small, rim] = ["stepDiameter", "idlerLargeDiameter", "idlerSmallDiameter", "rimDiameter"].map(
      wheel,
    );
    expect(distance(step!, large!)).toBeCloseTo(step!.r + large!.r, 9);
    expect(distance(small!, rim!)).toBeCloseTo(rim!.r - small!.r, 9);
  });

  it("stand clear where a belt joins them", () => {
    const wheel = wheelsOf(drives.belt!);
    const [pulley, driven] = ["pulleyDiameter", "drivenDiameter"].map(wheel);
    expect(distance(pulley!, driven!)).toBeGreaterThan(pulley!.r + driven!.r + 2);
  });
});

describe.each(Object.entries(drives))("the sheet of %s", (name, input) => {
  it.each([356, 520, 830])("says every size once, on the sheet, at %d px", (width) => {
    const { labels, sheet } = sheetOf(input, width);
    const said = [...sheet.placed.map(({ label }) => label.field), ...sheet.details.map(({ label }) => label.field)];
    expect(said.sort()).toEqual(labels.map(({ field }) => field).sort());
    for (const { at } of sheet.placed) {
      expect(at.box.left, at.key).toBeGreaterThanOrEqual(0);
      expect(at.box.left + at.box.width, at.key).toBeLessThanOrEqual(width);
      expect(at.box.top, at.key).toBeGreaterThanOrEqual(0);
      expect(at.box.top + at.box.height, at.key).toBeLessThanOrEqual(sheet.height);
    }
  });

  it.each([356, 520, 830])("lays no words on others at %d px", (width) => {
    const boxes = sheetOf(input, width).sheet.placed.map(({ at }) => at.box);
    for (const [i, one] of boxes.entries()) {
      for (const other of boxes.slice(i + 1)) {
        const apart =
          one.left + one.width <= other.left ||
          other.left + other.width <= one.left ||
          one.top + one.height <= other.top ||
          other.top + other.height <= one.top;
        expect(apart, `${name}: ${JSON.stringify([one, other])}`).toBe(true);
      }
    }
  });
});

describe("a detail", () => {
  it("shows a step too small for the plan, larger, and says by how much", () => {
    const { sheet, train } = sheetOf(drives.rim!, 830);
    const [detail] = sheet.details;
    expect(sheet.details).toHaveLength(1);
    expect(detail!.wheel).toBe(train.wheels.find(({ field }) => field === "stepDiameter"));
    expect(detail!.view.pxPerMm).toBeCloseTo(sheet.plan.pxPerMm * detail!.times, 9);
    expect(detail!.wheel.r * detail!.view.pxPerMm).toBeGreaterThan(15);
    expect(detail!.wheel.r * detail!.view.pxPerMm).toBeLessThan(detail!.radius);
  });

  it("is not made where everything can be seen", () => {
    expect(sheetOf(drives.capstan!, 830).sheet.details).toEqual([]);
  });

  it("bridges a platter of 5 m and a step of a tenth of a millimetre", () => {
    const { sheet } = sheetOf(
      { ...motor, drive: "rim", stepDiameter: 0.1, idlerDiameter: 0.1, rimDiameter: 5000 },
      356,
    );
    expect(sheet.details[0]!.times).toBe(10_000);
  });
});
