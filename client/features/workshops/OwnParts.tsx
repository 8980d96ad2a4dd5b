import { Link } from "react-router-dom";
import { dimensionWords, kindFacts, type ListingKind, listingKinds } from "#shared/domain/partKinds";
import type { PartSummary } from "#shared/schemas/part";
import { capitalised } from "../../lib/capitalised";
import { useUnit } from "../../lib/preferences";
import { kindPlural } from "../../ui/kindPlural";
import { Money } from "../../ui/Money";
import { Notice } from "../../ui/Notice";
import { readyWords } from "../../ui/offerWords";
import { RuledHeading } from "../../ui/RuledHeading";
import { Size } from "../../ui/Size";

const primarySize = (part: PartSummary) =>
  part.kind === "rebuild-kit" ? undefined : part.dimensions[kindFacts[part.kind].primary];

/** Along the primary size, so that neighbours in size are neighbours on the page. */
const bySize = (a: PartSummary, b: PartSummary) => (primarySize(a)?.nominalMm ?? 0) - (primarySize(b)?.nominalMm ?? 0);

const headingOf = (kind: ListingKind) =>
  kind === "rebuild-kit"
    ? "Rebuild kits"
    : `${capitalised(kindPlural(kind))}, by ${dimensionWords[kindFacts[kind].primary]}`;

function PartLine({ part }: { part: PartSummary }) {
  const unit = useUnit();
  const size = primarySize(part);
  return (
    <li className="grid grid-cols-[1fr_auto] items-baseline gap-x-6 border-b border-rule py-2 sm:grid-cols-[9rem_1fr_14rem_6rem]">
      <span className="order-3 sm:order-none">
        {size && part.kind !== "rebuild-kit" && (
          <>
            <span className="sr-only">{dimensionWords[kindFacts[part.kind].primary]} </span>
            <Size mm={size.nominalMm} unit={unit} />
          </>
        )}
        {part.kind === "rebuild-kit" && `${part.kitLines.length} lines`}
      </span>
      <Link
        to={`/parts/${part.id}`}
        className="inline-flex min-h-8 items-center font-semibold no-underline hover:underline"
      >
        {part.title}
      </Link>
      <span className="order-4 text-right text-soft sm:order-none sm:text-left">{readyWords(part)}</span>
      <span className="text-right font-semibold">
        <Money minor={part.priceMinor} currency={part.currency} />
      </span>
    </li>
  );
}

/** What a workshop offers, kind by kind, along their size. */
export function OwnParts({ parts }: { parts: readonly PartSummary[] }) {
  if (parts.length === 0) {
    return (
      <div className="py-8">
        <Notice title="Nothing is on offer at present" />
      </div>
    );
  }
  const kinds: ListingKind[] = listingKinds.filter((kind) => parts.some((part) => part.kind === kind));
  return kinds.map((kind) => (
    <section key={kind}>
      <RuledHeading className="mt-8">{headingOf(kind)}</RuledHeading>
      <ul className="mt-1">
        {parts
          .filter((part) => part.kind === kind)
          .sort(bySize)
          .map((part) => (
            <PartLine key={part.id} part={part} />
          ))}
      </ul>
    </section>
  ));
}
