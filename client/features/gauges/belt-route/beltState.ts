import type { Pulley } from "#shared/domain/beltRoute";
import type { SizeUnit } from "../../../lib/formatSize";

export const beltKinds = ["flat-belt", "square-belt", "round-belt"] as const;
export type BeltKind = (typeof beltKinds)[number];

/** A pulley with a number of its own, which it keeps when the order changes. */
export type NamedPulley = Pulley & { id: number; name: string };

/** The page: places and diameters in mm, the sizes of the belt as they were written. */
export type BeltState = {
  pulleys: readonly NamedPulley[];
  kind: BeltKind;
  /** Between the pulley and the outside: thickness of a flat belt, section of a square or round one. */
  thickness: string;
  /** Of a flat belt; it plays no part here, and is handed on to the search. */
  width: string;
  /** Percent. */
  stretch: { min: string; max: string };
  /** Whether the stretch is counted on the inside of the belt rather than along its middle. */
  isInsideStretch: boolean;
  /** What the search knew already, and gets back. */
  handedOn: { family?: string; shipTo?: string; unit?: SizeUnit };
};

/** The dimension of the kind that `thickness` is. */
export const thicknessName = (kind: BeltKind): "thickness" | "section" =>
  kind === "flat-belt" ? "thickness" : "section";

/** Number `i` as people call it. */
export const pulleyName = ({ name }: { name: string }, index: number): string => name.trim() || `Pulley ${index + 1}`;
