import { percentText } from "./percentText";

type Props = {
  percent: number;
  advice: { min: number; ideal: number; max: number };
  /** Ends of the scale, in percent. */
  from: number;
  to: number;
};

const width = 300;
const edge = 10;
const axis = 30;

/** Where a stretch lies towards what is advised; an arrow where it lies off the scale. */
export function StretchScale({ percent, advice, from, to }: Props) {
  const xOf = (value: number) => edge + ((value - from) / (to - from)) * (width - 2 * edge);
  const x = xOf(Math.min(Math.max(percent, from), to));
  const isOff = percent < from || percent > to;
  const isInside = percent >= advice.min && percent <= advice.max;
  const colour = isInside ? "var(--color-inband)" : "var(--color-outband)";
  const way = percent < from ? -1 : 1;
  const marks = Array.from({ length: to - from + 1 }, (_, i) => from + i);
  const words = `${percentText(percent)} %; advised from ${advice.min} to ${advice.max} %, ideally ${advice.ideal} %`;
  return (
    <svg viewBox={`0 0 ${width} 54`} className="block w-full max-w-[300px]" role="img" aria-label={words}>
      <rect
        x={xOf(advice.min)}
        y={8}
        width={xOf(advice.max) - xOf(advice.min)}
        height={axis - 8}
        fill="var(--color-inband-fill)"
        stroke="var(--color-inband)"
      />
      <path d={`M${xOf(advice.ideal)} 8V${axis}`} stroke="var(--color-inband)" strokeDasharray="3 3" />
      <path d={`M0 ${axis}H${width}`} stroke="var(--color-ink)" />
      {marks.map((value) => (
        <g key={value} transform={`translate(${xOf(value)} ${axis})`}>
          <path d={`M0 0V${value % 2 === 0 ? 6 : 3}`} stroke="var(--color-ink)" />
          {value % 2 === 0 && (
            <text y={20} textAnchor="middle" fontSize={13} fill="var(--color-ink)">
              {value < 0 ? `\u2212${-value}` : value}
            </text>
          )}
        </g>
      ))}
      {isOff ? (
        <path d={`M${x - 5 * way} 13l${8 * way} 6l${-8 * way} 6z`} fill={colour} />
      ) : isInside ? (
        <circle cx={x} cy={19} r={5} fill={colour} />
      ) : (
        <path d={`M${x - 4.5} 14.5l9 9m-9 0l9 -9`} stroke={colour} strokeWidth={2.2} />
      )}
    </svg>
  );
}
