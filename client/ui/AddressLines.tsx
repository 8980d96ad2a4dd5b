import { countryName } from "#shared/domain/countries";
import type { Address } from "#shared/schemas/order";

/** An address as it is written on a parcel, under what it is for. */
export function AddressLines({ label, address }: { label: string; address: Address }) {
  const { name, line1, line2, postcode, town, region, country } = address;
  const lines = [name, line1, line2, `${postcode} ${town}`, region, countryName(country)].filter(Boolean);
  return (
    <div>
      <h3 className="text-small font-normal text-soft">{label}</h3>
      <address className="not-italic">
        {lines.map((line) => (
          <span key={line} className="block">
            {line}
          </span>
        ))}
      </address>
    </div>
  );
}
