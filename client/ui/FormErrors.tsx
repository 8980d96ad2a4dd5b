import { useEffect, useRef } from "react";
import { fieldId } from "./fieldParts";

/** `field` is the name of the field at fault; null where it is the form as a whole. */
export type FormError = { field: string | null; message: string };

type Props = {
  errors: readonly FormError[];
  /** Counts the tries: each new one moves focus here again. */
  attempt: number;
};

/** What is wrong with a form, above it: takes the focus, and leads to each field. */
export function FormErrors({ errors, attempt }: Props) {
  const box = useRef<HTMLDivElement>(null);
  const any = errors.length > 0;
  useEffect(() => {
    if (any && attempt > 0) box.current?.focus();
  }, [any, attempt]);
  if (!any) return null;

  const goTo = (field: string) => (event: React.MouseEvent) => {
    const control = document.getElementById(fieldId(field));
    if (!control) return;
    event.preventDefault();
    control.focus();
    control.scrollIntoView({ block: "center" });
  };
  return (
    <div ref={box} tabIndex={-1} role="alert" className="grid gap-2 border-2 border-outband bg-sheet p-4">
      <h2 className="text-step1">There is a problem</h2>
      <ul className="grid gap-1">
        {errors.map(({ field, message }) => (
          <li key={`${field}${message}`} className="font-semibold text-outband">
            {field ? (
              <a href={`#${fieldId(field)}`} onClick={goTo(field)}>
                {message}
              </a>
            ) : (
              message
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
