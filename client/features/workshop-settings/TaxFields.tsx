import { useRef } from "react";
import { useFieldArray } from "react-hook-form";
import { countryName } from "#shared/domain/countries";
import { Button } from "../../ui/Button";
import { SelectField } from "../../ui/SelectField";
import { TextField } from "../../ui/TextField";
import { countriesByName } from "./countriesByName";
import { emptyRegistration } from "./settingsValues";
import type { SettingsForm } from "./ZoneFields";

/** The countries whose tax a workshop collects. */
export function TaxFields({ form: { control, register, formState } }: { form: SettingsForm }) {
  const { fields, append, remove } = useFieldArray({ control, name: "taxRegistrations" });
  // What was taken out takes the focus with it, unless it is put where the list goes on.
  const adding = useRef<HTMLButtonElement>(null);
  const errors = formState.errors.taxRegistrations;
  return (
    <div className="grid gap-6">
      <p className="max-w-prose text-soft">
        Your prices contain the tax of countries where you are registered. Elsewhere none is collected, and buyers read
        that import tax may be asked.
      </p>
      {fields.map(({ id }, index) => (
        <fieldset key={id} className="grid items-start gap-5 border-l-4 border-rule pl-4 sm:grid-cols-[2fr_2fr_1fr]">
          <legend className="sr-only">Registration {index + 1}</legend>
          <SelectField
            label="Country of the tax"
            {...register(`taxRegistrations.${index}.country`)}
            error={errors?.[index]?.country?.message}
          >
            <option value="">Choose</option>
            {countriesByName.map((code) => (
              <option key={code} value={code}>
                {countryName(code)}
              </option>
            ))}
          </SelectField>
          <TextField
            label="Number"
            {...register(`taxRegistrations.${index}.number`)}
            error={errors?.[index]?.number?.message}
          />
          <TextField
            label="Rate, %"
            inputMode="decimal"
            {...register(`taxRegistrations.${index}.ratePercent`)}
            error={errors?.[index]?.ratePercent?.message}
          />
          <Button
            className="justify-self-start sm:col-span-3"
            onClick={() => {
              remove(index);
              adding.current?.focus();
            }}
          >
            Take out registration {index + 1}
          </Button>
        </fieldset>
      ))}
      <Button ref={adding} className="justify-self-start" onClick={() => append(emptyRegistration)}>
        Add a registration
      </Button>
    </div>
  );
}
