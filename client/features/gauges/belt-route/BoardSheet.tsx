import type { ReactNode, Ref } from "react";
import type { Board } from "./boardView";

type Props = { board: Board; children: ReactNode; ref?: Ref<SVGSVGElement> };

/** One of the sheets that lie on each other to make the board: what moves is drawn apart from what stays. */
export function BoardSheet({ board, children, ref }: Props) {
  return (
    <svg
      ref={ref}
      width={board.width}
      height={board.height}
      viewBox={`0 0 ${board.width} ${board.height}`}
      className="belt-sheet"
      aria-hidden="true"
    >
      {children}
    </svg>
  );
}
