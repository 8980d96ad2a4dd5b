import { type AcceptedBand, defaultBand } from "./acceptedBands";
import type { Estimate } from "./asNew";
import { conformanceProbability } from "./conformance";
import { DomainError } from "./DomainError";
import { dimensionReason, fitReason } from "./fitReasons";
import { longestLengthMm } from "./length";
import { type DimensionName, dimensionsOf, dimensionWords, kindFacts, type PartKind } from "./partKinds";
import { partTolerance, type StatedSize } from "./partTolerance";
import { rectangular, rootSumSquare } from "./uncertainty";
import { type Verdict, verdictOf } from "./verdict";

export type ByDimension<T> = Partial<Record<DimensionName, T>>;
export type FitInput = {
  kind: PartKind;
  /** What is needed, as new. */
  need: ByDimension<Estimate>;
  part: ByDimension<StatedSize>;
  /** What the service point accepts, where that is known. */
  bands?: ByDimension<AcceptedBand>;
};
export type SizeChance = AcceptedBand & {
  dimension: DimensionName;
  chance: number;
  /** Nominal less need; where only a band is known, less the middle of the band. */
  deviationMm: number;
  combinedUncertaintyMm: number;
};
export type FitChance = {
  chance: number;
  coverage: number;
  dimensions: SizeChance[];
  /** Sizes that matter and could not be checked. */
  unchecked: DimensionName[];
};
export type DimensionFit = SizeChance & { reason: string };
export type Fit = { chance: number; verdict: Verdict; coverage: number; dimensions: DimensionFit[]; reason: string };

const isSize = (value: number) => value > 0 && value <= longestLengthMm;
const isSpread = (value: number) => value >= 0 && value <= longestLengthMm;
const isPlace = (value: number) => Math.abs(value) <= longestLengthMm;

function checkInput({ kind, need, part, bands = {} }: FitInput) {
  for (const [group, sizes] of Object.entries({ need, part, bands })) {
    const stranger = (Object.keys(sizes) as DimensionName[]).find((name) => !dimensionsOf(kind).includes(name));
    if (!stranger) continue;
    const words = `The ${kindFacts[kind].name} has no ${dimensionWords[stranger] ?? stranger}.`;
    throw new DomainError(`${group}/${stranger}`, words);
  }
  const demand = (holds: boolean, field: string, words: string) => {
    if (!holds) throw new DomainError(field, words);
  };
  for (const dimension of dimensionsOf(kind)) {
    const [needed, stated, band] = [need[dimension], part[dimension], bands[dimension]];
    if (needed) {
      demand(isSize(needed.valueMm), `need/${dimension}/valueMm`, "A size is more than 0 and at most 10 m.");
      const field = `need/${dimension}/standardUncertaintyMm`;
      demand(isSpread(needed.standardUncertaintyMm), field, "An uncertainty is 0 to 10 m.");
    }
    if (stated) {
      demand(isSize(stated.nominalMm), `part/${dimension}/nominalMm`, "A size is more than 0 and at most 10 m.");
      demand(isSpread(stated.plusMinusMm ?? 0), `part/${dimension}/plusMinusMm`, "A tolerance is 0 to 10 m.");
    }
    if (band) {
      const { lowerMm, upperMm } = band;
      demand(isPlace(lowerMm), `bands/${dimension}/lowerMm`, "A limit lies at most 10 m either way.");
      demand(isPlace(upperMm), `bands/${dimension}/upperMm`, "A limit lies at most 10 m either way.");
      demand(lowerMm <= upperMm, `bands/${dimension}/lowerMm`, "The lower limit must not lie above the upper one.");
    }
  }
}

function sizeChance(dimension: DimensionName, { kind, need, part, bands = {} }: FitInput): SizeChance | undefined {
  const needed = need[dimension];
  const stated = part[dimension];
  const band = bands[dimension] ?? (needed && defaultBand(kind, dimension, needed.valueMm));
  if (!stated || !band) return undefined;
  const { lowerMm, upperMm } = band;
  const { nominalMm } = stated;
  const { plusMinusMm } = partTolerance(stated);
  const combinedUncertaintyMm = rootSumSquare([needed?.standardUncertaintyMm ?? 0, rectangular(plusMinusMm)]);
  return {
    dimension,
    chance: conformanceProbability(nominalMm, combinedUncertaintyMm, band),
    deviationMm: nominalMm - (needed?.valueMm ?? (lowerMm + upperMm) / 2),
    combinedUncertaintyMm,
    lowerMm,
    upperMm,
  };
}

/**
 * The figures of `assessFit` without its words, for ranking many parts: same shape, errors and source.
 */
export function fitChance(input: FitInput): FitChance | null {
  checkInput(input);
  const { kind, need, bands = {} } = input;
  const dimensions = dimensionsOf(kind).flatMap((dimension) => sizeChance(dimension, input) ?? []);
  if (dimensions.length === 0) return null;
  const asked = kindFacts[kind].optional.filter((dimension) => need[dimension] || bands[dimension]);
  const matters = [...kindFacts[kind].matters, ...asked];
  return {
    chance: dimensions.reduce((product, { chance }) => product * chance, 1),
    coverage: dimensions.length / matters.length,
    dimensions,
    unchecked: matters.filter((name) => !dimensions.some(({ dimension }) => dimension === name)),
  };
}

/**
 * How probably a part fits: per dimension the chance that it lies in what is accepted, and overall their product.
 *
 * Shape:    a dimension is checked where the part states it and either a need or a band is known. Its band is the service
 *           point's, else the default one around the need. Coverage is checked / those that matter for the kind, optional
 *           ones mattering where they are asked for. Null where nothing can be checked.
 * Units:    mm; chances 0 to 1, assuming independent dimensions.
 * Errors:   DomainError with a path such as "need/bore/valueMm" for a dimension not of the kind or a size out of range.
 * Source:   JCGM 106:2012 7.4, with u^2 = u_need^2 + (plusMinus / sqrt 3)^2 (JCGM 100:2008 4.3.7, 5.1.2).
 */
export function assessFit(input: FitInput): Fit | null {
  const found = fitChance(input);
  if (!found) return null;
  const { need, part, bands = {} } = input;
  const { chance, coverage, unchecked } = found;
  const dimensions = found.dimensions.map((size) => ({
    ...size,
    reason: dimensionReason(size, part[size.dimension]!.nominalMm, need[size.dimension]?.valueMm),
  }));
  return {
    chance,
    verdict: verdictOf(chance),
    coverage,
    dimensions,
    reason: fitReason(chance, dimensions, {
      unmeasured: unchecked.filter((name) => !need[name] && !bands[name]),
      unstated: unchecked.filter((name) => need[name] || bands[name]),
    }),
  };
}
