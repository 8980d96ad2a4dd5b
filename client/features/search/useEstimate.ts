import { useEffect, useRef, useState } from "react";
import { useSearchParams } from "react-router-dom";
import { withParam } from "./resultParams";

const pause = 150;

/**
 * The as-new size as moved by hand: shown at once, written into the address (in place of the last) when it comes to rest.
 * `clear` goes back to what was measured.
 */
export function useEstimate() {
  const [params, setParams] = useSearchParams();
  const written = Number(params.get("estimateMm") ?? Number.NaN);
  const inAddress = written > 0 ? written : null;
  const [held, setHeld] = useState<number | null>(null);
  const latest = useRef(params);
  latest.current = params;

  useEffect(() => {
    if (held === null) return;
    // Held until the address has caught up, so that the marker never springs back for a moment.
    const timer = setTimeout(() => {
      const rest = held.toFixed(3);
      if (latest.current.get("estimateMm") === rest) setHeld(null);
      else setParams(withParam(latest.current, "estimateMm", rest), { replace: true });
    }, pause);
    return () => clearTimeout(timer);
  }, [held, setParams]);
  useEffect(() => {
    setHeld((now) => (now !== null && inAddress !== null && now.toFixed(3) === inAddress.toFixed(3) ? null : now));
  }, [inAddress]);

  return {
    movedTo: held ?? inAddress,
    move: setHeld,
    clear: () => {
      setHeld(null);
      setParams(withParam(latest.current, "estimateMm", ""), { replace: true });
    },
  };
}
