import { useForm } from "react-hook-form";
import { Link } from "react-router-dom";
import type { WorkshopSettingsPage as Answer, WorkshopSettings } from "#shared/schemas/workshopSettings";
import { ApiProblem } from "../../lib/ApiProblem";
import { listFieldErrors } from "../../lib/listFieldErrors";
import { setProblemErrors } from "../../lib/setProblemErrors";
import { AreaField } from "../../ui/AreaField";
import { Button } from "../../ui/Button";
import { type FormError, FormErrors } from "../../ui/FormErrors";
import { RuledHeading } from "../../ui/RuledHeading";
import { TextField } from "../../ui/TextField";
import { useSaveSettings } from "./api";
import { BuyersPayTable } from "./BuyersPayTable";
import { type SettingsValues, settingsResolver, valuesOf } from "./settingsValues";
import { TaxFields } from "./TaxFields";
import { ZoneFields } from "./ZoneFields";

const elsewhere =
  "The settings were changed in another place since you opened them, so nothing was kept. What you typed stays here: " +
  "open this page in another tab to see what changed, then load this one again";

/** Zones, and registrations, have the same fields: the summary says which is meant. */
const withPlace = ({ field, message }: FormError): FormError => {
  const [list, index] = field?.split(".") ?? [];
  const at = Number(index) + 1;
  if (list === "zones" && at > 0) return { field, message: `${message}, for zone ${at}` };
  if (list === "taxRegistrations" && at > 0) return { field, message: `${message}, for registration ${at}` };
  return { field, message };
};

/** Everything that a workshop sets, in one form that is kept whole. */
export function SettingsForm({ page }: { page: Answer }) {
  const { workshop, currency } = page;
  const save = useSaveSettings();
  const form = useForm<SettingsValues, unknown, WorkshopSettings>({
    resolver: settingsResolver(currency),
    shouldFocusError: false,
    defaultValues: valuesOf(page),
  });
  const { errors, isSubmitting, submitCount, isDirty } = form.formState;
  const submit = form.handleSubmit(async (settings) => {
    try {
      form.reset(valuesOf(await save.mutateAsync(settings)));
    } catch (error) {
      if (error instanceof ApiProblem && error.is("changed-meanwhile")) {
        form.setError("root.server", { type: "server", message: elsewhere });
      } else setProblemErrors(error, form.setError);
    }
  });
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="grid grid-cols-1 gap-8">
      <FormErrors errors={listFieldErrors(errors).map(withPlace)} attempt={submitCount} />
      <fieldset disabled={isSubmitting} className="grid grid-cols-1 gap-x-14 gap-y-8 lg:grid-cols-[1.5fr_1fr]">
        <div className="grid min-w-0 content-start gap-8">
          <section className="grid gap-5">
            <RuledHeading>Words</RuledHeading>
            <AreaField label="About your workshop" {...form.register("about")} error={errors.about?.message} />
            <AreaField
              label="When a part does not suit"
              hint="Your terms for returns, as buyers read them on your page."
              {...form.register("returnsTerms")}
              error={errors.returnsTerms?.message}
            />
            <TextField
              label="Days until what is in stock leaves"
              inputMode="numeric"
              className="max-w-24"
              {...form.register("dispatchDays")}
              error={errors.dispatchDays?.message}
            />
          </section>
          <section className="grid gap-5">
            <RuledHeading>Postage</RuledHeading>
            <ZoneFields form={form} currency={currency} />
          </section>
          <section className="grid gap-5">
            <RuledHeading>Tax</RuledHeading>
            <TaxFields form={form} />
          </section>
        </div>
        <section
          aria-labelledby="buyers-pay"
          className="grid min-w-0 content-start gap-3 lg:sticky lg:top-6 lg:self-start"
        >
          <RuledHeading id="buyers-pay">What buyers pay for postage</RuledHeading>
          <BuyersPayTable control={form.control} currency={currency} />
        </section>
        <div className="flex flex-wrap items-center gap-4">
          <Button type="submit" look="primary">
            Keep the settings
          </Button>
          <p role="status">
            {save.isSuccess && !isDirty && (
              <>
                Kept. Prices at the door follow at once.{" "}
                {workshop.state === "admitted" && <Link to={`/workshops/${workshop.slug}`}>See your page</Link>}
              </>
            )}
          </p>
        </div>
      </fieldset>
    </form>
  );
}
