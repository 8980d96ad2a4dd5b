import type { SpeedInput } from "#shared/domain/driveTrain";
import type { SpeedResult } from "#shared/domain/speed";
import { type SizeUnit, sizeNumber } from "../../../lib/formatSize";
import { sizeName } from "./sizeNames";
import { rpmText, sensitivityText } from "./trainLabels";

/** The drawing in words: every size, what it does to the speed, and what cancels. */
export function describeTrain(input: SpeedInput, result: SpeedResult, unit: SizeUnit): string {
  const stages = input.drive === "capstan" ? input.stages.length : 1;
  const sizes = result.sizes.map(
    ({ field, mm, percentPerHundredthMm }) =>
      `${sizeName(field, stages)} ${sizeNumber(mm, unit)} ${unit}: ${sensitivityText(percentPerHundredthMm, unit)}.`,
  );
  const cancels = result.cancels.map((field) => `${sizeName(field)} cancels: its size does not change the speed.`);
  const turning = `The motor turns at ${rpmText(result.motorRpm)} rpm, the last shaft at ${rpmText(result.outputRpm)} rpm.`;
  return [...sizes, ...cancels, turning].join(" ");
}
