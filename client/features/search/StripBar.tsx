import { Link, useLocation, useSearchParams } from "react-router-dom";
import { needOnly, needParams, readNeed } from "../../lib/needParams";
import { useShipTo, useUnit } from "../../lib/preferences";
import { MeasureStrip, type StripLook } from "./MeasureStrip";

const looks: Record<string, StripLook> = { "": "large", find: "plain" };

/** What a row of the results tells the page of its part: the way back. */
export type FromResults = { backTo: string; total: number };

function BackToResults() {
  const { state, search } = useLocation();
  const from = state as FromResults | null;
  const need = needOnly(new URLSearchParams(search));
  if (!from && !need.has("kind")) return null;
  const words = from ? `back to ${from.total === 1 ? "1 part" : `${from.total} parts`}` : "all parts of this size";
  return (
    <Link to={from ? from.backTo : `/find?${need}`} className="inline-flex min-h-8 items-center">
      {words}
    </Link>
  );
}

/** The measure strip at the head of a public page, filled from its address. */
export function StripBar() {
  const { pathname } = useLocation();
  const [params] = useSearchParams();
  const defaults = { shipTo: useShipTo(), unit: useUnit() };
  const [, place = "", name = ""] = pathname.split("/");
  const isPart = place === "parts";
  const read = readNeed(params, defaults);
  const initial = place === "families" && name ? { ...read, family: name } : read;
  // Another need in the address is another sentence; what is typed meanwhile stays as long as the address does.
  return (
    <MeasureStrip
      key={`${place}?${needParams(initial)}`}
      initial={initial}
      look={looks[place] ?? "compact"}
      action={isPart ? pathname : "/find"}
      submitWords={isPart ? "Check" : "Find"}
      aside={isPart && <BackToResults />}
    />
  );
}
