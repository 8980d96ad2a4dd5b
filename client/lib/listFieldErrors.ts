import type { FieldErrors, FieldValues } from "react-hook-form";
import type { FormError } from "../ui/FormErrors";

/** The errors of a react-hook-form as FormErrors takes them, nested fields by their dotted name. */
export function listFieldErrors<Values extends FieldValues>(errors: FieldErrors<Values>): FormError[] {
  const found: FormError[] = [];
  const visit = (node: unknown, path: string) => {
    if (typeof node !== "object" || node === null) return;
    const { message } = node as { message?: unknown };
    if (typeof message === "string" && message !== "") {
      found.push({ field: path.startsWith("root") ? null : path, message });
      return;
    }
    for (const [key, value] of Object.entries(node)) {
      if (key !== "ref" && key !== "types") visit(value, path ? `${path}.${key}` : key);
    }
  };
  visit(errors, "");
  return found;
}
