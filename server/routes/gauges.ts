import { estimateAsNew } from "#shared/domain/asNew";
import { conformanceProbability } from "#shared/domain/conformance";
import { DomainError } from "#shared/domain/DomainError";
import { assessFit } from "#shared/domain/fit";
import { longestLengthMm, parseLength } from "#shared/domain/length";
import { rubberTolerance } from "#shared/domain/rubberTolerance";
import { AsNewAnswer, AsNewRequest } from "#shared/schemas/gauges/asNew";
import { FitAnswer, FitRequest } from "#shared/schemas/gauges/fit";
import { LengthAnswer, LengthRequest } from "#shared/schemas/gauges/length";
import {
  ConformanceAnswer,
  ConformanceRequest,
  RubberToleranceAnswer,
  RubberToleranceRequest,
} from "#shared/schemas/gauges/tolerance";
import type { Endpoint } from "../http/endpoint";
import { gauge } from "../http/gauge";

const sizes = [
  gauge(
    {
      method: "post",
      path: "/length",
      summary: "A length as people write it, in millimetres, with the resolution that the writing implies.",
      takes: LengthRequest,
      answer: LengthAnswer,
    },
    ({ text, defaultUnit }) => {
      const parsed = parseLength(text, defaultUnit);
      if (!parsed.ok) throw new DomainError("text", parsed.problem);
      return parsed;
    },
  ),
  gauge(
    {
      method: "post",
      path: "/as-new",
      summary: "From readings on an old part and its condition to its size when new, with standard uncertainties.",
      takes: AsNewRequest,
      answer: AsNewAnswer,
    },
    estimateAsNew,
  ),
];

const fits = [
  gauge(
    {
      method: "get",
      path: "/rubber-tolerance",
      summary: "What a moulder's tolerance class allows for a size (ISO 3302-1).",
      takes: RubberToleranceRequest,
      answer: RubberToleranceAnswer,
    },
    ({ class: toleranceClass, nominalMm, dimension }) => {
      if (nominalMm > longestLengthMm) throw new DomainError("nominalMm", "A nominal size is at most 10 m.");
      const { range, ...tolerance } = rubberTolerance(toleranceClass, nominalMm, dimension);
      return { ...tolerance, range: [range[0], range[1] ?? longestLengthMm] as [number, number] };
    },
  ),
  gauge(
    {
      method: "post",
      path: "/conformance",
      summary: "The probability that a measured quantity lies within its limits (JCGM 106).",
      takes: ConformanceRequest,
      answer: ConformanceAnswer,
    },
    ({ estimateMm, standardUncertaintyMm, ...band }) => ({
      probability: conformanceProbability(estimateMm, standardUncertaintyMm, band),
    }),
  ),
  gauge(
    {
      method: "post",
      path: "/fit",
      summary: "How probably a part fits what is needed, size by size, with the reasons in words.",
      takes: FitRequest,
      answer: FitAnswer,
    },
    (asked) => {
      const fit = assessFit(asked);
      if (!fit) throw new DomainError("part", "Nothing can be checked: the part states none of the sizes needed.");
      return fit;
    },
  ),
];

/** The gauge desk: the computation by hand. Every refusal of a value is a 422 in plain words with a pointer. */
export function gaugeRoutes(): Endpoint[] {
  return [...sizes, ...fits];
}
