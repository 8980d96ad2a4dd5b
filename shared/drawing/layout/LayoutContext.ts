import type { LengthUnit } from "../dimensionText";
import type { PartSizes } from "../parts/PartSizes";
import type { DrawingStyle } from "./DrawingStyle";

/** What every step of a layout needs to know besides the view itself. */
export type LayoutContext = { sizes: PartSizes; unit: LengthUnit; style: DrawingStyle };
