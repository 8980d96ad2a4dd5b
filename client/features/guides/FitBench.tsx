import { useState } from "react";
import { assessFit } from "#shared/domain/fit";
import { roundDecimal } from "#shared/domain/roundDecimal";
import { VerdictMark } from "../../ui/VerdictMark";
import { chanceWords, verdictWords } from "../../ui/verdictWords";
import { BellCurve } from "./BellCurve";
import { offered, workExample } from "./workedExample";

const two = (mm: number) => roundDecimal(mm, 2);

/** The chance of one size, to be tried: how far the part is off, and how surely both sizes are known. */
export function FitBench() {
  const { diameter } = workExample();
  const needMm = diameter.asNew.valueMm;
  const [offMm, setOff] = useState(offered.outsideDiameter.nominalMm - needMm);
  const [needU, setNeedU] = useState(diameter.asNew.standardUncertaintyMm);
  const [plusMinusMm, setPlusMinus] = useState<number>(offered.outsideDiameter.plusMinusMm);
  const nominalMm = needMm + offMm;
  const fit = assessFit({
    kind: "idler-wheel",
    need: { outsideDiameter: { valueMm: needMm, standardUncertaintyMm: needU } },
    part: { outsideDiameter: { nominalMm, plusMinusMm } },
  });
  const size = fit?.dimensions[0];
  if (!fit || !size) return null;
  const { chance, verdict, reason } = fit;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-x-10 gap-y-4 lg:grid-cols-[minmax(0,1.6fr)_minmax(18rem,1fr)]">
      <BellCurve
        meanMm={nominalMm}
        sdMm={size.combinedUncertaintyMm}
        lowerMm={size.lowerMm}
        upperMm={size.upperMm}
        needMm={needMm}
        label={`A bell curve around ${two(nominalMm)} mm, ${chanceWords(chance)} of it between ${two(size.lowerMm)} and ${two(size.upperMm)} mm`}
      />
      <div className="grid gap-3">
        <p aria-live="polite" className="text-step2">
          <VerdictMark verdict={verdict} chance={chance} />
        </p>
        <p className="min-h-12">{reason}</p>
        <Slider
          label="The part differs from what is needed by"
          value={offMm}
          onChange={setOff}
          min={-1}
          max={1}
          words={`${offMm < 0 ? "−" : "+"}${two(Math.abs(offMm))} mm`}
        />
        <Slider
          label="What is needed is known to (k = 2)"
          value={2 * needU}
          onChange={(value) => setNeedU(value / 2)}
          min={0}
          max={1}
          words={`± ${two(2 * needU)} mm`}
        />
        <Slider
          label="The workshop states its part to"
          value={plusMinusMm}
          onChange={setPlusMinus}
          min={0}
          max={1}
          words={`± ${two(plusMinusMm)} mm`}
        />
        <p className="text-small text-soft">
          Green area: the chance. Red area: {verdictWords.unfit.toLowerCase()}. The axis is true to scale, in mm; the
          height of the curve says nothing.
        </p>
      </div>
    </div>
  );
}

type SliderProps = {
  label: string;
  value: number;
  onChange: (value: number) => void;
  min: number;
  max: number;
  words: string;
};

function Slider({ label, value, onChange, min, max, words }: SliderProps) {
  return (
    <label className="grid gap-0.5">
      <span className="flex justify-between gap-4">
        {label} <b className="whitespace-nowrap">{words}</b>
      </span>
      <input
        type="range"
        className="h-8 w-full accent-measured print:hidden"
        min={min}
        max={max}
        step="any"
        value={value}
        aria-valuetext={words}
        onChange={(event) => onChange(Math.round(Number(event.target.value) * 100) / 100)}
      />
    </label>
  );
}
