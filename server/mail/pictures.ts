import type { Logger } from "pino";
import sharp from "sharp";
import { drawPart } from "#shared/drawing/drawPart";
import { renderSceneToSvgString } from "#shared/drawing/renderSceneToSvgString";
import type { PartSummary } from "#shared/schemas/part";
import type { Picture } from "./Letter";

/** Drawn at twice the size that it is shown at, for sharp screens. */
const density = 72 * 2;
const toPng = (svg: string): Promise<Buffer> => sharp(Buffer.from(svg), { density }).png().toBuffer();

export const markContentId = "mark@idlewright";
let mark: Promise<Buffer> | undefined;

/** The mark: a wheel, its hub and the start of a belt. */
export function markPng(): Promise<Buffer> {
  mark ??= toPng(
    '<svg xmlns="http://www.w3.org/2000/svg" width="24" height="24" viewBox="0 0 24 24" fill="none" stroke="#16202E" stroke-width="2"><circle cx="10" cy="14" r="8"/><circle cx="10" cy="14" r="2.5"/><path d="M10 6H24"/></svg>',
  );
  return mark;
}

/** What there is to draw of a listing: itself, or the first measured line of a kit. */
function drawable({ kind, dimensions, kitLines }: PartSummary) {
  if (kind !== "rebuild-kit") return { kind, dims: dimensions };
  const line = kitLines.find((one) => one.kind !== null);
  return line?.kind ? { kind: line.kind, dims: line.dimensions } : null;
}

/** A part drawn to scale as a picture for mail; null where there is nothing to draw. A mail never fails for a drawing. */
export async function partPicture(contentId: string, listing: PartSummary, logger: Logger): Promise<Picture | null> {
  const what = drawable(listing);
  if (!what) return null;
  try {
    const scene = drawPart({ ...what, view: "row", material: listing.material ?? undefined });
    const png = await toPng(renderSceneToSvgString(scene, "light"));
    return { contentId, png, alt: scene.title, width: Math.round(scene.width), height: Math.round(scene.height) };
  } catch (error) {
    logger.error({ err: error, kind: listing.kind }, "a part could not be drawn for a mail");
    return null;
  }
}
