import type { InputHTMLAttributes, ReactNode, Ref } from "react";
import { describedBy, Field, fieldId } from "./fieldParts";

type Props = InputHTMLAttributes<HTMLInputElement> & {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  optional?: boolean;
  ref?: Ref<HTMLInputElement>;
};

/** A line of text. Takes what react-hook-form's `register` gives: `<TextField label="Town" {...register("town")} />`. */
export function TextField({ label, hint, error, optional, name, className = "", ...rest }: Props) {
  const id = fieldId(name);
  return (
    <Field id={id} label={label} hint={hint} error={error} optional={optional}>
      <input
        id={id}
        name={name}
        className={`input ${className}`}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, hint, error)}
        {...rest}
      />
    </Field>
  );
}
