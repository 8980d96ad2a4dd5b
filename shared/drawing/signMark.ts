import { round } from "./outlinePath";
import type { DimensionSign, TextItem } from "./Scene";
import { signWidthEm } from "./textWidth";

/** Height of a capital letter and of a digit in the product's typeface, em (its OS/2 table says 660 of 1000). */
const capHeight = 0.66;

/** Where a text's baseline begins, and how it is turned. */
export function baselineOf({ box, size, turned }: TextItem): { x: number; y: number } {
  const drop = (capHeight * size) / 2;
  return turned
    ? { x: box.x + box.width / 2 + drop, y: box.y + box.height }
    : { x: box.x, y: box.y + box.height / 2 + drop };
}

/** Room left of the digits for the sign, px. */
export function signRoom({ sign, size }: TextItem): number {
  return sign ? signWidthEm * size : 0;
}

/** The path of a diameter or square sign of ISO 129-1, drawn from the baseline's origin, for a given size of text. */
export function signPath(sign: DimensionSign, size: number): string {
  const [cap, r] = [capHeight * size, capHeight * size * 0.42];
  const [cx, cy] = [cap * 0.56, -cap / 2];
  if (sign === "square") {
    const [left, top, side] = [round(cx - r), round(cy - r), round(r * 2)];
    return `M${left} ${top}h${side}v${side}h${-side}Z`;
  }
  const slash = cap * 0.56;
  const ring = `M${round(cx - r)} ${round(cy)}a${round(r)} ${round(r)} 0 1 0 ${round(r * 2)} 0a${round(r)} ${round(r)} 0 1 0 ${round(-r * 2)} 0Z`;
  return `${ring}M${round(cx - slash * 0.85)} ${round(cy + slash)}L${round(cx + slash * 0.85)} ${round(cy - slash)}`;
}
