import type { SpeedInput } from "#shared/domain/driveTrain";
import type { SpeedResult } from "#shared/domain/speed";
import { type SizeUnit, sizeNumber } from "../../../lib/formatSize";
import { RuledHeading } from "../../../ui/RuledHeading";
import { signed } from "./errorWords";
import { isToBeHad, turnedSize } from "./FirstSize";
import { isThickness, sizeName } from "./sizeNames";

type Props = { input: SpeedInput; result: SpeedResult; unit: SizeUnit };

/** Every size with what it does to the speed, and the one change that would mend it. */
export function SettingTable({ input, result, unit }: Props) {
  const stages = input.drive === "capstan" ? input.stages.length : 1;
  const step = unit === "mm" ? 1 : 2.54;
  return (
    <section className="grid gap-3">
      <RuledHeading>What sets the speed</RuledHeading>
      <div className="overflow-x-auto">
        <table className="w-full border-collapse text-left">
          <thead className="text-small text-soft">
            <tr className="border-b border-rule">
              <th className="py-1 pr-3 font-semibold">Size</th>
              <th className="py-1 pr-3 text-right font-semibold">now, {unit}</th>
              <th className="py-1 pr-3 text-right font-semibold">{unit === "mm" ? "0.01 mm" : "0.001 in"} larger</th>
              {result.target && <th className="py-1 text-right font-semibold">alone, for {result.target}</th>}
            </tr>
          </thead>
          <tbody>
            {result.sizes.map(({ field, mm, percentPerHundredthMm, neededMm }) => (
              <tr key={field} className="border-b border-rule">
                <th className="py-1.5 pr-3 font-semibold text-measured">{sizeName(field, stages)}</th>
                <td className="py-1.5 pr-3 text-right">
                  {isThickness(field) ? "" : "ø\u00a0"}
                  {sizeNumber(mm, unit)}
                </td>
                <td className="py-1.5 pr-3 text-right">{signed(percentPerHundredthMm * step, 3)} %</td>
                {result.target && (
                  <td className="py-1.5 text-right">{isToBeHad(neededMm) ? turnedSize(neededMm, unit) : "–"}</td>
                )}
              </tr>
            ))}
            {result.cancels.map((field) => (
              <tr key={field} className="border-b border-rule text-soft">
                <th className="py-1.5 pr-3 font-normal line-through">{sizeName(field)}</th>
                <td colSpan={result.target ? 3 : 2} className="py-1.5 text-right">
                  cancels: its size does not change the speed
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}
