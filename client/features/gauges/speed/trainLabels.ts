import type { SpeedInput } from "#shared/domain/driveTrain";
import { roundDecimal } from "#shared/domain/roundDecimal";
import type { SpeedResult } from "#shared/domain/speed";
import { signWidthEm, textWidth } from "#shared/drawing/textWidth";
import { type SizeUnit, sizeNumber } from "../../../lib/formatSize";
import type { Train } from "./layoutTrain";
import { isThickness, sizeName } from "./sizeNames";

/** Words, and a number with a diameter sign before it. */
export type LabelLine = { name: string; number?: string; look: "size" | "soft" | "struck" };
export type TrainLabel = { field: string; cancels: boolean; lines: LabelLine[]; width: number; height: number };

export const labelSize = { size: 14, struck: 14, soft: 12 } as const;
export const lineHeight = 17;

/** A change of speed as words: two figures that count. */
export const percentText = (percent: number): string => {
  const size = Math.abs(percent);
  return `${size >= 10 ? roundDecimal(size, 0) : String(Number(size.toPrecision(2)))} %`;
};

/** A speed in turns a minute with four or five figures that count. */
export const rpmText = (rpm: number): string => {
  if (rpm >= 1e6) return rpm.toPrecision(3);
  if (rpm >= 1000) return roundDecimal(rpm, 0);
  return rpm >= 100 ? roundDecimal(rpm, 1) : rpm >= 0.1 ? roundDecimal(rpm, 2) : rpm.toPrecision(2);
};

/** What a hundredth of a millimetre, or a thousandth of an inch, of one size does to the speed. */
export function sensitivityText(percentPerHundredthMm: number, unit: SizeUnit): string {
  const step = unit === "mm" ? "0.01 mm" : "0.001 in";
  return `${step} here is ${percentText(percentPerHundredthMm * (unit === "mm" ? 1 : 2.54))}`;
}

export function lineWidth({ name, number, look }: LabelLine): number {
  const weight = look === "soft" ? 500 : 600;
  const signed = number === undefined ? 0 : textWidth(number, labelSize[look], weight) + signWidthEm * labelSize[look];
  return textWidth(name, labelSize[look], weight) + signed;
}

function labelOf(field: string, cancels: boolean, lines: LabelLine[]): TrainLabel {
  return { field, cancels, lines, width: Math.max(...lines.map(lineWidth)), height: lines.length * lineHeight };
}

/** What is written beside every size of the drive; in long trains only its name and number. */
export function trainLabels(input: SpeedInput, result: SpeedResult, train: Train, unit: SizeUnit): TrainLabel[] {
  const stages = input.drive === "capstan" ? input.stages.length : 1;
  const isLong = result.sizes.length > 6;
  const soft = (name: string): LabelLine => ({ name, look: "soft" });
  const line = (field: string, mm: number): LabelLine => {
    const name = isLong ? "" : `${sizeName(field, stages)} `;
    if (isThickness(field)) return { name: `${isLong ? "Belt " : name}${sizeNumber(mm, unit)}`, look: "size" };
    return { name, number: sizeNumber(mm, unit), look: "size" };
  };

  const setting = result.sizes.map(({ field, mm, percentPerHundredthMm }) => {
    if (isLong) return labelOf(field, false, [line(field, mm)]);
    const lines = [line(field, mm), soft(sensitivityText(percentPerHundredthMm, unit))];
    const wheel = train.wheels.find((one) => one.field === field);
    const tellsSpeed = field === result.sizes[0]?.field || /driven|rimDiameter|Large/i.test(field);
    const rpm = tellsSpeed && wheel?.shaft !== undefined ? result.shaftRpm[wheel.shaft] : undefined;
    if (rpm !== undefined) lines.push(soft(`turns at ${rpmText(rpm)} rpm`));
    const { tapeSpeedMmPerS } = result;
    if (field === "capstanDiameter" && tapeSpeedMmPerS) lines.push(soft(`tape at ${rpmText(tapeSpeedMmPerS)} mm/s`));
    return labelOf(field, false, lines);
  });
  const cancelling = result.cancels.map((field) => {
    const mm = input.drive === "rim" ? input.idlerDiameter : undefined;
    const size: LabelLine = mm
      ? { name: `${sizeName(field)} `, number: sizeNumber(mm, unit), look: "struck" }
      : { name: `${sizeName(field)}, any size`, look: "struck" };
    return labelOf(field, true, [size, soft("cancels: its size does"), soft("not change the speed")]);
  });
  return [...setting, ...cancelling];
}
