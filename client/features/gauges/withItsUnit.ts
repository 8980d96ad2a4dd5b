import { parseLength } from "#shared/domain/length";
import type { SizeUnit } from "../../lib/formatSize";

/** A length as it goes into an address: with its unit, so that it means the same to whoever opens it. */
export function withItsUnit(text: string, unit: SizeUnit): string {
  const written = text.trim();
  const [own, other] = [parseLength(written, unit), parseLength(written, unit === "in" ? "mm" : "in")];
  // A long one ("523") is no length at all in inches, and so has no unit either.
  return own.ok && !(other.ok && other.mm === own.mm) ? `${written} ${unit}` : written;
}
