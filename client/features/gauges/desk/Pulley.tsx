type Circle = { x: number; y: number; r: number };

/** A pulley with its axes. */
export function Pulley({ x, y, r }: Circle) {
  return (
    <g transform={`translate(${x} ${y})`}>
      <circle r={r} fill="var(--color-metal-fill)" stroke="var(--color-ink)" strokeWidth={1.4} />
      <path
        d={`M${-r - 5} 0H${r + 5}M0 ${-r - 5}V${r + 5}`}
        stroke="var(--color-soft)"
        strokeWidth={0.8}
        strokeDasharray="8 2 2 2"
      />
    </g>
  );
}
