import type { Settings } from "../Settings";
import { cutWords } from "./cutWords";

/** Something the query asks for: one word, or a phrase of words that must stand in this order side by side. */
export type Term = {
  words: string[];
  phrase: boolean;
  /** The last word, still being typed: longer words that begin like it fit too. */
  prefix: boolean;
  /** Typing errors forgiven. */
  typos: number;
};

export type Query = { terms: Term[]; excluded: Term[] };

/** Source: Meilisearch documentation, "Search", "Query (q)". */
const MOST_WORDS = 10;

/**
 * What a query asks for. Words in double quotes are a phrase; a minus in front excludes a word or phrase.
 * Source: Meilisearch documentation, "Search" ("Phrase search", "Query (q)") and "Typo tolerance settings". That a
 * space after the last word ends its being a prefix is from memory.
 */
export function readQuery(q: string, typo: Settings["typoTolerance"]): Query {
  const terms: Term[] = [];
  const excluded: Term[] = [];
  let endsInWord = false;
  for (const [, minus, quoted, plain = ""] of q.matchAll(/((?<!\S)-)?(?:"([^"]*)"?|([^\s"]+))/g)) {
    const words = cutWords(quoted ?? plain);
    endsInWord = !minus && quoted === undefined && words.length > 0;
    if (minus) excluded.push(...asPhrase(words));
    else if (quoted !== undefined) terms.push(...asPhrase(words));
    else terms.push(...words.map((word) => asTerm(word, typo)));
  }
  const last = terms.at(-1);
  if (last && endsInWord && !/\s$/.test(q)) last.prefix = true;
  return { terms: terms.slice(0, MOST_WORDS), excluded };
}

const asPhrase = (words: string[]): Term[] =>
  words.length > 0 ? [{ words, phrase: true, prefix: false, typos: 0 }] : [];

function asTerm(word: string, typo: Settings["typoTolerance"]): Term {
  return { words: [word], phrase: false, prefix: false, typos: forgiven(word, typo) };
}

function forgiven(word: string, typo: Settings["typoTolerance"]): number {
  const exempt = typo.disableOnWords.some((listed) => cutWords(listed).join(" ") === word);
  if (!typo.enabled || exempt || (typo.disableOnNumbers && /^\p{N}+$/u.test(word))) return 0;
  const { oneTypo, twoTypos } = typo.minWordSizeForTypos;
  const letters = [...word].length;
  return letters >= twoTypos ? 2 : letters >= oneTypo ? 1 : 0;
}
