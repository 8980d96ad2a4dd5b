import type { z } from "zod";
import type { DimensionName } from "#shared/domain/partKinds";
import type { NeedDimension } from "#shared/schemas/need";
import type { DimensionFit, StatedDimension } from "#shared/schemas/part";
import { focusStripField } from "../../lib/focusStrip";
import { roundedSize, type SizeUnit } from "../../lib/formatSize";
import { Button } from "../../ui/Button";
import { DeviationBar } from "../../ui/DeviationBar";
import { DimensionLabel } from "../../ui/DimensionLabel";
import { useOwnWidth } from "../../ui/drawing/useOwnWidth";
import { Size } from "../../ui/Size";
import { chanceWords } from "../../ui/verdictWords";

type Props = {
  name: DimensionName;
  stated: StatedDimension | undefined;
  fit: z.infer<typeof DimensionFit> | undefined;
  need: NeedDimension | undefined;
  unit: SizeUnit;
};

const insides: readonly DimensionName[] = ["bore", "insideDiameter", "insideCircumference"];
/** What it is called to lie below or above what is accepted: holes and loops are tight or loose. */
const limitWords = (name: DimensionName) =>
  insides.includes(name)
    ? (["too tight below", "too loose above"] as const)
    : (["too small below", "too large above"] as const);

/** One size: what is stated, how surely it suits, and where it lies in what is accepted; or the way to measure it. */
export function FitRow({ name, stated, fit, need, unit }: Props) {
  const [place, width] = useOwnWidth(400);
  const [below, above] = limitWords(name);
  const isOff = fit !== undefined && fit.chance < 0.2;
  return (
    <li className="grid grid-cols-[minmax(0,1fr)] gap-1 border-b border-rule py-3">
      <div className="flex flex-wrap items-baseline gap-x-4">
        <span className="min-w-12 font-semibold sm:min-w-24">
          <DimensionLabel name={name} />
        </span>
        {stated ? (
          <span>
            <Size mm={stated.nominalMm} plusMinusMm={stated.plusMinusMm} unit={unit} both />
            {stated.tolerance === "assumed" && <small className="text-soft"> tolerance assumed</small>}
            {stated.tolerance === "class" && <small className="text-soft"> class {stated.toleranceClass}</small>}
          </span>
        ) : (
          <span className="text-soft">not stated by the workshop</span>
        )}
        <span className="ml-auto">
          {fit && (
            <span className={`font-bold ${isOff ? "text-outband" : "text-inband"}`}>{chanceWords(fit.chance)}</span>
          )}
          {!fit && stated && !need && (
            <Button look="quiet" className="print:hidden" onClick={() => focusStripField(name)}>
              measure it
            </Button>
          )}
        </span>
      </div>
      {fit && stated && (
        <div ref={place} className="overflow-hidden">
          <DeviationBar
            name={name}
            nominalMm={stated.nominalMm}
            lowerMm={fit.lowerMm}
            upperMm={fit.upperMm}
            needMm={need?.asNewMm ?? null}
            spreadMm={need ? 2 * need.standardUncertaintyMm : 0}
            unit={unit}
            width={width}
            height={28}
          />
          <p className="flex justify-between text-small text-soft">
            <span>
              {below} {roundedSize(fit.lowerMm, unit)}
            </span>
            <span>
              {above} {roundedSize(fit.upperMm, unit)}
            </span>
          </p>
        </div>
      )}
    </li>
  );
}
