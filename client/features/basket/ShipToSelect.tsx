import { useQuery } from "@tanstack/react-query";
import { countryName } from "#shared/domain/countries";
import { countriesQuery } from "../../lib/catalogue";
import { keepShipTo } from "../../lib/preferences";

/** The country that postage is reckoned to, as a word in a sentence. */
export function ShipToSelect({ shipTo }: { shipTo: string }) {
  const listed = useQuery(countriesQuery).data?.items ?? [];
  const countries = listed.some(({ code }) => code === shipTo)
    ? listed
    : [{ code: shipTo, name: countryName(shipTo) }, ...listed];
  return (
    <select
      aria-label="Country it is sent to"
      className="slot"
      value={shipTo}
      onChange={(event) => keepShipTo(event.target.value)}
    >
      {countries.map(({ code, name }) => (
        <option key={code} value={code}>
          {name}
        </option>
      ))}
    </select>
  );
}
