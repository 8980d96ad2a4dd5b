import { type NominalSpeed, recordSpeeds, tapeSpeeds } from "#shared/domain/nominalSpeeds";
import type { SizeUnit } from "../../../lib/formatSize";
import { withItsUnit } from "../withItsUnit";

export const drives = ["rim", "stepped-idler", "belt", "capstan"] as const;
export type Drive = (typeof drives)[number];
export const mainsChoices = ["50", "60", "other"] as const;
export type StageTexts = { driver: string; driven: string; beltThickness: string };
export type MotorTexts = {
  mains: (typeof mainsChoices)[number];
  /** Only where the mains are neither 50 nor 60 Hz. */
  mainsHz: string;
  poles: string;
  /** How the motor's speed is known: by its slip, or measured. */
  by: "slip" | "rpm";
  slipPercent: string;
  motorRpm: string;
};

/** The drive as it was written; the sizes in any length format, by their names in the computation. */
export type SpeedState = {
  drive: Drive;
  unit: SizeUnit;
  motor: MotorTexts;
  sizes: Readonly<Record<string, string>>;
  /** Capstan only. */
  stages: readonly StageTexts[];
  target: NominalSpeed | "";
};

/** The sizes of each drive, in the order in which they are met from the motor on. */
export const sizesOf: Readonly<Record<Drive, readonly string[]>> = {
  rim: ["stepDiameter", "idlerDiameter", "rimDiameter"],
  "stepped-idler": ["stepDiameter", "idlerLargeDiameter", "idlerSmallDiameter", "rimDiameter"],
  belt: ["pulleyDiameter", "drivenDiameter", "beltThickness"],
  capstan: ["capstanDiameter"],
};

const induction: MotorTexts = { mains: "50", mainsHz: "", poles: "4", by: "slip", slipPercent: "4", motorRpm: "1440" };
const synchronous: MotorTexts = { ...induction, poles: "16", slipPercent: "0", motorRpm: "375" };
const metric = { unit: "mm", stages: [{ driver: "10", driven: "62", beltThickness: "0.5" }] } as const;

/** A worked example of each drive, invented: what the page shows before anything is said. */
export const examples: Readonly<Record<Drive, SpeedState>> = {
  rim: {
    ...metric,
    drive: "rim",
    motor: induction,
    sizes: { stepDiameter: "6.10", idlerDiameter: "40", rimDiameter: "260" },
    target: "33 1/3",
  },
  "stepped-idler": {
    ...metric,
    drive: "stepped-idler",
    motor: induction,
    sizes: { stepDiameter: "10.0", idlerLargeDiameter: "60", idlerSmallDiameter: "36", rimDiameter: "260" },
    target: "33 1/3",
  },
  belt: {
    ...metric,
    drive: "belt",
    motor: synchronous,
    sizes: { pulleyDiameter: "12.5", drivenDiameter: "150", beltThickness: "1.0" },
    target: "33 1/3",
  },
  capstan: { ...metric, drive: "capstan", motor: induction, sizes: { capstanDiameter: "7.60" }, target: "3 3/4" },
};

export const targetsOf = (drive: Drive): readonly NominalSpeed[] => (drive === "capstan" ? tapeSpeeds : recordSpeeds);

/** Another drive in the same machine: what was written is kept, what is missing or does not go with it is the example's. */
export function withDrive(state: SpeedState, drive: Drive): SpeedState {
  const [from, to] = [examples[state.drive], examples[drive]];
  const isUntouched = JSON.stringify(state.motor) === JSON.stringify(from.motor);
  return {
    ...state,
    drive,
    motor: isUntouched ? to.motor : state.motor,
    sizes: { ...to.sizes, ...state.sizes },
    target: state.target === "" || targetsOf(drive).includes(state.target) ? state.target : to.target,
  };
}

/** Another unit to show and to write in; no size changes by it. */
export function withUnit(state: SpeedState, unit: SizeUnit): SpeedState {
  if (unit === state.unit) return state;
  const said = (text: string) => withItsUnit(text, state.unit);
  return {
    ...state,
    unit,
    sizes: Object.fromEntries(Object.entries(state.sizes).map(([name, text]) => [name, said(text)])),
    stages: state.stages.map(({ driver, driven, beltThickness }) => ({
      driver: said(driver),
      driven: said(driven),
      beltThickness: said(beltThickness),
    })),
  };
}
