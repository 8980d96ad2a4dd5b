import { useRef } from "react";
import { type UseFormReturn, useFieldArray, useWatch } from "react-hook-form";
import type { WorkshopSettings } from "#shared/schemas/workshopSettings";
import { Button } from "../../ui/Button";
import { fieldId } from "../../ui/fieldParts";
import { TextField } from "../../ui/TextField";
import { emptyZone, type SettingsValues } from "./settingsValues";
import { ZoneCountries } from "./ZoneCountries";

export type SettingsForm = UseFormReturn<SettingsValues, unknown, WorkshopSettings>;
type Props = { form: SettingsForm; currency: string };

/** The zones of a workshop's postage. */
export function ZoneFields({ form, currency }: Props) {
  const { control, register, setValue, formState } = form;
  const { fields, append, remove } = useFieldArray({ control, name: "zones" });
  const zones = useWatch({ control, name: "zones" });
  const taken = zones.flatMap(({ countries }) => countries);
  // What was taken out takes the focus with it, unless it is put where the list goes on.
  const adding = useRef<HTMLButtonElement>(null);
  const errors = formState.errors.zones;
  const none = errors?.root?.message ?? errors?.message;
  const amount = (index: number, part: "baseMinor" | "perItemMinor" | "freeOverMinor") => ({
    ...register(`zones.${index}.${part}`),
    inputMode: "decimal" as const,
    error: errors?.[index]?.[part]?.message,
  });
  return (
    <div className="grid gap-8">
      <p className="max-w-prose text-soft">
        A parcel costs its own price and that of each part in it. A country lies in one zone only: it is offered where
        it lies in none. Where you have no zone you do not send.
      </p>
      {fields.map(({ id }, index) => (
        <fieldset key={id} className="grid gap-5 border-l-4 border-rule pl-4">
          <legend className="sr-only">Zone {index + 1}</legend>
          <TextField
            label="Name of the zone"
            {...register(`zones.${index}.zone`)}
            error={errors?.[index]?.zone?.message}
          />
          <div className="grid items-start gap-5 sm:grid-cols-3">
            <TextField label={`A parcel, ${currency}`} {...amount(index, "baseMinor")} />
            <TextField label={`Each part, ${currency}`} {...amount(index, "perItemMinor")} />
            <TextField label={`Free from, ${currency}`} hint="Empty: never" {...amount(index, "freeOverMinor")} />
          </div>
          <ZoneCountries
            name={`zones.${index}.countries`}
            countries={zones[index]?.countries ?? []}
            taken={taken}
            error={messageIn(errors?.[index]?.countries)}
            onChange={(countries) =>
              setValue(`zones.${index}.countries`, countries, {
                shouldDirty: true,
                shouldValidate: formState.isSubmitted,
              })
            }
          />
          <Button
            className="justify-self-start"
            onClick={() => {
              remove(index);
              adding.current?.focus();
            }}
          >
            Take out zone {index + 1}
          </Button>
        </fieldset>
      ))}
      <div className="grid gap-1.5">
        <Button
          ref={adding}
          id={fieldId(errors?.root ? "zones.root" : "zones")}
          aria-describedby={none ? "zones-error" : undefined}
          className="justify-self-start"
          onClick={() => append(emptyZone)}
        >
          Add a zone
        </Button>
        {none && (
          <p id="zones-error" className="font-semibold text-outband">
            {none}
          </p>
        )}
      </div>
    </div>
  );
}

/** The message of a list, or of the first of its items that has one. */
function messageIn(errors: { message?: string } | readonly ({ message?: string } | undefined)[] | undefined) {
  if (!errors) return undefined;
  if ("message" in errors && errors.message) return errors.message;
  return Array.isArray(errors) ? errors.find((error) => error?.message)?.message : undefined;
}
