import { useId } from "react";
import type { MouldDimension } from "#shared/domain/rubberTolerance";
import { DimensionLine } from "../DimensionLine";
import { Hatches } from "../Hatches";

const words: Record<MouldDimension, string> = {
  fixed: "Fixed: both ends of the size are formed by one part of the mould, so it repeats as the mould was cut.",
  closure: "Closure: the size runs across the split; how far the mould closes, and the flash in it, add to the size.",
};

/** A mould of two parts with rubber in it: which sizes one part forms, and which run across the split. */
export function MouldDrawing({ mould }: { mould: MouldDimension }) {
  const id = useId();
  const colour = (one: MouldDimension) => (one === mould ? "measured" : "ink");
  return (
    <figure className="grid gap-2">
      <svg viewBox="-24 10 344 186" className="block w-full max-w-[344px]" role="img" aria-label={words[mould]}>
        <Hatches id={id} />
        <path
          d="M30 38H230V92H190V62H70V92H30Z"
          fill={`url(#${id}-metal)`}
          stroke="var(--color-ink)"
          strokeWidth={1.4}
        />
        <path
          d="M30 96H70V132H190V96H230V162H30Z"
          fill={`url(#${id}-metal)`}
          stroke="var(--color-ink)"
          strokeWidth={1.4}
        />
        <path
          d="M70 62H190V92H212V96H190V132H70V96H48V92H70Z"
          fill={`url(#${id}-rubber)`}
          stroke="var(--color-ink)"
          strokeWidth={1.2}
        />
        <path d="M190 62H262M190 132H262" stroke="var(--color-soft)" strokeWidth={0.9} />
        <path d="M70 132V184M190 132V184" stroke="var(--color-soft)" strokeWidth={0.9} />
        <text x={30} y={24} fontSize={13.3} fill="var(--color-soft)">
          a mould in two parts, closed
        </text>
        <path d="M18 94H46" stroke="var(--color-soft)" strokeWidth={0.9} />
        <text x={-20} y={98} fontSize={13.3} fill="var(--color-soft)">
          flash
        </text>
        <DimensionLine from={{ x: 70, y: 182 }} to={{ x: 190, y: 182 }} text="fixed" colour={colour("fixed")} />
        <DimensionLine from={{ x: 256, y: 62 }} to={{ x: 256, y: 132 }} text="closure" colour={colour("closure")} />
      </svg>
      <figcaption className="text-soft">{words[mould]}</figcaption>
    </figure>
  );
}
