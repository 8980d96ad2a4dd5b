import { defaultBand } from "#shared/domain/acceptedBands";
import { instrumentFacts } from "#shared/domain/instruments";
import { dimensionsOf, dimensionWords, kindFacts, type PartKind } from "#shared/domain/partKinds";
import { roundDecimal } from "#shared/domain/roundDecimal";
import { capitalised } from "../../lib/capitalised";
import { coarsestInstrument } from "./coarsestInstrument";
import { exampleSizes } from "./exampleSizes";

const mm = (length: number) => roundDecimal(length, length < 100 ? 2 : 0);

/** For each size of a kind: what its place usually accepts, and what is fine enough to measure it with. */
export function HowFine({ kind }: { kind: PartKind }) {
  return (
    <table className="w-full max-w-3xl text-left">
      <caption className="pb-2 text-left font-semibold">{capitalised(kindFacts[kind].name)}</caption>
      <thead className="text-small text-soft">
        <tr className="align-bottom">
          <th className="py-1 pr-3 font-semibold">Size</th>
          <th className="py-1 pr-3 text-right font-semibold">such as</th>
          <th className="py-1 pr-3 text-right font-semibold">accepted, mm</th>
          <th className="py-1 font-semibold">measure with</th>
        </tr>
      </thead>
      <tbody>
        {dimensionsOf(kind).map((dimension) => {
          const sizeMm = exampleSizes[kind][dimension];
          if (sizeMm === undefined) return null;
          const { lowerMm, upperMm } = defaultBand(kind, dimension, sizeMm);
          const instrument = coarsestInstrument(kind, dimension, sizeMm);
          return (
            <tr key={dimension} className="border-t border-rule align-baseline">
              <th scope="row" className="py-1.5 pr-3 font-normal">
                {capitalised(dimensionWords[dimension])}
              </th>
              <td className="py-1.5 pr-3 text-right">{sizeMm}</td>
              <td className="py-1.5 pr-3 text-right">
                <span className="whitespace-nowrap">{mm(lowerMm)}</span> to{" "}
                <span className="whitespace-nowrap">{mm(upperMm)}</span>
              </td>
              <td className="py-1.5">{instrument ? instrumentFacts[instrument].withArticle : "several readings"}</td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
