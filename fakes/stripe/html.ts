/** Markup that is already safe to send. */
export class SafeHtml {
  constructor(readonly text: string) {}
}

type Part = SafeHtml | readonly SafeHtml[] | string | number;

const ESCAPES: Readonly<Record<string, string>> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&#39;",
};

function textOf(part: Part): string {
  if (part instanceof SafeHtml) return part.text;
  if (typeof part === "object") return part.map(({ text }) => text).join("");
  return String(part).replace(/[&<>"']/g, (letter) => ESCAPES[letter]!);
}

/** Template tag: everything put in is escaped unless it was made by this tag. */
export function html(strings: TemplateStringsArray, ...parts: readonly Part[]): SafeHtml {
  const pieces = strings.map((text, i) => text + (i < parts.length ? textOf(parts[i]!) : ""));
  return new SafeHtml(pieces.join(""));
}
