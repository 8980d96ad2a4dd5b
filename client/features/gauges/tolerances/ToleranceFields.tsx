import { dimensionWords, kindFacts, partKinds } from "#shared/domain/partKinds";
import type { MouldDimension } from "#shared/domain/rubberTolerance";
import { capitalised } from "../../../lib/capitalised";
import type { SizeUnit } from "../../../lib/formatSize";
import { RuledHeading } from "../../../ui/RuledHeading";
import { SelectField } from "../../../ui/SelectField";
import { LengthField } from "../LengthField";
import type { ToleranceErrors } from "./classesAt";
import { mouldedSizes, readPlace, type ToleranceState, writePlace } from "./toleranceState";

type Props = {
  state: ToleranceState;
  unit: SizeUnit;
  errors: ToleranceErrors;
  onChange: (change: (now: ToleranceState) => ToleranceState) => void;
};

const kinds = partKinds.filter((kind) => mouldedSizes(kind).length > 0);

export function ToleranceFields({ state, unit, errors, onChange }: Props) {
  return (
    <section className="mt-6 grid gap-3">
      <RuledHeading>The size</RuledHeading>
      <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-2">
        <LengthField
          name="size"
          label="Size as stated"
          text={state.size}
          unit={unit}
          hint="The nominal size that the workshop states."
          error={errors.size}
          onText={(size) => onChange((now) => ({ ...now, size }))}
        />
        <SelectField
          name="across"
          label="In the mould it is"
          value={state.mould}
          onChange={(event) => {
            const mould = event.target.value as MouldDimension;
            onChange((now) => ({ ...now, mould }));
          }}
        >
          <option value="fixed">fixed: formed by one part of the mould</option>
          <option value="closure">closure: across the split of the mould</option>
        </SelectField>
        <SelectField
          name="place"
          label="What it is"
          value={writePlace(state.place)}
          hint="Brings the band that such a place usually accepts: common practice, no source."
          onChange={(event) => {
            const place = readPlace(event.target.value);
            onChange((now) => ({ ...now, place }));
          }}
        >
          <option value="">nothing in particular</option>
          {kinds.map((kind) => (
            <optgroup key={kind} label={capitalised(kindFacts[kind].name)}>
              {mouldedSizes(kind).map((dimension) => (
                <option key={dimension} value={writePlace({ kind, dimension })}>
                  {kindFacts[kind].name}: {dimensionWords[dimension]}
                </option>
              ))}
            </optgroup>
          ))}
        </SelectField>
        {state.place && (
          <LengthField
            name="need"
            label="Size that is needed"
            text={state.need}
            unit={unit}
            optional
            hint="As new. Left empty, just the size that is stated."
            error={errors.need}
            onText={(need) => onChange((now) => ({ ...now, need }))}
          />
        )}
      </div>
    </section>
  );
}
