type Props = {
  /** Ends of the line, px; it lies level or upright. */
  from: { x: number; y: number };
  to: { x: number; y: number };
  /** Stands above a level line, or to the right of an upright one. */
  text: string;
  colour?: "ink" | "measured";
  /** Where the text goes when the line is too short for it. */
  beside?: "start" | "end";
};

const arrow = 7;

/** A dimension line with its arrowheads (ISO 129-1); a short one has them pointing inwards from outside. */
export function DimensionLine({ from, to, text, colour = "ink", beside }: Props) {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const upright = from.x === to.x;
  const short = length < 3 * arrow;
  const turn = upright ? 90 : 0;
  const stroke = `var(--color-${colour})`;
  const reach = short ? 2 * arrow : 0;
  const head = (x: number, way: 1 | -1) => `M${x} 0l${way * (short ? -arrow : arrow)} -2.4v4.8z`;
  const isBeside = beside !== undefined || short;
  const textX = upright
    ? from.x + 7
    : isBeside
      ? beside === "start"
        ? from.x - reach - 5
        : to.x + reach + 5
      : (from.x + to.x) / 2;
  const anchor = upright ? "start" : isBeside ? (beside === "start" ? "end" : "start") : "middle";
  const textY = upright ? (from.y + to.y) / 2 + 4.5 : isBeside ? from.y + 4.5 : from.y - 6;
  return (
    <g>
      <g transform={`translate(${from.x} ${from.y}) rotate(${turn})`} stroke="none" fill={stroke}>
        <path d={`M${-reach} 0H${length + reach}`} stroke={stroke} />
        <path d={head(0, 1)} />
        <path d={head(length, -1)} />
      </g>
      <text x={textX} y={textY} textAnchor={anchor} fontSize={13.3} fontWeight={600} fill={stroke}>
        {text}
      </text>
    </g>
  );
}
