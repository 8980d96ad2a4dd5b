import { memo } from "react";
import { hasInnerArrow } from "./boardLabels";
import { turnArrow } from "./turnArrow";

type Props = {
  number: number;
  x: number;
  y: number;
  radius: number;
  /** Direction of its free side, degrees; null without a route. */
  freeSide: number | null;
  /** The way it turns, 1 counter-clockwise. */
  turn: 1 | -1;
  beltPx: number;
  hasNumber: boolean;
  isRefused: boolean;
};

const badge = 11;

/** One pulley as it is drawn: brass, centre lines, its number, and the way it turns. */
export const PulleyMark = memo(function PulleyMark(props: Props) {
  const { number, x, y, radius, freeSide, turn, beltPx, hasNumber, isRefused } = props;
  const arm = radius + 9;
  const isInner = hasInnerArrow(radius);
  const arrow = isInner ? Math.max(badge + 6, radius * 0.62) : radius + beltPx + 6;
  return (
    <g transform={`translate(${x} ${y})`}>
      <circle
        r={radius}
        fill={isRefused ? "var(--color-sheet)" : "url(#belt-metal)"}
        stroke={isRefused ? "var(--color-outband)" : "var(--color-ink)"}
        strokeWidth={isRefused ? 3 : 1.5}
        strokeDasharray={isRefused ? "7 4" : undefined}
      />
      <path
        d={`M${-arm} 0H${arm}M0 ${-arm}V${arm}`}
        stroke="var(--color-soft)"
        strokeWidth={0.8}
        strokeDasharray="10 3 2 3"
      />
      {freeSide !== null && (
        <path
          d={turnArrow(arrow, freeSide, isInner ? 80 : 70, turn)}
          fill="none"
          stroke="var(--color-ink)"
          strokeWidth={1.6}
        />
      )}
      {hasNumber ? (
        <>
          <circle r={badge} fill={isRefused ? "var(--color-outband)" : "var(--color-measured)"} />
          <text y={4.5} textAnchor="middle" fontSize={13} fontWeight={700} fill="var(--color-on-measured)">
            {number}
          </text>
        </>
      ) : (
        <circle r={1.8} fill="var(--color-ink)" />
      )}
    </g>
  );
});
