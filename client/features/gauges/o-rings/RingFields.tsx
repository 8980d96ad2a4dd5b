import type { SizeUnit } from "../../../lib/formatSize";
import { RuledHeading } from "../../../ui/RuledHeading";
import { SelectField } from "../../../ui/SelectField";
import { LengthField } from "../LengthField";
import type { ORingState, RingUse } from "./oRingState";
import type { RingErrors } from "./ringNeed";

type Props = {
  state: ORingState;
  unit: SizeUnit;
  errors: RingErrors;
  onChange: (change: (now: ORingState) => ORingState) => void;
};

const uses: Record<RingUse, { words: string; label: string; hint: string }> = {
  seat: {
    words: "sits on a seat, as a tyre on its hub",
    label: "Diameter of the seat",
    hint: "Across the bottom of the groove or hub that the ring is stretched over.",
  },
  belt: {
    words: "runs as a drive belt",
    label: "Length of the path",
    hint: "Once around along the bottoms of the grooves.",
  },
  ring: {
    words: "replaces a ring that was measured",
    label: "Inside diameter of the old ring",
    hint: "Lying flat and relaxed.",
  },
};

export function RingFields({ state, unit, errors, onChange }: Props) {
  const { use } = state;
  const { label, hint } = uses[use];
  return (
    <section className="mt-6 grid gap-3">
      <RuledHeading>What it is for</RuledHeading>
      <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-2">
        <SelectField
          name="use"
          label="The ring"
          value={use}
          onChange={(event) => {
            const next = event.target.value as RingUse;
            onChange((now) => ({ ...now, use: next, pick: "" }));
          }}
        >
          {Object.entries(uses).map(([name, { words }]) => (
            <option key={name} value={name}>
              {words}
            </option>
          ))}
        </SelectField>
        <LengthField
          name="size"
          label={label}
          text={state.sizes[use]}
          unit={unit}
          hint={hint}
          error={errors.size}
          onText={(text) => onChange((now) => ({ ...now, sizes: { ...now.sizes, [use]: text }, pick: "" }))}
        />
        <LengthField
          name="section"
          label="Section diameter"
          text={state.section}
          unit={unit}
          optional
          hint="Of the cord itself. Left empty, every section is looked at."
          error={errors.section}
          onText={(section) => onChange((now) => ({ ...now, section, pick: "" }))}
        />
        {use === "belt" && (
          <LengthField
            name="groove"
            label="Smallest groove"
            text={state.groove}
            unit={unit}
            optional
            hint="Diameter at the bottom of the smallest groove."
            error={errors.groove}
            onText={(groove) => onChange((now) => ({ ...now, groove }))}
          />
        )}
      </div>
    </section>
  );
}
