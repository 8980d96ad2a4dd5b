import { zodResolver } from "@hookform/resolvers/zod";
import { useForm } from "react-hook-form";
import { DispatchParcel } from "#shared/schemas/workshopParcel";
import { TextField } from "../../ui/TextField";
import { AccountForm } from "../account/AccountForm";

/** What a form sends is never left out, only empty. */
const DispatchFields = DispatchParcel.required();

/** How a parcel travels, both of it optional, and the word that it has left. */
export function DispatchForm({ onDispatch }: { onDispatch: (details: DispatchParcel) => Promise<void> }) {
  const form = useForm({
    shouldFocusError: false,
    resolver: zodResolver(DispatchFields),
    defaultValues: { carrier: "", trackingNumber: "" },
  });
  const { errors } = form.formState;
  return (
    <AccountForm form={form} onSubmit={onDispatch} action="It has left: tell the buyer">
      <TextField
        label="Carrier"
        optional
        hint="Who took it: the post office, or a firm’s name."
        autoComplete="off"
        error={errors.carrier?.message}
        {...form.register("carrier")}
      />
      <TextField
        label="Tracking number"
        optional
        autoComplete="off"
        autoCapitalize="characters"
        spellCheck={false}
        error={errors.trackingNumber?.message}
        {...form.register("trackingNumber")}
      />
    </AccountForm>
  );
}
