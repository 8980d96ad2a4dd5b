import { type CSSProperties, type KeyboardEvent, useCallback, useMemo, useRef } from "react";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { Button } from "../../../ui/Button";
import { useOwnWidth } from "../../../ui/drawing/useOwnWidth";
import { useLastGood } from "../useLastGood";
import { BoardMoving } from "./BoardMoving";
import { BoardStill } from "./BoardStill";
import { BoardWords } from "./BoardWords";
import { type BeltState, type NamedPulley, pulleyName } from "./beltState";
import { keyStep } from "./keyStep";
import { PulleyHandle } from "./PulleyHandle";
import { RefusalNote } from "./RefusalNote";
import { RimHandle } from "./RimHandle";
import type { Solved } from "./solveState";
import { useBoardView } from "./useBoardView";
import { usePulleyDrag } from "./usePulleyDrag";

type Props = {
  state: BeltState;
  solved: Solved;
  unit: SizeUnit;
  /** Another one is another machine, which is shown whole. */
  drawn: string;
  selectedId: number | null;
  onSelect: (id: number) => void;
  onChange: (id: number, change: Partial<NamedPulley>, isByKey: boolean) => void;
};

const arrows: Record<string, readonly [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

/** Above and below the drawing, px. */
const borders = 2;

/** The drawing with what its pulleys are dragged by; each is reached by Tab and moved with the arrow keys. */
export function BeltBoard(props: Props) {
  const { state, solved, unit, drawn, selectedId, onSelect, onChange } = props;
  const [place, width] = useOwnWidth(760);
  const height = Math.round(Math.min(Math.max(width * 0.66, 320), 560));
  const board = useMemo(() => ({ width, height }), [width, height]);
  const latest = useRef(props);
  latest.current = props;
  const scale = useRef(1);
  const onDrag = useCallback(
    (id: number, change: Partial<NamedPulley>) => latest.current.onChange(id, change, false),
    [],
  );
  const { held, heldId, hold, holdRim, handlers } = usePulleyDrag(state.pulleys, scale, onDrag, place);
  const { pulleys } = state;
  const { route, thicknessMm, refusal } = solved;
  const { good } = useLastGood(thicknessMm);
  const thickness = good ?? 1;
  const { view, closer, wider, fit } = useBoardView(pulleys, thickness, board, drawn, heldId !== null);
  scale.current = view.scale;

  const onKey = useCallback((event: KeyboardEvent, id: number) => {
    const way = arrows[event.key];
    const pulley = latest.current.state.pulleys.find((one) => one.id === id);
    if (!way || !pulley) return;
    event.preventDefault();
    const step = keyStep(event);
    latest.current.onChange(id, { x: pulley.x + way[0] * step, y: pulley.y + way[1] * step }, true);
  }, []);

  const sizeOf = (mm: number) => `${roundedSize(mm, unit)} ${unit}`;
  const selected = pulleys.findIndex(({ id }) => id === selectedId);
  const chosen = pulleys[selected];

  return (
    <div>
      <div
        ref={place}
        role="application"
        aria-label="Board. Arrow keys move a pulley by 1 mm, with Shift by 10 mm, with Alt by 0.1 mm."
        className={`belt-board gauge-sheet relative mt-2 overflow-hidden ${heldId === null ? "" : "belt-dragging"}`}
        style={{ "--board-height": `${height + borders}px` } as CSSProperties}
        {...handlers}
      >
        <div className="belt-sheets">
          <BoardStill
            pulleys={pulleys}
            heldId={heldId}
            route={route}
            refusedIndex={refusal?.pulley ?? null}
            thickness={thickness}
            view={view}
            board={board}
          />
          <BoardMoving held={held} state={state} solved={solved} unit={unit} view={view} board={board} />
          <BoardWords
            isPale={heldId !== null}
            pulleys={pulleys}
            route={route}
            selectedId={selectedId}
            thickness={thickness}
            unit={unit}
            view={view}
            board={board}
          />
        </div>
        {pulleys.map((pulley, i) => (
          <PulleyHandle
            key={pulley.id}
            pulley={pulley}
            view={view}
            words={`${pulleyName(pulley, i)}: x ${sizeOf(pulley.x)}, y ${sizeOf(pulley.y)}, ${sizeOf(pulley.diameter)} across`}
            isSelected={pulley.id === selectedId}
            onHold={hold}
            onKey={onKey}
            onSelect={onSelect}
          />
        ))}
        {chosen && (
          <RimHandle
            pulley={chosen}
            view={view}
            name={pulleyName(chosen, selected)}
            onHold={holdRim}
            onDiameter={(id, diameter) => onChange(id, { diameter }, true)}
          />
        )}
        {refusal && <RefusalNote refusal={refusal} pulleys={pulleys} view={view} board={board} />}
      </div>
      <div className="flex flex-wrap items-center gap-x-4 print:hidden">
        <span className="text-soft">Look</span>
        <Button look="quiet" onClick={closer}>
          closer
        </Button>
        <Button look="quiet" onClick={wider}>
          wider
        </Button>
        <Button look="quiet" onClick={fit}>
          everything
        </Button>
      </div>
    </div>
  );
}
