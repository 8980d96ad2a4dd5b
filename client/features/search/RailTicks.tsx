import type { RailTick } from "#shared/schemas/search";
import { VerdictShape } from "../../ui/VerdictMark";
import { verdictColour, verdictWords } from "../../ui/verdictWords";
import { intoLanes } from "./railScale";

type Props = {
  ticks: readonly RailTick[];
  xOf: (mm: number) => number;
  width: number;
  top: number;
  laneHeight: number;
  lanes: number;
  /** Where marks stand that no lane had room for. */
  overflowY: number;
  radius: number;
  litId: string | null;
  onLight: (partId: string | null) => void;
  onPick: (partId: string) => void;
};

const rank = { sure: 0, likely: 1, chancy: 2, unfit: 3 };

/** Every candidate at its true size, its tolerance as a bar. The likelier ones choose their lanes first. */
export function RailTicks(props: Props) {
  const { ticks, xOf, width, top, laneHeight, lanes, overflowY, radius, litId, onLight, onPick } = props;
  const visible = ticks
    .map((tick) => {
      const [x, from, to] = [tick.nominalMm, tick.nominalMm - tick.plusMinusMm, tick.nominalMm + tick.plusMinusMm].map(
        xOf,
      ) as [number, number, number];
      return { ...tick, x, from, to };
    })
    .filter(({ x }) => x >= 0 && x <= width)
    .sort((a, b) => rank[a.verdict] - rank[b.verdict] || a.nominalMm - b.nominalMm);
  const reach = radius + 1;
  const placed = intoLanes(
    visible.map(({ x, from, to }) => ({ fromPx: Math.min(from, x - reach), toPx: Math.max(to, x + reach) })),
    lanes,
  );

  const isLit = (id: string) => id === litId;
  const drawn = visible.map((tick, i) => ({ ...tick, lane: placed[i] ?? null }));
  // The lit one last, so that it lies on top.
  drawn.sort((a, b) => Number(isLit(a.partId)) - Number(isLit(b.partId)));
  return drawn.map(({ partId, title, verdict, x, from, to, lane }) => {
    const lit = isLit(partId);
    const y = lane === null ? overflowY : top + (lane + 0.5) * laneHeight;
    return (
      // biome-ignore lint/a11y/noStaticElementInteractions: for the pointer alone; the rows say all of it and can be reached by keyboard
      <g
        key={`${partId}${x}`}
        className={`rail-tick ${verdictColour[verdict]}`}
        data-lit={lit || undefined}
        onPointerEnter={() => onLight(partId)}
        onPointerLeave={() => onLight(null)}
        onClick={() => onPick(partId)}
      >
        <title>{`${title}: ${verdictWords[verdict]}`}</title>
        {lane === null && !lit ? (
          <path d={`M${x} ${y - 4}V${y + 4}`} stroke="currentColor" strokeWidth={1.5} />
        ) : (
          <>
            <rect
              x={Math.min(from, x - 8)}
              y={y - laneHeight / 2}
              width={Math.max(to - from, 16)}
              height={laneHeight}
              fill="transparent"
            />
            <path
              d={`M${from} ${y}H${to}M${from} ${y - 3}V${y + 3}M${to} ${y - 3}V${y + 3}`}
              stroke="var(--color-ink)"
              strokeWidth={lit ? 2.4 : 1}
            />
            <g transform={`translate(${x} ${y})${lit ? " scale(1.35)" : ""}`}>
              <VerdictShape verdict={verdict} radius={radius} />
            </g>
          </>
        )}
      </g>
    );
  });
}
