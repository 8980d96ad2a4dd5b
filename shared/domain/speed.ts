import { DomainError } from "./DomainError";
import { type DriveStage, driveTrain, type SpeedInput } from "./driveTrain";
import { motorSpeed } from "./motorSpeed";
import { type NominalSpeed, nominalSpeeds, recordSpeeds, tapeSpeeds } from "./nominalSpeeds";
import { type SettingSize, settingSizes } from "./settingSizes";
import { type SpeedError, speedError } from "./speedError";

export type SpeedResult = Partial<SpeedError> & {
  motorRpm: number;
  /** Of the platter, or of the capstan. */
  outputRpm: number;
  /** Capstan only. */
  tapeSpeedMmPerS?: number;
  target?: NominalSpeed;
  /** Paths of the sizes that set the speed, and of those that do not, as the input names them. */
  sets: string[];
  cancels: string[];
  /** The motor's step or pulley (of a capstan the first driver) that keeps this speed at the other mains frequency. */
  otherMains: { mainsHz: number; stepDiameterMm: number };
  /** What `sets` names; with a target, `neededMm` is the size that alone would hit it. */
  sizes: SettingSize[];
  /** Speed of every shaft, from the motor's to the last. */
  shaftRpm: number[];
};

function ratedSpeed({ drive, target }: SpeedInput): number | undefined {
  if (target === undefined) return undefined;
  const names: readonly NominalSpeed[] = drive === "capstan" ? tapeSpeeds : recordSpeeds;
  if (names.includes(target)) return nominalSpeeds[target];
  throw new DomainError(
    "target",
    `This drive runs at one of ${names.join(", ")} ${drive === "capstan" ? "in/s" : "rpm"}.`,
  );
}

function convert({ driver, thickness }: DriveStage, fromHz: number): SpeedResult["otherMains"] {
  const mainsHz = fromHz < 55 ? 60 : 50;
  const stepDiameterMm = ((driver.mm + thickness.mm) * fromHz) / mainsHz - thickness.mm;
  if (stepDiameterMm > 0) return { mainsHz, stepDiameterMm };
  throw new DomainError(thickness.field, `No pulley is small enough for so thick a belt at ${mainsHz} Hz.`);
}

/**
 * Speed of a drive from what was measured on it.
 *
 * Shape:  every stage multiplies the motor's speed by its ratio of pitch diameters (metal plus belt thickness; the metal's
 *         own where nothing lies between). Tape runs at pi x capstan diameter x rpm / 60 mm/s; the tape's own thickness is
 *         left out. No slip of belt or rubber is counted: it slows what is worked out here.
 * Limits: see `speedBounds`. With `target`, the error in percent and cents; positive is fast.
 * Mains:  60 Hz is the other frequency below 55 Hz, else 50 Hz, at equal slip: the first pitch diameter scales by f / f'.
 * Errors: DomainError on the field at fault; on the thickness where no pulley is small enough for the other mains; on
 *         "target" for a speed of the other medium.
 * Source: rolling without slip; belts by N2 / N1 = (d1 + t) / (d2 + t), as textbooks of the theory of machines give it.
 */
export function solveSpeed(input: SpeedInput): SpeedResult {
  const motorRpm = motorSpeed(input);
  const train = driveTrain(input);
  const rated = ratedSpeed(input);
  const shaftRpm = [motorRpm];
  let outputRpm = motorRpm;
  for (const { driver, driven, thickness } of train.stages) {
    outputRpm = (outputRpm * (driver.mm + thickness.mm)) / (driven.mm + thickness.mm);
    shaftRpm.push(outputRpm);
  }
  const tape = train.capstan && { tapeSpeedMmPerS: (Math.PI * train.capstan.mm * outputRpm) / 60 };
  const actual = tape?.tapeSpeedMmPerS ?? outputRpm;
  const sizes = settingSizes(train, rated && rated / actual);
  return {
    motorRpm,
    outputRpm,
    ...tape,
    ...(rated && { target: input.target, ...speedError(actual, rated) }),
    sets: sizes.map(({ field }) => field),
    cancels: train.cancels,
    otherMains: convert(train.stages[0]!, input.mainsHz),
    sizes,
    shaftRpm,
  };
}
