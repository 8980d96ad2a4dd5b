import { Link } from "react-router-dom";
import type { WorkshopParcelSummary } from "#shared/schemas/workshopParcel";
import { dueOf, workshopParcelWords } from "./parcelWords";

/** One parcel: whose, where it stands and what to do next, what is in it, by when it leaves. */
export function ParcelRow({ parcel }: { parcel: WorkshopParcelSummary }) {
  const { id, orderNumber, state, recipient, town, countryName, pieces, titles } = parcel;
  const { name, next } = workshopParcelWords[state];
  const due = dueOf(parcel, new Date());
  return (
    <li className="relative grid gap-x-6 gap-y-2 border-b border-rule py-4 hover:bg-sheet md:grid-cols-[14rem_minmax(0,1fr)_minmax(0,1fr)]">
      <div>
        <h2 className="text-base font-semibold">
          <Link to={`/workshop/orders/${id}`} className="inline-block min-h-6 after:absolute after:inset-0">
            {orderNumber}
          </Link>
        </h2>
        <p>{recipient}</p>
        <p className="text-soft">
          {town}, {countryName}
        </p>
      </div>
      <div>
        <p className="font-semibold">{name}</p>
        <p>{next}</p>
        {due && <p className={due.isLate ? "font-semibold text-outband" : "text-soft"}>{due.words}</p>}
      </div>
      <p>
        {titles.join("; ")}
        <span className="block text-soft">{pieces === 1 ? "1 piece" : `${pieces} pieces`}</span>
      </p>
    </li>
  );
}
