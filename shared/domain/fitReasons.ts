import { conformanceProbability } from "./conformance";
import { formatLength } from "./length";
import { type DimensionName, dimensionWords } from "./partKinds";
import { verdictThresholds } from "./verdict";

type CheckedSize = {
  dimension: DimensionName;
  chance: number;
  deviationMm: number;
  combinedUncertaintyMm: number;
  lowerMm: number;
  upperMm: number;
};

/** What a size is called that lies below, and above, what is wanted. */
const senses: Record<DimensionName, readonly [below: string, above: string]> = {
  outsideDiameter: ["small", "large"],
  bore: ["tight", "loose"],
  treadWidth: ["narrow", "wide"],
  overallHeight: ["short", "tall"],
  secondTreadDiameter: ["small", "large"],
  insideCircumference: ["tight", "loose"],
  width: ["narrow", "wide"],
  thickness: ["thin", "thick"],
  section: ["thin", "thick"],
  insideDiameter: ["tight", "loose"],
  grooveDiameter: ["small", "large"],
  grooveWidth: ["narrow", "wide"],
  height: ["short", "tall"],
  length: ["short", "long"],
};
const mm = (length: number) => formatLength(Math.abs(length), "mm");
const senseOf = (dimension: DimensionName, difference: number) => senses[dimension][difference < 0 ? 0 : 1];

/** How far a size lies outside its band: negative below it, positive above, 0 inside. */
function excessOf(nominalMm: number, { lowerMm, upperMm }: CheckedSize): number {
  return Math.min(nominalMm - lowerMm, 0) + Math.max(nominalMm - upperMm, 0);
}

function outside(size: CheckedSize, excessMm: number, neededMm: number | undefined): string {
  const { dimension, deviationMm } = size;
  const sense = senseOf(dimension, excessMm);
  if (neededMm === undefined || Math.sign(deviationMm) !== Math.sign(excessMm)) {
    return `is ${mm(excessMm)} too ${sense} for what is accepted here`;
  }
  if (dimension === "bore") return `is ${mm(deviationMm)} ${sense} for a ${mm(neededMm)} spindle`;
  if (dimension === "insideCircumference") return `is ${mm(deviationMm)} too ${sense} for the ${mm(neededMm)} needed`;
  return `is ${mm(deviationMm)} too ${sense}`;
}

/** Why one dimension has the chance it has: a clause without a capital or full stop, beginning with its name. */
export function dimensionReason(size: CheckedSize, nominalMm: number, neededMm: number | undefined): string {
  const { dimension, chance, deviationMm, combinedUncertaintyMm, lowerMm, upperMm } = size;
  const name = dimensionWords[dimension];
  const excessMm = excessOf(nominalMm, size);
  if (excessMm !== 0) return `${name} ${outside(size, excessMm, neededMm)}`;

  const exact = Math.abs(deviationMm) < 0.005;
  const middle = neededMm === undefined ? "in the middle of what is accepted" : "just what is needed";
  const apart = neededMm === undefined ? " from the middle" : "";
  const offset = exact ? middle : `${mm(deviationMm)} ${senseOf(dimension, deviationMm)}${apart}`;
  if (chance >= verdictThresholds.sure) return `${name} is ${offset}${exact ? "" : ", well inside what is accepted"}`;

  const best = conformanceProbability((lowerMm + upperMm) / 2, combinedUncertaintyMm, { lowerMm, upperMm });
  if (best < verdictThresholds.sure) {
    return `${name} is ${offset}, but known only to ± ${mm(2 * combinedUncertaintyMm)} where ${mm(upperMm - lowerMm)} in all is accepted`;
  }
  return `${name} is ${offset}, near the limit of what is accepted`;
}

const capitalised = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);
const listed = (names: readonly DimensionName[]) =>
  names
    .map((name) => dimensionWords[name])
    .join(", ")
    .replace(/, ([^,]*)$/, " and $1");

function limitSentence(chance: number, checked: readonly (CheckedSize & { reason: string })[]): string {
  const worstFirst = [...checked].sort((a, b) => a.chance - b.chance);
  const limiting = worstFirst.filter((size) => size.chance < verdictThresholds.sure);
  if (limiting.length > 0) {
    const clauses = limiting.slice(0, 2).map(({ reason }) => reason);
    return `${capitalised(clauses.join(", and "))}.`;
  }
  const worst = dimensionWords[worstFirst[0]!.dimension];
  const all = checked.length === 2 ? "Both sizes" : `All ${checked.length} sizes`;
  if (chance < verdictThresholds.sure) return `${all} are inside what is accepted; the ${worst} is the least certain.`;
  return checked.length === 1
    ? `The ${worst} sits well inside what is accepted.`
    : `${all} sit well inside what is accepted.`;
}

/** The whole fit in a sentence or two: what limits it, at most two sizes, then what could not be checked. */
export function fitReason(
  chance: number,
  checked: readonly (CheckedSize & { reason: string })[],
  { unmeasured, unstated }: { unmeasured: readonly DimensionName[]; unstated: readonly DimensionName[] },
): string {
  const sentences = [limitSentence(chance, checked)];
  if (unmeasured.length > 0) sentences.push(`Not measured: ${listed(unmeasured)}.`);
  if (unstated.length > 0) sentences.push(`Not stated by the workshop: ${listed(unstated)}.`);
  return sentences.join(" ");
}
