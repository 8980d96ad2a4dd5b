import { formatLength, parseLength } from "#shared/domain/length";
import type { DimensionName } from "#shared/domain/partKinds";
import { needParams } from "../../../lib/needParams";
import { withItsUnit } from "../withItsUnit";
import { type BeltSampleState, thicknessOf } from "./beltSampleState";
import type { Sample } from "./readSample";

export type BeltSearch = { to: string; words: string };

/** What of a text can be searched for; nothing where it cannot be read. */
const readable = (text: string, unit: BeltSampleState["unit"]) =>
  parseLength(text, unit).ok ? withItsUnit(text, unit) : "";

/**
 * The search for belts like the sample.
 *
 * Readings of the inside circumference are handed over as they are: the search does the same with them. By another way of
 * measuring what is uncertain counts differently, so the size as new goes over as worked out, its half width sqrt(3) u so
 * that the search reckons with just this u. Thickness and width were measured either way and go with their condition.
 */
export function findBelt(state: BeltSampleState, { input, result }: Sample): BeltSearch {
  const { kind, unit, instrument, condition, family, shipTo } = state;
  const isRead = input.method === "inside-circumference";
  const { insideCircumferenceMm, standardUncertaintyMm } = result.asNew;
  const size = formatLength(insideCircumferenceMm, "mm").replace(" mm", "");
  const half = formatLength(Math.sqrt(3) * standardUncertaintyMm, "mm");
  const lengths: Partial<Record<DimensionName, string>> = {
    insideCircumference: isRead
      ? state.readings.flatMap((text) => (text.trim() === "" ? [] : [withItsUnit(text, unit)])).join("; ")
      : `${size} ± ${half}`,
    [thicknessOf(kind)]: readable(state.thickness, unit),
    ...(kind === "flat-belt" && { width: readable(state.width, unit) }),
  };
  return {
    to: `/find?${needParams({ kind, lengths, instrument, condition, family, shipTo, unit, q: "" })}`,
    words: isRead
      ? "The search takes your readings, with instrument and condition, and comes to the same size."
      : `The search takes it as worked out: ${size} ± ${half}, all within that equally likely, which is just as uncertain.`,
  };
}
