import { useCallback, useEffect, useRef, useState } from "react";
import { useSearchParams } from "react-router-dom";

const settleMs = 250;

type Codec<T> = {
  /** Lenient: what is missing or cannot be read falls back to the worked example of the gauge. */
  read: (params: URLSearchParams) => T;
  write: (state: T) => URLSearchParams;
};
type Change<T> = T | ((now: T) => T);

/**
 * The state of a gauge, kept in the address.
 *
 * The state changes at once; the address follows when it has been still for a quarter of a second, in place, so that "back"
 * leaves the gauge instead of walking through every move. An address that changes from outside is read again.
 * `codec` must not change between renders.
 */
export function useGaugeState<T>(codec: Codec<T>): [T, (change: Change<T>) => void] {
  const [params, setParams] = useSearchParams();
  const [state, setState] = useState(() => codec.read(params));
  const written = useRef(params.toString());
  const timer = useRef<number | undefined>(undefined);

  useEffect(() => {
    const address = params.toString();
    if (address === written.current) return;
    written.current = address;
    window.clearTimeout(timer.current);
    setState(codec.read(params));
  }, [params, codec]);

  const latestSet = useRef(setParams);
  latestSet.current = setParams;
  const change = useCallback((next: Change<T>) => setState(next), []);

  const isFirst = useRef(true);
  useEffect(() => {
    if (isFirst.current) {
      isFirst.current = false;
      return;
    }
    const next = codec.write(state);
    if (next.toString() === written.current) return;
    timer.current = window.setTimeout(() => {
      written.current = next.toString();
      latestSet.current(next, { replace: true, preventScrollReset: true });
    }, settleMs);
    return () => window.clearTimeout(timer.current);
  }, [state, codec]);

  return [state, change];
}
