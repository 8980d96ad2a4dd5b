import { traitsOf } from "#shared/domain/dimensionTraits";
import { parseLength } from "#shared/domain/length";
import { type DimensionName, dimensionsOf, type PartKind, partKinds } from "#shared/domain/partKinds";
import type { MouldDimension } from "#shared/domain/rubberTolerance";
import { storedUnit } from "../../../lib/preferences";
import { readPlainNumber } from "../readPlainNumber";
import { withItsUnit } from "../withItsUnit";

/** One size of one kind of part. */
export type Place = { kind: PartKind; dimension: DimensionName };
/** The page as it was written: lengths and hardnesses as texts. */
export type ToleranceState = {
  size: string;
  mould: MouldDimension;
  place: Place | null;
  /** The size that is needed there; empty for the size itself. */
  need: string;
  hardness: string;
  reading: string;
};

const example: ToleranceState = {
  size: "44.1 mm",
  mould: "fixed",
  place: { kind: "idler-wheel", dimension: "outsideDiameter" },
  need: "",
  hardness: "50",
  reading: "",
};

/** The sizes of a kind that are moulded in rubber. */
export const mouldedSizes = (kind: PartKind): DimensionName[] =>
  dimensionsOf(kind).filter((dimension) => traitsOf(kind, dimension).material === "rubber");

/** "idler-wheel.outsideDiameter", as in the address; null for anything else. */
export function readPlace(text: string | null): Place | null {
  const [kindText, dimensionText] = (text ?? "").split(".");
  const kind = partKinds.find((one) => one === kindText);
  const dimension = kind && mouldedSizes(kind).find((one) => one === dimensionText);
  return kind && dimension ? { kind, dimension } : null;
}
export const writePlace = (place: Place | null): string => (place ? `${place.kind}.${place.dimension}` : "");

/** The address: `size`, `across` (fixed or closure), `place`, `need`, `hardness`, `reading`. What cannot be read falls back. */
export const toleranceCodec = {
  read(params: URLSearchParams): ToleranceState {
    const size = params.get("size");
    if (size === null) return example;
    const length = (text: string | null, otherwise: string) =>
      text !== null && parseLength(text, storedUnit()).ok ? text : otherwise;
    const number = (name: "hardness" | "reading") => {
      const text = params.get(name) ?? "";
      return text && readPlainNumber(text) === null ? example[name] : text;
    };
    return {
      size: length(size, example.size),
      mould: params.get("across") === "closure" ? "closure" : "fixed",
      place: readPlace(params.get("place")),
      need: length(params.get("need"), ""),
      hardness: number("hardness"),
      reading: number("reading"),
    };
  },
  write({ size, mould, place, need, hardness, reading }: ToleranceState): URLSearchParams {
    const params = new URLSearchParams({ size: withItsUnit(size, storedUnit()) });
    const put = (name: string, text: string) => {
      if (text.trim()) params.set(name, text.trim());
    };
    if (mould === "closure") put("across", mould);
    put("place", writePlace(place));
    if (place) put("need", withItsUnit(need, storedUnit()));
    put("hardness", hardness);
    put("reading", reading);
    return params;
  },
};
