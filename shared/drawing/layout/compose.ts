import type { Box, SceneItem } from "../Scene";
import { around } from "./boxOfItem";
import type { LaidView } from "./layOutView";
import { moveItem } from "./moveItem";

/** Views on a sheet that begins at 0, 0. `items` moves them there; trying a scale needs only the size. */
export type Composition = { width: number; height: number; items: () => SceneItem[] };
/** Views side by side, by index, one list for each row of the sheet. */
export type Arrangement = readonly (readonly number[])[];

/**
 * Puts views on one sheet. Views in a row share their axis, as a projection does; rows are centred on each other,
 * or, where `projected`, share their upright centre line.
 */
export function compose(views: readonly LaidView[], rows: Arrangement, gap: number, projected: boolean): Composition {
  const laid = rows.map((row) =>
    besideEachOther(
      row.map((i) => views[i]!),
      gap,
    ),
  );
  const left = Math.min(...laid.map(({ box }) => (projected ? box.x : -box.width / 2)));
  const right = Math.max(...laid.map(({ box }) => (projected ? box.x + box.width : box.width / 2)));
  const height = laid.reduce((sum, { box }) => sum + box.height + gap, -gap);
  const items = () => {
    let y = 0;
    return laid.flatMap(({ placed, box }) => {
      const dx = (projected ? 0 : -box.width / 2 - box.x) - left;
      const dy = y - box.y;
      y += box.height + gap;
      return placed.flatMap(({ view, x }) => view.items.map((item) => moveItem(item, x + dx, dy)));
    });
  };
  return { width: right - left, height, items };
}

type Row = { placed: { view: LaidView; x: number }[]; box: Box };

function besideEachOther(views: readonly LaidView[], gap: number): Row {
  const placed: Row["placed"] = [];
  const boxes: Box[] = [];
  let end = 0;
  for (const view of views) {
    const x = boxes.length === 0 ? 0 : end - view.box.x;
    placed.push({ view, x });
    boxes.push({ ...view.box, x: view.box.x + x });
    end = view.box.x + x + view.box.width + gap;
  }
  return { placed, box: around(boxes)! };
}
