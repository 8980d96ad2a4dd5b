import { useState } from "react";
import { useUnit } from "../../../lib/preferences";
import { useOwnWidth } from "../../../ui/drawing/useOwnWidth";
import { RuledHeading } from "../../../ui/RuledHeading";
import { GaugePage } from "../GaugePage";
import { useGaugeState } from "../useGaugeState";
import { useLastGood } from "../useLastGood";
import { oRingCodec } from "./oRingState";
import { RingFields } from "./RingFields";
import { RingNotes } from "./RingNotes";
import { RingOnSeat } from "./RingOnSeat";
import { RingRail } from "./RingRail";
import { RingReadouts } from "./RingReadouts";
import { RingRows } from "./RingRows";
import { ringNeed } from "./ringNeed";

/** Which standard O-ring serves as a tyre, a belt or in place of an old ring, and what stretching does to it. */
export function ORingsPage() {
  const unit = useUnit();
  const [state, setState] = useGaugeState(oRingCodec);
  const [litDash, setLit] = useState<string | null>(null);
  const [place, width] = useOwnWidth(760);
  const { need, errors } = ringNeed(state, unit);
  const { good, isStale } = useLastGood(need);
  const pick = (dash: string) => setState((now) => ({ ...now, pick: dash }));
  const stale = isStale ? "opacity-40" : "";

  return (
    <GaugePage
      title="O-ring sizes"
      lead="Which standard ring serves as a tyre or a belt, and how thin it becomes when it is stretched."
      board={
        <>
          <RuledHeading>Standard sizes, inside diameter in {unit}</RuledHeading>
          <div className={`gauge-sheet mt-2 ${stale}`}>
            <div ref={place} className="overflow-hidden">
              {good && (
                <>
                  <RingRail need={good} unit={unit} width={width} litDash={litDash} onLight={setLit} onPick={pick} />
                  <div className="border-t border-rule">
                    <RingOnSeat need={good} unit={unit} width={width} />
                  </div>
                </>
              )}
            </div>
          </div>
          <RingFields state={state} unit={unit} errors={errors} onChange={setState} />
        </>
      }
      side={
        good && (
          <div className={`grid gap-7 ${stale}`}>
            <RingReadouts need={good} unit={unit} />
          </div>
        )
      }
    >
      <div className="grid gap-8">
        {good && (
          <div className={stale}>
            <RingRows need={good} unit={unit} litDash={litDash} onLight={setLit} onPick={pick} />
          </div>
        )}
        <RingNotes use={state.use} />
      </div>
    </GaugePage>
  );
}
