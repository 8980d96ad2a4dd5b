import { useId } from "react";
import { type AxisMark, axisMarks } from "../../../lib/axisMarks";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { useOwnWidth } from "../../../ui/drawing/useOwnWidth";
import { DimensionLine } from "../DimensionLine";
import type { Sample } from "./readSample";

type Props = { sample: Sample; unit: SizeUnit };

const left = 20;
/** Half the height of the gap between the two sides of a belt that lies flat, px. */
const gap = 7;
const [foundY, newY, rulerY, height] = [74, 138, 200, 236];

/** The inside of a belt laid flat is a straight run with half a circle at each end. */
const loop = (right: number, y: number, more: number) => {
  const r = gap + more;
  return `M${left + gap} ${y - r}H${right - gap}a${r} ${r} 0 0 1 0 ${2 * r}H${left + gap}a${r} ${r} 0 0 1 0 ${-2 * r}Z`;
};

/**
 * The belt laid flat beside a ruler, one scale for all: above as it was found, dashed, below as it was when new, with the
 * band of its uncertainty at the fold. Both begin at the same line, so that the other ends show what has changed.
 */
export function BeltLaidOut({ sample, unit }: Props) {
  const [place, width] = useOwnWidth(760);
  const id = useId();
  const { asFound, asNew } = sample.result;
  const [foundMm, newMm] = [asFound.insideCircumferenceMm / 2, asNew.insideCircumferenceMm / 2];
  // U = 2 u of the circumference is u of half of it, doubled.
  const newPlusMinus = asNew.standardUncertaintyMm;
  const rest = Math.max(56, width * 0.06);
  const scale = (width - left - rest) / Math.max(foundMm, newMm + newPlusMinus);
  const at = (mm: number) => left + mm * scale;
  const thick = Math.min(Math.max(sample.input.thicknessMm * scale, 2), 14);
  const from = Math.max(at(newMm - newPlusMinus), left);
  const words = (mm: number) => `${roundedSize(mm, unit)} ${unit}`;
  const label = `Laid flat, the inside was ${words(foundMm)} as found and is ${words(newMm)} as new, give or take ${words(newPlusMinus)}`;
  const toMm = (width - left - 6) / scale;
  const marks = axisMarks({ fromMm: 0, toMm }, width - left - 6, unit);

  return (
    <div ref={place} className="gauge-sheet overflow-hidden">
      <svg width={width} height={height} className="block" role="img" aria-labelledby={id} fontFamily="inherit">
        <title id={id}>{label}</title>
        <rect
          x={from}
          y={foundY - gap - 10}
          width={Math.max(at(newMm + newPlusMinus) - from, 1)}
          height={rulerY - foundY + gap + 10}
          fill="var(--color-measured-fill)"
        />
        <path
          d={`M${left} 22V${rulerY}M${at(foundMm)} 22V${rulerY}M${at(newMm)} ${newY - gap}V${rulerY}`}
          stroke="var(--color-soft)"
          strokeWidth={0.9}
        />
        <path
          d={loop(at(foundMm), foundY, 0) + (thick < 4 ? "" : loop(at(foundMm), foundY, thick))}
          fill="none"
          stroke="var(--color-measured)"
          strokeWidth={1.6}
          strokeDasharray="6 4"
        />
        <path
          d={loop(at(newMm), newY, 0) + loop(at(newMm), newY, thick)}
          fill="var(--color-rubber)"
          fillRule="evenodd"
          stroke="var(--color-rubber-hatch)"
        />
        <DimensionLine
          from={{ x: left, y: 36 }}
          to={{ x: at(foundMm), y: 36 }}
          text={`½ C as found ${roundedSize(foundMm, unit)}`}
          colour="measured"
        />
        <DimensionLine
          from={{ x: left, y: newY + 42 }}
          to={{ x: at(newMm), y: newY + 42 }}
          text={`½ C as new ${roundedSize(newMm, unit)} ± ${roundedSize(newPlusMinus, unit)}`}
        />
        <Ruler marks={marks} at={at} to={width} unit={unit} />
      </svg>
    </div>
  );
}

type RulerProps = { marks: readonly AxisMark[]; at: (mm: number) => number; to: number; unit: SizeUnit };

function Ruler({ marks, at, to, unit }: RulerProps) {
  return (
    <g>
      <path
        d={`M${left - 8} ${rulerY}H${to}${marks.map(({ mm, label }) => `M${at(mm)} ${rulerY}v${label ? 11 : 6}`).join("")}`}
        stroke="var(--color-ink)"
        fill="none"
      />
      {marks.map(({ mm, label }) =>
        label === null ? null : (
          <text key={mm} x={at(mm)} y={rulerY + 26} textAnchor="middle" fontSize={13.3} fill="var(--color-ink)">
            {mm === 0 ? `0 ${unit}` : label}
          </text>
        ),
      )}
    </g>
  );
}
