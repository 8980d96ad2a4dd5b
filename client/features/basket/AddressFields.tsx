import { type UseFormReturn, useFormState, useWatch } from "react-hook-form";
import { TextField } from "../../ui/TextField";
import { CountryField } from "./CountryField";
import type { CheckoutValues } from "./checkoutValues";

type Props = {
  form: UseFormReturn<CheckoutValues>;
  name: "shippingAddress" | "billingAddress";
  /** Group of the autocomplete tokens (HTML, "Autofill"). */
  group: "shipping" | "billing";
};

/** An address as it stands on a label. */
export function AddressFields({ form, name, group }: Props) {
  const { errors: all } = useFormState({ control: form.control, name });
  const errors = all[name];
  const country = useWatch({ control: form.control, name: `${name}.country` });
  const field = (part: keyof CheckoutValues["shippingAddress"], token: string) => ({
    ...form.register(`${name}.${part}`),
    autoComplete: `${group} ${token}`,
    error: errors?.[part]?.message,
  });
  return (
    <div className="grid max-w-xl gap-5 sm:grid-cols-6 sm:[&>*]:col-span-6">
      <TextField label="Name on the label" {...field("name", "name")} />
      <TextField label="Street and house" {...field("line1", "address-line1")} />
      <TextField label="Flat, floor or company" optional {...field("line2", "address-line2")} />
      <div className="sm:!col-span-2">
        <TextField label="Postcode" {...field("postcode", "postal-code")} />
      </div>
      <div className="sm:!col-span-4">
        <TextField label="Town" {...field("town", "address-level2")} />
      </div>
      <TextField label="State or region" optional {...field("region", "address-level1")} />
      <CountryField current={country} {...field("country", "country")} />
    </div>
  );
}
