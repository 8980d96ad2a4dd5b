import type { NamedPulley } from "./beltState";
import { type Board, toPx, type View } from "./boardView";
import type { Refusal } from "./solveState";

type Props = { refusal: Refusal; pulleys: readonly NamedPulley[]; view: View; board: Board };

const width = 250;

/** Why the belt does not close, in its first sentence, beside the pulley that keeps it from it; what to do stands with the results. */
export function RefusalNote({ refusal, pulleys, view, board }: Props) {
  const pulley = refusal.pulley === null ? undefined : pulleys[refusal.pulley];
  const at = pulley ? toPx(view, pulley) : { x: board.width / 2, y: 12 };
  const reach = pulley ? (pulley.diameter / 2) * view.scale + 10 : 0;
  const left = Math.min(Math.max(at.x - width / 2, 8), Math.max(board.width - width - 8, 8));
  const isBelow = at.y < board.height / 2;
  const top = at.y + reach;
  return (
    <p
      className="pointer-events-none absolute border-2 border-outband bg-sheet px-2.5 py-1.5 text-small font-semibold text-outband"
      style={{
        left,
        width: Math.min(width, board.width - 16),
        ...(isBelow ? { top: Math.max(top, 8) } : { bottom: Math.max(board.height - at.y + reach, 8) }),
      }}
    >
      {refusal.words.replace(/\. .*$/, ".")}
    </p>
  );
}
