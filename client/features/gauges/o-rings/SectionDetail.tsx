import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import type { RingNeed } from "./ringNeed";

type Props = {
  need: RingNeed;
  unit: SizeUnit;
  hatchId: string;
  /** px to the mm of the ring beside it. */
  ringScale: number;
  box: { x: number; width: number; height: number };
};

/** A cut through the ring, magnified: the section before as a broken line, after as rubber, on its seat or in its groove. */
export function SectionDetail({ need, unit, hatchId, ringScale, box }: Props) {
  const { picked, onSeat, use } = need;
  const room = Math.min(box.width - 72, box.height - 128);
  const magnified = Math.max(1, Math.floor(room / (picked.sectionMm * ringScale)));
  const scale = ringScale * magnified;
  // A ring that takes the place of another is not on anything here.
  const drawnMm = use === "ring" ? picked.sectionMm : onSeat.sectionMm;
  const [before, after] = [(picked.sectionMm / 2) * scale, (drawnMm / 2) * scale];
  const cx = box.x + box.width / 2;
  const seatY = 24 + 2 * before + Math.max(0, (box.height - 128 - 2 * before) / 2);
  const half = Math.min(box.width / 2 - 8, before + 34);
  const depth = 30;
  return (
    <g>
      <path
        d={
          use === "belt"
            ? groovePath(cx, seatY, half, before, depth)
            : `M${cx - half} ${seatY}H${cx + half}v${depth}h${-2 * half}z`
        }
        fill={use === "ring" ? "none" : `url(#${hatchId}-metal)`}
        stroke={use === "ring" ? "none" : "var(--color-ink)"}
        strokeWidth={1.2}
      />
      <circle
        cx={cx}
        cy={seatY - after}
        r={after}
        fill={`url(#${hatchId}-rubber)`}
        stroke="var(--color-ink)"
        strokeWidth={1.2}
      />
      <circle
        cx={cx}
        cy={seatY - before}
        r={before}
        fill="none"
        stroke="var(--color-ink)"
        strokeWidth={1.3}
        strokeDasharray="5 3"
      />
      <text x={cx} y={seatY + depth + 20} textAnchor="middle" fontSize={13.3} fill="var(--color-ink)">
        <tspan fontWeight={600}>
          {onSeat.stretchPercent > 0 && use !== "ring" && `${roundedSize(picked.sectionMm, unit)} → `}
          {roundedSize(drawnMm, unit)} {unit}
        </tspan>
      </text>
      <text x={cx} y={seatY + depth + 38} textAnchor="middle" fontSize={13.3} fill="var(--color-soft)">
        {magnified > 1 ? `section, ${magnified} × the ring` : "section, same scale"}
      </text>
    </g>
  );
}

/** A round groove, as belts of this sort run in: its bottom is as round as the ring. */
function groovePath(cx: number, seatY: number, half: number, r: number, depth: number): string {
  const lip = seatY - r;
  const bottom = seatY + depth;
  return `M${cx - half} ${lip}H${cx - r}A${r} ${r} 0 0 0 ${cx + r} ${lip}H${cx + half}V${bottom}H${cx - half}Z`;
}
