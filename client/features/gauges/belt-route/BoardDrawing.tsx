import { useRef } from "react";
import type { BeltRoute } from "#shared/domain/beltRoute";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { Hatches } from "../Hatches";
import { BeltLine } from "./BeltLine";
import { BoardGrid } from "./BoardGrid";
import { BoardLabel } from "./BoardLabel";
import type { NamedPulley } from "./beltState";
import { type BoardLabels, boardLabels, freeSideOf, hasOwnNumber, nameWords, noLabels } from "./boardLabels";
import { type Board, toPx, type View } from "./boardView";
import { PulleyMark } from "./PulleyMark";
import { rimHandleBox } from "./rimHandleBox";

type Props = {
  pulleys: readonly NamedPulley[];
  /** The route, or the last one that closed. */
  route: BeltRoute | null;
  isStale: boolean;
  refusedIndex: number | null;
  /** Its handle keeps words away. */
  selectedId: number | null;
  thickness: number;
  unit: SizeUnit;
  view: View;
  board: Board;
};

/** The machine from above, to scale, with its belt, names and lengths. */
export function BoardDrawing({
  pulleys,
  route,
  isStale,
  refusedIndex,
  selectedId,
  thickness,
  unit,
  view,
  board,
}: Props) {
  const live = isStale ? null : route;
  const spanWords = live ? live.spansMm.map((mm) => (unit === "mm" ? mm.toFixed(1) : roundedSize(mm, unit))) : [];
  const chosen = pulleys.find(({ id }) => id === selectedId);
  const taken = chosen ? [rimHandleBox(toPx(view, chosen), (chosen.diameter / 2) * view.scale)] : [];
  const before = useRef<BoardLabels>(noLabels);
  const labels = boardLabels(pulleys, live, thickness, spanWords, view, board, before.current, taken);
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
          freeSide={live?.contacts[i] ? freeSideOf(live.contacts[i]) : null}
          turn={live?.contacts[i]?.turn ?? 1}
          beltPx={Math.max(thickness * view.scale, 2)}
          hasNumber={hasOwnNumber(pulley, view)}
          isRefused={refusedIndex === i}
        />
      ))}
      {route && <BeltLine route={route} thickness={thickness} view={view} isStale={isStale} />}
      {live && (
        <text x={board.width - 10} y={21} textAnchor="end" fontSize={15} fontWeight={700} fill="var(--color-ink)">
          {unit === "mm" ? live.pitchLengthMm.toFixed(1) : roundedSize(live.pitchLengthMm, unit)} {unit} in place
        </text>
      )}
      <g fontSize={13} textAnchor="middle">
        {labels.spans.map(({ id, x, y }) => (
          <BoardLabel key={id} x={x} y={y} soft={spanWords[indexOf.get(id) ?? 0] ?? ""} />
        ))}
        {labels.names.map(({ id, x, y, isShort }) => {
          const i = indexOf.get(id) ?? 0;
          const { name, wrap } = nameWords(pulleys[i]!, i, live?.wrapsDeg[i], view, board);
          return <BoardLabel key={id} x={x} y={y} strong={isShort ? `${i + 1}` : name} soft={isShort ? "" : wrap} />;
        })}
      </g>
    </svg>
  );
}
