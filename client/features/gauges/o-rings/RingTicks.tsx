import type { RingOffer } from "./ringNeed";

type Props = {
  rings: readonly RingOffer[];
  xOf: (mm: number) => number;
  width: number;
  height: number;
  /** Of the lane: stands at its left, and no number is written over it. */
  name: string;
  idealMm: number;
  pickedDash: string;
  litDash: string | null;
  onLight: (dash: string | null) => void;
  onPick: (dash: string) => void;
};

const numberWidth = 26;
const letterWidth = 6.9;

/** The sizes of one section: a mark at the inside diameter, its tolerance as a bar, its number where there is room. */
export function RingTicks(props: Props) {
  const { rings, xOf, width, height, name, idealMm, pickedDash, litDash, onLight, onPick } = props;
  const numberY = 27;
  const y = height - 10;
  const visible = rings
    .map((ring) => ({ ...ring, x: xOf(ring.insideDiameterMm) }))
    .filter(({ x }) => x >= 0 && x <= width);

  // Those that matter write their numbers first.
  const rank = (ring: RingOffer) => (ring.dash === litDash ? 0 : ring.dash === pickedDash ? 1 : ring.isInside ? 2 : 3);
  const away = (ring: RingOffer) => Math.abs(ring.insideDiameterMm - idealMm);
  const numbered: number[] = [];
  const withNumber = new Set<string>();
  for (const { dash, x } of [...visible].sort((a, b) => rank(a) - rank(b) || away(a) - away(b))) {
    if (numbered.some((other) => Math.abs(other - x) < numberWidth + 4)) continue;
    numbered.push(x);
    withNumber.add(dash);
  }
  const drawn = [...visible].sort((a, b) => rank(b) - rank(a));

  return (
    <>
      <rect x={0} y={0} width={name.length * letterWidth + 6} height={16} fill="var(--color-sheet)" opacity={0.85} />
      <text x={4} y={12.5} fontSize={12.5} fill="var(--color-soft)">
        {name}
      </text>
      {drawn.map((ring) => {
        const { dash, x, isInside } = ring;
        const [from, to] = [-1, 1].map((way) => xOf(ring.insideDiameterMm + way * ring.insideDiameterTolMm));
        const isLit = dash === litDash;
        const isPicked = dash === pickedDash;
        const strong = isLit || isPicked;
        return (
          // biome-ignore lint/a11y/noStaticElementInteractions: for the pointer alone; the rows say all of it and can be reached by keyboard
          <g
            key={dash}
            className={`rail-tick ${isInside ? "text-inband" : "text-soft"}`}
            data-lit={isLit || undefined}
            onPointerEnter={() => onLight(dash)}
            onPointerLeave={() => onLight(null)}
            onClick={() => onPick(dash)}
          >
            <title>{dash}</title>
            <rect x={x - 13} y={14} width={26} height={height - 14} fill="transparent" />
            <path
              d={`M${from} ${y}H${to}M${from} ${y - 3.5}v7M${to} ${y - 3.5}v7`}
              stroke="var(--color-ink)"
              strokeWidth={isLit ? 2.4 : 1.2}
            />
            <circle
              cx={x}
              cy={y}
              r={strong ? 5.6 : 4.2}
              fill={isInside ? "currentColor" : "var(--color-sheet)"}
              stroke="currentColor"
              strokeWidth={1.6}
            />
            {isPicked && <circle cx={x} cy={y} r={8.6} fill="none" stroke="var(--color-measured)" strokeWidth={1.8} />}
            {withNumber.has(dash) && (
              <text
                x={x}
                y={numberY - (isPicked ? 2 : 0)}
                textAnchor="middle"
                fontSize={13}
                fontWeight={strong ? 700 : 450}
                fill={strong ? "var(--color-ink)" : "currentColor"}
              >
                {dash}
              </text>
            )}
          </g>
        );
      })}
    </>
  );
}
