import { roundDecimal } from "#shared/domain/roundDecimal";
import { useOwnWidth } from "../../ui/drawing/useOwnWidth";

type Props = {
  /** Middle of the curve and its standard uncertainty, mm. */
  meanMm: number;
  sdMm: number;
  lowerMm: number;
  upperMm: number;
  /** What is needed, mm. */
  needMm: number;
  label: string;
};

const [top, base, height] = [30, 190, 234];

/** Where a part may lie, over what its place accepts, true to scale along the axis; the height says nothing. */
export function BellCurve({ meanMm, sdMm, lowerMm, upperMm, needMm, label }: Props) {
  const [place, width] = useOwnWidth(640);
  const middle = (lowerMm + upperMm) / 2;
  const half = (upperMm - lowerMm) * 1.5;
  const xOf = (mm: number) => ((mm - middle) / half) * (width / 2) + width / 2;
  const [low, high] = [xOf(lowerMm), xOf(upperMm)];
  const yOf = (mm: number) => base - (base - top - 14) * Math.exp(-(((mm - meanMm) / sdMm) ** 2) / 2);
  const curve = Array.from({ length: 241 }, (_, i) => {
    const mm = middle + half * (i / 120 - 1);
    return `${i === 0 ? "M" : "L"}${xOf(mm).toFixed(1)} ${yOf(mm).toFixed(1)}`;
  }).join("");
  const area = `${curve}V${base}H0Z`;
  const step = (upperMm - lowerMm) / 2;
  const ticks = [-2, -1, 0, 1, 2].map((times) => middle + times * step);
  const shown = Math.min(Math.max(xOf(needMm), 60), width - 60);
  return (
    <div ref={place} className="border border-rule bg-sheet">
      <svg
        width={width}
        height={height}
        viewBox={`0 0 ${width} ${height}`}
        className="block max-w-full"
        role="img"
        aria-label={label}
        fontSize="13"
      >
        <rect x={low} y={top} width={high - low} height={base - top} fill="var(--color-inband-fill)" />
        <path d={`M${low} ${top}V${base}M${high} ${top}V${base}`} stroke="var(--color-inband)" strokeWidth="1.6" />
        {sdMm > 0 ? (
          <>
            <clipPath id="bell-inside">
              <rect x={low} y="0" width={high - low} height={base} />
            </clipPath>
            <path d={area} fill="var(--color-outband)" opacity="0.25" />
            <path d={area} fill="var(--color-inband-fill)" clipPath="url(#bell-inside)" />
            <path d={area} fill="var(--color-inband)" opacity="0.35" clipPath="url(#bell-inside)" />
            <path d={curve} fill="none" stroke="var(--color-ink)" strokeWidth="2" />
          </>
        ) : (
          <path d={`M${xOf(meanMm)} ${top + 14}V${base}`} stroke="var(--color-ink)" strokeWidth="3" />
        )}
        <path
          d={`M${xOf(needMm)} ${top}V${base + 6}`}
          stroke="var(--color-measured)"
          strokeWidth="2"
          strokeDasharray="6 4"
        />
        <path
          d={`M0 ${base}H${width}${ticks.map((mm) => `M${xOf(mm)} ${base}v6`).join("")}`}
          fill="none"
          stroke="var(--color-ink)"
          strokeWidth="1.4"
        />
        <g fill="var(--color-soft)" textAnchor="middle">
          {ticks.map((mm) => (
            <text key={mm} x={xOf(mm)} y={base + 22}>
              {roundDecimal(mm, 2)}
            </text>
          ))}
        </g>
        <g textAnchor="middle" fontWeight="600">
          <text x={low / 2} y="20" fill="var(--color-outband)">
            too small
          </text>
          <text x={(low + high) / 2} y="20" fill="var(--color-inband)">
            accepted
          </text>
          <text x={(high + width) / 2} y="20" fill="var(--color-outband)">
            too large
          </text>
        </g>
        <text x={shown} y={base + 36} textAnchor="middle" fontWeight="600" fill="var(--color-measured)">
          needed {roundDecimal(needMm, 2)}
        </text>
      </svg>
    </div>
  );
}
