import { useMemo } from "react";
import type { LengthUnit } from "#shared/drawing/dimensionText";
import { drawKit } from "#shared/drawing/drawKit";
import type { KitLine } from "#shared/drawing/KitLine";
import { SceneSvg } from "./SceneSvg";
import { useOwnWidth } from "./useOwnWidth";

type KitDrawingProps = { lines: readonly KitLine[]; unit?: LengthUnit; className?: string };

/** A rebuild kit, its parts drawn on one sheet at one scale, as wide as its place. */
export function KitDrawing({ lines, unit = "mm", className }: KitDrawingProps) {
  const [place, width] = useOwnWidth(760);
  const scene = useMemo(() => drawKit(lines, { width, unit }), [lines, width, unit]);
  return (
    <div ref={place} className={className}>
      <SceneSvg scene={scene} />
    </div>
  );
}
