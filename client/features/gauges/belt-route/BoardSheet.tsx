import type { ReactNode } from "react";
import type { Board } from "./boardView";

type Props = { board: Board; isMoving?: boolean; children: ReactNode };

/** One of the sheets that lie on each other to make the board: what moves is drawn apart from what stays. */
export function BoardSheet({ board, isMoving = false, children }: Props) {
  return (
    <svg
      width={board.width}
      height={board.height}
      viewBox={`0 0 ${board.width} ${board.height}`}
      className={`belt-sheet ${isMoving ? "belt-moving" : ""}`}
      aria-hidden="true"
    >
      {children}
    </svg>
  );
}
