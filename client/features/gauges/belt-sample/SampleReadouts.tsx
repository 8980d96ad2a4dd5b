import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { LinkButton } from "../../../ui/LinkButton";
import { Readout } from "../Readout";
import type { BeltSampleState } from "./beltSampleState";
import { findBelt } from "./findBelt";
import type { Sample } from "./readSample";

type Props = {
  state: BeltSampleState;
  sample: Sample;
  unit: SizeUnit;
  /** The figures are not of what stands in the fields: no search for them. */
  isStale: boolean;
};

/** The belt as found and as new, and the search for it. */
export function SampleReadouts({ state, sample, unit, isStale }: Props) {
  const { asFound, asNew } = sample.result;
  const other = unit === "mm" ? "in" : "mm";
  const show = (mm: number) => `${roundedSize(mm, unit)} ${unit}`;
  const search = findBelt(state, sample);
  return (
    <>
      <Readout label="As found" value={roundedSize(asFound.insideCircumferenceMm, unit)} unit={unit} look="measured">
        <p>
          ±{show(2 * asFound.standardUncertaintyMm)} (k = 2), the inside circumference of the old belt;{" "}
          {roundedSize(asFound.insideCircumferenceMm, other)} {other}.
        </p>
      </Readout>
      <Readout label="As new" value={roundedSize(asNew.insideCircumferenceMm, unit)} unit={unit}>
        <p>
          ±{show(2 * asNew.standardUncertaintyMm)} (k = 2), what to look for;{" "}
          {roundedSize(asNew.insideCircumferenceMm, other)} {other}.
        </p>
        <p>
          Laid flat {show(asNew.insideCircumferenceMm / 2)} inside; lying round{" "}
          {show(asNew.insideCircumferenceMm / Math.PI)} across.
        </p>
      </Readout>
      {!isStale && (
        <div className="grid gap-2 print:hidden">
          <LinkButton look="primary" to={search.to}>
            Find this belt
          </LinkButton>
          <p className="text-small text-soft">{search.words}</p>
        </div>
      )}
    </>
  );
}
