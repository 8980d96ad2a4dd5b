import { countTypos } from "./countTypos";
import type { Term } from "./readQuery";
import type { Word, WordList } from "./WordList";

export type TermMatch = {
  typos: number;
  /** The very word stands there, not a longer or a mistyped one. */
  exact: boolean;
  /** Where it stands, for the fewest typos found; a phrase by its first word. */
  places: Word[];
};

type Tolerance = { enabled: boolean; disableOnAttributes: readonly string[] };

/** For each term where and how well a document has it; null where it has not. */
export function matchTerms(terms: readonly Term[], list: WordList, tolerance: Tolerance): (TermMatch | null)[] {
  const matches = terms.map((term) => (term.phrase ? matchPhrase(term, list) : matchWord(term, list, tolerance)));
  if (!tolerance.enabled) return matches;
  return terms.reduce((found, term, i) => joinWithNext(found, i, term, terms[i + 1], list), matches);
}

function matchWord(term: Term, { words }: WordList, { disableOnAttributes }: Tolerance): TermMatch | null {
  const [text = ""] = term.words;
  let best: TermMatch | null = null;
  for (const word of words) {
    const counted = typosBetween(term, text, word.text);
    const typos = counted !== 0 && disableOnAttributes.includes(word.field) ? null : counted;
    if (typos === null || (best && typos > best.typos)) continue;
    if (!best || typos < best.typos) best = { typos, exact: false, places: [] };
    best.places.push(word);
    best.exact ||= word.text === text;
  }
  return best;
}

/** Documents share most of their words, so each is compared with a term only once. */
const counts = new WeakMap<Term, Map<string, number | null>>();

function typosBetween(term: Term, text: string, word: string): number | null {
  const known = counts.get(term) ?? new Map<string, number | null>();
  counts.set(term, known);
  const typos = known.get(word);
  if (typos !== undefined) return typos;
  const counted = countTypos(text, word, term.typos, term.prefix);
  known.set(word, counted);
  return counted;
}

function matchPhrase(phrase: Term, { words }: WordList): TermMatch | null {
  const places = words.filter((first, i) =>
    phrase.words.every((text, offset) => {
      const word = words[i + offset];
      return word?.text === text && word.field === first.field && word.position === first.position + offset;
    }),
  );
  return places.length > 0 ? { typos: 0, exact: true, places } : null;
}

/**
 * Two words typed apart find the one word they make, which counts as one typo.
 * Source: Meilisearch documentation, "Typo tolerance settings", "Concatenation".
 */
function joinWithNext(
  matches: (TermMatch | null)[],
  i: number,
  term: Term,
  next: Term | undefined,
  list: WordList,
): (TermMatch | null)[] {
  if (!next || term.phrase || next.phrase) return matches;
  const joined: Term = { words: [`${term.words[0]}${next.words[0]}`], phrase: false, prefix: next.prefix, typos: 0 };
  const found = matchWord(joined, list, { enabled: true, disableOnAttributes: [] });
  if (!found) return matches;
  const left = matches[i];
  const right = matches[i + 1];
  const changed = [...matches];
  if (!left || left.typos > 1) changed[i] = { ...found, typos: 1, exact: false };
  if (!right) changed[i + 1] = { ...found, typos: 0, exact: false };
  return changed;
}
