import { LabelLines } from "./LabelLines";
import type { Train } from "./layoutTrain";
import { TrainShapes } from "./TrainShapes";
import { type Detail, letterOf } from "./trainDetails";
import { toPx } from "./trainView";

/** A letter can be read on rubber as well. */
const halo = { paintOrder: "stroke", stroke: "var(--color-sheet)", strokeWidth: 4, strokeLinejoin: "round" } as const;
const thin = { stroke: "var(--color-ink)", strokeWidth: 0.9, fill: "none" };

/** A small wheel again in a round window, larger: its letter and by how much stand with it. */
export function TrainDetail({
  detail,
  train,
  cancels,
  id,
}: {
  detail: Detail;
  train: Train;
  cancels: readonly string[];
  id: string;
}) {
  const { letter, times, view, centre, radius, mark, wheel, label, words } = detail;
  const at = toPx(view, wheel);
  const r = wheel.r * view.pxPerMm;
  const beside = letterOf(mark);
  const clip = `${id}-${letter}`;
  return (
    <g>
      <clipPath id={clip}>
        <circle cx={centre.x} cy={centre.y} r={radius} />
      </clipPath>
      <g clipPath={`url(#${clip})`}>
        <TrainShapes train={train} view={view} cancels={cancels} />
        {/* Dimension line across the wheel with its arrowheads (ISO 129-1). */}
        <g stroke="var(--color-measured)" fill="var(--color-measured)">
          <path d={`M${at.x - r} ${at.y}H${at.x + r}`} strokeWidth={1.2} />
          <path d={`M${at.x - r} ${at.y}l9 -3v6ZM${at.x + r} ${at.y}l-9 -3v6Z`} stroke="none" />
        </g>
      </g>
      <circle cx={centre.x} cy={centre.y} r={radius} {...thin} />
      <circle cx={mark.x} cy={mark.y} r={mark.r} {...thin} />
      <text
        {...halo}
        x={beside.x}
        y={beside.y + 5}
        textAnchor="middle"
        fontSize={14}
        fontWeight={600}
        fill="var(--color-ink)"
      >
        {letter}
      </text>
      <text x={words.x} y={words.y} fontSize={12} fontWeight={500} fill="var(--color-soft)" textAnchor={words.anchor}>
        <tspan fontSize={14} fontWeight={600} fill="var(--color-ink)">
          {letter}
        </tspan>{" "}
        at {times} times the scale
      </text>
      <LabelLines label={label} x={words.x} y={words.y + 18} anchor={words.anchor} />
    </g>
  );
}
