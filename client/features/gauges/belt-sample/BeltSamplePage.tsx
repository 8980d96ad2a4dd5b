import { useCallback } from "react";
import { RuledHeading } from "../../../ui/RuledHeading";
import { GaugePage } from "../GaugePage";
import { useGaugeState } from "../useGaugeState";
import { useLastGood } from "../useLastGood";
import { BeltFields } from "./BeltFields";
import { BeltLaidOut } from "./BeltLaidOut";
import { BudgetTable } from "./BudgetTable";
import { type BeltSampleState, beltSampleCodec } from "./beltSampleState";
import { MethodChooser } from "./MethodChooser";
import { ReadingFields } from "./ReadingFields";
import { readSample } from "./readSample";
import { SampleReadouts } from "./SampleReadouts";

const exampleState = beltSampleCodec.read(new URLSearchParams());
const workedExample = { state: exampleState, sample: readSample(exampleState).sample! };

/** The size of a belt from the old one, however it was measured: as found, as new, and how sure that is. */
export function BeltSamplePage() {
  const [state, setState] = useGaugeState<BeltSampleState>(beltSampleCodec);
  const { sample, errors } = readSample(state);
  const { good, isStale } = useLastGood(sample && { sample, state });
  // An address may be wrong from the start: then the worked example stands behind, greyed.
  const shown = good ?? workedExample;
  const change = useCallback((part: Partial<BeltSampleState>) => setState((now) => ({ ...now, ...part })), [setState]);
  const { unit } = state;
  // What is out of date is drained of its colour; words stay dark enough to be read.
  const stale = isStale ? "text-soft grayscale" : "";

  return (
    <GaugePage
      title="Belt from a sample"
      lead="Measure the old belt in the way that it lets you; see the size that it had when new, and how sure that is."
      board={
        <>
          <MethodChooser method={state.method} onMethod={(method) => change({ method })} />
          <div className={isStale ? "opacity-40 grayscale" : ""}>
            <BeltLaidOut sample={shown.sample} unit={unit} />
          </div>
          {isStale && (
            <p role="status" className="pt-2 font-semibold text-outband">
              The picture and the figures are not of these readings: mend the fields that say so below.
            </p>
          )}
        </>
      }
      side={
        <div className={`grid gap-7 ${stale}`}>
          <SampleReadouts state={shown.state} sample={shown.sample} unit={unit} isStale={isStale} />
        </div>
      }
    >
      <div className="grid gap-8">
        <ReadingFields
          state={state}
          sample={sample}
          errors={errors}
          onReadings={(readings) => change({ readings: readings.length > 0 ? readings : [""] })}
        />
        <BeltFields state={state} errors={errors} onChange={change} />
        <div className={`grid gap-8 ${stale}`}>
          <BudgetTable budget={shown.sample.result.budget} unit={unit} />
          <section className="grid gap-3">
            <RuledHeading>How it is reckoned</RuledHeading>
            <ol className="grid max-w-prose list-decimal gap-1 pl-8">
              {shown.sample.result.basis.map((line) => (
                <li key={line}>{line}</li>
              ))}
            </ol>
            <p className="max-w-prose text-soft">
              Before a belt is put on: machine unplugged. What is left of a tarred belt stains and should not be
              breathed in as dust; wipe it off with gloves on. Check the new belt on the machine before closing it up.
            </p>
          </section>
        </div>
      </div>
    </GaugePage>
  );
}
