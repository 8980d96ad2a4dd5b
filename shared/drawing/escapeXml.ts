const entities: Record<string, string> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" };

/** Text made safe inside an XML element or a quoted attribute; characters that XML forbids are left out. */
export function escapeXml(text: string): string {
  return [...text]
    .filter(isAllowed)
    .map((character) => entities[character] ?? character)
    .join("");
}

/** XML 1.0, production 2 (Char): of the control characters only tab and the two line breaks. */
function isAllowed(character: string): boolean {
  const code = character.codePointAt(0)!;
  if (code < 0x20) return code === 0x09 || code === 0x0a || code === 0x0d;
  return !(code >= 0xd800 && code <= 0xdfff) && code !== 0xfffe && code !== 0xffff;
}
