import { Link } from "react-router-dom";
import type { WorkshopSummary } from "#shared/schemas/part";
import { RuledHeading } from "../../ui/RuledHeading";

type Props = {
  label: string;
  workshop: WorkshopSummary;
  /** After the place: when it leaves. */
  aside?: string;
  level?: 2 | 3;
};

/** Which parcel, from whom, from where. */
export function ParcelHeading({ label, workshop, aside, level = 2 }: Props) {
  return (
    <>
      <RuledHeading level={level}>
        {label}
        <span className="sr-only"> from {workshop.name}</span>
      </RuledHeading>
      <p className="mt-2 text-soft">
        <Link to={`/workshops/${workshop.slug}`} className="font-semibold text-ink">
          {workshop.name}
        </Link>
        , {workshop.town}, {workshop.countryName}
        {aside && `; ${aside}`}
      </p>
    </>
  );
}
