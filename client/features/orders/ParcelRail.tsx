import type { ParcelState } from "#shared/domain/parcelState";
import { parcelStateWords, stationsOf } from "./orderWords";

/** A parcel's way as a rail: its stations in order, a pointer at the one where it is. In words alone where it left the way. */
export function ParcelRail({ state }: { state: ParcelState }) {
  const stations = stationsOf(state);
  const { name, next } = parcelStateWords[state];
  const at = stations?.indexOf(state) ?? -1;
  return (
    <div className="grid gap-3">
      {stations && (
        <ol aria-label="Its way" className="flex pt-3">
          {stations.map((station, index) => (
            <li
              key={station}
              aria-current={index === at ? "step" : undefined}
              className={`relative flex-1 border-t-2 pt-3 pr-1 text-small leading-tight ${index < at ? "border-ink" : "border-rule"} ${index === at ? "font-bold" : "text-soft"} last:flex-none last:border-transparent`}
            >
              <span
                aria-hidden="true"
                className={`absolute -top-[7px] left-0 w-px ${index === at ? "h-3 bg-measured" : "h-3 bg-edge"}`}
              />
              {index === at && (
                <svg
                  aria-hidden="true"
                  width="13"
                  height="11"
                  viewBox="0 0 13 11"
                  className="absolute -top-[17px] -left-1.5 text-measured"
                >
                  <path d="M0 0H13V5L6.5 11L0 5Z" fill="currentColor" />
                </svg>
              )}
              <span className={index === at ? "" : "max-sm:sr-only"}>{parcelStateWords[station].name}</span>
            </li>
          ))}
        </ol>
      )}
      <p>
        {!stations && <strong className="font-semibold">{name}. </strong>}
        {next}
      </p>
    </div>
  );
}
