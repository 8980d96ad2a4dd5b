import { boxOfItem, overlap } from "#shared/drawing/layout/boxOfItem";
import type { Box, Outline, Point, Scene, SceneItem, TextItem } from "#shared/drawing/Scene";

/** Everything that a label of the scene touches and should not, in words; an empty list for a clean drawing. */
export function findCollisions(scene: Scene): string[] {
  const found: string[] = [];
  const texts = scene.items.filter((item) => item.type === "text");
  for (const [i, text] of texts.entries()) {
    const ink = inkOf(text);
    if (ink.x < 0 || ink.y < 0 || ink.x + ink.width > scene.width || ink.y + ink.height > scene.height) {
      found.push(`"${text.content}" leaves the sheet`);
    }
    for (const other of texts.slice(i + 1)) {
      if (overlap(ink, inkOf(other))) found.push(`"${text.content}" meets "${other.content}"`);
    }
    for (const item of scene.items) {
      if (item.type !== "text" && overlap(boxOfItem(item), ink) && touches(item, ink))
        found.push(`"${text.content}" meets ${nameOf(item)}`);
    }
  }
  return found;
}

/** The part of a text's box that letters can reach: the line spacing above and below them is left out. */
function inkOf({ box, size, turned }: TextItem): Box {
  const spare = (turned ? box.width : box.height) - size * 0.92;
  return turned
    ? { ...box, x: box.x + spare / 2, width: box.width - spare }
    : { ...box, y: box.y + spare / 2, height: box.height - spare };
}

function nameOf(item: SceneItem): string {
  return item.type === "contour" || item.type === "line" ? `a ${item.role} ${item.type}` : `an ${item.type}`;
}

function touches(item: Exclude<SceneItem, TextItem>, box: Box): boolean {
  switch (item.type) {
    case "line":
      return segmentMeets(item.from, item.to, box);
    case "arrow": {
      const { tip, direction, length } = item;
      return segmentMeets(tip, { x: tip.x - direction.x * length, y: tip.y - direction.y * length }, box);
    }
    case "contour":
      return edgeMeets(item.outline, box);
    case "area": {
      const middle = { x: box.x + box.width / 2, y: box.y + box.height / 2 };
      const filled = item.outlines.filter((outline) => contains(outline, middle)).length % 2 === 1;
      return filled || item.outlines.some((outline) => edgeMeets(outline, box));
    }
  }
}

function edgeMeets(outline: Outline, box: Box): boolean {
  const points = polyline(outline);
  return points.some((point, i) => segmentMeets(point, points[(i + 1) % points.length]!, box));
}

/** Curves as 240 chords. */
export function polyline(outline: Outline): Point[] {
  if (outline.shape === "polygon") return outline.points;
  const half = outline.shape === "stadium" ? outline.straight / 2 : 0;
  const { centre, radius } = outline;
  return [...Array(240).keys()].map((i) => {
    const angle = -Math.PI / 2 + ((i + 0.5) * Math.PI) / 120;
    const shift = i < 120 ? half : -half;
    return { x: centre.x + shift + radius * Math.cos(angle), y: centre.y + radius * Math.sin(angle) };
  });
}

function contains(outline: Outline, p: Point): boolean {
  const points = polyline(outline);
  let inside = false;
  for (const [i, a] of points.entries()) {
    const b = points[(i + 1) % points.length]!;
    if (a.y > p.y !== b.y > p.y && p.x < ((b.x - a.x) * (p.y - a.y)) / (b.y - a.y) + a.x) inside = !inside;
  }
  return inside;
}

/** Liang and Barsky's clipping: whether any of the segment lies in the box. */
function segmentMeets(from: Point, to: Point, box: Box): boolean {
  let [enter, leave] = [0, 1];
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  const sides = [
    [-dx, from.x - box.x],
    [dx, box.x + box.width - from.x],
    [-dy, from.y - box.y],
    [dy, box.y + box.height - from.y],
  ] as const;
  for (const [p, q] of sides) {
    if (p === 0 && q < 0) return false;
    if (p < 0) enter = Math.max(enter, q / p);
    if (p > 0) leave = Math.min(leave, q / p);
  }
  return enter <= leave;
}
