import { drawPart, type PartDrawingRequest } from "./drawPart";
import { PartSizes } from "./parts/PartSizes";
import { beltSection, sectionScaleFor } from "./partViews";

type Comparable = Pick<PartDrawingRequest, "kind" | "dims" | "asFound" | "unit">;

/** Room for a belt's cross-section in a row, px across. */
const sectionRoom = 36;

/**
 * The one scale at which all these parts fit the box of a row, so that a list of them can be compared by eye:
 * the largest that the largest part allows. For belts also the scale of their cross-sections.
 *
 * Units: the box in px; scales in px to the mm. Nothing for an empty list.
 */
export function sharedScale(
  parts: readonly Comparable[],
  box: { width?: number; height?: number } = {},
): { pxPerMm?: number; sectionPxPerMm?: number } {
  if (parts.length === 0) return {};
  const sections = parts.map(({ kind, dims, asFound }) => sectionOf(kind, new PartSizes(dims, asFound ?? {})));
  const belts = sections.filter((across) => across !== undefined);
  const section = belts.length > 0 ? { sectionPxPerMm: sectionScaleFor(Math.max(...belts), sectionRoom) } : {};
  const scales = parts.map((part) => drawPart({ ...part, ...box, ...section, view: "row" }).pxPerMm);
  return { pxPerMm: Math.min(...scales), ...section };
}

function sectionOf(kind: PartDrawingRequest["kind"], sizes: PartSizes): number | undefined {
  return kind === "flat-belt" || kind === "square-belt" || kind === "round-belt" ? beltSection(kind, sizes) : undefined;
}
