import { axisMarks } from "../../../lib/axisMarks";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { RingTicks } from "./RingTicks";
import { ringLanes, ringView } from "./ringLanes";
import type { RingNeed, RingOffer } from "./ringNeed";

type Props = {
  need: RingNeed;
  unit: SizeUnit;
  width: number;
  litDash: string | null;
  onLight: (dash: string | null) => void;
  onPick: (dash: string) => void;
};

const top = 30;
const laneHeight = 46;
const side = 12;

/** The standard sizes along their inside diameter, true to scale: one lane a section, what is advised as a blue band. */
export function RingRail({ need, unit, width, litDash, onLight, onPick }: Props) {
  const narrow = width < 560;
  const all = ringLanes(need);
  const view = ringView(need, all, narrow ? 4 : 8);
  const isSeen = ({ insideDiameterMm }: RingOffer) => insideDiameterMm >= view.fromMm && insideDiameterMm <= view.toMm;
  const lanes = all.filter(({ rings }) => rings.some(isSeen));
  const xOf = (mm: number) => side + ((mm - view.fromMm) / (view.toMm - view.fromMm)) * (width - 2 * side);
  const axis = top + lanes.length * laneHeight + 6;
  const [from, to, ideal] = [need.band.fromMm, need.band.toMm, need.idealMm].map(xOf) as [number, number, number];
  const words = `${roundedSize(need.band.fromMm, unit)} to ${roundedSize(need.band.toMm, unit)} ${unit} inside`;
  const isRight = (from + to) / 2 > width / 2;

  return (
    <svg width={width} height={axis + 28} className="block" aria-hidden="true">
      <rect
        x={from}
        y={top - 6}
        width={Math.max(to - from, 2)}
        height={axis - top + 6}
        fill="var(--color-measured-fill)"
        opacity={0.75}
      />
      <path d={`M${ideal} ${top - 6}V${axis}`} stroke="var(--color-measured)" strokeWidth={1.8} />
      <text
        x={isRight ? Math.max(to, ideal) : Math.min(from, ideal)}
        y={top - 12}
        textAnchor={isRight ? "end" : "start"}
        fontSize={13.3}
        fontWeight={650}
        fill="var(--color-measured)"
      >
        {words}
      </text>
      {lanes.map(({ sectionMm, rings }, i) => (
        <g key={sectionMm ?? "odd"} transform={`translate(0 ${top + i * laneHeight})`}>
          <path d={`M0 ${laneHeight}H${width}`} stroke="var(--color-rule)" />
          <RingTicks
            rings={rings}
            xOf={xOf}
            width={width}
            height={laneHeight}
            name={sectionMm === null ? "odd sections" : `section ${roundedSize(sectionMm, unit)}`}
            idealMm={need.idealMm}
            pickedDash={need.picked.dash}
            litDash={litDash}
            onLight={onLight}
            onPick={onPick}
          />
        </g>
      ))}
      <path d={`M0 ${axis + 0.5}H${width}`} stroke="var(--color-ink)" />
      {axisMarks(view, width - 2 * side, unit).map(({ mm, label }) => (
        <g key={mm} transform={`translate(${xOf(mm).toFixed(1)} ${axis})`}>
          <path d={`M0 0V${label ? 7 : 4}`} stroke="var(--color-ink)" strokeWidth={label ? 1.2 : 0.8} />
          {label && xOf(mm) > 16 && xOf(mm) < width - 16 && (
            <text y={21} textAnchor="middle" fontSize={13} fill="var(--color-ink)">
              {label}
            </text>
          )}
        </g>
      ))}
    </svg>
  );
}
