import type { Sought } from "../adapters/SearchEngine";
import { edgeReach } from "./meiliDocument";

function filterOf({ kind, windows }: Sought): string {
  const isKind = `kind = "${kind}"`;
  if (windows.length === 0) return isKind;
  const stated = windows.map(({ dimension }) => `${dimension}Low EXISTS`).join(" OR ");
  // The edges reach over more tolerance than the window needs, so what they let through is looked at again.
  const within = windows
    .filter(({ reach }) => reach <= edgeReach)
    .map(
      ({ dimension, lowerUm, upperUm }) =>
        `(${dimension}Low NOT EXISTS OR (${dimension}High >= ${lowerUm} AND ${dimension}Low <= ${upperUm}))`,
    );
  return [isKind, `(${stated})`, ...within].join(" AND ");
}

/** What is sought, in the filter language of Meilisearch. Made from names of this program and numbers alone. */
export function meiliFilter(sought: readonly Sought[]): string {
  if (sought.length === 0) return "alone = true";
  return sought.map((one) => `(${filterOf(one)})`).join(" OR ");
}
