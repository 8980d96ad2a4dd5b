import { select } from "../db/select";
import { forgivenSlips, mayStandFor } from "./editDistance";
import { plainWords } from "./plainWords";

const mostWords = 10;
/** Words that say nothing about a part. */
const idle = new Set("a an and as at by for from i in is it my of on or that the this to with".split(" "));

/** The words of a query that are looked for, at most ten. */
export const soughtWords = (text: string): string[] =>
  [...new Set(plainWords(text))].filter((word) => !idle.has(word)).slice(0, mostWords);

type Row = { word: string; known: boolean; near: string[]; empty: boolean };

// Similarity by trigrams narrows a few thousand words down to a few; what is a slip is decided by counting letters.
const sql = `
  SELECT t.word, k.known,
    CASE WHEN k.known OR length(t.word) < 5 THEN '{}'::text[] ELSE ARRAY(
      SELECT v.word FROM search_vocabulary v
      WHERE length(v.word) BETWEEN length(t.word) - 2 AND length(t.word) + 2 AND similarity(v.word, t.word) >= 0.15
      ORDER BY similarity(v.word, t.word) DESC, v.word LIMIT 40
    ) END AS near,
    NOT EXISTS (SELECT FROM search_vocabulary) AS empty
  FROM unnest($words::text[]) WITH ORDINALITY AS t(word, n),
  LATERAL (SELECT EXISTS (SELECT FROM search_vocabulary v
    WHERE v.word = t.word OR (t.n = cardinality($words::text[]) AND starts_with(v.word, t.word))) AS known) k
  ORDER BY t.n`;

/** A word for to_tsquery. Words are letters, digits and points, so quotes hold them. */
const quoted = (word: string, prefix = false) => `'${word}'${prefix ? ":*" : ""}`;

/**
 * What was typed as a text query of PostgreSQL: every word has to be there, the last one may be unfinished, and a word that
 * no listing uses also stands for those that it may be a slip of. `empty` tells that no word of any listing is known yet.
 */
export async function wordQuery(text: string): Promise<{ tsquery: string; empty: boolean }> {
  const words = soughtWords(text);
  if (words.length === 0) return { tsquery: "", empty: false };
  const rows = await select<Row>(sql, { words });
  const terms = rows.map(({ word, known, near }, index) => {
    const meant = known || forgivenSlips(word) === 0 ? [] : near.filter((other) => mayStandFor(word, other));
    return `(${[quoted(word, index === rows.length - 1), ...meant.map((other) => quoted(other))].join(" | ")})`;
  });
  return { tsquery: terms.join(" & "), empty: rows[0]?.empty ?? false };
}
