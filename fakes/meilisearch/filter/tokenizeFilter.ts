import { FilterError } from "./FilterError";

export type Token = {
  kind: "word" | "quoted" | "sign" | "end";
  /** Unescaped and without quotes. */
  value: string;
  start: number;
  end: number;
};

const SIGNS = ["!=", ">=", "<=", "=", ">", "<", "(", ")", "[", "]", ","];

/**
 * Cuts a filter into words, quoted strings and signs, with an "end" token last.
 *
 * Shape:  a word is letters, digits, `_`, `-` and `.`; a quoted string is in single or double quotes, where `\`
 *         keeps the next quote or backslash from its usual meaning.
 * Errors: FilterError on a quote that is not closed and on any other character.
 * Source: Meilisearch documentation, "Filter expression reference", and the grammar published with its filter parser.
 */
export function tokenizeFilter(input: string): Token[] {
  const tokens: Token[] = [];
  let at = 0;
  while (at < input.length) {
    const space = /^\s+/.exec(input.slice(at));
    if (space) {
      at += space[0].length;
      continue;
    }
    const token = readToken(input, at);
    tokens.push(token);
    at = token.end;
  }
  return [...tokens, { kind: "end", value: "", start: input.length, end: input.length }];
}

function readToken(input: string, start: number): Token {
  const rest = input.slice(start);
  const quote = rest[0];
  if (quote === '"' || quote === "'") return readQuoted(input, start, quote);

  const sign = SIGNS.find((candidate) => rest.startsWith(candidate));
  if (sign) return { kind: "sign", value: sign, start, end: start + sign.length };

  const word = /^[\p{L}\p{N}_.-]+/u.exec(rest)?.[0];
  if (word) return { kind: "word", value: word, start, end: start + word.length };

  const odd = /^[^\s()=<>!]+/.exec(rest)?.[0] ?? rest.slice(0, 1);
  throw new FilterError(`Was expecting a value but instead got \`${odd}\`.`, input, start, start + odd.length);
}

function readQuoted(input: string, start: number, quote: string): Token {
  let value = "";
  for (let at = start + 1; at < input.length; at += 1) {
    const char = input[at];
    if (char === quote) return { kind: "quoted", value, start, end: at + 1 };
    const next = input[at + 1];
    if (char === "\\" && next !== undefined && ["\\", '"', "'"].includes(next)) {
      value += next;
      at += 1;
    } else {
      value += char;
    }
  }
  const reason = `Expression \`${input.slice(start)}\` is missing the following closing delimiter: \`${quote}\`.`;
  throw new FilterError(reason, input, start, input.length);
}
