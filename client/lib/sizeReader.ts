import { use, useState } from "react";
import type { parseSize } from "#shared/domain/parseSize";

export type SizeReader = typeof parseSize;

let reader: SizeReader | undefined;
let fetching: Promise<SizeReader | undefined> | undefined;

/** Fetches what reads sizes, once; undefined where it cannot be had, and the server alone says what it read. */
export function fetchSizeReader(): Promise<SizeReader | undefined> {
  fetching ??= import("#shared/domain/parseSize").then(
    (found) => {
      reader = found.parseSize;
      return reader;
    },
    () => undefined,
  );
  return fetching;
}

/**
 * What reads sizes. The first page does without it until somebody begins to write (`fetchRead`); one that opens with sizes
 * waits for it, so that nothing moves when they are shown back.
 */
export function useSizeReader(isNeededAtOnce: boolean) {
  const [fetched, setFetched] = useState(() => reader);
  const read = fetched ?? (isNeededAtOnce ? (reader ?? use(fetchSizeReader())) : undefined);
  const fetchRead = async () => {
    const found = await fetchSizeReader();
    setFetched(() => found);
    return found;
  };
  return { read, fetchRead };
}
