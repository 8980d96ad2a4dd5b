import { Link } from "react-router-dom";
import { dimensionWords, kindFacts } from "#shared/domain/partKinds";
import { capitalised } from "../../../lib/capitalised";
import { roundedSize } from "../../../lib/formatSize";
import { useUnit } from "../../../lib/preferences";
import { useOwnWidth } from "../../../ui/drawing/useOwnWidth";
import { LinkButton } from "../../../ui/LinkButton";
import { RuledHeading } from "../../../ui/RuledHeading";
import { GaugePage } from "../GaugePage";
import { Readout } from "../Readout";
import { useGaugeState } from "../useGaugeState";
import { useLastGood } from "../useLastGood";
import { withItsUnit } from "../withItsUnit";
import { ClassBars } from "./ClassBars";
import { ClassTable } from "./ClassTable";
import { classesAt } from "./classesAt";
import { HardnessGauge } from "./HardnessGauge";
import { MouldDrawing } from "./MouldDrawing";
import { TableEnd } from "./TableEnd";
import { ToleranceFields } from "./ToleranceFields";
import { toleranceCodec } from "./toleranceState";

/** What a moulder's class means for a size: how far it may be off, and the chance that it is still accepted. */
export function TolerancesPage() {
  const unit = useUnit();
  const [state, setState] = useGaugeState(toleranceCodec);
  const [board, width] = useOwnWidth(760);
  const { result, errors } = classesAt(state, unit);
  const { good, isStale } = useLastGood(result);
  const { place } = state;
  const stale = isStale ? "opacity-40" : "";

  return (
    <GaugePage
      title="Tolerances"
      lead="What a moulder’s class means for a size: how far a part may be off, and whether it is still accepted."
      board={
        <>
          <RuledHeading>Four classes at one scale</RuledHeading>
          <div className={`gauge-sheet mt-2 ${stale}`}>
            <div ref={board} className="overflow-hidden">
              {good && <ClassBars result={good} unit={unit} width={width} />}
            </div>
            {good?.band && (
              <p className="px-3 pb-2 text-small text-soft">
                Green: accepted. Red hatch: allowed by the class, but not accepted.
              </p>
            )}
          </div>
          <ToleranceFields state={state} unit={unit} errors={errors} onChange={setState} />
        </>
      }
      side={
        good && (
          <div className={`grid gap-7 ${stale}`}>
            <ClassTable result={good} unit={unit} />
            {place && good.band && (
              <Readout
                label="Usually accepted"
                value={`${roundedSize(good.band.lowerMm, unit)} to ${roundedSize(good.band.upperMm, unit)}`}
                unit={unit}
              >
                <p>
                  {capitalised(dimensionWords[place.dimension])} of {kindFacts[place.kind].plural}, where{" "}
                  {roundedSize(good.needMm, unit)} {unit} is needed: common practice, no source. The register of a
                  mechanism family may know better.
                </p>
              </Readout>
            )}
            {place && !isStale && (
              <LinkButton
                look="primary"
                className="print:hidden"
                to={`/find?${new URLSearchParams({ kind: place.kind, [place.dimension]: withItsUnit(state.need.trim() || state.size, unit) })}`}
              >
                Find such parts
              </LinkButton>
            )}
            <section className="grid gap-3">
              <RuledHeading>Fixed or closure</RuledHeading>
              <MouldDrawing mould={state.mould} />
            </section>
          </div>
        )
      }
    >
      <div className="grid grid-cols-1 gap-8">
        <TableEnd mould={state.mould} unit={unit} />
        <HardnessGauge state={state} onChange={setState} />
        <section className="grid max-w-prose gap-2">
          <RuledHeading>Mind</RuledHeading>
          <p>
            Across a diameter the whole tolerance counts; each side moves by half of it. A wheel that is ground after
            moulding holds closer than any of these classes: ask for what is stated.
          </p>
          <p>
            The classes hold for rubber that has rested: measured no sooner than 16 hours after vulcanisation (72 in a
            dispute) and within three months. They leave precision sealing rings out: those have{" "}
            <Link to="/gauges/o-rings">sizes of their own</Link>.
          </p>
        </section>
      </div>
    </GaugePage>
  );
}
