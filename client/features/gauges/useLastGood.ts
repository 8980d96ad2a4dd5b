import { useRef } from "react";

/** The value, or while there is none the last one that there was, so that a picture stays while its field is mended. */
export function useLastGood<T>(value: T | null): { good: T | null; isStale: boolean } {
  const last = useRef(value);
  if (value !== null) last.current = value;
  return { good: last.current, isStale: value === null };
}
