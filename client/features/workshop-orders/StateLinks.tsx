import { Link } from "react-router-dom";
import { openParcelStates, parcelStates } from "#shared/domain/parcelState";
import type { WorkshopParcelList, WorkshopParcelQuery } from "#shared/schemas/workshopParcel";
import { workshopParcelWords } from "./parcelWords";

type Props = { shown: WorkshopParcelQuery["state"]; counts: WorkshopParcelList["counts"] };

/** The states that a workshop has parcels in, with how many: each shows its own. */
export function StateLinks({ shown, counts }: Props) {
  const open = openParcelStates.reduce((sum, state) => sum + (counts[state] ?? 0), 0);
  const links = [
    { state: "open" as const, name: "Still to leave", count: open },
    ...parcelStates.flatMap((state) => {
      const count = counts[state] ?? 0;
      return count > 0 || state === shown ? [{ state, name: workshopParcelWords[state].name, count }] : [];
    }),
  ];
  return (
    <nav aria-label="Parcels by state" className="flex flex-wrap gap-x-6">
      {links.map(({ state, name, count }) => (
        <Link
          key={state}
          to={state === "open" ? "/workshop/orders" : `/workshop/orders?state=${state}`}
          aria-current={state === shown ? "page" : undefined}
          className="inline-flex min-h-11 items-center gap-2 border-b-2 border-transparent no-underline hover:border-rule aria-[current=page]:border-ink aria-[current=page]:font-semibold"
        >
          {name} <span className="text-soft">{count}</span>
        </Link>
      ))}
    </nav>
  );
}
