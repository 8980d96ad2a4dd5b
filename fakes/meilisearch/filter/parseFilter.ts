import { FilterError } from "./FilterError";
import type { Comparison, Field, FilterNode } from "./FilterNode";
import { type Token, tokenizeFilter } from "./tokenizeFilter";

/** Deeper nesting is refused. Source: the grammar published with the service's filter parser. */
const DEEPEST = 200;

const COMPARISONS: readonly string[] = ["=", "!=", ">", ">=", "<", "<="] satisfies Comparison[];
/** Words that need quotes to stand for a field or a value. */
const KEYWORDS = "AND OR NOT IN TO EXISTS IS NULL EMPTY CONTAINS STARTS WITH _geoRadius _geoBoundingBox".split(" ");
const RESERVED = /^_geo(Radius|BoundingBox|Polygon|Point|Distance)?$/;
const OPERATIONS =
  "`=`, `!=`, `>=`, `>`, `<=`, `<`, `IN`, `NOT IN`, `TO`, `EXISTS`, `NOT EXISTS`, `IS NULL`, `IS NOT NULL`, `IS EMPTY`, `IS NOT EMPTY`, `STARTS WITH` or `NOT STARTS WITH`";

/**
 * Reads a filter expression; null when there is nothing in it.
 *
 *     or        = and ("OR" and)*
 *     and       = not ("AND" not)*
 *     not       = "NOT" not | "(" or ")" | condition
 *     condition = value (comparison value | value "TO" value | "NOT"? ("IN" list | "EXISTS" | "STARTS" "WITH" value)
 *                        | "IS" "NOT"? ("NULL" | "EMPTY"))
 *     list      = "[" (value ("," value)* ","?)? "]"
 *
 * Errors: FilterError with the place. Places on a map and `CONTAINS` (an experimental feature, off unless asked for)
 *         are refused by name.
 * Source: Meilisearch documentation, "Filter expression reference".
 */
export function parseFilter(input: string): FilterNode | null {
  if (input.trim() === "") return null;
  return new FilterParser(input).parse();
}

class FilterParser {
  readonly #tokens: Token[];
  #at = 0;

  constructor(private readonly input: string) {
    this.#tokens = tokenizeFilter(input);
  }

