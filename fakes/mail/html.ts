/** Text that is already HTML. Only `html` makes it, so whatever else is put into a page gets escaped. */
export class Markup {
  constructor(readonly value: string) {}
}

type Part = string | number | Markup | readonly Part[];

/** A piece of a page; what is filled in is escaped unless it came from `html` itself. */
export function html(strings: TemplateStringsArray, ...parts: Part[]): Markup {
  const filled = parts.map(render);
  return new Markup(strings.map((string, i) => string + (filled[i] ?? "")).join(""));
}

function render(part: Part): string {
  if (part instanceof Markup) return part.value;
  if (typeof part === "string" || typeof part === "number") return escapeHtml(String(part));
  return part.map(render).join("");
}

const escapes: Record<string, string> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" };

export const escapeHtml = (text: string) => text.replace(/[&<>"']/g, (c) => escapes[c] ?? c);
