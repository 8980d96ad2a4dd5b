/** A stored document: any JSON object. */
export type Doc = Readonly<Record<string, unknown>>;

export const isObject = (value: unknown): value is Doc =>
  typeof value === "object" && value !== null && !Array.isArray(value);

/**
 * Every value a dotted field name leads to, in order. Objects inside arrays are looked into, so "parts.bore" of
 * `{parts: [{bore: 4}, {bore: 5}]}` gives 4 and 5. A key that itself holds dots counts too. Empty: no such field.
 */
export function valuesAt(value: unknown, path: string): unknown[] {
  if (Array.isArray(value)) return value.flatMap((item) => valuesAt(item, path));
  if (!isObject(value)) return [];
  const whole = Object.hasOwn(value, path) ? [value[path]] : [];
  const deeper = dots(path).flatMap((dot) => {
    const head = path.slice(0, dot);
    return Object.hasOwn(value, head) ? valuesAt(value[head], path.slice(dot + 1)) : [];
  });
  return [...whole, ...deeper];
}

function dots(path: string): number[] {
  return [...path].flatMap((char, i) => (char === "." ? [i] : []));
}

/** Arrays laid flat: the single values that comparisons and words are about. */
export const leaves = (values: unknown[]): unknown[] =>
  values.flatMap((value) => (Array.isArray(value) ? leaves(value) : [value]));

/**
 * Whether a list of attribute patterns takes in a field: "*" takes all, "a" takes "a" and all below it,
 * "a*" and "*a" match beginnings and ends.
 * Source: Meilisearch documentation, "Filterable attributes" (attributePatterns) and "Nested fields".
 */
export function covers(patterns: readonly string[], field: string): boolean {
  return patterns.some((pattern) => {
    if (pattern === "*" || pattern === field || field.startsWith(`${pattern}.`)) return true;
    if (pattern.endsWith("*")) return field.startsWith(pattern.slice(0, -1));
    return pattern.startsWith("*") && field.endsWith(pattern.slice(1));
  });
}

/** The fields of a document that patterns name; "a.b" keeps the objects around b. */
export function pickFields(doc: Doc, patterns: readonly string[]): Doc {
  if (patterns.includes("*")) return doc;
  return pickBelow(doc, patterns, "") as Doc;
}

function pickBelow(value: unknown, patterns: readonly string[], prefix: string): unknown {
  if (Array.isArray(value)) return value.map((item) => pickBelow(item, patterns, prefix));
  if (!isObject(value)) return value;
  const kept = Object.entries(value).flatMap(([key, inner]) => {
    const field = prefix + key;
    if (covers(patterns, field)) return [[key, inner] as const];
    const wantsBelow = patterns.some((pattern) => pattern.startsWith(`${field}.`));
    return wantsBelow ? [[key, pickBelow(inner, patterns, `${field}.`)] as const] : [];
  });
  return Object.fromEntries(kept);
}
