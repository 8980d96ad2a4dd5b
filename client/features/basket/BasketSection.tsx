import type { BasketLine } from "#shared/schemas/basket";
import { dispatchWords } from "../../lib/formatDate";
import type { ComparedScale } from "../../ui/drawing/comparedScale";
import { BasketRow } from "./BasketRow";
import { ParcelHeading } from "./ParcelHeading";
import { ParcelSums } from "./ParcelSums";
import { RemovedRow } from "./RemovedRow";
import type { Section } from "./withRemoved";

export const parcelId = (workshopId: string): string => `parcel-${workshopId}`;

type Props = {
  section: Section;
  /** "Parcel 1 of 2". */
  label: string;
  shipTo: string;
  currency: string;
  scale: ComparedScale;
  onRemove: (line: BasketLine, index: number) => void;
  onUnsettled: (partId: string, isUnsettled: boolean) => void;
};

/** What one workshop packs into one parcel. */
export function BasketSection({ section, label, shipTo, currency, scale, onRemove, onUnsettled }: Props) {
  const { workshop, parcel, entries } = section;
  return (
    <section id={parcelId(workshop.id)}>
      <ParcelHeading
        label={parcel ? label : "No parcel now"}
        workshop={workshop}
        {...(parcel ? { aside: dispatchWords(parcel.leavesInDays) } : {})}
      />
      {parcel?.problem && (
        <p className="mt-2 max-w-prose">
          <span className="font-semibold text-outband">{parcel.problem}.</span> Choose another country, or remove what
          comes from this workshop.
        </p>
      )}
      <ul className="mt-1 border-t border-transparent">
        {entries.map(({ line, isRemoved }, index) =>
          isRemoved ? (
            <RemovedRow key={`removed-${line.part.id}`} line={line} shipTo={shipTo} />
          ) : (
            <BasketRow
              key={line.part.id}
              line={line}
              shipTo={shipTo}
              scale={scale}
              onRemove={() => onRemove(line, index)}
              onUnsettled={onUnsettled}
            />
          ),
        )}
      </ul>
      {parcel && <ParcelSums parcel={parcel} currency={currency} label="This parcel" />}
    </section>
  );
}
