import { useMemo } from "react";
import type { SizeUnit } from "../../lib/formatSize";
import { type ComparedScale, comparedBox, type Drawable, reductionOf } from "./comparedScale";
import { PartDrawing } from "./PartDrawing";

type Props = {
  part: Drawable;
  scale: ComparedScale;
  unit: SizeUnit;
  material?: string | undefined;
  caption?: string | undefined;
};

/** A part at the scale of its list; a belt too long for that is drawn smaller and says so. */
export function ComparedDrawing({ part, scale, unit, material, caption }: Props) {
  const by = useMemo(() => reductionOf(part, scale), [part, scale]);
  return (
    <figure className="w-[120px] text-center">
      <PartDrawing
        view="row"
        kind={part.kind}
        dims={part.dims}
        unit={unit}
        material={material}
        {...comparedBox}
        {...scale}
        pxPerMm={scale.pxPerMm / by}
      />
      {(caption || by > 1) && (
        <figcaption className="text-small text-soft">
          {caption} {by > 1 && `loop at 1/${by} scale`}
        </figcaption>
      )}
    </figure>
  );
}
