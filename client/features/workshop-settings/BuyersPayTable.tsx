import { type Control, useWatch } from "react-hook-form";
import { formatMoney } from "#shared/domain/money";
import type { WorkshopSettings } from "#shared/schemas/workshopSettings";
import { buyersPay } from "./buyersPay";
import { type SettingsValues, settingsOf } from "./settingsValues";

type Props = { control: Control<SettingsValues, unknown, WorkshopSettings>; currency: string };

/** What buyers in each country pay by the form as it stands, kept or not. */
export function BuyersPayTable({ control, currency }: Props) {
  const values = useWatch({ control }) as SettingsValues;
  const rows = buyersPay(settingsOf(values, currency));
  if (rows.length === 0) return <p className="text-soft">Give a zone its countries and amounts to see it here.</p>;
  const money = (minor: number) => formatMoney(minor, currency);
  return (
    <table className="w-full text-left">
      <caption className="sr-only">What buyers pay for postage</caption>
      <thead className="text-small text-soft">
        <tr>
          <th className="py-2 pr-4 font-semibold">In</th>
          <th className="py-2 pr-4 text-right font-semibold">1 part</th>
          <th className="py-2 text-right font-semibold">3 parts</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ key, countries, oneMinor, threeMinor, freeOverMinor, taxPercent }) => (
          <tr key={key} className="border-t border-rule align-top tabular-nums">
            <th scope="row" className="py-2 pr-4 font-normal">
              {countries.slice(0, 6).join(", ")}
              {countries.length > 6 && ` and ${countries.length - 6} more`}
              <span className="block text-small text-soft">
                {taxPercent === null ? "no tax collected" : `${taxPercent} % tax inside the price`}
                {freeOverMinor !== null && `; free from ${money(freeOverMinor)}`}
              </span>
            </th>
            <td className="py-2 pr-4 text-right">{money(oneMinor)}</td>
            <td className="py-2 text-right">{money(threeMinor)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
