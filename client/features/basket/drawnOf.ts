import type { PartSummary } from "#shared/schemas/part";
import type { Drawable } from "../../ui/drawing/comparedScale";

/** What is drawn of a part: itself, or the first measured line of a kit; null where nothing of it is measured. */
export function drawnOf({ kind, dimensions, kitLines }: PartSummary): Drawable | null {
  if (kind !== "rebuild-kit") return { kind, dims: dimensions };
  const line = kitLines.find((one) => one.kind !== null);
  return line?.kind ? { kind: line.kind, dims: line.dimensions } : null;
}
