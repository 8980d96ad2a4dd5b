import type { DriveSize, DriveTrain } from "./driveTrain";

/** A size that sets the speed. */
export type SettingSize = DriveSize & {
  /** Change of speed in percent where this size is 0.01 mm larger, to first order; negative slows. */
  percentPerHundredthMm: number;
  /** The size that alone would make the speed `change` times as high: only for diameters, and where there is one. */
  neededMm?: number;
};

/**
 * Every size that sets the speed, in the order of the drive.
 * The speed goes with each pitch diameter (metal plus belt) to the power 1, for what drives, or -1, for what is driven.
 */
export function settingSizes({ stages, capstan }: DriveTrain, change?: number): SettingSize[] {
  const size = ({ field, mm }: DriveSize, power: 1 | -1, thicknessMm = 0): SettingSize => {
    const pitch = mm + thicknessMm;
    const neededMm = change ? pitch * change ** power - thicknessMm : 0;
    return { field, mm, percentPerHundredthMm: power / pitch, ...(neededMm > 0 && { neededMm }) };
  };
  const sizes = stages.flatMap(({ driver, driven, thickness }) => {
    const both = [size(driver, 1, thickness.mm), size(driven, -1, thickness.mm)];
    const percentPerHundredthMm = both[0]!.percentPerHundredthMm + both[1]!.percentPerHundredthMm;
    return thickness.mm > 0 ? [...both, { ...thickness, percentPerHundredthMm }] : both;
  });
  return capstan ? [...sizes, size(capstan, 1)] : sizes;
}
