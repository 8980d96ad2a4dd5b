import { type ParsedSize, parseSize } from "#shared/domain/parseSize";
import { dimensionsOf, partKinds } from "#shared/domain/partKinds";
import type { SizeUnit } from "./formatSize";

/** What a text means, apart from how it is put. */
const meaningOf = (size: ParsedSize) => size.ok && [size.mm, "plusMinusMm" in size && size.plusMinusMm].join();

/** A size whose meaning does not hang on the unit that is read by default: bare numbers get theirs written out. */
function written(text: string, from: SizeUnit, to: SizeUnit): string {
  return text
    .split(/[;\n\r]/)
    .filter((reading) => reading.trim())
    .map((reading) => {
      const now = parseSize(reading, from);
      const isSame = !now.ok || meaningOf(now) === meaningOf(parseSize(reading, to));
      return isSame ? reading.trim() : `${reading.trim()} ${from}`;
    })
    .join("; ");
}

/** Another unit to read in, without changing what any size means. */
export function withUnit(params: URLSearchParams, from: SizeUnit, to: SizeUnit): URLSearchParams {
  const next = new URLSearchParams(params);
  for (const name of new Set(partKinds.flatMap(dimensionsOf))) {
    const text = next.get(name);
    if (text) next.set(name, written(text, from, to));
  }
  next.set("unit", to);
  return next;
}
