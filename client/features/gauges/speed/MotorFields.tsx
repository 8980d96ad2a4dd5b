import { SelectField } from "../../../ui/SelectField";
import { NumberField } from "../NumberField";
import { type MotorTexts, mainsChoices } from "./speedState";

type Props = {
  motor: MotorTexts;
  errors: Readonly<Record<string, string>>;
  onMotor: (change: Partial<MotorTexts>) => void;
};

/** The motor: its mains, its poles, and its slip or what it was measured to turn at. */
export function MotorFields({ motor, errors, onMotor }: Props) {
  return (
    <>
      <SelectField
        name="mains"
        label="Mains"
        value={motor.mains}
        onChange={(event) => onMotor({ mains: mainsChoices.find((one) => one === event.target.value) ?? "50" })}
        error={motor.mains === "other" ? undefined : errors.mainsHz}
      >
        <option value="50">50 Hz</option>
        <option value="60">60 Hz</option>
        <option value="other">another frequency</option>
      </SelectField>
      {motor.mains === "other" && (
        <NumberField
          name="mainsHz"
          label="Frequency, Hz"
          text={motor.mainsHz}
          onText={(mainsHz) => onMotor({ mainsHz })}
          error={errors.mainsHz}
          hint="10 to 400 Hz"
        />
      )}
      <NumberField
        name="poles"
        label="Poles of the motor"
        text={motor.poles}
        onText={(poles) => onMotor({ poles })}
        error={errors.poles}
        hint="An even number, as the plate or the winding tells"
      />
      <SelectField
        name="by"
        label="Its speed is known by"
        value={motor.by}
        onChange={(event) => onMotor({ by: event.target.value === "rpm" ? "rpm" : "slip" })}
      >
        <option value="slip">slip</option>
        <option value="rpm">measuring it</option>
      </SelectField>
      {motor.by === "slip" ? (
        <NumberField
          name="slipPercent"
          label="Slip, %"
          text={motor.slipPercent}
          onText={(slipPercent) => onMotor({ slipPercent })}
          error={errors.slipPercent}
          hint="0 for a motor that keeps step; else often 2 to 6 (common practice, no source)"
        />
      ) : (
        <NumberField
          name="motorRpm"
          label="Motor measured, rpm"
          text={motor.motorRpm}
          onText={(motorRpm) => onMotor({ motorRpm })}
          error={errors.motorRpm}
          hint="Driving the mechanism, warm"
        />
      )}
    </>
  );
}
