import type { ReactNode, Ref, SelectHTMLAttributes } from "react";
import { describedBy, Field, fieldId } from "./fieldParts";

type Props = SelectHTMLAttributes<HTMLSelectElement> & {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  optional?: boolean;
  ref?: Ref<HTMLSelectElement>;
};

/** One of a few; `children` are the `<option>`s. */
export function SelectField({ label, hint, error, optional, name, className = "", children, ...rest }: Props) {
  const id = fieldId(name);
  return (
    <Field id={id} label={label} hint={hint} error={error} optional={optional}>
      <select
        id={id}
        name={name}
        className={`input ${className}`}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, hint, error)}
        {...rest}
      >
        {children}
      </select>
    </Field>
  );
}
