import { assessFit, type ByDimension, type Fit } from "#shared/domain/fit";
import type { DimensionName } from "#shared/domain/partKinds";
import type { StatedSize } from "#shared/domain/partTolerance";
import type { CandidateRow } from "./loadRows";
import type { Target } from "./Target";

/** A fit and what it is reckoned against. */
export type Assessed = { fit: Fit; target: Target };

/** The sizes of a row as `assessFit` takes them; the tolerance in force is taken as stated. */
export function statedSizes({ sizes }: Pick<CandidateRow, "sizes">): ByDimension<StatedSize> {
  const stated: ByDimension<StatedSize> = {};
  for (const dimension in sizes) {
    const [nominalUm, halfWidthUm] = sizes[dimension as DimensionName]!;
    stated[dimension as DimensionName] = { nominalMm: nominalUm / 1000, plusMinusMm: halfWidthUm / 1000 };
  }
  return stated;
}

/** Negative where `a` is the better fit: the likelier, then the one with more sizes checked. */
export const compareFits = (a: Fit, b: Fit): number => b.chance - a.chance || b.coverage - a.coverage;

/** How a row fits the target that it fits best; null where none is of its kind or no size can be checked. */
export function assessRow(row: CandidateRow, targets: readonly Target[]): Assessed | null {
  let best: Assessed | null = null;
  const part = statedSizes(row);
  for (const target of targets) {
    if (target.kind !== row.kind) continue;
    const { kind, need, bands } = target;
    const fit = assessFit({ kind, need, bands, part });
    if (fit && (!best || compareFits(fit, best.fit) < 0)) best = { fit, target };
  }
  return best;
}
