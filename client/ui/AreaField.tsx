import type { ReactNode, Ref, TextareaHTMLAttributes } from "react";
import { describedBy, Field, fieldId } from "./fieldParts";

type Props = TextareaHTMLAttributes<HTMLTextAreaElement> & {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  ref?: Ref<HTMLTextAreaElement>;
};

/** Several lines of text. */
export function AreaField({ label, hint, error, name, className = "", rows = 5, ...rest }: Props) {
  const id = fieldId(name);
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <textarea
        id={id}
        name={name}
        rows={rows}
        className={`input py-2 ${className}`}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, hint, error)}
        {...rest}
      />
    </Field>
  );
}
