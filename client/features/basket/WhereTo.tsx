import { type UseFormReturn, useWatch } from "react-hook-form";
import { countryName } from "#shared/domain/countries";
import { AddressFields } from "./AddressFields";
import type { SavedAddress } from "./api";
import { type CheckoutValues, otherAddress } from "./checkoutValues";

type Props = { form: UseFormReturn<CheckoutValues>; saved: readonly SavedAddress[] };

const written = ({ line1, line2, postcode, town, region, country }: SavedAddress) =>
  [line1, line2, `${postcode} ${town}`, region, countryName(country)].filter(Boolean).join(", ");

/** One of the addresses used before, or another one. */
export function WhereTo({ form, saved }: Props) {
  const isOther = useWatch({ control: form.control, name: "choice" }) === otherAddress;
  return (
    <div className="grid gap-6">
      {saved.length > 0 && (
        <fieldset className="grid gap-1">
          <legend className="sr-only">Address to send to</legend>
          {saved.map((address) => (
            <label key={address.id} className="flex min-h-11 gap-3 py-1.5">
              <input type="radio" className="check shrink-0" value={address.id} {...form.register("choice")} />
              <span>
                <span className="font-semibold">{address.name}</span>
                <span className="block text-soft">{written(address)}</span>
              </span>
            </label>
          ))}
          <label className="flex min-h-11 gap-3 py-1.5 font-semibold">
            <input type="radio" className="check shrink-0" value={otherAddress} {...form.register("choice")} />
            Another address
          </label>
        </fieldset>
      )}
      {isOther && <AddressFields form={form} name="shippingAddress" group="shipping" />}
    </div>
  );
}
