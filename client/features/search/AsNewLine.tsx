import { DomainError } from "#shared/domain/DomainError";
import { parseSize } from "#shared/domain/parseSize";
import { type DimensionName, dimensionWords } from "#shared/domain/partKinds";
import { type SizeAsNew, sizeAsNew } from "#shared/domain/sizeAsNew";
import type { WrittenSize } from "#shared/domain/writtenSize";
import { roundedSize, type SizeUnit } from "../../lib/formatSize";
import { type NeedValues, primaryOf } from "../../lib/needParams";
import { Disclosure } from "../../ui/Disclosure";

type Line = { name: DimensionName; size: WrittenSize; estimate: SizeAsNew };

function lineFor({ kind, lengths, unit, instrument, condition }: NeedValues, name: DimensionName): Line[] {
  const size = parseSize(lengths[name] ?? "", unit);
  if (!size.ok) return [];
  try {
    return [{ name, size, estimate: sizeAsNew(size, { kind, dimension: name, instrument, condition }) }];
  } catch (error) {
    if (error instanceof DomainError) return [];
    throw error;
  }
}

function Figure({ estimate, unit }: { estimate: SizeAsNew; unit: SizeUnit }) {
  const { valueMm, standardUncertaintyMm } = estimate.asNew;
  return (
    <strong className="font-semibold whitespace-nowrap text-measured">
      {roundedSize(valueMm, unit)} ± {roundedSize(2 * standardUncertaintyMm, unit)}&#8201;{unit}
    </strong>
  );
}

/** "Flat spot: the readings differ by 0.30 mm." Where the readings show none, nothing. */
function flatSpotWords({ size, estimate }: Line, unit: SizeUnit): string | null {
  if (!estimate.flatSpot || !("readingsMm" in size) || size.readingsMm.length < 3) return null;
  const range = Math.max(...size.readingsMm) - Math.min(...size.readingsMm);
  return `Flat spot: the readings differ by ${roundedSize(range, unit)} ${unit}`;
}

/** How large the part was when new, worked out as it is written, and why. */
export function AsNewLine({ values, shown }: { values: NeedValues; shown: readonly DimensionName[] }) {
  const { unit, kind } = values;
  const lines = shown.flatMap((name) => lineFor(values, name));
  if (lines.length === 0) {
    return <p className="text-soft">Not a length yet: write it like 44.1, 44,1 mm, 1.736 in or 1-47/64.</p>;
  }
  const measured = lines.filter(({ size }) => "readingsMm" in size);
  const first = measured.find(({ name }) => name === primaryOf(kind));
  const wear = first?.estimate.budget.find(({ name }) => name === "condition");
  const flatSpots = measured.flatMap((line) => flatSpotWords(line, unit) ?? []);
  return (
    <div className="flex flex-wrap gap-x-6 gap-y-1 text-soft">
      {first && (
        <p>
          As new it was about <Figure estimate={first.estimate} unit={unit} />
        </p>
      )}
      {flatSpots.map((words) => (
        <p key={words}>{words}</p>
      ))}
      {wear && <p>{wear.words}</p>}
      {measured
        .filter((line) => line !== first)
        .map(({ name, estimate }) => (
          <p key={name}>
            {dimensionWords[name]} <Figure estimate={estimate} unit={unit} />
          </p>
        ))}
      {measured.length < lines.length && <p>What was worked out is taken as it stands, without correction</p>}
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
