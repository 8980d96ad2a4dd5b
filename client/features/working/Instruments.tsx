import { instrumentFacts, instruments } from "#shared/domain/instruments";
import { roundDecimal } from "#shared/domain/roundDecimal";

/** The instruments and how finely each is read. */
export function Instruments() {
  return (
    <table className="w-full max-w-prose text-left">
      <caption className="sr-only">How finely each instrument is read</caption>
      <thead className="text-small text-soft">
        <tr>
          <th className="py-1 font-semibold">Instrument</th>
          <th className="py-1 text-right font-semibold">read in steps of</th>
        </tr>
      </thead>
      <tbody>
        {instruments.map((instrument) => (
          <tr key={instrument} className="border-t border-rule">
            <th scope="row" className="py-1 font-normal">
              {instrumentFacts[instrument].name}
            </th>
            <td className="py-1 text-right">{roundDecimal(instrumentFacts[instrument].stepMm, 2)} mm</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
