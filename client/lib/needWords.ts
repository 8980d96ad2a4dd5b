import { dimensionWords, kindFacts } from "#shared/domain/partKinds";
import type { Need } from "#shared/schemas/need";

/** Brackets around what has a comma of its own. */
const inList = (words: string) => (words.includes(", ") ? `(${words})` : words);

/** A need in a few words, as it stands on a basket line: "idler wheel, outside diameter 44.1 mm, bore 4 mm". */
export function needWords(need: Need): string | null {
  const sizes = need.dimensions
    .filter(({ text }) => text !== null)
    .map(({ dimension, echo }) => `${dimensionWords[dimension]} ${inList(echo)}`);
  const words = [need.kind ? kindFacts[need.kind].name : null, need.family?.name ?? null, ...sizes].filter(Boolean);
  return sizes.length > 0 || need.family ? words.join(", ") : null;
}
