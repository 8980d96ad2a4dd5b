import { useId } from "react";
import { type Drawn, type Letter, type Look, letterSize, letterWidth, type Sketch, sketchBox } from "./Sketch";

type Props = {
  sketch: Sketch;
  /** What it shows, in words. */
  label: string;
  className?: string | undefined;
};

const ink = { stroke: "var(--color-ink)", strokeWidth: 1.2 };
const measured = { stroke: "var(--color-measured)", strokeWidth: 1.4, fill: "none" };
const looks: Record<Exclude<Look, "rubber" | "metal" | "felt">, object> = {
  rubberFace: { fill: "var(--color-rubber)", ...ink },
  metalFace: { fill: "var(--color-metal-fill)", ...ink },
  tool: { fill: "var(--color-sheet)", stroke: "var(--color-edge)", strokeWidth: 1.2 },
  thin: { fill: "none", ...ink, strokeWidth: 0.8 },
  centre: { fill: "none", stroke: "var(--color-edge)", strokeWidth: 0.8, strokeDasharray: "10 3 2 3" },
  extension: { ...measured, strokeWidth: 0.8 },
  dimension: measured,
  arrow: { fill: "var(--color-measured)" },
  loop: { ...measured, strokeWidth: 2 },
};

function Piece({ mark, id }: { mark: Drawn; id: string }) {
  const { look, d } = mark;
  if (look !== "rubber" && look !== "metal" && look !== "felt")
    return <path d={d} fillRule="evenodd" {...looks[look]} />;
  const base = look === "metal" ? "metal-fill" : look;
  return (
    <>
      <path d={d} fillRule="evenodd" fill={`var(--color-${base})`} />
      <path d={d} fillRule="evenodd" fill={`url(#${id}-${look})`} {...ink} />
    </>
  );
}

/** The letter of a dimension with the diameter sign before it, drawn because few fonts have it. */
function Sign({ x, y, words, isDiameter }: Letter) {
  const left = x - letterWidth(words, isDiameter) / 2;
  const cx = left + 6;
  return (
    <>
      {isDiameter && (
        <path
          d={`M${cx - 4.6} ${y}a4.6 4.6 0 1 0 9.2 0a4.6 4.6 0 1 0 -9.2 0ZM${cx - 5.4} ${y + 6.4}L${cx + 5.4} ${y - 6.4}`}
          {...measured}
        />
      )}
      <text
        x={isDiameter ? left + 15 : x}
        y={y + letterSize * 0.34}
        textAnchor={isDiameter ? "start" : "middle"}
        fontSize={letterSize}
        fontWeight="600"
        fill="var(--color-measured)"
      >
        {words}
      </text>
    </>
  );
}

/** A sketch in the colours of what its marks mean. Not to scale. */
export function SketchDrawing({ sketch, label, className }: Props) {
  const id = useId();
  const { width, height } = sketchBox;
  return (
    <svg
      role="img"
      aria-label={label}
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      className={className}
      fontFamily="inherit"
    >
      <defs>
        <pattern id={`${id}-rubber`} width="6" height="6" patternUnits="userSpaceOnUse">
          <path d="M-1 1l2 -2M0 6l6 -6M5 7l2 -2" stroke="var(--color-rubber-hatch)" strokeWidth="0.9" />
        </pattern>
        <pattern id={`${id}-metal`} width="6" height="6" patternUnits="userSpaceOnUse">
          <path d="M-1 5l2 2M0 0l6 6M5 -1l2 2" stroke="var(--color-metal)" strokeWidth="0.9" />
        </pattern>
        <pattern id={`${id}-felt`} width="7" height="7" patternUnits="userSpaceOnUse">
          <path d="M1.5 2h1.2M5 5.5h1.2" stroke="var(--color-ink)" strokeWidth="1.1" />
        </pattern>
      </defs>
      {sketch.map((mark) =>
        mark.look === "letter" ? (
          <Sign key="letter" {...mark} />
        ) : (
          <Piece key={mark.look + mark.d} mark={mark} id={id} />
        ),
      )}
    </svg>
  );
}
