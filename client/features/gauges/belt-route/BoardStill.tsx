import { memo } from "react";
import type { BeltRoute } from "#shared/domain/beltRoute";
import { Hatches } from "../Hatches";
import { BoardGrid } from "./BoardGrid";
import { BoardSheet } from "./BoardSheet";
import type { NamedPulley } from "./beltState";
import type { Board, View } from "./boardView";
import { PlacedPulley } from "./PlacedPulley";

type Props = {
  pulleys: readonly NamedPulley[];
  /** It is drawn on the moving sheet. */
  heldId: number | null;
  route: BeltRoute | null;
  refusedIndex: number | null;
  thickness: number;
  view: View;
  board: Board;
};

/** What stays while a pulley is dragged: the paper and the other pulleys. */
export const BoardStill = memo(function BoardStill(props: Props) {
  const { pulleys, heldId, route, refusedIndex, thickness, view, board } = props;
  return (
    <BoardSheet board={board}>
      <Hatches id="belt" />
      <BoardGrid view={view} board={board} />
      {pulleys.map((pulley, i) =>
        pulley.id === heldId ? null : (
          <PlacedPulley
            key={pulley.id}
            pulley={pulley}
            index={i}
            contact={route?.contacts[i]}
            isRefused={refusedIndex === i}
            thickness={thickness}
            view={view}
          />
        ),
      )}
    </BoardSheet>
  );
});
