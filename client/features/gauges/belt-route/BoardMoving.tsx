import { memo, useEffect, useReducer, useRef } from "react";
import { beltOutline } from "#shared/domain/beltOutline";
import type { BeltRoute } from "#shared/domain/beltRoute";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { useLastGood } from "../useLastGood";
import { BeltLine } from "./BeltLine";
import { BoardSheet } from "./BoardSheet";
import type { BeltState, NamedPulley } from "./beltState";
import { type Board, toPx, type View } from "./boardView";
import type { HeldPulley } from "./heldPulley";
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

const lengthWords = ({ pitchLengthMm: mm }: BeltRoute, unit: SizeUnit) =>
  `${unit === "mm" ? mm.toFixed(1) : roundedSize(mm, unit)} ${unit} in place`;

/** The state with the pulley where it is held, and its route. */
function withHeld({ state, solved, unit }: Props, pulley: NamedPulley | null) {
  if (!pulley) return { pulleys: state.pulleys, solved };
  const pulleys = state.pulleys.map((one) => (one.id === pulley.id ? pulley : one));
  return { pulleys, solved: solveState({ ...state, pulleys }, unit) };
}

/**
 * What is drawn anew in each frame of a drag: the belt, its length, and the pulley that is held.
 *
 * As long as the belt closes and only places change, they are written straight into the drawing: rendering would take
 * longer than all the rest. Everything else is rendered, and so is where the pulley comes to rest.
 */
export const BoardMoving = memo(function BoardMoving(props: Props) {
  const { held, unit, view, board } = props;
  const [, render] = useReducer((count: number) => count + 1, 0);
  const sheet = useRef<SVGSVGElement>(null);
  const pulley = held.get();
  const { pulleys, solved } = withHeld(props, pulley);
  const { route, thicknessMm, refusal } = solved;
  const { good } = useLastGood(route && thicknessMm !== null ? { route, thicknessMm } : null);
  const index = pulley ? pulleys.indexOf(pulley) : -1;
  const thickness = thicknessMm ?? good?.thicknessMm ?? 1;

  const rendered = useRef({ props, pulley, route });
  rendered.current = { props, pulley, route };
  useEffect(() => {
    const paint = (now: NamedPulley): boolean => {
      const { props: latest, pulley: before, route: closed } = rendered.current;
      const drawing = sheet.current;
      if (!drawing || !closed || before?.id !== now.id || before.diameter !== now.diameter) return false;
      const next = withHeld(latest, now).solved.route;
      const { x, y } = toPx(latest.view, now);
      if (!next) return false;
      const outline = beltOutline(next.contacts);
      for (const line of drawing.querySelectorAll(".belt-line path")) line.setAttribute("d", outline);
      drawing.querySelector(".belt-held > g")?.setAttribute("transform", `translate(${x} ${y})`);
      const words = drawing.querySelector(".belt-length")?.firstChild;
      if (words) words.nodeValue = lengthWords(next, latest.unit);
      return true;
    };
    return held.subscribe(() => {
      const now = held.get();
      if (!now || !paint(now)) render();
    });
  }, [held]);

  return (
    <BoardSheet board={board} ref={sheet}>
      {pulley && index >= 0 && (
        <g className="belt-held">
          <PlacedPulley
            pulley={pulley}
            index={index}
            contact={route?.contacts[index]}
            isRefused={refusal?.pulley === index}
            thickness={thickness}
            view={view}
          />
        </g>
      )}
      {good && <BeltLine route={route ?? good.route} thickness={thickness} view={view} isStale={!route} />}
      {route && (
        <text
          className="belt-length"
          x={board.width - 10}
          y={21}
          textAnchor="end"
          fontSize={15}
          fontWeight={700}
          fill="var(--color-ink)"
        >
          {lengthWords(route, unit)}
        </text>
      )}
    </BoardSheet>
  );
});
