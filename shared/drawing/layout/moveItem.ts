import type { Outline, Point, SceneItem } from "../Scene";

/** The same item, shifted. */
export function moveItem(item: SceneItem, dx: number, dy: number): SceneItem {
  const move = (p: Point): Point => ({ x: p.x + dx, y: p.y + dy });
  switch (item.type) {
    case "text":
      return { ...item, box: { ...item.box, ...move(item.box) } };
    case "line":
      return { ...item, from: move(item.from), to: move(item.to) };
    case "arrow":
      return { ...item, tip: move(item.tip) };
    case "contour":
      return { ...item, outline: mapOutline(item.outline, move, 1) };
    case "area":
      return { ...item, outlines: item.outlines.map((outline) => mapOutline(outline, move, 1)) };
  }
}

/** An outline with every point mapped and every length multiplied by `scale`. */
export function mapOutline(outline: Outline, map: (p: Point) => Point, scale: number): Outline {
  if (outline.shape === "polygon") return { ...outline, points: outline.points.map(map) };
  const round = { ...outline, centre: map(outline.centre), radius: outline.radius * scale };
  return round.shape === "stadium" ? { ...round, straight: round.straight * scale } : round;
}
