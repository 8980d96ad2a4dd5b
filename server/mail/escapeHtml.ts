const entities: Record<string, string> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" };

/** Text as it may stand in HTML, between tags or in a quoted attribute. */
export const escapeHtml = (text: string): string => text.replaceAll(/[&<>"']/g, (letter) => entities[letter] ?? letter);
