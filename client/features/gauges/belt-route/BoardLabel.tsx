import { memo } from "react";

type Props = { x: number; y: number; strong?: string; soft: string };

/** Words on the board. They are moved by their group, so that the letters are not laid out anew in each frame of a drag. */
export const BoardLabel = memo(function BoardLabel({ x, y, strong, soft }: Props) {
  return (
    <g transform={`translate(${x} ${y})`}>
      <text y={4.5} fill="var(--color-soft)">
        {strong && (
          <tspan fontWeight={650} fill="var(--color-ink)">
            {strong}{" "}
          </tspan>
        )}
        {soft}
      </text>
    </g>
  );
});
