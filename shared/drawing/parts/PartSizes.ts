import type { DimensionName } from "#shared/domain/partKinds";
import type { StatedSize } from "../dimensionText";
import type { LineRole } from "../Scene";

export type StatedDimensions = Partial<Record<DimensionName, StatedSize>>;
export type MeasuredDimensions = Partial<Record<DimensionName, number>>;

/**
 * The sizes that a part is drawn with, in mm: what the workshop states, else what was measured on the old part,
 * else a plausible proportion. A size that is not a positive number counts as not known.
 */
export class PartSizes {
  constructor(
    readonly stated: StatedDimensions,
    readonly measured: MeasuredDimensions,
  ) {}

  known(name: DimensionName): number | undefined {
    return usable(this.stated[name]?.nominalMm) ?? this.found(name);
  }

  found(name: DimensionName): number | undefined {
    return usable(this.measured[name]);
  }

  or(name: DimensionName, proportion: number): number {
    return this.known(name) ?? proportion;
  }

  /** How an edge set by this dimension is drawn. */
  role(name: DimensionName): LineRole {
    return usable(this.stated[name]?.nominalMm) === undefined ? "presumed" : "outline";
  }
}

function usable(mm: number | undefined): number | undefined {
  return mm !== undefined && Number.isFinite(mm) && mm > 0 ? mm : undefined;
}
