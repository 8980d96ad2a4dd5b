import { outlinePath, round } from "./outlinePath";
import type { MaterialLook, Scene, SceneItem, TextItem } from "./Scene";
import { type ColourName, fills, rimOf, type Stroke, strokeOf } from "./sceneStyle";

/** An SVG element with its attributes as React spells them. */
export type SvgElement = { tag: string; attributes: Record<string, string | number>; children?: SvgElement[] };

export type Paint = {
  colour: (name: ColourName) => string;
  /** An id that no other drawing on the page has. */
  patternId: (material: MaterialLook) => string;
  text: (item: TextItem) => SvgElement[];
};

const layers = ["area", "outline", "measured", "extension", "dimension", "text"] as const;

/** What a scene looks like as SVG elements, hatch patterns first, painted from the back to the front. */
export function sceneElements(scene: Scene, paint: Paint): SvgElement[] {
  const used = new Set(
    scene.items.flatMap((item) => (item.type === "area" && isPatterned(item) ? [item.material] : [])),
  );
  const patterns = [...used].map((material) => pattern(material, scene.fine, paint));
  const painted = layers.flatMap((layer) =>
    scene.items.filter((i) => layerOf(i) === layer).flatMap((i) => paintItem(i, scene.fine, paint)),
  );
  return patterns.length > 0 ? [{ tag: "defs", attributes: {}, children: patterns }, ...painted] : painted;
}

function layerOf(item: SceneItem): (typeof layers)[number] {
  if (item.type === "area" || item.type === "text") return item.type;
  if (item.type === "arrow" || item.role === "dimension") return "dimension";
  return item.role === "measured" || item.role === "extension" ? item.role : "outline";
}

function isPatterned(item: Extract<SceneItem, { type: "area" }>): boolean {
  return item.hatched || fills[item.material].pattern === "dots";
}

function paintItem(item: SceneItem, fine: boolean, paint: Paint): SvgElement[] {
  switch (item.type) {
    case "area": {
      const d = item.outlines.map(outlinePath).join("");
      const base = {
        tag: "path",
        attributes: { d, fillRule: "evenodd", fill: paint.colour(fills[item.material].base) },
      };
      if (!isPatterned(item)) return [base];
      return [
        base,
        { tag: "path", attributes: { d, fillRule: "evenodd", fill: `url(#${paint.patternId(item.material)})` } },
      ];
    }
    case "contour":
      return stroked(outlinePath(item.outline), item.role, fine, paint);
    case "line": {
      const { from, to } = item;
      return stroked(`M${round(from.x)} ${round(from.y)}L${round(to.x)} ${round(to.y)}`, item.role, fine, paint);
    }
    case "arrow":
      return [{ tag: "path", attributes: { d: arrowPath(item), fill: paint.colour("ink") } }];
    case "text":
      return paint.text(item);
  }
}

function stroked(d: string, role: Parameters<typeof strokeOf>[0], fine: boolean, paint: Paint): SvgElement[] {
  const rim = rimOf(role, fine);
  const strokes: Stroke[] = rim ? [rim, strokeOf(role, fine)] : [strokeOf(role, fine)];
  return strokes.map(({ colour, width, dash }) => ({
    tag: "path",
    attributes: {
      d,
      fill: "none",
      stroke: paint.colour(colour),
      strokeWidth: width,
      ...(dash
        ? { strokeDasharray: dash }
        : { strokeLinecap: role === "outline" || role === "thin" ? "square" : "butt" }),
    },
  }));
}

/** Filled, a third as wide as long (ISO 129-1 leaves the angle between 15 and 90 degrees). */
function arrowPath({ tip, direction, length }: Extract<SceneItem, { type: "arrow" }>): string {
  const [bx, by] = [tip.x - direction.x * length, tip.y - direction.y * length];
  const [nx, ny] = [(-direction.y * length) / 6, (direction.x * length) / 6];
  return `M${round(tip.x)} ${round(tip.y)}L${round(bx + nx)} ${round(by + ny)}L${round(bx - nx)} ${round(by - ny)}Z`;
}

function pattern(material: MaterialLook, fine: boolean, paint: Paint): SvgElement {
  const { hatch, angle, pattern: kind } = fills[material];
  const size = fine ? 4 : 6;
  const stroke = paint.colour(hatch);
  const common = { id: paint.patternId(material), width: size, height: size, patternUnits: "userSpaceOnUse" };
  const line = { tag: "path", attributes: { d: `M0 0V${size}`, stroke, strokeWidth: fine ? 0.9 : 1.1 } };
  // Turning an upright line by 45 degrees clockwise leaves it falling to the left, as ISO 128-3 draws it.
  if (kind === "lines") {
    return {
      tag: "pattern",
      attributes: { ...common, patternTransform: `rotate(${angle === 45 ? 45 : -45})` },
      children: [line],
    };
  }
  const dot = (x: number, y: number) => ({
    tag: "circle",
    attributes: { cx: x, cy: y, r: fine ? 0.5 : 0.7, fill: stroke },
  });
  const dots = [dot(size * 0.2, size * 0.3), dot(size * 0.7, size * 0.75)];
  return { tag: "pattern", attributes: { ...common, patternTransform: "rotate(20)" }, children: dots };
}
