import { useRef } from "react";
import type { BeltRoute } from "#shared/domain/beltRoute";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { Hatches } from "../Hatches";
import { BeltLine } from "./BeltLine";
import { BoardGrid } from "./BoardGrid";
import type { NamedPulley } from "./beltState";
import { type BoardLabels, boardLabels, hasOwnNumber, nameWords, noLabels } from "./boardLabels";
import { type Board, toPx, type View } from "./boardView";
import { PulleyMark } from "./PulleyMark";

type Props = {
  pulleys: readonly NamedPulley[];
  /** The route, or the last one that closed. */
  route: BeltRoute | null;
  isStale: boolean;
  refusedIndex: number | null;
  thickness: number;
  unit: SizeUnit;
  view: View;
  board: Board;
};

/** Direction of a pulley's free side, opposite the middle of its wrap, in whole degrees. */
function freeSideOf({ contacts }: BeltRoute, i: number): number {
  const { x, y, arrive, wrap, turn } = contacts[i]!;
  return Math.round(((Math.atan2(arrive.y - y, arrive.x - x) + (turn * wrap) / 2 + Math.PI) * 180) / Math.PI);
}

/** The machine from above, to scale, with its belt, names and lengths. */
export function BoardDrawing({ pulleys, route, isStale, refusedIndex, thickness, unit, view, board }: Props) {
  const live = isStale ? null : route;
  const spanWords = live ? live.spansMm.map((mm) => (unit === "mm" ? mm.toFixed(1) : roundedSize(mm, unit))) : [];
  const before = useRef<BoardLabels>(noLabels);
  const labels = boardLabels(pulleys, live, thickness, spanWords, view, board, before.current);
  before.current = labels;
  const indexOf = new Map(pulleys.map(({ id }, i) => [id, i]));
  return (
    <svg
      width={board.width}
      height={board.height}
      viewBox={`0 0 ${board.width} ${board.height}`}
      className="block h-auto w-full"
      aria-hidden="true"
    >
      <Hatches id="belt" />
      <BoardGrid view={view} board={board} />
      {pulleys.map((pulley, i) => (
        <PulleyMark
          key={pulley.id}
          number={i + 1}
          {...toPx(view, pulley)}
          radius={(pulley.diameter / 2) * view.scale}
          freeSide={live ? freeSideOf(live, i) : null}
          turn={live?.contacts[i]?.turn ?? 1}
          beltPx={Math.max(thickness * view.scale, 2)}
          hasNumber={hasOwnNumber(pulley, view)}
          isRefused={refusedIndex === i}
        />
      ))}
      {route && <BeltLine route={route} thickness={thickness} view={view} isStale={isStale} />}
      <g fontSize={13} textAnchor="middle">
        {labels.spans.map(({ id, x, y }) => (
          <text key={id} x={x} y={y + 4.5} fill="var(--color-soft)">
            {spanWords[indexOf.get(id) ?? 0]}
          </text>
        ))}
        {labels.names.map(({ id, x, y }) => {
          const i = indexOf.get(id) ?? 0;
          const { name, wrap } = nameWords(pulleys[i]!, i, live?.wrapsDeg[i], view);
          return (
            <text key={id} x={x} y={y + 4.5} fill="var(--color-ink)">
              <tspan fontWeight={650}>{name}</tspan>
              <tspan fill="var(--color-soft)">{wrap && ` ${wrap}`}</tspan>
            </text>
          );
        })}
      </g>
    </svg>
  );
}
