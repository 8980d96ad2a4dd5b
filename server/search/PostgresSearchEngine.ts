import type { CandidateQuery, Candidates, SearchEngine } from "../adapters/SearchEngine";
import { select } from "../db/select";
import { candidateSql } from "./candidateSql";
import { wordQuery } from "./wordQuery";

const learnSql = `
  INSERT INTO search_vocabulary (word)
  SELECT DISTINCT word FROM parts, regexp_split_to_table(lower(search_text), '[^[:alnum:].]+') AS word
  WHERE ($partIds::uuid[] IS NULL OR parts.id = ANY($partIds::uuid[])) AND length(word) BETWEEN 2 AND 40
  ORDER BY word
  ON CONFLICT DO NOTHING`;

/**
 * Candidates straight from the tables: sizes through the window index, words through the text index.
 * Only the vocabulary that forgives typing errors has to be kept up; words that no part uses any more stay in it.
 */
export class PostgresSearchEngine implements SearchEngine {
  async candidates({ sought, words, limit }: CandidateQuery): Promise<Candidates> {
    const tsquery = words === null ? null : await this.#tsqueryOf(words);
    return {
      of: sought.length > 0 ? "items" : "parts",
      select: (statement) => candidateSql({ sought, tsquery, limit }, statement),
    };
  }

  async index(partIds: readonly string[]): Promise<void> {
    await select(learnSql, { partIds });
  }

  async #tsqueryOf(words: string): Promise<string> {
    const first = await wordQuery(words);
    if (!first.empty) return first.tsquery;
    await select(learnSql, { partIds: null });
    return (await wordQuery(words)).tsquery;
  }
}
