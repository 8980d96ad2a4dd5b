import type { LengthUnit } from "./dimensionText";
import type { KitLine } from "./KitLine";
import { type DrawnLine, isBelt, type KitCell, kitCell } from "./kitCell";
import { styleFor } from "./layout/DrawingStyle";
import { footer } from "./layout/footer";
import { label, setLabel } from "./layout/labels";
import { moveItem } from "./layout/moveItem";
import { wrapText } from "./layout/wrapText";
import type { Scene, SceneItem } from "./Scene";
import { sharedScale } from "./sharedScale";

export type KitOptions = { width?: number; unit?: LengthUnit };

const pad = 20;
const gap = { across: 36, down: 28, words: 8 };
const cellBox = { width: 210, height: 170 };

/**
 * A rebuild kit on one sheet: the small drawing of each of its parts, all at one scale, named, with a scale bar.
 * Loops of belts that would dwarf the rest are drawn at a stated fraction of the scale. Plain items are listed below.
 */
export function drawKit(lines: readonly KitLine[], { width = 760, unit = "mm" }: KitOptions = {}): Scene {
  const drawn = lines.filter((line): line is DrawnLine => line.kind !== undefined);
  const plain = lines.filter((line) => line.kind === undefined);
  const named = plain.map(({ label: name, quantity = 1 }) => (quantity > 1 ? `${quantity} × ${name}` : name));
  const inner = width - pad * 2;
  const box = { ...cellBox, width: Math.min(cellBox.width, inner) };
  const scale = kitScale(drawn, box, unit);
  const cells = drawn.map((line) => kitCell(line, scale, box, unit));

  const items: SceneItem[] = [];
  let y = pad;
  for (const row of rowsOf(cells, inner)) {
    const tall = Math.max(...row.map((cell) => cell.height));
    const spare = inner - row.reduce((sum, cell) => sum + cell.width, 0) - gap.across * (row.length - 1);
    let x = pad + spare / 2;
    for (const cell of row) {
      items.push(...cell.items.map((item) => moveItem(item, x, y + (tall - cell.height) / 2)));
      items.push(...cell.words.map((item) => moveItem(item, x, y + tall + gap.words)));
      x += cell.width + gap.across;
    }
    y += tall + gap.words + Math.max(...row.map((cell) => cell.wordsHeight)) + gap.down;
  }
  const style = styleFor("large", width);
  if (plain.length > 0) {
    const also = wrapText(`Not drawn: ${named.join("; ")}`, inner, style.words, 500);
    const words = label(also.map((content) => ({ content, role: "note", size: style.words, weight: 500 }) as const));
    items.push(...setLabel(words, { x: pad, y }, { align: "start" }));
    y += words.height + gap.words;
  }
  if (drawn.length > 0) {
    const roles = new Set(drawn.some((line) => line.asFound) ? (["measured"] as const) : []);
    const foot = footer(roles, inner, unit, style);
    items.push(...foot.draw(scale.pxPerMm, y).map((item) => moveItem(item, pad, 0)));
    y += foot.height;
  }
  return {
    width,
    height: y + pad,
    ...scale,
    fine: true,
    items,
    title: `Kit of ${lines.length} ${lines.length === 1 ? "line" : "lines"}`,
    description: [...cells.map((cell) => cell.description), ...named.map((name) => `${name}: not drawn.`)].join(" "),
  };
}

/** Belts give way: the scale is that of the other parts, where there are any. */
function kitScale(drawn: readonly DrawnLine[], box: { width: number; height: number }, unit: LengthUnit) {
  const comparable = drawn.map(({ kind, dims = {}, asFound }) => ({ kind, dims, asFound, unit }));
  const others = comparable.filter(({ kind }) => !isBelt(kind));
  const { pxPerMm = 1 } = sharedScale(others.length > 0 ? others : comparable, box);
  const { sectionPxPerMm } = sharedScale(
    comparable.filter(({ kind }) => isBelt(kind)),
    box,
  );
  return { pxPerMm, ...(sectionPxPerMm === undefined ? {} : { sectionPxPerMm }) };
}

function rowsOf(cells: readonly KitCell[], width: number): KitCell[][] {
  const rows: KitCell[][] = [];
  let used = 0;
  for (const cell of cells) {
    const row = rows.at(-1);
    if (row && used + gap.across + cell.width <= width) {
      row.push(cell);
      used += gap.across + cell.width;
    } else {
      rows.push([cell]);
      used = cell.width;
    }
  }
  return rows;
}
