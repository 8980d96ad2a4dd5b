import { useQuery } from "@tanstack/react-query";
import type { ComponentProps } from "react";
import { countryName } from "#shared/domain/countries";
import { countriesQuery } from "../../lib/catalogue";
import { SelectField } from "../../ui/SelectField";

type Props = Omit<ComponentProps<typeof SelectField>, "label" | "children"> & { current: string };

/** A country that somebody ships to; what is chosen stays in the list whatever is known. */
export function CountryField({ current, ...rest }: Props) {
  const listed = useQuery(countriesQuery).data?.items ?? [];
  const isListed = current === "" || listed.some(({ code }) => code === current);
  const countries = isListed ? listed : [{ code: current, name: countryName(current) }, ...listed];
  return (
    <SelectField label="Country" {...rest}>
      {current === "" && <option value="">Choose</option>}
      {countries.map(({ code, name }) => (
        <option key={code} value={code}>
          {name}
        </option>
      ))}
    </SelectField>
  );
}
