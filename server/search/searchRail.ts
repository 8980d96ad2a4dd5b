import { kindFacts } from "#shared/domain/partKinds";
import { verdictOf } from "#shared/domain/verdict";
import type { Need, NeedDimension } from "#shared/schemas/need";
import type { Rail, RailTick } from "#shared/schemas/search";
import type { Ranked } from "./rankCandidates";

const mostTicks = 60;
/** Places kept for parts that do not fit, so that the rail shows what lies on both sides. */
const keptForUnfit = 16;
/** Left free at both ends, so that nothing stands at the very edge. */
const marginShare = 0.04;

/** The size that the rail runs along: the primary one, else the first that is known. Null where several kinds are searched. */
export function railSizeOf({ kind, dimensions }: Need): NeedDimension | null {
  if (!kind) return null;
  return dimensions.find(({ dimension }) => dimension === kindFacts[kind].primary) ?? dimensions[0] ?? null;
}

function tickOf({ row, assessed }: Ranked, { kind }: Need, { dimension }: NeedDimension): RailTick | null {
  const size = row.sizes[dimension];
  if (!size || !assessed || row.kind !== kind) return null;
  const [nominalUm, halfWidthUm] = size;
  return {
    partId: row.partId,
    title: row.title,
    nominalMm: nominalUm / 1000,
    plusMinusMm: halfWidthUm / 1000,
    verdict: verdictOf(assessed.fit.chance),
  };
}

/** The largest of 1, 2, 5 x 10^n that parts a length into at least ten: what a ruler of that length is marked in. */
function neatStep(lengthMm: number): number {
  const tenth = Math.max(lengthMm, 0.01) / 10;
  const power = 10 ** Math.floor(Math.log10(tenth));
  return ([5, 2, 1].find((step) => step * power <= tenth) ?? 1) * power;
}

/** Rounded to a step without the tail that floating point leaves. */
const toStep = (mm: number, step: number, round: (value: number) => number) =>
  Number((round(mm / step) * step).toFixed(6));

/**
 * The ruler across the results: the band, the estimate with twice its uncertainty, and the parts nearest to it, at most 60.
 * `missing` are parts that do not fit but lie near; its ends are rounded outwards to neat numbers.
 */
export function searchRail(need: Need, fitting: readonly Ranked[], missing: readonly Ranked[]): Rail | null {
  const size = railSizeOf(need);
  if (!size) return null;
  const nearest = (candidates: readonly Ranked[], most: number) =>
    candidates
      .flatMap((candidate) => tickOf(candidate, need, size) ?? [])
      .sort((a, b) => Math.abs(a.nominalMm - size.asNewMm) - Math.abs(b.nominalMm - size.asNewMm))
      .slice(0, most);
  const unfit = nearest(missing, mostTicks);
  const fit = nearest(fitting, mostTicks - Math.min(unfit.length, keptForUnfit));
  const ticks = [...fit, ...unfit.slice(0, mostTicks - fit.length)].sort((a, b) => a.nominalMm - b.nominalMm);

  const uncertain = 2 * size.standardUncertaintyMm;
  const lowest = Math.min(
    size.lowerMm,
    size.asNewMm - uncertain,
    ...ticks.map(({ nominalMm, plusMinusMm }) => nominalMm - plusMinusMm),
  );
  const highest = Math.max(
    size.upperMm,
    size.asNewMm + uncertain,
    ...ticks.map(({ nominalMm, plusMinusMm }) => nominalMm + plusMinusMm),
  );
  const margin = (highest - lowest) * marginShare;
  const step = neatStep(highest - lowest);
  return {
    dimension: size.dimension,
    fromMm: Math.max(0, toStep(lowest - margin, step, Math.floor)),
    toMm: toStep(highest + margin, step, Math.ceil),
    ticks,
  };
}
