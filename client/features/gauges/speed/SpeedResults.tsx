import { Link } from "react-router-dom";
import type { SpeedInput } from "#shared/domain/driveTrain";
import { true78 } from "#shared/domain/nominalSpeeds";
import { roundDecimal } from "#shared/domain/roundDecimal";
import type { SpeedResult } from "#shared/domain/speed";
import type { SizeUnit } from "../../../lib/formatSize";
import { Readout } from "../Readout";
import { ErrorScale } from "./ErrorScale";
import { errorSentence, signed } from "./errorWords";
import { FirstSize } from "./FirstSize";
import { OtherMains } from "./OtherMains";
import { rpmText } from "./trainLabels";

type Props = { input: SpeedInput; result: SpeedResult; unit: SizeUnit };

/** What follows from the drive: its speed, how far it is off, what would mend it, and the other mains. */
export function SpeedResults({ input, result, unit }: Props) {
  const { errorPercent, errorCents, target, tapeSpeedMmPerS, outputRpm } = result;
  const hasTarget = errorPercent !== undefined && errorCents !== undefined;
  const isTape = tapeSpeedMmPerS !== undefined;
  return (
    <>
      <Readout
        label={isTape ? "Tape speed" : "Platter speed"}
        value={rpmText(tapeSpeedMmPerS ?? outputRpm)}
        unit={isTape ? "mm/s" : "rpm"}
      >
        {isTape && (
          <p>
            {roundDecimal(tapeSpeedMmPerS / 25.4, 4)} in/s; the capstan turns at {rpmText(outputRpm)} rpm
          </p>
        )}
        {!isTape && outputRpm > 0.1 && <p>One turn takes {roundDecimal(60 / outputRpm, 3)} s.</p>}
        {hasTarget && <p className="text-step1 font-semibold text-ink">{errorSentence(errorPercent, errorCents)}</p>}
        {hasTarget && (
          <p>
            {signed(errorPercent)} %, {signed(errorCents, 1)} cents against {target} {isTape ? "in/s" : "rpm"}
          </p>
        )}
        {target === "78" && (
          <p>
            Records called 78 were cut at{" "}
            {true78.map(({ rpm, mainsHz }) => `${roundDecimal(rpm, 2)} (${mainsHz} Hz)`).join(" or ")}.
          </p>
        )}
      </Readout>
      {hasTarget && <ErrorScale error={{ errorPercent, errorCents }} medium={isTape ? "tape" : "record"} />}
      {target && <FirstSize input={input} result={result} unit={unit} />}
      <OtherMains input={input} result={result} unit={unit} />
      <p className="print:hidden">
        <Link to="/gauges/sheets">Print a stroboscope disc</Link> and see the speed on the machine itself: belts creep
        and rubber slips, which is not counted here.
      </p>
    </>
  );
}
