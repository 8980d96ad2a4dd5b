import { memo } from "react";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { useLastGood } from "../useLastGood";
import { BeltLine } from "./BeltLine";
import { BoardSheet } from "./BoardSheet";
import type { BeltState } from "./beltState";
import type { Board, View } from "./boardView";
import { type HeldPulley, useHeldPulley } from "./heldPulley";
import { PlacedPulley } from "./PlacedPulley";
import { type Solved, solveState } from "./solveState";

type Props = {
  held: HeldPulley;
  state: BeltState;
  /** Of the state; while a pulley is held the route is worked out anew in each frame. */
  solved: Solved;
  unit: SizeUnit;
  view: View;
  board: Board;
};

/** What is drawn anew in each frame of a drag: the belt, its length, and the pulley that is held. */
export const BoardMoving = memo(function BoardMoving({ held, state, solved: settled, unit, view, board }: Props) {
  const pulley = useHeldPulley(held);
  const pulleys = pulley ? state.pulleys.map((one) => (one.id === pulley.id ? pulley : one)) : state.pulleys;
  const { route, thicknessMm, refusal } = pulley ? solveState({ ...state, pulleys }, unit) : settled;
  const { good } = useLastGood(route && thicknessMm !== null ? { route, thicknessMm } : null);
  const index = pulley ? pulleys.indexOf(pulley) : -1;
  const thickness = thicknessMm ?? good?.thicknessMm ?? 1;
  return (
    <BoardSheet board={board} isMoving={pulley !== null}>
      {pulley && index >= 0 && (
        <PlacedPulley
          pulley={pulley}
          index={index}
          contact={route?.contacts[index]}
          isRefused={refusal?.pulley === index}
          thickness={thickness}
          view={view}
        />
      )}
      {good && <BeltLine route={route ?? good.route} thickness={thickness} view={view} isStale={!route} />}
      {route && (
        <text x={board.width - 10} y={21} textAnchor="end" fontSize={15} fontWeight={700} fill="var(--color-ink)">
          {unit === "mm" ? route.pitchLengthMm.toFixed(1) : roundedSize(route.pitchLengthMm, unit)} {unit} in place
        </text>
      )}
    </BoardSheet>
  );
});
