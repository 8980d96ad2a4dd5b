import type { FieldValues, Path, UseFormSetError } from "react-hook-form";
import { ApiProblem } from "./ApiProblem";

/** "#/body/address/town" and "/address/town" both name the field `address.town`. */
function fieldOf(pointer: string): string {
  const parts = pointer
    .replace(/^#/, "")
    .split("/")
    .slice(1)
    .map((part) => decodeURIComponent(part).replaceAll("~1", "/").replaceAll("~0", "~"));
  if (parts[0] === "body") parts.shift();
  return parts.join(".");
}

/**
 * Puts what the server refused beside its field; what belongs to no field goes to `root.server`.
 * Gives back nothing; anything but an Error is thrown on.
 */
export function setProblemErrors<Values extends FieldValues>(error: unknown, setError: UseFormSetError<Values>): void {
  if (!(error instanceof Error)) throw error;
  const placed = error instanceof ApiProblem ? error.errors : [];
  for (const { pointer, detail } of placed) {
    const field = fieldOf(pointer);
    setError((field || "root.server") as Path<Values>, { type: "server", message: detail });
  }
  if (placed.length === 0) setError("root.server", { type: "server", message: error.message });
}
