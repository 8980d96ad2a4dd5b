import { covers, type Doc, isObject } from "../documentValues";
import { cutWords } from "./cutWords";

export type Word = {
  text: string;
  /** Dotted field name. */
  field: string;
  /** Place of its attribute among the searchable ones; 0 is the most important. */
  rank: number;
  /** Place within the field, counting words from 0. */
  position: number;
};

/** Words of separate values in one list stand this far apart, so that no phrase or nearness spans them. */
const GAP = 8;

/** Every searchable word of a document. */
export class WordList {
  readonly words: readonly Word[];

  constructor(doc: Doc, searchable: readonly string[]) {
    const texts = [...textsBelow(doc, "")];
    const fields = [...new Set(texts.map(([field]) => field))];
    const rankOf = (field: string) =>
      searchable.includes("*") ? fields.indexOf(field) : searchable.findIndex((pattern) => covers([pattern], field));

    const nextPosition = new Map<string, number>();
    this.words = texts.flatMap(([field, text]) => {
      const rank = rankOf(field);
      if (rank < 0) return [];
      const from = nextPosition.get(field) ?? 0;
      const words = cutWords(text);
      nextPosition.set(field, from + words.length + GAP);
      return words.map((word, i) => ({ text: word, field, rank, position: from + i }));
    });
  }
}

function* textsBelow(value: unknown, field: string): Generator<[field: string, text: string]> {
  if (Array.isArray(value)) {
    for (const item of value) yield* textsBelow(item, field);
  } else if (isObject(value)) {
    for (const [key, inner] of Object.entries(value)) yield* textsBelow(inner, field ? `${field}.${key}` : key);
  } else if (typeof value === "string" || typeof value === "number") {
    yield [field, String(value)];
  }
}
