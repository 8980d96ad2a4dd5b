import type { PartKind } from "#shared/domain/partKinds";
import type { MeasuredDimensions, StatedDimensions } from "./parts/PartSizes";

/** A line of a rebuild kit. Without a kind it is a plain item, such as grease, and is only named. */
export type KitLine = {
  /** What it is for or is: "platter idler", "circlip". */
  label: string;
  quantity?: number | undefined;
  kind?: PartKind | undefined;
  dims?: StatedDimensions | undefined;
  asFound?: MeasuredDimensions | undefined;
  material?: string | undefined;
};
