import { useState } from "react";
import type { Pulley } from "#shared/domain/beltRoute";
import { type Board, fitView, middleOf, showsAll, type View, zoomedView } from "./boardView";

type Kept = { view: View; board: Board; drawn: string; isChosen: boolean };

/**
 * The window on the machine. It stays while a pulley is dragged, so that nothing slides under the finger; it is fitted
 * anew for another machine (`drawn`), another size of the board, and when a pulley has come to lie outside.
 */
export function useBoardView(
  pulleys: readonly Pulley[],
  thickness: number,
  board: Board,
  drawn: string,
  isHeld: boolean,
) {
  const [kept, setKept] = useState<Kept | null>(null);
  const isSame =
    kept !== null && kept.drawn === drawn && kept.board.width === board.width && kept.board.height === board.height;
  const stays = isSame && (isHeld || kept.isChosen || showsAll(kept.view, pulleys, board));
  const view = stays ? kept.view : fitView(pulleys, thickness, board);
  if (!stays) setKept({ view, board, drawn, isChosen: false });

  const zoom = (times: number) =>
    setKept({ view: zoomedView(view, times, board, middleOf(view, board)), board, drawn, isChosen: true });
  return {
    view,
    closer: () => zoom(1.5),
    wider: () => zoom(1 / 1.5),
    fit: () => setKept({ view: fitView(pulleys, thickness, board), board, drawn, isChosen: false }),
  };
}
