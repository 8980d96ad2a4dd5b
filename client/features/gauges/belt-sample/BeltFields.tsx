import { beltSampleFacts } from "#shared/domain/beltSample";
import { type Condition, conditionFacts } from "#shared/domain/conditions";
import { type Instrument, instrumentFacts, instruments } from "#shared/domain/instruments";
import { kindFacts } from "#shared/domain/partKinds";
import { keepUnit } from "../../../lib/preferences";
import { RuledHeading } from "../../../ui/RuledHeading";
import { SelectField } from "../../../ui/SelectField";
import { LengthField } from "../LengthField";
import { withItsUnit } from "../withItsUnit";
import { type BeltKind, type BeltSampleState, beltConditions, beltKinds } from "./beltSampleState";
import type { SampleErrors } from "./readSample";

type Props = {
  state: BeltSampleState;
  errors: SampleErrors;
  onChange: (change: Partial<BeltSampleState>) => void;
};

const thicknessLabels: Record<BeltKind, string> = {
  "flat-belt": "Thickness",
  "square-belt": "Side of the section",
  "round-belt": "Diameter of the section",
};

/** The belt itself: kind, section, what it was measured with and what has become of it. */
export function BeltFields({ state, errors, onChange }: Props) {
  const { kind, method, unit, condition } = state;
  const needsThickness = beltSampleFacts[method].perThickness > 0;
  return (
    <section className="grid gap-4">
      <RuledHeading>The belt</RuledHeading>
      <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
        <SelectField
          name="kind"
          label="Kind"
          value={kind}
          onChange={(event) => onChange({ kind: event.target.value as BeltKind })}
        >
          {beltKinds.map((one) => (
            <option key={one} value={one}>
              {kindFacts[one].name}
            </option>
          ))}
        </SelectField>
        <LengthField
          name="thickness"
          label={thicknessLabels[kind]}
          text={state.thickness}
          unit={unit}
          optional={!needsThickness}
          hint={needsThickness ? "It is taken off the reading." : "Does not count here; only for the search."}
          error={errors.thickness}
          onText={(thickness) => onChange({ thickness })}
        />
        {kind === "flat-belt" && (
          <LengthField
            name="width"
            label="Width"
            text={state.width}
            unit={unit}
            optional
            hint="Only for the search."
            onText={(width) => onChange({ width })}
          />
        )}
        <SelectField
          name="instrument"
          label="Measured with"
          value={state.instrument}
          onChange={(event) => onChange({ instrument: event.target.value as Instrument })}
        >
          {instruments.map((one) => (
            <option key={one} value={one}>
              {instrumentFacts[one].name}
            </option>
          ))}
        </SelectField>
        <SelectField
          name="condition"
          label="Condition"
          hint={conditionFacts[condition].sign}
          value={condition}
          onChange={(event) => onChange({ condition: event.target.value as Condition })}
        >
          {beltConditions.map((one) => (
            <option key={one} value={one}>
              {conditionFacts[one].name}
            </option>
          ))}
        </SelectField>
        <SelectField
          name="unit"
          label="Sizes without a unit are in"
          value={unit}
          onChange={(event) => {
            const next = event.target.value === "in" ? "in" : "mm";
            keepUnit(next);
            // What was written keeps its meaning.
            onChange({
              unit: next,
              readings: state.readings.map((text) => withItsUnit(text, unit)),
              thickness: withItsUnit(state.thickness, unit),
              width: withItsUnit(state.width, unit),
            });
          }}
        >
          <option value="mm">millimetres</option>
          <option value="in">inches</option>
        </SelectField>
      </div>
    </section>
  );
}
