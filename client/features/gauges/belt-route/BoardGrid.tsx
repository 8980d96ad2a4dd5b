import { memo } from "react";
import { type Board, gridOf, type View } from "./boardView";

/** Millimetre paper: fine lines, main ones with their numbers along the lower and the left edge. */
export const BoardGrid = memo(function BoardGrid({ view, board }: { view: View; board: Board }) {
  const { upright, level } = gridOf(view, board);
  const { width, height } = board;
  const path = (isMain: boolean) =>
    [
      ...upright.filter(({ label }) => (label !== null) === isMain).map(({ px }) => `M${px.toFixed(1)} 0V${height}`),
      ...level.filter(({ label }) => (label !== null) === isMain).map(({ px }) => `M0 ${px.toFixed(1)}H${width}`),
    ].join("");
  return (
    <g>
      <path d={path(false)} stroke="var(--color-rule)" strokeWidth={0.5} opacity={0.55} />
      <path d={path(true)} stroke="var(--color-rule)" strokeWidth={1} />
      <g fontSize={11.5} fill="var(--color-soft)">
        {upright.map(
          ({ px, label }) =>
            label !== null &&
            px > 30 &&
            px < width - 26 && (
              <text key={label} x={px} y={height - 5} textAnchor="middle">
                {label}
              </text>
            ),
        )}
        {level.map(
          ({ px, label }) =>
            label !== null &&
            px > 18 &&
            px < height - 22 && (
              <text key={label} x={5} y={px + 4}>
                {label}
              </text>
            ),
        )}
      </g>
    </g>
  );
});
