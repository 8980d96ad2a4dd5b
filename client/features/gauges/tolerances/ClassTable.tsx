import { verdictOf } from "#shared/domain/verdict";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { RuledHeading } from "../../../ui/RuledHeading";
import { VerdictMark } from "../../../ui/VerdictMark";
import type { ClassesAt } from "./classesAt";

/** Each class in numbers, and the chance that a part of it is accepted. */
export function ClassTable({ result, unit }: { result: ClassesAt; unit: SizeUnit }) {
  const { nominalMm, classes, range, band } = result;
  const [over, upTo] = range;
  return (
    <section className="grid gap-2">
      <RuledHeading>What a class allows, {unit}</RuledHeading>
      <table className="w-full border-collapse">
        <thead>
          <tr className="border-b border-rule text-left text-small text-soft">
            <th className="py-1 pr-2 font-semibold">class</th>
            <th className="py-1 pr-2 text-right font-semibold">±</th>
            <th className="py-1 pr-2 text-right font-semibold">from</th>
            <th className="py-1 text-right font-semibold">to</th>
          </tr>
        </thead>
        <tbody>
          {classes.map(({ name, plusMinusMm, chance }) => (
            <tr key={name} className="border-b border-rule align-baseline">
              <th scope="row" className="py-1.5 pr-2 text-left">
                {name}
                {chance !== null && (
                  <span className="block text-small">
                    <VerdictMark verdict={verdictOf(chance)} chance={chance} />
                  </span>
                )}
              </th>
              <td className="py-1.5 pr-2 text-right font-semibold">{roundedSize(plusMinusMm, unit)}</td>
              <td className="py-1.5 pr-2 text-right">{roundedSize(Math.max(nominalMm - plusMinusMm, 0), unit)}</td>
              <td className="py-1.5 text-right">{roundedSize(nominalMm + plusMinusMm, unit)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="text-small text-soft">
        ISO 3302-1:2014, Table 1:{" "}
        {upTo === null ? "over 160 mm, percent of the size" : `over ${over} up to and including ${upTo} mm`}. Where a
        workshop states neither tolerance nor class, M3 is assumed here.
      </p>
      {band && (
        <p className="text-small text-soft">
          The chance is reckoned as in the search: a standard uncertainty of ± / √3, normally distributed (JCGM 106). So
          a bar just inside the green may still read less than 100 %.
        </p>
      )}
    </section>
  );
}
