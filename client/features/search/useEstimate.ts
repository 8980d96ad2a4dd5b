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
    const timer = setTimeout(() => {
      setParams(withParam(latest.current, "estimateMm", held.toFixed(3)), { replace: true });
      setHeld(null);
    }, pause);
    return () => clearTimeout(timer);
  }, [held, setParams]);

  return {
    movedTo: held ?? inAddress,
    move: setHeld,
    clear: () => {
      setHeld(null);
      setParams(withParam(latest.current, "estimateMm", ""), { replace: true });
    },
  };
}
