import { recordSpeeds } from "#shared/domain/nominalSpeeds";
import { CheckField } from "../../../ui/CheckField";
import { SelectField } from "../../../ui/SelectField";
import { TextField } from "../../../ui/TextField";
import { LengthField } from "../LengthField";
import { NumberField } from "../NumberField";
import type { SheetErrors } from "./readSheet";
import { mainsChoices, type SheetsState } from "./sheetsState";

type Props = { state: SheetsState; errors: SheetErrors; onChange: (change: Partial<SheetsState>) => void };

/** The mains of the lamp, the hole, and the speeds of the rings. */
export function StrobeFields({ state, errors, onChange }: Props) {
  const { mains, mainsHz, speeds, moreSpeeds, spindle } = state;
  const toggle = (speed: (typeof recordSpeeds)[number]) =>
    onChange({ speeds: recordSpeeds.filter((one) => speeds.includes(one) !== (one === speed)) });
  return (
    <>
      <SelectField
        name="mains"
        label="Mains of the lamp"
        value={mains}
        onChange={(event) => onChange({ mains: mainsChoices.find((one) => one === event.target.value) ?? "50" })}
      >
        <option value="50">50 Hz</option>
        <option value="60">60 Hz</option>
        <option value="other">another frequency</option>
      </SelectField>
      {mains === "other" && (
        <NumberField
          name="mainsHz"
          label="Frequency, Hz"
          text={mainsHz}
          onText={(text) => onChange({ mainsHz: text })}
          error={errors.mainsHz}
          hint="10 to 400 Hz"
        />
      )}
      <LengthField
        name="spindle"
        label="Hole for the spindle"
        text={spindle}
        unit="mm"
        onText={(text) => onChange({ spindle: text })}
        error={errors.spindleMm}
        hint={"A little wider than your spindle; 1 to 40\u00a0mm"}
      />
      <fieldset className="col-span-full grid gap-1">
        <legend className="mb-1 font-semibold">Rings for, rpm</legend>
        <div className="flex flex-wrap gap-x-6">
          {recordSpeeds.map((speed) => (
            <CheckField
              key={speed}
              name={`speed-${speed.replace(/\W/g, "-")}`}
              label={speed}
              checked={speeds.includes(speed)}
              onChange={() => toggle(speed)}
            />
          ))}
        </div>
        <div className="max-w-96">
          <TextField
            name="moreSpeeds"
            label="Other speeds, rpm"
            optional
            value={moreSpeeds}
            onChange={(event) => onChange({ moreSpeeds: event.target.value })}
            inputMode="text"
            autoComplete="off"
            maxLength={60}
            hint="Commas between, a point for decimals: 76.6, 80"
            error={errors.speeds}
          />
        </div>
      </fieldset>
    </>
  );
}
