import type { Box, Outline, Point, SceneItem } from "../Scene";

/** Smallest box around boxes; undefined for none. */
export function around(boxes: readonly Box[]): Box | undefined {
  if (boxes.length === 0) return undefined;
  const x = Math.min(...boxes.map((b) => b.x));
  const y = Math.min(...boxes.map((b) => b.y));
  const right = Math.max(...boxes.map((b) => b.x + b.width));
  const bottom = Math.max(...boxes.map((b) => b.y + b.height));
  return { x, y, width: right - x, height: bottom - y };
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
