import type { DimensionName } from "#shared/domain/partKinds";
import type { DimensionSign, LineRole, MaterialLook, Outline, Point } from "../Scene";

/**
 * One view of a part (a section, a face, a magnified cross-section) in millimetres around its own origin, y downwards.
 * What is asked to be dimensioned is listed; where the dimension lines go is decided by the layout.
 */
export type PartView = {
  /** Times the scale of the drawing; above 1 for a magnified cross-section. */
  magnification: number;
  areas: {
    material: MaterialLook;
    cut: boolean;
    outlines: Outline[] /** mm, of the thinnest wall */;
    thinnest: number;
  }[];
  contours: { role: LineRole; outline: Outline; dimension?: DimensionName }[];
  lines: { role: LineRole; from: Point; to: Point /** px added at both ends */; overhang?: number }[];
  marks: DimensionMark[];
  caption?: string;
};

export type Side = "left" | "right" | "top" | "bottom";

export type DimensionMark =
  /** Extension lines, a dimension line and its text beside the view. */
  | {
      mark: "linear";
      name: DimensionName;
      side: Side;
      /** Centre of the measured length, on the axis that it runs along. */
      middle: number;
      /** The feature's extent on the other axis: extension lines start at its end, as-found edges span it. */
      span: readonly [number, number];
      /** Where extension lines start instead, on a curved feature. */
      start?: number;
      sign?: DimensionSign;
    }
  /** A diameter at the bottom of a groove: arrows stand in the groove, the text at the right of the view. */
  | { mark: "groove"; name: DimensionName; sign?: DimensionSign }
  /** A circumference, written inside the loop where there is room and below it where not. */
  | { mark: "loop"; name: DimensionName; radius: number; straight: number; outer: number }
  /** Words at the right of the view, for a small drawing. */
  | { mark: "beside"; names: readonly DimensionName[]; sign?: DimensionSign };

export type LinearMark = Extract<DimensionMark, { mark: "linear" }>;

export function emptyView(magnification = 1): PartView {
  return { magnification, areas: [], contours: [], lines: [], marks: [] };
}
