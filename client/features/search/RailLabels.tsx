type Props = {
  estimateX: number;
  estimate: string;
  bandFromX: number;
  bandToX: number;
  band: string;
  width: number;
  y: number;
};

const letter = 7;
type Span = { from: number; to: number };
const clear = (a: Span, b: Span) => a.to + 8 <= b.from || b.to + 8 <= a.from;

/** The estimate beside its marker, and the accepted band outside its own edges: wherever both have room. */
export function RailLabels({ estimateX, estimate, bandFromX, bandToX, band, width, y }: Props) {
  const estimateWidth = estimate.length * letter + 4;
  const onRight = estimateX + 12 + estimateWidth < width;
  const at = onRight ? estimateX + 12 : estimateX - 12;
  const taken: Span = onRight
    ? { from: estimateX - 8, to: at + estimateWidth }
    : { from: at - estimateWidth, to: estimateX + 8 };

  const bandWidth = band.length * letter;
  const places: (Span & { anchor: "start" | "end" })[] = [
    { from: bandToX + 6, to: bandToX + 6 + bandWidth, anchor: "start" },
    { from: bandFromX - 6 - bandWidth, to: bandFromX - 6, anchor: "end" },
  ];
  const free = places.find((span) => span.from >= 0 && span.to <= width && clear(span, taken));
  return (
    <g fontSize={13} fontWeight={600}>
      <text x={at} y={y} textAnchor={onRight ? "start" : "end"} fill="var(--color-measured)">
        {estimate}
      </text>
      {free && (
        <text
          x={free.anchor === "start" ? free.from : free.to}
          y={y}
          textAnchor={free.anchor}
          fill="var(--color-inband)"
        >
          {band}
        </text>
      )}
    </g>
  );
}
