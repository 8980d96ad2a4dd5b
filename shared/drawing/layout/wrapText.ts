import { textWidth } from "../textWidth";

/** Breaks words into lines no wider than `width` px; a single word that is wider is cut, with an ellipsis. */
export function wrapText(text: string, width: number, size: number, weight: 500 | 600): string[] {
  const lines: string[] = [];
  for (const word of text.split(/\s+/).filter(Boolean)) {
    const longer = lines.length > 0 ? `${lines.at(-1)} ${word}` : word;
    if (lines.length > 0 && textWidth(longer, size, weight) <= width) lines[lines.length - 1] = longer;
    else lines.push(cut(word, width, size, weight));
  }
  return lines;
}

function cut(word: string, width: number, size: number, weight: 500 | 600): string {
  if (textWidth(word, size, weight) <= width) return word;
  const characters = [...word];
  while (characters.length > 1 && textWidth(`${characters.join("")}…`, size, weight) > width) characters.pop();
  return `${characters.join("")}…`;
}
