import type { PartSummary } from "#shared/schemas/part";
import type { Drawable } from "../../ui/drawing/comparedScale";

const drawnKitLine = ({ kind, kitLines }: PartSummary) =>
  kind === "rebuild-kit" ? kitLines.find((line) => line.kind !== null) : undefined;

/** What is drawn of a part: itself, or the first measured line of a kit; null where nothing of it is measured. */
export function drawnOf(part: PartSummary): Drawable | null {
  if (part.kind !== "rebuild-kit") return { kind: part.kind, dims: part.dimensions };
  const line = drawnKitLine(part);
  return line?.kind ? { kind: line.kind, dims: line.dimensions } : null;
}

/** Which of a kit's parts is drawn, where it is one. */
export function captionOf(part: PartSummary): string | undefined {
  const line = drawnKitLine(part);
  return line && `${line.title}, of the kit`;
}
