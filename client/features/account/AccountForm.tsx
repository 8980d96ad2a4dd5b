import type { ReactNode } from "react";
import type { FieldValues, UseFormReturn } from "react-hook-form";
import { listFieldErrors } from "../../lib/listFieldErrors";
import { setProblemErrors } from "../../lib/setProblemErrors";
import { Button } from "../../ui/Button";
import { FormErrors } from "../../ui/FormErrors";

type Props<Values extends FieldValues> = {
  form: UseFormReturn<Values>;
  /** What happens with right values; what it throws lands beside the fields. */
  onSubmit: (values: Values) => Promise<void>;
  action: string;
  children: ReactNode;
};

/** A short form with one action: errors above, fields, the button. Nothing typed is lost. */
export function AccountForm<Values extends FieldValues>({ form, onSubmit, action, children }: Props<Values>) {
  const { errors, isSubmitting, submitCount } = form.formState;
  const submit = form.handleSubmit(async (values) => {
    try {
      await onSubmit(values);
    } catch (error) {
      setProblemErrors(error, form.setError);
    }
  });
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="grid max-w-md gap-6">
      <FormErrors errors={listFieldErrors(errors)} attempt={submitCount} />
      <fieldset disabled={isSubmitting} className="grid gap-6">
        {children}
        <Button type="submit" look="primary" className="justify-self-start">
          {action}
        </Button>
      </fieldset>
    </form>
  );
}
