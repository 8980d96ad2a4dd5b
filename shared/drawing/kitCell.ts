import type { PartKind } from "#shared/domain/partKinds";
import type { LengthUnit } from "./dimensionText";
import { drawPart, type PartDrawingRequest } from "./drawPart";
import type { KitLine } from "./KitLine";
import { around, boxOfItem } from "./layout/boxOfItem";
import { styleFor } from "./layout/DrawingStyle";
import { label, setLabel } from "./layout/labels";
import { moveItem } from "./layout/moveItem";
import { wrapText } from "./layout/wrapText";
import type { SceneItem } from "./Scene";

export type DrawnLine = KitLine & { kind: PartKind };
/** A line of a kit, drawn from 0, 0; its words lie under the drawing's own height. */
export type KitCell = {
  items: SceneItem[];
  words: SceneItem[];
  width: number;
  height: number;
  wordsHeight: number;
  description: string;
};

const reductions = [1, 2, 4, 5, 10, 20, 50, 100] as const;
const belts: readonly PartKind[] = ["flat-belt", "square-belt", "round-belt"];

export function isBelt(kind: PartKind): boolean {
  return belts.includes(kind);
}

type Box = { width: number; height: number };

/** Draws a line of a kit at the scale of its sheet. A belt's loop too large for that is drawn smaller and says so. */
export function kitCell(
  line: DrawnLine,
  scale: { pxPerMm: number; sectionPxPerMm?: number },
  box: Box,
  unit: LengthUnit,
): KitCell {
  const { kind, dims, asFound, material } = line;
  const request: PartDrawingRequest = {
    kind,
    dims: dims ?? {},
    asFound,
    material,
    unit,
    view: "row",
    ...box,
    ...scale,
  };
  const wanted = (by: number) => scale.pxPerMm / by;
  const by =
    reductions.find((n) => drawPart({ ...request, pxPerMm: wanted(n) }).pxPerMm >= wanted(n) * 0.999) ??
    reductions.at(-1)!;
  const scene = drawPart({ ...request, pxPerMm: wanted(by) });
  const drawn = around(scene.items.map(boxOfItem))!;

  const { words: size } = styleFor("row", box.width);
  const wide = Math.max(drawn.width, 110);
  const name = line.quantity && line.quantity > 1 ? `${line.quantity} × ${line.label}` : line.label;
  const notes = by > 1 ? wrapText(`loop at 1/${by} scale`, wide, size, 500) : [];
  const lines = [
    ...wrapText(name, wide, size, 600).map((content) => ({ content, role: "label", size, weight: 600 }) as const),
    ...notes.map((content) => ({ content, role: "note", size, weight: 500 }) as const),
  ];
  const under = label(lines);
  const width = Math.max(drawn.width, under.width);
  return {
    items: scene.items.map((item) => moveItem(item, (width - drawn.width) / 2 - drawn.x, -drawn.y)),
    words: setLabel(under, { x: (width - under.width) / 2, y: 0 }),
    width,
    height: drawn.height,
    wordsHeight: under.height,
    description: `${name}: ${scene.description}`,
  };
}
