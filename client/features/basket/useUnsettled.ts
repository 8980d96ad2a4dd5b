import { useCallback, useState } from "react";

/** The lines whose quantity, as written, the basket did not take: by part id, and how a line says so. */
export function useUnsettled(): [ReadonlySet<string>, (partId: string, isUnsettled: boolean) => void] {
  const [unsettled, setUnsettled] = useState<ReadonlySet<string>>(new Set());
  const tell = useCallback((partId: string, isUnsettled: boolean) => {
    setUnsettled((now) => {
      if (now.has(partId) === isUnsettled) return now;
      const next = new Set(now);
      if (isUnsettled) next.add(partId);
      else next.delete(partId);
      return next;
    });
  }, []);
  return [unsettled, tell];
}
