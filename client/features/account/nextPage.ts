/** Where to go on after signing in: a path of our own, never another site. */
export function nextPage(search: URLSearchParams): string {
  const next = search.get("next") ?? "";
  return /^\/(?![/\\])/.test(next) ? next : "/";
}

/** The same wish, carried on to another page of the account. */
export function withNext(path: string, search: URLSearchParams): string {
  const next = nextPage(search);
  return next === "/" ? path : `${path}?next=${encodeURIComponent(next)}`;
}
