import { outlinePath, round } from "./outlinePath";
import type { LineRole, MaterialLook, Scene, SceneItem, TextItem } from "./Scene";
import { type ColourName, fills, rimStroke, type Stroke, strokeOf } from "./sceneStyle";

/** An SVG element with its attributes as React spells them. */
export type SvgElement = { tag: string; attributes: Record<string, string | number>; children?: SvgElement[] };

export type Paint = {
  colour: (name: ColourName) => string;
  /** An id that no other drawing on the page has. */
  patternId: (material: MaterialLook) => string;
  text: (item: TextItem) => SvgElement[];
};

const layers = ["area", "rim", "outline", "measured", "extension", "dimension", "text"] as const;

/** What a scene looks like as SVG elements, hatch patterns first, painted from the back to the front. */
export function sceneElements(scene: Scene, paint: Paint): SvgElement[] {
  const used = new Set(
    scene.items.flatMap((item) => (item.type === "area" && isPatterned(item) ? [item.material] : [])),
  );
  const patterns = [...used].map((material) => pattern(material, scene.fine, paint));
  const painted = layers.flatMap((layer) => paintLayer(scene, layer, paint));
  return patterns.length > 0 ? [{ tag: "defs", attributes: {}, children: patterns }, ...painted] : painted;
}

function paintLayer(scene: Scene, layer: (typeof layers)[number], paint: Paint): SvgElement[] {
  const { items, fine } = scene;
  if (layer !== "rim") return items.filter((i) => layerOf(i) === layer).flatMap((i) => paintItem(i, fine, paint));
  const measured = items.filter((i) => i.type === "contour" || i.type === "line").filter((i) => i.role === "measured");
  return measured.map((i) => stroked(linePath(i), i.role, rimStroke(fine), paint));
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
    case "line":
      return [stroked(linePath(item), item.role, strokeOf(item.role, fine), paint)];
    case "arrow":
      return [{ tag: "path", attributes: { d: arrowPath(item), fill: paint.colour("ink") } }];
    case "text":
      return paint.text(item);
  }
}

function stroked(d: string, role: LineRole, stroke: Stroke, paint: Paint): SvgElement {
  const { colour, width, dash } = stroke;
  const corner = role === "outline" || role === "thin" ? "square" : "butt";
  const ends: SvgElement["attributes"] = dash ? { strokeDasharray: dash } : { strokeLinecap: corner };
  return { tag: "path", attributes: { d, fill: "none", stroke: paint.colour(colour), strokeWidth: width, ...ends } };
}

function linePath(item: Extract<SceneItem, { type: "contour" | "line" }>): string {
  if (item.type === "contour") return outlinePath(item.outline);
  const { from, to } = item;
  return `M${round(from.x)} ${round(from.y)}L${round(to.x)} ${round(to.y)}`;
}

/** Closed and filled, a third as wide as long: an angle of 19 degrees (ISO 129-1:2018 asks for 15 to 90; from memory). */
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
  // An upright line turned clockwise by 45 degrees rises to the right.
  if (kind === "lines") {
    return {
      tag: "pattern",
      attributes: { ...common, patternTransform: `rotate(${angle === 45 ? 45 : -45})` },
      children: [line],
    };
  }
  // A cell of five specks, uneven enough not to read as lines.
  const cell = size * 2;
  const specks = [
    [0.12, 0.2],
    [0.55, 0.08],
    [0.82, 0.44],
    [0.34, 0.56],
    [0.66, 0.86],
  ] as const;
  const dots = specks.map(([x, y]) => ({
    tag: "circle",
    attributes: { cx: x * cell, cy: y * cell, r: fine ? 0.45 : 0.65, fill: stroke },
  }));
  return { tag: "pattern", attributes: { ...common, width: cell, height: cell }, children: dots };
}
