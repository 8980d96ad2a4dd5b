import { type Instrument, instrumentFacts, instruments } from "#shared/domain/instruments";
import { permissibleError } from "#shared/domain/permissibleError";
import { roundDecimal } from "#shared/domain/roundDecimal";
import { capitalised } from "../../lib/capitalised";

const figure = (mm: number) => roundDecimal(mm, mm < 0.02 ? 3 : mm < 1 ? 2 : 1);

/** How finely each instrument is read and how far it may be off, at each of these sizes; then with its inside jaws. */
export function InstrumentTable({ sizesMm }: { sizesMm: readonly number[] }) {
  const inside = instruments.filter((instrument) => instrumentFacts[instrument].insideJaws);
  return (
    <table className="w-full max-w-3xl text-left">
      <caption className="sr-only">How far each instrument may be off</caption>
      <thead className="text-small text-soft">
        <tr className="align-bottom">
          <th className="py-1 pr-2 font-semibold">May be off by, ± mm</th>
          <th className="py-1 pl-2 text-right font-semibold">read in steps of</th>
          {sizesMm.map((size) => (
            <th key={size} className="py-1 pl-2 text-right font-semibold">
              at {size}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {instruments.map((instrument) => (
          <Row key={instrument} instrument={instrument} sizesMm={sizesMm} />
        ))}
        {inside.map((instrument) => (
          <Row key={instrument} instrument={instrument} sizesMm={sizesMm} inside />
        ))}
      </tbody>
    </table>
  );
}

type RowProps = { instrument: Instrument; sizesMm: readonly number[]; inside?: boolean };

function Row({ instrument, sizesMm, inside = false }: RowProps) {
  const { name, stepMm } = instrumentFacts[instrument];
  return (
    <tr className="border-t border-rule align-baseline">
      <th scope="row" className="py-1.5 pr-2 font-normal">
        {capitalised(name)}
        {inside && <span className="text-small text-soft">, inside jaws</span>}
      </th>
      <td className="py-1.5 pl-2 text-right">{stepMm}</td>
      {sizesMm.map((size) => (
        <td key={size} className="py-1.5 pl-2 text-right">
          {figure(permissibleError(instrument, size, { inside }).plusMinusMm)}
        </td>
      ))}
    </tr>
  );
}
