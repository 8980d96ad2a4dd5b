import { useLocation, useSearchParams } from "react-router-dom";
import { needParams, readNeed } from "../../lib/needParams";
import { useShipTo, useUnit } from "../../lib/preferences";
import { MeasureStrip, type StripLook } from "./MeasureStrip";

const looks: Record<string, StripLook> = { "": "large", find: "plain", parts: "compact" };

/** The measure strip at the head of a public page, filled from its address. */
export function StripBar() {
  const { pathname } = useLocation();
  const [params] = useSearchParams();
  const defaults = { shipTo: useShipTo(), unit: useUnit() };
  const initial = readNeed(params, defaults);
  const look = looks[pathname.split("/")[1] ?? ""] ?? "plain";
  const onPart = look === "compact";
  // Another need in the address is another sentence; what is typed meanwhile stays as long as the address does.
  return (
    <MeasureStrip
      key={`${look}?${needParams(initial)}`}
      initial={initial}
      look={look}
      action={onPart ? pathname : "/find"}
      submitWords={onPart ? "Check" : "Find"}
    />
  );
}
