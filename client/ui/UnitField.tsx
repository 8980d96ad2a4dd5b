import type { InputHTMLAttributes, ReactNode, Ref } from "react";
import { describedBy, Field, fieldId } from "./fieldParts";

type Props = InputHTMLAttributes<HTMLInputElement> & {
  name: string;
  label: ReactNode;
  /** Stands beside the field: "mm", "Shore A", "€". */
  unit: string;
  hint?: ReactNode;
  error?: string | undefined;
  optional?: boolean;
  ref?: Ref<HTMLInputElement>;
};

/** A number with its unit beside it. Text, not a number input: commas and fractions are read too. */
export function UnitField({ label, unit, hint, error, optional, name, className = "", ...rest }: Props) {
  const id = fieldId(name);
  return (
    <Field id={id} label={label} hint={hint} error={error} optional={optional}>
      <span className="flex items-center gap-2">
        <input
          id={id}
          name={name}
          inputMode="decimal"
          autoComplete="off"
          className={`input max-w-40 ${className}`}
          aria-invalid={error ? true : undefined}
          aria-describedby={`${id}-unit ${describedBy(id, hint, error) ?? ""}`.trim()}
          {...rest}
        />
        <span id={`${id}-unit`} className="text-soft">
          {unit}
        </span>
      </span>
    </Field>
  );
}
