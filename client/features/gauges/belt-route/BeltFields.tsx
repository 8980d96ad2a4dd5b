import { kindFacts } from "#shared/domain/partKinds";
import { capitalised } from "../../../lib/capitalised";
import type { SizeUnit } from "../../../lib/formatSize";
import { RuledHeading } from "../../../ui/RuledHeading";
import { SelectField } from "../../../ui/SelectField";
import { LengthField } from "../LengthField";
import { NumberField } from "../NumberField";
import { type BeltKind, type BeltState, beltKinds } from "./beltState";
import type { FieldErrors } from "./solveState";
import { choiceOf, choicesFor, stretchOf } from "./stretchChoices";

type Props = {
  state: BeltState;
  unit: SizeUnit;
  errors: FieldErrors;
  onChange: (change: Partial<BeltState>) => void;
};

const thicknessWords: Record<BeltKind, [label: string, hint: string]> = {
  "flat-belt": ["Thickness", "Between the pulley and its outside. Seldom over 2 mm."],
  "square-belt": ["Section side", "The side of the square that lies on the pulley."],
  "round-belt": ["Section diameter", "Counted from the bottom of the groove, where it lies."],
};

/** What the belt is: its section, and how far it is stretched in place. */
export function BeltFields({ state, unit, errors, onChange }: Props) {
  const { kind, thickness, width, stretch } = state;
  const choice = choiceOf(state);
  const [label, hint] = thicknessWords[kind];
  const setKind = (next: BeltKind) => onChange({ kind: next, ...stretchOf(choicesFor(next)[0]!) });
  return (
    <section className="grid gap-4 print:hidden">
      <RuledHeading>The belt</RuledHeading>
      <SelectField name="kind" label="Kind" value={kind} onChange={(event) => setKind(event.target.value as BeltKind)}>
        {beltKinds.map((one) => (
          <option key={one} value={one}>
            {capitalised(kindFacts[one].name)}
          </option>
        ))}
      </SelectField>
      <div className="grid grid-cols-2 items-start gap-4">
        <LengthField
          name="thickness"
          label={label}
          text={thickness}
          unit={unit}
          hint={hint}
          error={errors.thickness}
          onText={(text) => onChange({ thickness: text })}
        />
        {kind === "flat-belt" && (
          <LengthField
            name="width"
            label="Width"
            text={width}
            unit={unit}
            hint="For the search; empty for any."
            onText={(text) => onChange({ width: text })}
          />
        )}
      </div>
      <SelectField
        name="stretchOf"
        label="Stretch in place"
        value={choice?.id ?? "own"}
        hint={choice ? capitalised(`${choice.source}.`) : "Numbers of your own, along the middle of the belt."}
        onChange={(event) => {
          const next = choicesFor(kind).find(({ id }) => id === event.target.value);
          onChange(next ? stretchOf(next) : { isInsideStretch: false });
        }}
      >
        {choicesFor(kind).map(({ id, words, min, max }) => (
          <option key={id} value={id}>
            {words}, {min === max ? min : `${min} to ${max}`} %
          </option>
        ))}
        {!choice && <option value="own">Numbers of my own</option>}
      </SelectField>
      <div className="grid grid-cols-2 items-start gap-4">
        <NumberField
          name="stretchMin"
          label="At least, %"
          text={stretch.min}
          error={errors.min}
          onText={(min) => onChange({ stretch: { ...stretch, min } })}
        />
        <NumberField
          name="stretchMax"
          label="At most, %"
          text={stretch.max}
          error={errors.max}
          onText={(max) => onChange({ stretch: { ...stretch, max } })}
        />
      </div>
    </section>
  );
}
