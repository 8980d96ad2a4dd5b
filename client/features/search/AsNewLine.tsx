import { type AsNewEstimate, estimateAsNew } from "#shared/domain/asNew";
import { conditionFacts } from "#shared/domain/conditions";
import { DomainError } from "#shared/domain/DomainError";
import { parseLength } from "#shared/domain/length";
import { type DimensionName, dimensionWords } from "#shared/domain/partKinds";
import { roundedSize, type SizeUnit } from "../../lib/formatSize";
import { type NeedValues, primaryOf } from "../../lib/needParams";
import { Disclosure } from "../../ui/Disclosure";

type Line = { name: DimensionName; estimate: AsNewEstimate };

function estimateFor({ kind, lengths, unit, instrument, condition }: NeedValues, name: DimensionName) {
  const read = parseLength(lengths[name] ?? "", unit);
  if (!read.ok) return null;
  try {
    const { mm, roundedToMm } = read;
    return estimateAsNew({
      kind,
      dimension: name,
      readingsMm: [mm],
      resolutionMm: roundedToMm,
      instrument,
      condition,
    });
  } catch (error) {
    if (error instanceof DomainError) return null;
    throw error;
  }
}

function Figure({ estimate, unit }: { estimate: AsNewEstimate; unit: SizeUnit }) {
  const { valueMm, standardUncertaintyMm } = estimate.asNew;
  return (
    <strong className="font-semibold whitespace-nowrap text-measured">
      {roundedSize(valueMm, unit)} ± {roundedSize(2 * standardUncertaintyMm, unit)}&#8201;{unit}
    </strong>
  );
}

/** How large the part was when new, worked out as it is written, and why. */
export function AsNewLine({ values, shown }: { values: NeedValues; shown: readonly DimensionName[] }) {
  const { condition, unit, kind } = values;
  if (!conditionFacts[condition].hasReadings) {
    return (
      <p className="text-soft">
        Nothing is left to measure on a {condition} part: choose the mechanism, and its register gives the sizes.
      </p>
    );
  }
  const lines: Line[] = shown.flatMap((name) => {
    const estimate = estimateFor(values, name);
    return estimate ? [{ name, estimate }] : [];
  });
  if (lines.length === 0) {
    return <p className="text-soft">Not a length yet: write it like 44.1, 44,1 mm, 1.736 in or 1-47/64.</p>;
  }
  const first = lines.find(({ name }) => name === primaryOf(kind));
  const wear = first?.estimate.budget.find(({ name }) => name === "condition");
  return (
    <div className="flex flex-wrap gap-x-6 gap-y-1 text-soft">
      {first && (
        <p>
          As new it was about <Figure estimate={first.estimate} unit={unit} />
        </p>
      )}
      {wear && <p>{wear.words}</p>}
      {lines
        .filter((line) => line !== first)
        .map(({ name, estimate }) => (
          <p key={name}>
            {dimensionWords[name]} <Figure estimate={estimate} unit={unit} />
          </p>
        ))}
      <Disclosure summary="why" className="max-w-full open:w-full">
        <ul className="grid max-w-prose gap-4 pb-2">
          {lines.map(({ name, estimate }) => (
            <li key={name}>
              <p className="font-semibold text-ink">{dimensionWords[name]}</p>
              <ul>
                {estimate.basis.map((step) => (
                  <li key={step}>{step}</li>
                ))}
              </ul>
            </li>
          ))}
        </ul>
      </Disclosure>
    </div>
  );
}
