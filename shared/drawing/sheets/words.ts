import { textWidth } from "../textWidth";
import { onCircle } from "./paths";
import type { WordsItem } from "./Sheet";

type Look = Partial<Pick<WordsItem, "sizeMm" | "weight" | "anchor" | "turnDeg" | "shade">>;

/** Size of running text on a sheet, mm per em: 8 pt. */
export const bodyMm = 2.8;
const leading = 1.42;

/** A number and its unit stay on one line. */
const withUnits = (text: string) => text.replaceAll(/(\d) (?=%|(?:mm|in|rpm|Hz)\b)/g, "$1\u00a0");

export const words = (x: number, y: number, content: string, look: Look = {}): WordsItem => ({
  type: "words",
  sizeMm: bodyMm,
  weight: 500,
  anchor: "start",
  turnDeg: 0,
  shade: "ink",
  ...look,
  x,
  y,
  content,
});

const widthOf = (text: string, sizeMm: number, weight: 500 | 600) =>
  textWidth(text.replaceAll("\u00a0", " "), sizeMm, weight);

/** Lines no wider than so many mm; broken at spaces only, so that a number keeps to its unit by a no-break space. */
function linesOf(text: string, width: number, sizeMm: number, weight: 500 | 600): string[] {
  const lines: string[] = [];
  for (const word of text.split(" ")) {
    const longer = `${lines.at(-1)} ${word}`;
    if (lines.length > 0 && widthOf(longer, sizeMm, weight) <= width) lines[lines.length - 1] = longer;
    else lines.push(word);
  }
  return lines;
}

/** Text broken to a width, its first line's top at y; gives where it ends. */
export function paragraph(
  x: number,
  y: number,
  width: number,
  content: string,
  look: Look = {},
): { items: WordsItem[]; bottom: number } {
  const { sizeMm = bodyMm, weight = 500 } = look;
  const lines = linesOf(withUnits(content), width, sizeMm, weight);
  const step = sizeMm * leading;
  return {
    items: lines.map((text, i) => words(x, y + sizeMm * 0.95 + i * step, text, look)),
    bottom: y + lines.length * step,
  };
}

/** Paragraphs below each other, a heading before each that has one. */
export function column(
  x: number,
  y: number,
  width: number,
  parts: readonly { heading?: string; text: string }[],
  sizeMm = bodyMm,
): { items: WordsItem[]; bottom: number } {
  let bottom = y;
  const items = parts.flatMap(({ heading, text }) => {
    const head = heading ? paragraph(x, bottom, width, heading, { sizeMm, weight: 600 }) : { items: [], bottom };
    const body = paragraph(x, head.bottom, width, text, { sizeMm });
    bottom = body.bottom + sizeMm * 0.5;
    return [...head.items, ...body.items];
  });
  return { items, bottom };
}

/**
 * Words set along the outside of a circle, its middle at `deg` (see onCircle), read clockwise. Each word is straight
 * and turned as a whole, so that it stays one piece of text.
 */
export function wordsAround(cx: number, cy: number, radius: number, deg: number, content: string, look: Look = {}) {
  const { sizeMm = bodyMm, weight = 500 } = look;
  const wide = (text: string) => widthOf(text, sizeMm, weight);
  const degPerMm = 180 / (Math.PI * radius);
  const space = wide(" ") * 1.15;
  const pieces = content.split(" ");
  const total = pieces.reduce((sum, piece) => sum + wide(piece), 0) + space * (pieces.length - 1);
  let along = -total / 2;
  return pieces.map((piece) => {
    const at = deg + (along + wide(piece) / 2) * degPerMm;
    along += wide(piece) + space;
    return words(...onCircle(cx, cy, radius, at), piece, { ...look, anchor: "middle", turnDeg: at + 90 });
  });
}
