import { memo, useRef } from "react";
import type { BeltRoute } from "#shared/domain/beltRoute";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { BoardLabel } from "./BoardLabel";
import { BoardSheet } from "./BoardSheet";
import type { NamedPulley } from "./beltState";
import { type BoardLabels, boardLabels, nameWords, noLabels } from "./boardLabels";
import { type Board, toPx, type View } from "./boardView";
import { rimHandleBox } from "./rimHandleBox";

type Props = {
  /** While a pulley is held they lag behind it. */
  isPale: boolean;
  pulleys: readonly NamedPulley[];
  /** Null where the belt does not close. */
  route: BeltRoute | null;
  /** Its handle keeps words away. */
  selectedId: number | null;
  thickness: number;
  unit: SizeUnit;
  view: View;
  board: Board;
};

/** Names, wraps and lengths, each where there is room for it. */
export const BoardWords = memo(function BoardWords(props: Props) {
  const { isPale, pulleys, route, selectedId, thickness, unit, view, board } = props;
  const spanWords = route ? route.spansMm.map((mm) => (unit === "mm" ? mm.toFixed(1) : roundedSize(mm, unit))) : [];
  const chosen = pulleys.find(({ id }) => id === selectedId);
  const taken = chosen ? [rimHandleBox(toPx(view, chosen), (chosen.diameter / 2) * view.scale)] : [];
  const before = useRef<BoardLabels>(noLabels);
  const labels = boardLabels(pulleys, route, thickness, spanWords, view, board, before.current, taken);
  before.current = labels;
  const indexOf = new Map(pulleys.map(({ id }, i) => [id, i]));
  return (
    <BoardSheet board={board}>
      <g fontSize={13} textAnchor="middle" fillOpacity={isPale ? 0.5 : 1}>
        {labels.spans.map(({ id, x, y }) => (
          <BoardLabel key={id} x={x} y={y} soft={spanWords[indexOf.get(id) ?? 0] ?? ""} />
        ))}
        {labels.names.map(({ id, x, y, isShort }) => {
          const i = indexOf.get(id) ?? 0;
          const { name, wrap } = nameWords(pulleys[i]!, i, route?.wrapsDeg[i], view, board);
          return <BoardLabel key={id} x={x} y={y} strong={isShort ? `${i + 1}` : name} soft={isShort ? "" : wrap} />;
        })}
      </g>
    </BoardSheet>
  );
});
