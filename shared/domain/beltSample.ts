import { type Estimate, plusMinus } from "./asNew";
import type { Condition } from "./conditions";
import { DomainError } from "./DomainError";
import { type Instrument, instrumentFacts } from "./instruments";
import { formatLength } from "./length";
import { type Measurement, measure } from "./measure";
import { checkMeasurable, putBackCondition } from "./putBackCondition";
import { type Contribution, combined } from "./uncertainty";

export const beltSampleMethods = [
  "inside-circumference",
  "lay-flat-inside",
  "lay-flat-outside",
  "inside-diameter",
  "outside-circumference",
] as const;
export type BeltSampleMethod = (typeof beltSampleMethods)[number];

/** The thickest belt that is reckoned with, in mm. */
export const thickestBeltMm = 50;

type MethodFacts = {
  /** How often the reading counts in the circumference, and how often the thickness is taken off. */
  perReading: number;
  perThickness: number;
  formula: string;
};
export const beltSampleFacts: Record<BeltSampleMethod, MethodFacts> = {
  "inside-circumference": { perReading: 1, perThickness: 0, formula: "C is the reading itself" },
  "lay-flat-inside": { perReading: 2, perThickness: 0, formula: "C = 2 F, the inside of the fold there and back" },
  "lay-flat-outside": {
    perReading: 2,
    perThickness: 4,
    formula: "C = 2 (F - 2 t), since a tight fold holds the thickness once at each end",
  },
  "inside-diameter": { perReading: Math.PI, perThickness: 0, formula: "C = π d, a belt that lies round" },
  "outside-circumference": {
    perReading: 1,
    perThickness: 2 * Math.PI,
    formula: "C = L - 2 π t, since the outside of a loop is longer by that whatever its shape",
  },
};

export type BeltSampleInput = {
  method: BeltSampleMethod;
  readingsMm: readonly number[];
  thicknessMm: number;
  instrument: Instrument;
  condition: Condition;
  /** What the last place written is worth (see parseLength), where that is coarser than the instrument. */
  resolutionMm?: number;
};
type Circumference = { insideCircumferenceMm: number; standardUncertaintyMm: number };
export type BeltSample = {
  asFound: Circumference;
  asNew: Circumference;
  /** Every step in words, with its source or "common practice, no source". */
  basis: string[];
  /** The terms of asNew's uncertainty, as they count in the circumference; "condition" does not belong to asFound. */
  budget: Contribution[];
};

const mm = (length: number, decimals = 2) => formatLength(length, "mm", { decimals });
const times = (sensitivity: number) => {
  if (sensitivity === 2) return "twice";
  return sensitivity === 4 ? "4 times" : `${sensitivity > 4 ? "2π" : "π"} times`;
};
const scaled = (budget: readonly Contribution[], by: number) =>
  budget.map((term) => ({ ...term, standardUncertaintyMm: by * term.standardUncertaintyMm }));
const circumference = ({ valueMm, standardUncertaintyMm }: Estimate): Circumference => ({
  insideCircumferenceMm: valueMm,
  standardUncertaintyMm,
});

/** The thickness with its uncertainty, in mm: as by the same instrument if it has jaws, else as by a steel rule. */
function measureThickness({ thicknessMm, instrument, condition }: BeltSampleInput): [Measurement, string] {
  const { presses, withArticle } = instrumentFacts[instrument];
  const taken: Instrument = presses ? instrument : "steel-rule";
  const measurement = measure({
    readingsMm: [thicknessMm],
    instrument: taken,
    traits: { role: "section", material: "rubber", inside: false },
    condition,
  });
  const why = taken === instrument ? "" : `, since ${withArticle} cannot measure it`;
  return [measurement, `taken as measured with ${instrumentFacts[taken].withArticle}${why}`];
}

/**
 * The inside circumference of a belt as found, from any of five ways of measuring it, and as it was when new; in mm with
 * standard uncertainties.
 *
 * Shape:  C = r; laid flat, inside 2 F, over the outside 2 (F - 2 t); inside diameter π d, also read where the belt rests on
 *         a cone; around the outside L - 2 π t. Terms of a reading count by the same factor, the thickness 4 or 2 π times.
 * Limits: thickness above 0 and at most 50 where it enters, else from 0; readings as `measure`. Errors of reading and
 *         thickness are taken as independent.
 * Errors: DomainError on "condition" (as `estimateAsNew`), "readingsMm" or "readingsMm/<index>", "resolutionMm", "thicknessMm"
 *         (out of its limits, or thicker than the fold or loop that was measured).
 * Source: geometry of a closed loop (offset by t, it grows by 2 π t); JCGM 100:2008 5.1.2 for the sensitivities. What the
 *         condition took is that of `estimateAsNew`: common practice without a source.
 */
export function estimateBeltSample(input: BeltSampleInput): BeltSample {
  const { method, readingsMm, thicknessMm, instrument, condition } = input;
  const { perReading, perThickness, formula } = beltSampleFacts[method];
  checkMeasurable("flat-belt", condition);
  if (!(thicknessMm >= 0 && thicknessMm <= thickestBeltMm)) {
    throw new DomainError("thicknessMm", `A thickness is from 0 to ${thickestBeltMm} mm.`);
  }
  const found = measure({
    ...input,
    traits: { role: "loop", material: "rubber", inside: method === "inside-diameter" },
  });
  const taken = readingsMm.length === 1 ? "One reading" : `Mean of ${readingsMm.length} readings`;
  const basis = [
    `${taken} with ${instrumentFacts[instrument].withArticle}: ${plusMinus(found)} (k = 2).`,
    ...found.budget.map((term) => `${term.words}: ${mm(term.standardUncertaintyMm, 3)} (${term.source}).`),
    `Inside circumference: ${formula} (geometry).`,
  ];
  const budget = scaled(found.budget, perReading);
  if (perReading > 1)
    basis.push(`So what the reading may be off by counts ${times(perReading)} (JCGM 100:2008 5.1.2).`);

  if (perThickness > 0) {
    if (thicknessMm === 0) throw new DomainError("thicknessMm", "This way of measuring needs the belt's thickness.");
    if (perReading * found.valueMm <= perThickness * thicknessMm) {
      throw new DomainError(
        "thicknessMm",
        `A belt of ${mm(thicknessMm)} cannot measure only ${mm(found.valueMm)} this way.`,
      );
    }
    const [thickness, how] = measureThickness(input);
    const [words, source] = [`The thickness, ${how}, counts ${times(perThickness)}`, "JCGM 100:2008 5.1.2"];
    const standardUncertaintyMm = perThickness * thickness.standardUncertaintyMm;
    budget.push({ name: "thickness", standardUncertaintyMm, words, source });
    basis.push(`${words}: ${plusMinus(thickness)} (k = 2, ${source}).`);
  }

  const valueMm = perReading * found.valueMm - perThickness * thicknessMm;
  const asFound = { valueMm, standardUncertaintyMm: combined(budget) };
  basis.push(`As found ${plusMinus(asFound)} (k = 2).`);

  const change = putBackCondition("loop", condition, valueMm, "insideCircumference");
  budget.push(...change.terms);
  const asNew = { valueMm: valueMm + change.correctionMm, standardUncertaintyMm: combined(budget) };
  basis.push(change.basis, `As new ${plusMinus(asNew)} (k = 2).`);
  return { asFound: circumference(asFound), asNew: circumference(asNew), basis, budget };
}
