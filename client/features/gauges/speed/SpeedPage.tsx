import { useCallback } from "react";
import type { NominalSpeed } from "#shared/domain/nominalSpeeds";
import { keepUnit } from "../../../lib/preferences";
import { RuledHeading } from "../../../ui/RuledHeading";
import { SelectField } from "../../../ui/SelectField";
import { GaugePage } from "../GaugePage";
import { useGaugeState } from "../useGaugeState";
import { DriveChooser } from "./DriveChooser";
import { DriveFields } from "./DriveFields";
import { MotorFields } from "./MotorFields";
import { SettingTable } from "./SettingTable";
import { SpeedResults } from "./SpeedResults";
import { StageFields } from "./StageFields";
import { speedCodec } from "./speedCodec";
import { type SpeedState, targetsOf, withDrive, withUnit } from "./speedState";
import { TrainDrawing } from "./TrainDrawing";
import { useDrive } from "./useDrive";

/** The speed of a platter or a tape from the sizes of its drive: what sets it, what cancels, how far it is off. */
export function SpeedPage() {
  const [state, setState] = useGaugeState<SpeedState>(speedCodec);
  const { shown, errors, isStale } = useDrive(state);
  const { drive, unit, motor, stages, target } = state;
  const change = useCallback((part: Partial<SpeedState>) => setState((now) => ({ ...now, ...part })), [setState]);
  const isTape = drive === "capstan";

  return (
    <GaugePage
      title="Speed"
      lead="Measure the drive; see the speed it gives, which sizes set it, and what to change."
      board={
        <>
          <DriveChooser drive={drive} onDrive={(next) => setState((now) => withDrive(now, next))} />
          <div inert={isStale} className={isStale ? "opacity-40" : ""}>
            <TrainDrawing input={shown.input} result={shown.result} unit={unit} />
          </div>
          <p className="pt-2 text-small text-soft">
            To scale, but for the distances between shafts. Blue sizes set the speed
            {drive === "rim" ? "; the pale one cancels." : "."}
            {isTape && " Dashed: the pinch roller, which only presses."}
          </p>
          {isStale && (
            <p role="status" className="pt-2 font-semibold text-outband">
              The picture and the figures are not of these sizes: mend the fields that say so below.
            </p>
          )}
        </>
      }
      side={
        <div inert={isStale} className={`grid grid-cols-[minmax(0,1fr)] gap-7 ${isStale ? "opacity-40" : ""}`}>
          <SpeedResults input={shown.input} result={shown.result} unit={unit} />
        </div>
      }
    >
      <div className="grid gap-8">
        <section className="grid gap-4">
          <RuledHeading>Motor and speed wanted</RuledHeading>
          <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
            <MotorFields
              motor={motor}
              errors={errors}
              onMotor={(part) => setState((now) => ({ ...now, motor: { ...now.motor, ...part } }))}
            />
            <SelectField
              name="target"
              label="Speed wanted"
              value={target}
              onChange={(event) => change({ target: event.target.value as NominalSpeed | "" })}
              error={errors.target}
            >
              {targetsOf(drive).map((name) => (
                <option key={name} value={name}>
                  {name} {isTape ? "in/s" : "rpm"}
                </option>
              ))}
              <option value="">none: only tell the speed</option>
            </SelectField>
          </div>
        </section>
        <section className="grid gap-4">
          <RuledHeading>Sizes as measured</RuledHeading>
          {isTape && (
            <StageFields stages={stages} unit={unit} errors={errors} onStages={(next) => change({ stages: next })} />
          )}
          <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
            <DriveFields
              state={state}
              errors={errors}
              onSize={(name, text) => setState((now) => ({ ...now, sizes: { ...now.sizes, [name]: text } }))}
            />
            <SelectField
              name="unit"
              label="Sizes without a unit are in"
              value={unit}
              onChange={(event) => {
                const next = event.target.value === "in" ? "in" : "mm";
                keepUnit(next);
                setState((now) => withUnit(now, next));
              }}
            >
              <option value="mm">millimetres</option>
              <option value="in">inches</option>
            </SelectField>
          </div>
        </section>
        <div inert={isStale} className={isStale ? "opacity-40" : ""}>
          <SettingTable input={shown.input} result={shown.result} unit={unit} />
        </div>
      </div>
    </GaugePage>
  );
}
