import { type DimensionName, dimensionsOf, dimensionWords, type PartKind } from "#shared/domain/partKinds";
import { dimensionText } from "#shared/drawing/dimensionText";
import type { PartSummary, StatedDimensions } from "#shared/schemas/part";

function sizes(kind: PartKind, dimensions: StatedDimensions): string {
  const said = (name: DimensionName) => {
    const size = dimensions[name];
    if (!size) return [];
    const { nominal, tolerance } = dimensionText(size, "mm");
    return [`${dimensionWords[name]} ${nominal}${tolerance ? ` ${tolerance}` : ""} mm`];
  };
  return dimensionsOf(kind).flatMap(said).join(", ");
}

/** What a listing states, in words; a kit names its lines. Empty where it states nothing. */
export function sizesText({
  kind,
  dimensions,
  kitLines,
}: Pick<PartSummary, "kind" | "dimensions" | "kitLines">): string {
  if (kind !== "rebuild-kit") return sizes(kind, dimensions);
  return kitLines
    .map((line) => {
      const stated = line.kind ? sizes(line.kind, line.dimensions) : "";
      return `${line.quantity} x ${line.title}${stated ? ` (${stated})` : ""}`;
    })
    .join("; ");
}
