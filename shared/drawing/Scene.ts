import type { DimensionName } from "#shared/domain/partKinds";

/**
 * A drawing described without a browser: what lies where and what it means, never which colour it has.
 *
 * Units:  CSS pixels of the box that the scene was laid out for, y downwards, origin at its top left corner;
 *         `pxPerMm` is the scale of the part in it, so a true length of L mm measures L * pxPerMm.
 * Use:    the two renderers turn roles into colours (client/ui/drawing/SceneSvg, renderSceneToSvgString).
 */
export type Scene = {
  width: number;
  height: number;
  pxPerMm: number;
  /** A small drawing: narrower lines and closer hatching. */
  fine: boolean;
  /** Scale of a cross-section that is magnified in the same drawing, where there is one. */
  sectionPxPerMm?: number;
  items: SceneItem[];
  /** One line: what is drawn. */
  title: string;
  /** The text alternative: every size in words. */
  description: string;
};

export type Point = { x: number; y: number };
export type Box = { x: number; y: number; width: number; height: number };

/** A closed curve. A stadium is two half circles joined by straights of the given length, lying along x. */
export type Outline =
  | { shape: "polygon"; points: Point[] }
  | { shape: "circle"; centre: Point; radius: number }
  | { shape: "stadium"; centre: Point; radius: number; straight: number };

export type MaterialLook = "rubber" | "metal" | "felt" | "cork";

/**
 * `outline` stated edge, `thin` edge that no dimension sets (a usual proportion), `presumed` edge whose size
 * could be stated but is not, `centre` axis, `extension` and `dimension` as in ISO 129-1, `measured` the user's own part.
 */
export type LineRole = "outline" | "thin" | "presumed" | "centre" | "extension" | "dimension" | "measured" | "scale";
export type TextRole = "stated" | "tolerance" | "measured" | "note" | "label";
/** Drawn rather than typed, because few fonts have them. */
export type DimensionSign = "diameter" | "square";

export type AreaItem = {
  type: "area";
  material: MaterialLook;
  /** Cut surfaces are hatched (ISO 128-3); surfaces seen from outside and sections too thin to hatch are plain. */
  hatched: boolean;
  /** Filled by the even-odd rule, so an outline inside another is a hole. */
  outlines: Outline[];
};
export type ContourItem = { type: "contour"; role: LineRole; outline: Outline; dimension?: DimensionName };
export type LineItem = { type: "line"; role: LineRole; from: Point; to: Point; dimension?: DimensionName };
/** A filled arrowhead; `direction` is where it points, a unit vector. */
export type ArrowItem = { type: "arrow"; tip: Point; direction: Point; length: number };
export type TextItem = {
  type: "text";
  role: TextRole;
  content: string;
  sign?: DimensionSign;
  size: number;
  weight: 500 | 600;
  /** Reads upwards, from the right of the sheet. */
  turned: boolean;
  /** Where the words lie, after turning; no wider than the words need. */
  box: Box;
};
export type SceneItem = AreaItem | ContourItem | LineItem | ArrowItem | TextItem;
