import { type HardnessScale, hardnessScale, hardnessWindow } from "#shared/domain/hardness";
import { useOwnWidth } from "../../../ui/drawing/useOwnWidth";
import { RuledHeading } from "../../../ui/RuledHeading";
import { NumberField } from "../NumberField";
import { readPlainNumber } from "../readPlainNumber";
import { HardnessRuler } from "./HardnessRuler";
import type { ToleranceState } from "./toleranceState";

type Props = {
  state: ToleranceState;
  onChange: (change: (now: ToleranceState) => ToleranceState) => void;
};

const scaleAdvice: Record<HardnessScale, string> = {
  A: "Shore A is the right scale for it.",
  AO: "Under 20 on A: read it on AO.",
  D: "Over 90 on A: read it on D.",
  AM: "Thinner than 6 mm: read it on AM.",
};
const error = "More than 0 up to 100.";
const onScale = (text: string) => {
  const value = readPlainNumber(text);
  return value !== null && value > 0 && value <= 100 ? value : null;
};

/** A stated hardness, what it may measure, and whether a reading agrees. */
export function HardnessGauge({ state, onChange }: Props) {
  const [place, width] = useOwnWidth(560);
  const nominal = onScale(state.hardness);
  const reading = onScale(state.reading);
  const window = nominal === null ? null : hardnessWindow(nominal);
  const isInside = window && reading !== null && reading >= window.lower && reading <= window.upper;
  const problem = (text: string, value: number | null) => (text.trim() && value === null ? error : undefined);
  return (
    <section className="grid grid-cols-1 gap-3">
      <RuledHeading>Hardness, Shore A</RuledHeading>
      <div ref={place} className="overflow-hidden">
        <HardnessRuler window={window} nominal={nominal} reading={reading} width={width} />
      </div>
      {window && (
        <p className="max-w-prose">
          {nominal} Shore A stands for {window.lower} to {window.upper}.{" "}
          {reading !== null && (
            <>
              <strong className={isInside ? "text-inband" : "text-outband"}>
                {reading} lies {isInside ? "inside" : "outside"}.
              </strong>{" "}
              {scaleAdvice[hardnessScale({ scale: "A", reading })]}
            </>
          )}
        </p>
      )}
      <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-2">
        <NumberField
          name="hardness"
          label="Hardness as stated"
          text={state.hardness}
          error={problem(state.hardness, nominal)}
          onText={(hardness) => onChange((now) => ({ ...now, hardness }))}
        />
        <NumberField
          name="reading"
          label="Your reading (if you have one)"
          text={state.reading}
          error={problem(state.reading, reading)}
          onText={(text) => onChange((now) => ({ ...now, reading: text }))}
        />
      </div>
      <p className="max-w-prose text-small text-soft">
        The usual ±5 as in call-outs of ASTM D2000; choice of scale by ISO 48-4:2018. A reading wants 6 mm of flat
        rubber and 12 mm to the nearest edge: on a wheel, a ring or a belt it is an apparent hardness, good to compare
        like with like.
      </p>
    </section>
  );
}
