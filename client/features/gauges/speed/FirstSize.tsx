import type { SpeedInput } from "#shared/domain/driveTrain";
import { roundDecimal } from "#shared/domain/roundDecimal";
import type { SpeedResult } from "#shared/domain/speed";
import { speedBounds } from "#shared/domain/speedBounds";
import type { SizeUnit } from "../../../lib/formatSize";
import { Readout } from "../Readout";
import { sizeName } from "./sizeNames";

type Props = { input: SpeedInput; result: SpeedResult; unit: SizeUnit };

/** Whether a size can be measured and made at all. */
export const isToBeHad = (mm: number | undefined): mm is number => {
  const [least, most] = speedBounds.diameterMm;
  return mm !== undefined && mm >= least && mm <= most;
};

/** A diameter to turn on a lathe, to the micrometre or the ten-thousandth of an inch: "ø 6.019". */
export const turnedSize = (mm: number, unit: SizeUnit): string =>
  `ø\u00a0${unit === "mm" ? roundDecimal(mm, 3) : roundDecimal(mm / 25.4, 4)}`;

/** The motor's step or pulley that would hit the target from this motor. */
export function FirstSize({ input, result, unit }: Props) {
  const [first] = result.sizes;
  if (!first || !result.target) return null;
  const stages = input.drive === "capstan" ? input.stages.length : 1;
  const name = sizeName(first.field, stages).toLowerCase();
  const isTape = input.drive === "capstan";
  const wanted = isTape ? `${result.target} in/s` : `${result.target} rpm`;
  const need = first.neededMm;
  if (!isToBeHad(need)) {
    return (
      <Readout label={`For just ${wanted}`} value={null}>
        <p>No {name} that can be made gives this speed: change another size.</p>
      </Readout>
    );
  }
  return (
    <Readout label={`For just ${wanted}`} value={turnedSize(need, unit)} unit={unit} look="measured">
      <p>
        {sizeName(first.field, stages)} to turn for this motor; it has {turnedSize(first.mm, unit)} now. Or change one
        other size: see the table.
      </p>
    </Readout>
  );
}