  parse(): FilterNode {
    const node = this.#or(0);
    const rest = this.#peek();
    if (rest.kind === "end") return node;
    const text = this.input.slice(rest.start);
    throw this.#error(
      `Found unexpected characters at the end of the filter: \`${text}\`. You probably forgot an \`OR\` or an \`AND\` rule.`,
      rest,
    );
  }

  #or(depth: number): FilterNode {
    return this.#chain("OR", "or", () => this.#and(depth));
  }

  #and(depth: number): FilterNode {
    return this.#chain("AND", "and", () => this.#not(depth));
  }

  #chain(keyword: string, kind: "and" | "or", next: () => FilterNode): FilterNode {
    const first = next();
    const parts = [first];
    while (this.#takeKeyword(keyword)) parts.push(next());
    return parts.length === 1 ? first : { kind, parts };
  }

  #not(depth: number): FilterNode {
    if (depth > DEEPEST) throw this.#error("The filter exceeded the maximum depth limit.", this.#peek());
    if (this.#takeKeyword("NOT")) return { kind: "not", part: this.#not(depth + 1) };
    if (!this.#takeSign("(")) return this.#condition();

    const opening = this.#tokens[this.#at - 1]!;
    const inside = this.#or(depth + 1);
    if (this.#takeSign(")")) return inside;
    const text = this.input.slice(opening.start);
    throw this.#error(`Expression \`${text}\` is missing the following closing delimiter: \`)\`.`, opening);
  }

  #condition(): FilterNode {
    const field = this.#field();
    const about = { input: this.input, field };
    const next = this.#peek();
    if (next.kind === "sign" && COMPARISONS.includes(next.value)) {
      this.#at += 1;
      return { kind: "compare", ...about, operator: next.value as Comparison, value: this.#value() };
    }
    if (this.#takeKeyword("IS")) return this.#is(about);
    if (this.#takeKeyword("NOT")) return { kind: "not", part: this.#keywordCondition(about) };
    if (next.kind === "quoted" || (next.kind === "word" && !KEYWORDS.includes(next.value))) {
      const low = this.#value();
      if (!this.#takeKeyword("TO")) throw this.#expectedOperation();
      return { kind: "between", ...about, low, high: this.#value() };
    }
    return this.#keywordCondition(about);
  }

  #is(about: { input: string; field: Field }): FilterNode {
    const negated = this.#takeKeyword("NOT");
    const kind = this.#takeKeyword("NULL") ? "isNull" : this.#takeKeyword("EMPTY") ? "isEmpty" : null;
    if (!kind) throw this.#expectedOperation();
    const node: FilterNode = { kind, ...about };
    return negated ? { kind: "not", part: node } : node;
  }

  /** What may follow a field with or without `NOT` between them. */
  #keywordCondition(about: { input: string; field: Field }): FilterNode {
    if (this.#takeKeyword("EXISTS")) return { kind: "exists", ...about };
    if (this.#takeKeyword("IN")) return { kind: "in", ...about, values: this.#list() };
    if (this.#takeKeyword("STARTS")) {
      if (!this.#takeKeyword("WITH")) throw this.#expectedOperation();
      return { kind: "startsWith", ...about, value: this.#value() };
    }
    if (this.#peek().kind === "word" && this.#peek().value === "CONTAINS") {
      throw this.#error("Using `CONTAINS` in a filter requires an experimental feature that is off.", this.#peek());
    }
    throw this.#expectedOperation();
  }

  #list(): string[] {
    if (!this.#takeSign("[")) throw this.#error("Expected `[` after `IN` keyword.", this.#peek());
    const values: string[] = [];
    while (!this.#takeSign("]")) {
      const next = this.#peek();
      if (next.kind === "end") {
        throw this.#error("Expected matching `]` after the list of field names given to `IN[`", next);
      }
      if (next.kind === "sign" || (next.kind === "word" && KEYWORDS.includes(next.value))) {
        throw this.#error(
          `Expected only comma-separated field names inside \`IN[..]\` but instead found \`${next.value}\`.`,
          next,
        );
      }
      values.push(this.#value());
      if (!this.#takeSign(",") && !(this.#peek().kind === "sign" && this.#peek().value === "]")) {
        const found = this.#peek();
        if (found.kind === "end") continue;
        throw this.#error(
          `Expected only comma-separated field names inside \`IN[..]\` but instead found \`${found.value}\`.`,
          found,
        );
      }
    }
    return values;
  }

  #field(): Field {
    const token = this.#peek();
    if (token.kind === "word" && RESERVED.test(token.value)) {
      throw this.#error(`\`${token.value}\` is a reserved keyword; places on a map are not filtered on here.`, token);
    }
    return { name: this.#value(), start: token.start, end: token.end };
  }

  #value(): string {
    const token = this.#peek();
    if (token.kind === "end") throw this.#error("Was expecting a value but instead got nothing.", token);
    if (token.kind === "word" && KEYWORDS.includes(token.value)) {
      throw this.#error(
        `Was expecting a value but instead got \`${token.value}\`, which is a reserved keyword. To use \`${token.value}\` as a field name or a value, surround it by quotes.`,
        token,
      );
    }
    if (token.kind === "sign") throw this.#error(`Was expecting a value but instead got \`${token.value}\`.`, token);
    this.#at += 1;
    return token.value;
  }

  #peek(): Token {
    return this.#tokens[this.#at]!;
  }

  #take(kind: Token["kind"], value: string): boolean {
    const token = this.#peek();
    if (token.kind !== kind || token.value !== value) return false;
    this.#at += 1;
    return true;
  }

  #takeKeyword = (keyword: string) => this.#take("word", keyword);
  #takeSign = (sign: string) => this.#take("sign", sign);

  #expectedOperation(): FilterError {
    const token = this.#peek();
    const found = token.kind === "end" ? "but instead got nothing" : `at \`${this.input.slice(token.start)}\``;
    return this.#error(`Was expecting an operation ${OPERATIONS} ${found}.`, token);
  }

  #error(reason: string, { start, end }: { start: number; end: number }): FilterError {
    return new FilterError(reason, this.input, start, end);
  }
}
