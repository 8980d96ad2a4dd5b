import type { Box, Outline, Point, SceneItem } from "../Scene";

/** Smallest box around boxes; undefined for none. */
export function around(boxes: readonly Box[]): Box | undefined {
  const [first] = boxes;
  if (!first) return undefined;
  let [left, top, right, bottom] = [first.x, first.y, first.x + first.width, first.y + first.height];
  for (const { x, y, width, height } of boxes) {
    left = Math.min(left, x);
    top = Math.min(top, y);
    right = Math.max(right, x + width);
    bottom = Math.max(bottom, y + height);
  }
  return { x: left, y: top, width: right - left, height: bottom - top };
}

export function overlap(a: Box, b: Box): boolean {
  return a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;
}

export function boxOfOutline(outline: Outline): Box {
  if (outline.shape === "polygon") return boxOfPoints(outline.points);
  const across = outline.radius + (outline.shape === "stadium" ? outline.straight / 2 : 0);
  const { centre, radius } = outline;
  return { x: centre.x - across, y: centre.y - radius, width: across * 2, height: radius * 2 };
}

export function boxOfPoints(points: readonly Point[]): Box {
  return around(points.map((p) => ({ x: p.x, y: p.y, width: 0, height: 0 }))) ?? { x: 0, y: 0, width: 0, height: 0 };
}

export function boxOfItem(item: SceneItem): Box {
  switch (item.type) {
    case "text":
      return item.box;
    case "line":
      return boxOfPoints([item.from, item.to]);
    case "contour":
      return boxOfOutline(item.outline);
    case "area":
      return around(item.outlines.map(boxOfOutline))!;
    case "arrow": {
      const { tip, direction, length } = item;
      return boxOfPoints([tip, { x: tip.x - direction.x * length, y: tip.y - direction.y * length }]);
    }
  }
}
