import { z } from "zod";
import type { SearchQuery } from "#shared/schemas/search";
import { compareKeys, type SortKey } from "./rankCandidates";
import { refused } from "./readSizes";

const amount = z.number().min(-Number.MAX_SAFE_INTEGER).max(Number.MAX_SAFE_INTEGER);
const Place = z.discriminatedUnion("sort", [
  z.object({ sort: z.literal("fit"), key: z.tuple([amount, amount, amount, z.uuid()]) }),
  z.object({ sort: z.literal("price"), key: z.tuple([amount, z.uuid()]) }),
  z.object({ sort: z.literal("dispatch"), key: z.tuple([amount, amount, z.uuid()]) }),
]);

/** The place after an item in a sorted list, opaque to whoever carries it. */
export function writeCursor(sort: SearchQuery["sort"], key: SortKey): string {
  return Buffer.from(JSON.stringify({ sort, key })).toString("base64url");
}

/** The key that a cursor holds. Errors: `invalid-request` for what was never given out, or for another order. */
export function readCursor(cursor: string, sort: SearchQuery["sort"]): SortKey {
  let text: unknown;
  try {
    text = JSON.parse(Buffer.from(cursor, "base64url").toString("utf8"));
  } catch {
    text = undefined;
  }
  const place = Place.safeParse(text);
  if (!place.success || place.data.sort !== sort) {
    const detail = "This place in the list is not known. Begin again from the first page.";
    throw refused([{ pointer: "#/cursor", detail }], place.error);
  }
  return place.data.key;
}

/** How many of a sorted list lie at or before a place: where the next page begins. */
export function countUpTo(keys: readonly SortKey[], place: SortKey): number {
  let [from, to] = [0, keys.length];
  while (from < to) {
    const middle = (from + to) >> 1;
    if (compareKeys(keys[middle]!, place) <= 0) from = middle + 1;
    else to = middle;
  }
  return from;
}
