import { formatLength, type ParsedLength, parseLength } from "./length";
import { unitNamed } from "./lengthUnits";
import { meanOf } from "./uncertainty";
import { isWorkedOut, plusMinus, sizeLimits, type WrittenSize } from "./writtenSize";

export type ParsedSize = WrittenSize | { ok: false; problem: string };
type Length = Extract<ParsedLength, { ok: true }>;
type Unit = "mm" | "in";

const separator = /[;\n\r]/;
const unitAtEnd = /[^\d\s.,/¼-¾⅐-⅞-]+\.?\s*$/;
const refuse = (problem: string): ParsedSize => ({ ok: false, problem });

/** The length as it was written, in its own unit: "20.9 in". */
const written = ({ echo }: Length) => echo.replace(/ = .*/, "");

/** A text that names no unit, with the unit that the other one names. */
function withUnitOf(text: string, other: string): string {
  const unit = unitAtEnd.exec(other)?.[0] ?? "";
  return unitAtEnd.test(text) || !unitNamed(unit.trim()) ? text : text + unit;
}

function workedOut([sizeText = "", halfText = "", ...more]: readonly string[], defaultUnit: Unit): ParsedSize {
  if (more.length > 0) return refuse("Write one ± only, like 532 ± 8 mm.");
  const size = parseLength(withUnitOf(sizeText, halfText), defaultUnit);
  if (!size.ok) return refuse(`Before ±: ${size.problem}`);
  const half = parseLength(withUnitOf(halfText, sizeText), defaultUnit);
  if (!half.ok) return refuse(`After ±: ${half.problem}`);
  if (half.mm >= size.mm) return refuse("What follows ± must be smaller than the size itself.");

  const own = size.unit === half.unit ? written(size).replace(/ \D+$/, "") : written(size);
  const metric = ` = ${formatLength(size.mm, "mm").replace(" mm", "")} ± ${formatLength(half.mm, "mm")}`;
  const echo = `worked out as ${own} ± ${written(half)}${(size.echo + half.echo).includes(" = ") ? metric : ""}`;
  return { ok: true, mm: size.mm, plusMinusMm: half.mm, echo };
}

function meanOfReadings(readings: readonly Length[]): ParsedSize {
  const [least, ...others] = [...readings].sort((a, b) => a.mm - b.mm) as [Length, ...Length[]];
  const most = others.at(-1) ?? least;
  if (most.mm > 2 * least.mm) {
    const ends = `${written(least)} and ${written(most)}`;
    return refuse(`${ends} are too far apart for one size. Check them, and write the unit after each.`);
  }
  const readingsMm = readings.map(({ mm }) => mm);
  const mm = meanOf(readingsMm);
  const roundedToMm = Math.max(...readings.map((reading) => reading.roundedToMm));
  if (!others[0]) return { ok: true, mm, readingsMm, roundedToMm, echo: least.echo };

  const { unit } = least;
  const finest = Math.min(...readings.map(({ resolutionMm }) => resolutionMm));
  const decimals = Math.min(Math.max(Math.ceil(-Math.log10(finest) - 1e-9), 2), 4);
  const own = unit === "mm" || others.some((other) => other.unit !== unit) ? "" : `${formatLength(mm, unit)} = `;
  const echo = `${readings.length} readings, mean ${own}${formatLength(mm, "mm", { decimals })}`;
  return { ok: true, mm, readingsMm, roundedToMm, echo };
}

/**
 * Reads a size as it stands in one field: one length ("44.1", see `parseLength`), several readings of it
 * ("44.1; 44.0 mm; 1.736 in"), or one that was worked out ("532 ± 8 mm", "532 mm +/- 8", "20.9 +- 0.3 in").
 *
 * Units:    millimetres out. Each reading is read on its own; a unit on one side of ± holds on both.
 * Parting:  a semicolon or a line's end parts readings. A comma cannot (it may be a decimal comma), nor a plus (it may
 *           be meant as a sum). Empty readings are passed over, so that "44.1; " can be written on.
 * Limits:   12 readings, the largest at most twice the smallest (further apart a unit is missing or a digit is wrong);
 *           160 characters; what follows ± is more than zero and less than the size.
 * Errors:   in plain words that name the reading, never thrown.
 */
export function parseSize(text: string, defaultUnit: Unit): ParsedSize {
  if (text.length > sizeLimits.characters) return refuse("This is too long for one size.");
  const [only = "", ...further] = text.split(separator).filter((piece) => piece.trim());
  if (isWorkedOut(text)) {
    if (further.length > 0) return refuse("A worked-out size stands alone. Write it once, or readings without ±.");
    return workedOut(only.split(plusMinus), defaultUnit);
  }
  const texts = [only, ...further];
  if (texts.length > sizeLimits.readings) return refuse(`Write at most ${sizeLimits.readings} readings.`);
  const readings: Length[] = [];
  for (const [i, piece] of texts.entries()) {
    const reading = parseLength(piece, defaultUnit);
    if (!reading.ok) return refuse(further.length > 0 ? `Reading ${i + 1}: ${reading.problem}` : reading.problem);
    readings.push(reading);
  }
  return meanOfReadings(readings);
}
