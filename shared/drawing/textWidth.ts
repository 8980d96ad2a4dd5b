import type { DimensionSign } from "./Scene";
import advances from "./workSansAdvances.json";

type Weight = 500 | 600;

const tables: Record<Weight, Map<string, number>> = { 500: read("500"), 600: read("600") };

function read(weight: "500" | "600"): Map<string, number> {
  const table = new Map<string, number>();
  for (const [advance, characters] of Object.entries(advances.weights[weight])) {
    for (const character of characters) table.set(character, Number(advance));
  }
  return table;
}

/** Room that a drawn sign takes before the digits, in em. */
export const signWidthEm = 0.98;

/**
 * Width of one line of text in the product's typeface with tabular figures.
 *
 * Units:  `size` in px per em, answer in px.
 * Error:  kerning is left out (under 1 %); a character that the table does not know counts as one em, which is
 *         wider than nearly every letter, so that unknown scripts reserve too much room rather than too little.
 */
export function textWidth(content: string, size: number, weight: Weight, sign?: DimensionSign): number {
  let thousandths = sign ? signWidthEm * 1000 : 0;
  for (const character of content) thousandths += tables[weight].get(character) ?? 1000;
  return (thousandths * size) / 1000;
}
