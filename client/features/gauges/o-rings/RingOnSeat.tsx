import { useId } from "react";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { DimensionLine } from "../DimensionLine";
import { Hatches } from "../Hatches";
import type { RingNeed } from "./ringNeed";
import { SectionDetail } from "./SectionDetail";

const seatNames = { seat: "seat", belt: "path made round", ring: "as measured" } as const;

/** The ring on its seat, at one scale, with its outline before it was stretched; beside it its section, magnified. */
export function RingOnSeat({ need, unit, width }: { need: RingNeed; unit: SizeUnit; width: number }) {
  const id = useId();
  const narrow = width < 560;
  const height = narrow ? 236 : 280;
  const left = Math.round(width * (narrow ? 0.56 : 0.58));
  const { picked, seatMm, onSeat, use } = need;
  const isStretched = use !== "ring" && onSeat.stretchPercent > 0;
  const insideMm = isStretched ? seatMm : picked.insideDiameterMm;
  const outsideMm = insideMm + 2 * (isStretched ? onSeat.sectionMm : picked.sectionMm);
  const widestMm = Math.max(outsideMm, seatMm, picked.insideDiameterMm + 2 * picked.sectionMm);
  const scale = Math.min(left - 24, height - 62) / widestMm;
  const [cx, cy] = [left / 2, 14 + (widestMm * scale) / 2];
  const r = (mm: number) => (mm / 2) * scale;
  const dimensionY = cy + (widestMm * scale) / 2 + 26;
  const edges = r(outsideMm);
  const beforeWords = `${roundedSize(picked.insideDiameterMm, unit)} ${unit} inside`;
  const label = isStretched
    ? `Ring ${picked.dash}, ${beforeWords}, stretched by ${onSeat.stretchPercent.toFixed(1)} % to ${roundedSize(seatMm, unit)} ${unit}; its section goes from ${roundedSize(picked.sectionMm, unit)} to ${roundedSize(onSeat.sectionMm, unit)} ${unit}`
    : `Ring ${picked.dash}, ${beforeWords}, ${use === "ring" ? "over the old one of" : "loose on"} ${roundedSize(seatMm, unit)} ${unit}`;

  return (
    <svg width={width} height={height} className="block" role="img" aria-label={label}>
      <Hatches id={id} />
      <g transform={`translate(${cx} ${cy})`}>
        {use === "seat" && (
          <circle r={r(seatMm)} fill={`url(#${id}-metal)`} stroke="var(--color-ink)" strokeWidth={1.2} />
        )}
        <path
          d={ringPath(r(insideMm), r(outsideMm))}
          fillRule="evenodd"
          fill="var(--color-rubber)"
          stroke="var(--color-rubber-hatch)"
        />
        {use !== "seat" && (
          <circle r={r(seatMm)} fill="none" stroke="var(--color-measured)" strokeWidth={1.8} strokeDasharray="6 4" />
        )}
        {isStretched && (
          <circle
            r={r(picked.insideDiameterMm)}
            fill="none"
            stroke="var(--color-ink)"
            strokeWidth={1.3}
            strokeDasharray="5 3"
          />
        )}
        <path
          d={`M${-edges - 8} 0H${edges + 8}M0 ${-edges - 8}V${edges + 8}`}
          stroke="var(--color-soft)"
          strokeWidth={0.9}
          strokeDasharray="12 3 2 3"
        />
      </g>
      <path
        d={[-1, 1].map((way) => `M${cx + way * r(seatMm)} ${cy + 4}V${dimensionY + 4}`).join("")}
        stroke="var(--color-soft)"
        strokeWidth={0.9}
      />
      <DimensionLine
        from={{ x: cx - r(seatMm), y: dimensionY }}
        to={{ x: cx + r(seatMm), y: dimensionY }}
        text={`${seatNames[use]} ${roundedSize(seatMm, unit)}`}
        colour="measured"
      />
      <SectionDetail
        need={need}
        unit={unit}
        hatchId={id}
        ringScale={scale}
        box={{ x: left, width: width - left, height }}
      />
    </svg>
  );
}

const disc = (r: number) => `M${-r} 0A${r} ${r} 0 1 0 ${r} 0A${r} ${r} 0 1 0 ${-r} 0Z`;
const ringPath = (inside: number, outside: number) => disc(inside) + disc(outside);
