import type { ReactNode } from "react";

/** The id of the field of this name, which the error summary links to. */
export const fieldId = (name: string): string => `field-${name.replaceAll(".", "-")}`;

/** What a control has to say of its hint and error. */
export function describedBy(id: string, hint: unknown, error: unknown): string | undefined {
  const ids = [hint ? `${id}-hint` : "", error ? `${id}-error` : ""].filter(Boolean).join(" ");
  return ids === "" ? undefined : ids;
}

type FieldProps = {
  id: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  optional?: boolean | undefined;
  children: ReactNode;
};

/** Label above, control, error in words, hint below. */
export function Field({ id, label, hint, error, optional, children }: FieldProps) {
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className="font-semibold">
        {label}
        {optional && <span className="font-normal text-soft"> (if you like)</span>}
      </label>
      {children}
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
