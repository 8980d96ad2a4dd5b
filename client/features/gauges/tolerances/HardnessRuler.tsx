type Props = {
  window: { lower: number; upper: number } | null;
  nominal: number | null;
  reading: number | null;
  width: number;
};

const side = 14;
const axis = 44;

/** The Shore A scale from end to end, the window of a stated hardness and a reading. */
export function HardnessRuler({ window, nominal, reading, width }: Props) {
  const xOf = (value: number) => side + (value / 100) * (width - 2 * side);
  const isInside = window && reading !== null && reading >= window.lower && reading <= window.upper;
  return (
    <svg width={width} height={74} className="block" aria-hidden="true">
      {window && (
        <rect
          x={xOf(window.lower)}
          y={12}
          width={xOf(window.upper) - xOf(window.lower)}
          height={axis - 12}
          fill="var(--color-inband-fill)"
          stroke="var(--color-inband)"
        />
      )}
      {nominal !== null && <path d={`M${xOf(nominal)} 12V${axis}`} stroke="var(--color-ink)" strokeWidth={1.4} />}
      <path d={`M0 ${axis + 0.5}H${width}`} stroke="var(--color-ink)" />
      {Array.from({ length: 21 }, (_, i) => i * 5).map((value) => (
        <g key={value} transform={`translate(${xOf(value)} ${axis})`}>
          <path d={`M0 0V${value % 10 === 0 ? 7 : 4}`} stroke="var(--color-ink)" />
          {value % (width < 420 ? 20 : 10) === 0 && (
            <text y={21} textAnchor="middle" fontSize={13} fill="var(--color-ink)">
              {value}
            </text>
          )}
        </g>
      ))}
      {reading !== null && (
        <path
          d={isInside ? `M${xOf(reading)} 2v${axis - 2}` : `M${xOf(reading)} 2v${axis - 2}m-4 -34l8 8m-8 0l8 -8`}
          stroke={isInside ? "var(--color-measured)" : "var(--color-outband)"}
          strokeWidth={2}
        />
      )}
    </svg>
  );
}
