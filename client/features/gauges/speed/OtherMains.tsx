import { DomainError } from "#shared/domain/DomainError";
import type { SpeedInput } from "#shared/domain/driveTrain";
import { nominalSpeeds } from "#shared/domain/nominalSpeeds";
import { type SpeedResult, solveSpeed } from "#shared/domain/speed";
import { speedError } from "#shared/domain/speedError";
import type { SizeUnit } from "../../../lib/formatSize";
import { cautions } from "../../../ui/measuring/cautions";
import { Readout } from "../Readout";
import { errorSentence } from "./errorWords";
import { isToBeHad, turnedSize } from "./FirstSize";
import { sizeName } from "./sizeNames";
import { rpmText } from "./trainLabels";

type Props = { input: SpeedInput; result: SpeedResult; unit: SizeUnit };

/** The step that hits the target at the other mains; undefined where there is no target or no such step. */
function neededThere(input: SpeedInput, mainsHz: number): number | undefined {
  try {
    return solveSpeed({ ...input, mainsHz }).sizes[0]?.neededMm;
  } catch (error) {
    if (error instanceof DomainError) return undefined;
    throw error;
  }
}

/** The same parts at the other mains frequency, and the step or pulley that keeps the speed there. */
export function OtherMains({ input, result, unit }: Props) {
  const { mainsHz, stepDiameterMm } = result.otherMains;
  const isTape = result.tapeSpeedMmPerS !== undefined;
  const now = result.tapeSpeedMmPerS ?? result.outputRpm;
  const there = (now * mainsHz) / input.mainsHz;
  const { errorPercent, errorCents } = speedError(there, result.target ? nominalSpeeds[result.target] : now);
  const stages = input.drive === "capstan" ? input.stages.length : 1;
  const name = sizeName(result.sizes[0]!.field, stages);
  const needed = neededThere(input, mainsHz);
  return (
    <Readout label={`On ${mainsHz} Hz mains`} value={turnedSize(stepDiameterMm, unit)} unit={unit} look="measured">
      <p>
        {name} that keeps today’s speed there
        {isToBeHad(needed) && `; ${turnedSize(needed, unit)} would hit the target there`}.
      </p>
      <p>
        Left as it is, it would run at {rpmText(there)} {isTape ? "mm/s" : "rpm"}.{" "}
        {errorSentence(errorPercent, errorCents)}
      </p>
      <p className="border-l-4 border-outband pl-3 text-ink">{cautions.power}</p>
    </Readout>
  );
}
