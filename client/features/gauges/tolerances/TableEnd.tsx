import { type MouldDimension, rubberTolerance, toleranceClasses } from "#shared/domain/rubberTolerance";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { RuledHeading } from "../../../ui/RuledHeading";

/** Table and percentages of the standard do not meet: what each class allows on both sides of 160 mm. */
export function TableEnd({ mould, unit }: { mould: MouldDimension; unit: SizeUnit }) {
  return (
    <section className="grid max-w-prose gap-2">
      <RuledHeading>A step at 160 mm</RuledHeading>
      <p>
        Up to 160 mm the standard has a table, above it a percentage of the size, and the two do not meet. A belt of 161
        mm has another tolerance than one of 160 mm, {mould} sizes:
      </p>
      <table className="w-full border-collapse">
        <thead>
          <tr className="border-b border-rule text-left text-small text-soft">
            <th className="py-1 pr-3 font-semibold">± in {unit}</th>
            {toleranceClasses.map((name) => (
              <th key={name} className="py-1 text-right font-semibold">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {[160, 161].map((nominal) => (
            <tr key={nominal} className="border-b border-rule">
              <th scope="row" className="py-1.5 pr-3 text-left">
                at {nominal} mm
              </th>
              {toleranceClasses.map((name) => (
                <td key={name} className="py-1.5 text-right">
                  {roundedSize(rubberTolerance(name, nominal, mould).plusMinusMm, unit)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
