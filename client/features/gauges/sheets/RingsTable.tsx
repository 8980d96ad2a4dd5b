import { isExact } from "#shared/domain/strobe";
import type { DiscRing } from "#shared/drawing/sheets/discLayout";
import { barsWords, creepWords, shownWords, speedName } from "#shared/drawing/sheets/strobeWords";
import { RuledHeading } from "../../../ui/RuledHeading";
import { ringKey } from "./readDrift";

/** What each ring of the disc really shows, from the outside inwards. */
export function RingsTable({ rings }: { rings: readonly DiscRing[] }) {
  return (
    <section className="grid gap-2">
      <RuledHeading id="rings">What the rings really show</RuledHeading>
      <table className="w-full text-left" aria-labelledby="rings">
        <thead className="text-small text-soft">
          <tr>
            <th className="py-1 pr-3 font-semibold whitespace-nowrap">For rpm</th>
            <th className="py-1 font-semibold">Ring</th>
          </tr>
        </thead>
        <tbody>
          {rings.map((ring) => (
            <tr key={ringKey(ring)} className="border-t border-rule align-top">
              <th scope="row" className="py-1.5 pr-3 font-semibold whitespace-nowrap">
                {speedName(ring.rpm)}
              </th>
              <td className="py-1.5">
                <span className={`font-semibold ${isExact(ring) ? "text-inband" : "text-outband"}`}>
                  {shownWords(ring)}
                </span>
                <br />
                <small className="text-soft">
                  {barsWords(ring)}
                  {!isExact(ring) && `; at ${speedName(ring.rpm)} rpm they creep ${creepWords(ring)}`}
                </small>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="text-small text-soft">
        A lamp on the mains flashes twice a cycle, and a ring has whole bars, so not every speed can be shown exactly.
      </p>
    </section>
  );
}
