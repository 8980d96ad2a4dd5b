import { parseLength } from "#shared/domain/length";
import type { SizeUnit } from "../../lib/formatSize";

/** A length as it goes into an address: with its unit, so that it means the same to whoever opens it. */
export function withItsUnit(text: string, unit: SizeUnit): string {
  const written = text.trim();
  const [metric, imperial] = [parseLength(written, "mm"), parseLength(written, "in")];
  return metric.ok && imperial.ok && metric.mm !== imperial.mm ? `${written} ${unit}` : written;
}
