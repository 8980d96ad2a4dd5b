import type { PartKind } from "#shared/domain/partKinds";
import type { StatedDimensions } from "#shared/schemas/part";
import type { SearchItem } from "#shared/schemas/search";

export type Drawn = { kind: PartKind; dims: StatedDimensions };
export type RowScale = { pxPerMm?: number; sectionPxPerMm?: number };
export const rowDrawing = { width: 150, height: 132 };

/** What is drawn in a row: the part, or of a kit the line that fits, else its first measured line. */
export function drawnOf({ part, kitLineId }: Pick<SearchItem, "part" | "kitLineId">): Drawn | null {
  if (part.kind !== "rebuild-kit") return { kind: part.kind, dims: part.dimensions };
  const line = part.kitLines.find(({ id }) => id === kitLineId) ?? part.kitLines.find(({ kind }) => kind !== null);
  return line?.kind ? { kind: line.kind, dims: line.dimensions } : null;
}
