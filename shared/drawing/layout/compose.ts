import type { Box, SceneItem } from "../Scene";
import { around } from "./boxOfItem";
import type { LaidView } from "./layOutView";
import { moveItem } from "./moveItem";

export type Composition = { items: SceneItem[]; width: number; height: number };
/** Views side by side, by index, one list for each row of the sheet. */
export type Arrangement = readonly (readonly number[])[];

/**
 * Puts views on one sheet. Views in a row share their axis, as a projection does; rows are centred on each other,
 * or, where `projected`, share their upright centre line. The result begins at 0, 0.
 */
export function compose(views: readonly LaidView[], rows: Arrangement, gap: number, projected: boolean): Composition {
  const laid = rows.map((row) =>
    besideEachOther(
      row.map((i) => views[i]!),
      gap,
    ),
  );
  const items: SceneItem[] = [];
  const left = Math.min(...laid.map(({ box }) => (projected ? box.x : -box.width / 2)));
  const right = Math.max(...laid.map(({ box }) => (projected ? box.x + box.width : box.width / 2)));
  let y = 0;
  for (const { items: own, box } of laid) {
    const dx = (projected ? 0 : -box.width / 2 - box.x) - left;
    items.push(...own.map((item) => moveItem(item, dx, y - box.y)));
    y += box.height + gap;
  }
  return { items, width: right - left, height: y - gap };
}

function besideEachOther(views: readonly LaidView[], gap: number): LaidView {
  const items: SceneItem[] = [];
  const boxes: Box[] = [];
  let x = 0;
  for (const { items: own, box } of views) {
    const dx = boxes.length === 0 ? 0 : x - box.x;
    items.push(...own.map((item) => moveItem(item, dx, 0)));
    boxes.push({ ...box, x: box.x + dx });
    x = box.x + dx + box.width + gap;
  }
  return { items, box: around(boxes)! };
}
