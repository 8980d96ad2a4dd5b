import { conformanceProbability } from "#shared/domain/conformance";
import { formatLength } from "#shared/domain/length";
import { roundDecimal } from "#shared/domain/roundDecimal";
import { rectangular } from "#shared/domain/uncertainty";
import { offered, readings, workExample } from "./workedExample";

const mm = (length: number, decimals = 2) => formatLength(length, "mm", { decimals });
const share = (chance: number) => roundDecimal(chance, 3);

/** One search by hand, from the readings to the chance: each figure is worked out as the page is shown. */
export function WorkedExample() {
  const { diameter, fit, first, second } = workExample();
  const { asFound, asNew, budget } = diameter;
  const part = offered.outsideDiameter;
  const u = first.combinedUncertaintyMm;
  const upTo = (limitMm: number) => conformanceProbability(part.nominalMm, u, { upperMm: limitMm });
  return (
    <ol className="grid max-w-3xl list-decimal gap-4 pl-6 marker:font-semibold">
      <li>
        <b>Read.</b> An idler gone hard, three times round with a digital calliper:{" "}
        {readings.outsideDiameter.map((reading) => roundDecimal(reading, 2)).join(", ")} mm. Mean {mm(asFound.valueMm)}.
      </li>
      <li>
        <b>How far that may be off.</b> Standard uncertainties, in mm:
        <table className="mt-1 w-full text-left">
          <thead className="sr-only">
            <tr>
              <th>Why</th>
              <th>mm</th>
            </tr>
          </thead>
          <tbody>
            {budget.map((term) => (
              <tr key={term.words} className="border-t border-rule align-baseline">
                <th scope="row" className="py-1 pr-4 font-normal">
                  {term.words} <span className="text-small text-soft">{term.source}</span>
                </th>
                <td className="py-1 text-right">{roundDecimal(term.standardUncertaintyMm, 3)}</td>
              </tr>
            ))}
            <tr className="border-t border-ink align-baseline font-semibold">
              <th scope="row" className="py-1 pr-4">
                All together: root of the sum of squares
              </th>
              <td className="py-1 text-right">{roundDecimal(asNew.standardUncertaintyMm, 3)}</td>
            </tr>
          </tbody>
        </table>
      </li>
      <li>
        <b>Its size when new.</b> Being hard took {mm(asNew.valueMm - asFound.valueMm)}: y<sub>need</sub> ={" "}
        {mm(asNew.valueMm)}, u<sub>need</sub> = {mm(asNew.standardUncertaintyMm, 3)}.
      </li>
      <li>
        <b>What the place accepts.</b> L = {mm(first.lowerMm)} to U = {mm(first.upperMm)}.
      </li>
      <li>
        <b>What is offered.</b> y = {mm(part.nominalMm)}, stated to t = ± {mm(part.plusMinusMm)}. Anything inside is
        equally likely: t / √3 = {mm(rectangular(part.plusMinusMm), 3)}. Both together: u = {mm(u, 3)}.
      </li>
      <li>
        <b>The chance.</b> Φ((U − y) / u) = {share(upTo(first.upperMm))} and Φ((L − y) / u) ={" "}
        {share(upTo(first.lowerMm))}; their difference is P = {share(first.chance)}.
      </li>
      <li>
        <b>The other size.</b> Its bore was read as {mm(readings.bore[0])} and is stated as {mm(offered.bore.nominalMm)}
        : P = {share(second.chance)}. Both: {share(first.chance)} × {share(second.chance)} = {share(fit.chance)}, with{" "}
        {fit.dimensions.length} of {Math.round(fit.dimensions.length / fit.coverage)} sizes checked.
      </li>
      <li>
        <b>In words.</b> “{fit.reason}”
      </li>
    </ol>
  );
}
