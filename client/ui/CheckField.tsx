import type { InputHTMLAttributes, ReactNode, Ref } from "react";
import { describedBy, fieldId } from "./fieldParts";

type Props = InputHTMLAttributes<HTMLInputElement> & {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  ref?: Ref<HTMLInputElement>;
};

/** Yes or no, with its words to the right. */
export function CheckField({ label, hint, error, name, ...rest }: Props) {
  const id = fieldId(name);
  return (
    <div className="grid gap-1">
      <div className="flex gap-3 py-1.5">
        <input
          id={id}
          name={name}
          type="checkbox"
          className="check shrink-0"
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, hint, error)}
          {...rest}
        />
        <label htmlFor={id}>{label}</label>
      </div>
      {error && (
        <p id={`${id}-error`} className="font-semibold text-outband">
          {error}
        </p>
      )}
      {hint && (
        <p id={`${id}-hint`} className="max-w-prose text-small text-soft">
          {hint}
        </p>
      )}
    </div>
  );
}
