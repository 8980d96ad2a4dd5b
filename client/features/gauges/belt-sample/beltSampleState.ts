import { type BeltSampleMethod, beltSampleMethods } from "#shared/domain/beltSample";
import { type Condition, conditionFacts, conditionsFor } from "#shared/domain/conditions";
import { type Instrument, instruments } from "#shared/domain/instruments";
import type { DimensionName } from "#shared/domain/partKinds";
import { isWorkedOut, sizeLimits } from "#shared/domain/writtenSize";
import type { SizeUnit } from "../../../lib/formatSize";
import { storedShipTo, storedUnit } from "../../../lib/preferences";
import { withItsUnit } from "../withItsUnit";

export const beltKinds = ["flat-belt", "square-belt", "round-belt"] as const;
export type BeltKind = (typeof beltKinds)[number];
/** The dimension that is a belt's thickness. */
export const thicknessOf = (kind: BeltKind): DimensionName => (kind === "flat-belt" ? "thickness" : "section");
/** What a belt can be in and still be measured. */
export const beltConditions = conditionsFor("flat-belt").filter((condition) => conditionFacts[condition].hasReadings);

export type BeltSampleState = {
  method: BeltSampleMethod;
  kind: BeltKind;
  /** As written; at least one. */
  readings: readonly string[];
  thickness: string;
  width: string;
  instrument: Instrument;
  condition: Condition;
  unit: SizeUnit;
  /** Kept for the search that the sample came from. */
  family: string;
  shipTo: string;
};

const example: Omit<BeltSampleState, "unit" | "family" | "shipTo"> = {
  method: "lay-flat-inside",
  kind: "flat-belt",
  readings: ["261.5 mm", "262 mm", "261.5 mm"],
  thickness: "0.8 mm",
  width: "5 mm",
  instrument: "steel-rule",
  condition: "slack",
};

const oneOf = <T extends string>(all: readonly T[], text: string | null, otherwise: T): T =>
  all.find((one) => one === text) ?? otherwise;

/** Readings as they stand in one field: parted by semicolons. */
export function partReadings(text: string): string[] {
  const parts = text.split(";").map((part) => part.trim());
  return parts.filter((part) => part !== "").slice(0, sizeLimits.readings);
}

/**
 * The sample in its address: `method`, `readings` (parted by semicolons), `thickness` or `section`, `width`, `instrument`,
 * `condition`, `kind`. A search hands its own readings over as `insideCircumference`. What cannot be read falls back to the
 * worked example; lengths stay as written.
 */
export const beltSampleCodec = {
  read(params: URLSearchParams): BeltSampleState {
    const kind = oneOf(beltKinds, params.get("kind"), example.kind);
    const found = params.get("insideCircumference") ?? "";
    const handedOver = found.length <= sizeLimits.characters && !isWorkedOut(found) ? partReadings(found) : [];
    const own = partReadings((params.get("readings") ?? "").slice(0, 12 * 40));
    const readings = own.length > 0 ? own : handedOver;
    const usual = readings === handedOver && handedOver.length > 0 ? "inside-circumference" : example.method;
    const text = (name: DimensionName, otherwise: string) => {
      const written = params.get(name);
      if (params.size > 0 && written === null) return "";
      return written === null || written.length > 60 ? otherwise : written;
    };
    const country = params.get("shipTo") ?? "";
    const bare = params.size === 0;
    return {
      method: oneOf(beltSampleMethods, params.get("method"), usual),
      kind,
      readings: readings.length > 0 ? readings : example.readings,
      thickness: text(thicknessOf(kind), example.thickness),
      width: text("width", example.width),
      instrument: oneOf(instruments, params.get("instrument"), example.instrument),
      condition: oneOf(beltConditions, params.get("condition"), example.condition),
      unit: oneOf(["mm", "in"], params.get("unit"), bare ? storedUnit() : "mm"),
      family: (params.get("family") ?? "").slice(0, 80),
      shipTo: /^[A-Z]{2}$/.test(country) ? country : storedShipTo(),
    };
  },
  write({ method, kind, readings, thickness, width, instrument, condition, unit, family, shipTo }: BeltSampleState) {
    const params = new URLSearchParams({ method, kind });
    const written = readings.filter((text) => text.trim() !== "");
    params.set("readings", written.map((text) => withItsUnit(text, unit)).join("; "));
    const put = (name: string, text: string) => {
      if (text.trim() !== "") params.set(name, withItsUnit(text, unit));
    };
    put(thicknessOf(kind), thickness);
    if (kind === "flat-belt") put("width", width);
    params.set("instrument", instrument);
    params.set("condition", condition);
    if (family) params.set("family", family);
    params.set("shipTo", shipTo);
    if (unit !== "mm") params.set("unit", unit);
    return params;
  },
};
