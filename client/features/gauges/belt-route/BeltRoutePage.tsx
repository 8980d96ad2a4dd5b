import { useCallback, useEffect, useMemo, useRef, useState } from "react";
import { announce } from "../../../lib/announcements";
import { useUnit } from "../../../lib/preferences";
import { Button } from "../../../ui/Button";
import { RuledHeading } from "../../../ui/RuledHeading";
import { GaugePage } from "../GaugePage";
import { useGaugeState } from "../useGaugeState";
import { BeltBoard } from "./BeltBoard";
import { BeltFields } from "./BeltFields";
import { BeltResults } from "./BeltResults";
import { beltCodec } from "./beltCodec";
import { beltExamples, withExample } from "./beltExamples";
import type { BeltState, NamedPulley } from "./beltState";
import { PulleyTable } from "./PulleyTable";
import { withPulley } from "./pulleyEdits";
import { solveState, spokenRoute } from "./solveState";

/** How long the keys must be still before a move is spoken. */
const speakAfterMs = 600;

/** No belt left: its length from the pulleys that it ran over. */
export function BeltRoutePage() {
  const [state, setState] = useGaugeState(beltCodec);
  const preferred = useUnit();
  const unit = state.handedOn.unit ?? preferred;
  const [selectedId, setSelected] = useState<number | null>(null);
  const [exampleCount, setExampleCount] = useState(0);
  const solved = useMemo(() => solveState(state, unit), [state, unit]);
  const { route, refusal } = solved;

  const movedByKey = useRef<number | null>(null);
  useEffect(() => {
    if (movedByKey.current === null) return;
    const id = movedByKey.current;
    const timer = setTimeout(() => {
      movedByKey.current = null;
      announce(spokenRoute(state, solved, id));
    }, speakAfterMs);
    return () => clearTimeout(timer);
  }, [state, solved]);

  const onPulleys = useCallback(
    (change: (now: BeltState["pulleys"]) => BeltState["pulleys"]) =>
      setState((now) => ({ ...now, pulleys: change(now.pulleys) })),
    [setState],
  );
  const onBoard = useCallback(
    (id: number, change: Partial<NamedPulley>, isByKey: boolean) => {
      if (isByKey) movedByKey.current = id;
      onPulleys((now) => withPulley(now, id, change));
    },
    [onPulleys],
  );

  return (
    <GaugePage
      title="Belt route"
      lead="No belt left? Lay out the pulleys that it ran over; the belt follows."
      board={
        <>
          <RuledHeading>Board, millimetres</RuledHeading>
          <BeltBoard
            state={state}
            solved={solved}
            unit={unit}
            drawn={String(exampleCount)}
            selectedId={selectedId}
            onSelect={setSelected}
            onChange={onBoard}
          />
          <p className="flex flex-wrap items-center gap-x-4 print:hidden">
            <span className="text-soft">Begin with</span>
            {beltExamples.map((example) => (
              <Button
                key={example.id}
                look="quiet"
                onClick={() => {
                  setState((now) => withExample(now, example));
                  setSelected(null);
                  setExampleCount((count) => count + 1);
                }}
              >
                {example.words}
              </Button>
            ))}
          </p>
        </>
      }
      side={
        <>
          <BeltResults state={state} solved={solved} unit={unit} />
          <BeltFields
            state={state}
            unit={unit}
            errors={solved.errors}
            onChange={(change) => setState((now) => ({ ...now, ...change }))}
          />
        </>
      }
    >
      <PulleyTable
        pulleys={state.pulleys}
        route={route}
        refusedIndex={refusal?.pulley ?? null}
        unit={unit}
        selectedId={selectedId}
        onSelect={setSelected}
        onPulleys={onPulleys}
      />
    </GaugePage>
  );
}
