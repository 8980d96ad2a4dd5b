import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { RuledHeading } from "../../../ui/RuledHeading";
import { percentText } from "./percentText";
import { RingSize } from "./RingSize";
import type { RingNeed } from "./ringNeed";

type Props = {
  need: RingNeed;
  unit: SizeUnit;
  litDash: string | null;
  onLight: (dash: string | null) => void;
  onPick: (dash: string) => void;
};

const signed = (mm: number, unit: SizeUnit) =>
  `${mm > 0 ? "+" : ""}${roundedSize(mm, unit).replace("-", "\u2212")} ${unit}`;

/** The nearest sizes, nearest first. Each row lights its mark on the rail; its number draws it. */
export function RingRows({ need, unit, litDash, onLight, onPick }: Props) {
  const isInPlace = need.use === "ring";
  return (
    <section className="grid gap-2">
      <RuledHeading>Nearest standard sizes</RuledHeading>
      {need.isSectionMissed && (
        <p>No standard ring of about that section comes near this diameter; these are of other sections.</p>
      )}
      <table className="w-full border-collapse max-sm:text-small">
        <thead>
          <tr className="border-b border-rule text-left text-small text-soft">
            <th className="py-1.5 pr-3 font-semibold">size</th>
            <th className="py-1.5 pr-3 font-semibold">inside diameter</th>
            <th className="py-1.5 pr-3 font-semibold">section</th>
            <th className="py-1.5 text-right font-semibold">{isInPlace ? "than the old one" : "stretch"}</th>
          </tr>
        </thead>
        <tbody>
          {need.rows.map((ring) => (
            <tr
              key={ring.dash}
              data-lit={ring.dash === litDash || undefined}
              className="border-b border-rule data-lit:border-measured data-lit:bg-sheet"
              onPointerEnter={() => onLight(ring.dash)}
              onPointerLeave={() => onLight(null)}
            >
              <th scope="row" className="py-0.5 pr-3 text-left">
                <button
                  type="button"
                  aria-pressed={ring.dash === need.picked.dash}
                  className="min-h-11 min-w-11 cursor-pointer text-left font-bold underline decoration-1 underline-offset-4 aria-pressed:text-measured aria-pressed:decoration-2"
                  onFocus={() => onLight(ring.dash)}
                  onBlur={() => onLight(null)}
                  onClick={() => onPick(ring.dash)}
                >
                  {ring.dash}
                </button>
              </th>
              <td className="py-1.5 pr-3">
                <RingSize mm={ring.insideDiameterMm} plusMinusMm={ring.insideDiameterTolMm} unit={unit} />
              </td>
              <td className="py-1.5 pr-3">
                <RingSize mm={ring.sectionMm} plusMinusMm={ring.sectionTolMm} unit={unit} />
              </td>
              <td className={`py-1.5 text-right whitespace-nowrap ${ring.isInside ? "font-semibold text-inband" : ""}`}>
                {ring.isInside && "● "}
                {isInPlace
                  ? signed(ring.insideDiameterMm - need.seatMm, unit)
                  : `${percentText(ring.stretchPercent)} %`}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="text-small text-soft">
        Sizes and tolerances of SAE AS568, 369 in all, as openly reproduced. A filled mark lies inside what is advised.
      </p>
    </section>
  );
}
