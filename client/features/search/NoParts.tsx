import { Link, useSearchParams } from "react-router-dom";
import { dimensionWords } from "#shared/domain/partKinds";
import type { SearchAnswer } from "#shared/schemas/search";
import { Notice } from "../../ui/Notice";
import { appliedFilters, withParam } from "./resultParams";

/** Which size rules out the most, in words; null where nothing comes near. */
export function hardestBound({ nearMisses }: Pick<SearchAnswer, "nearMisses">): string | null {
  const counts = new Map<string, number>();
  for (const { failing } of nearMisses) {
    const words = dimensionWords[failing.dimension];
    counts.set(words, (counts.get(words) ?? 0) + 1);
  }
  const [most] = [...counts].sort((a, b) => b[1] - a[1]);
  if (!most) return null;
  const [words, count] = most;
  return count === 1
    ? `One part misses by its ${words} alone; it is listed below.`
    : `The ${words} rules out the most: ${count} parts below miss by it alone.`;
}

/** Nothing fits: why, and the ways on. */
export function NoParts({ answer }: { answer: SearchAnswer }) {
  const [params] = useSearchParams();
  const { need } = answer;
  const isMeasured = need.dimensions.length > 0;
  const isWorkedOut = need.dimensions.some(({ text, asFoundMm }) => text !== null && asFoundMm === null);
  const filters = appliedFilters(params);
  const wider = [
    ...filters.map(({ name, words }) => ({ to: withParam(params, name, ""), words: `not only ${words}` })),
    ...(need.dimensions.filter(({ text }) => text !== null).length > 1
      ? need.dimensions.slice(1).map(({ dimension }) => ({
          to: withParam(params, dimension, ""),
          words: `without the ${dimensionWords[dimension]}`,
        }))
      : []),
    ...(need.family ? [{ to: withParam(params, "family", ""), words: "on any mechanism" }] : []),
    ...(need.q ? [{ to: withParam(params, "q", ""), words: `without “${need.q}”` }] : []),
  ];
  return (
    <Notice title="No part fits this as it stands">
      <p>
        {hardestBound(answer) ??
          (isMeasured
            ? "Nothing on offer comes near these sizes."
            : "Nothing on offer has these words, or words one letter away from them.")}
      </p>
      {wider.length > 0 && (
        <>
          <p className="text-soft">Look wider:</p>
          <ul className="flex flex-wrap gap-x-5 gap-y-1">
            {wider.map(({ to, words }) => (
              <li key={words}>
                <Link to={`?${to}`} className="inline-flex min-h-6 items-center">
                  {words}
                </Link>
              </li>
            ))}
          </ul>
        </>
      )}
      <p className="text-soft">
        {isWorkedOut
          ? "A worked-out size is as good as what it was worked out from: check that once more, or allow it a wider ±."
          : isMeasured
            ? "Measure once more if you can: three readings around a wheel, rubber hardly touched, written with all their digits."
            : "A size finds more than words do: measure what is left, and write it in the sentence above."}
      </p>
    </Notice>
  );
}
