import type { AcceptedBand } from "#shared/domain/acceptedBands";
import type { Estimate } from "#shared/domain/asNew";
import type { ByDimension } from "#shared/domain/fit";
import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import type { NeedDimension } from "#shared/schemas/need";

/** One thing that would do: a kind of part and its sizes, for one service point or for none in particular. */
export type Target = {
  kind: PartKind;
  /** The service point whose register is used; null where common practice gives the bands. */
  point: { id: string; name: string } | null;
  /** In the canonical order of the kind. */
  dimensions: readonly NeedDimension[];
  /** The same sizes as `assessFit` takes them. */
  need: ByDimension<Estimate>;
  bands: ByDimension<AcceptedBand>;
};

export function targetOf(kind: PartKind, point: Target["point"], dimensions: readonly NeedDimension[]): Target {
  const need: Target["need"] = {};
  const bands: Target["bands"] = {};
  for (const size of dimensions) {
    need[size.dimension] = { valueMm: size.asNewMm, standardUncertaintyMm: size.standardUncertaintyMm };
    bands[size.dimension] = { lowerMm: size.lowerMm, upperMm: size.upperMm };
  }
  return { kind, point, dimensions, need, bands };
}

/** Every dimension that one of the targets asks for. */
export const dimensionsIn = (targets: readonly Target[]): DimensionName[] => [
  ...new Set(targets.flatMap((target) => target.dimensions.map(({ dimension }) => dimension))),
];
