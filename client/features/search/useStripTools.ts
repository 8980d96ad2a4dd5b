import { use, useEffect, useState } from "react";
import type { stripTools } from "./stripTools";

export type StripTools = typeof stripTools;

let tools: StripTools | undefined;
let fetching: Promise<StripTools | undefined> | undefined;

/** Fetches what reads sizes, once; undefined where it cannot be had, and the server alone says what it read. */
export function fetchStripTools(): Promise<StripTools | undefined> {
  fetching ??= import("./stripTools").then(
    (found) => {
      tools = found.stripTools;
      return tools;
    },
    () => undefined,
  );
  return fetching;
}

/**
 * What reads sizes and says what follows from them. The first page does without it until somebody begins to write
 * (`fetchTools`); a strip that opens with something to say waits for it, so that nothing moves when it is said.
 */
export function useStripTools(isNeeded: boolean) {
  const [isAwaited] = useState(isNeeded);
  const [fetched, setFetched] = useState(tools);
  const found = fetched ?? tools ?? (isAwaited ? use(fetchStripTools()) : undefined);
  useEffect(() => {
    if (isNeeded) void fetchStripTools().then(setFetched);
  }, [isNeeded]);
  const fetchTools = async () => {
    const late = await fetchStripTools();
    setFetched(late);
    return late;
  };
  return { tools: found, fetchTools };
}
