import { assessFit, type ByDimension, type Fit, type FitChance, fitChance } from "#shared/domain/fit";
import type { DimensionName } from "#shared/domain/partKinds";
import type { StatedSize } from "#shared/domain/partTolerance";
import type { CandidateRow } from "./loadRows";
import type { Target } from "./Target";

/** How a row fits, and what that is reckoned against. */
export type Assessed = { fit: FitChance; target: Target };
type Measured = Pick<CandidateRow, "kind" | "sizes">;

/** The sizes of a row as the computation takes them; the tolerance in force is taken as stated. */
function statedSizes({ sizes }: Measured): ByDimension<StatedSize> {
  const stated: ByDimension<StatedSize> = {};
  for (const dimension in sizes) {
    const [nominalUm, halfWidthUm] = sizes[dimension as DimensionName]!;
    stated[dimension as DimensionName] = { nominalMm: nominalUm / 1000, plusMinusMm: halfWidthUm / 1000 };
  }
  return stated;
}

/** Negative where `a` is the better fit: the likelier, then the one with more sizes checked. */
export const compareFits = (a: FitChance, b: FitChance): number => b.chance - a.chance || b.coverage - a.coverage;

/** How a row fits the target that it fits best; null where none is of its kind or no size can be checked. */
export function assessRow(row: Measured, targets: readonly Target[]): Assessed | null {
  let best: Assessed | null = null;
  const part = statedSizes(row);
  for (const target of targets) {
    if (target.kind !== row.kind) continue;
    const { kind, need, bands } = target;
    const fit = fitChance({ kind, need, bands, part });
    if (fit && (!best || compareFits(fit, best.fit) < 0)) best = { fit, target };
  }
  return best;
}

/** The same fit with its reasons in words, for the few that are shown. */
export function explainFit(row: Measured, { kind, need, bands }: Target): Fit {
  const fit = assessFit({ kind, need, bands, part: statedSizes(row) });
  if (!fit) throw new Error("what was assessed can be explained");
  return fit;
}
