import { LengthField } from "../LengthField";
import { isThickness, sizeName } from "./sizeNames";
import { type SpeedState, sizesOf } from "./speedState";

type Props = {
  state: SpeedState;
  errors: Readonly<Record<string, string>>;
  onSize: (name: string, text: string) => void;
};

const hints: Readonly<Record<string, string>> = {
  stepDiameter: "Of the sleeve or step that the idler runs on: a micrometer is worth it here",
  idlerDiameter: "It cancels; it is only drawn",
  idlerLargeDiameter: "The tread that the motor turns",
  idlerSmallDiameter: "The tread that turns the rim",
  rimDiameter: "Where the idler runs, inside or outside",
  pulleyDiameter: "Where the belt lies, without the belt",
  drivenDiameter: "Where the belt lies, without the belt",
  beltThickness: "It counts with the pulleys: half of it on either side",
  capstanDiameter: "Of the shaft that touches the tape",
};

/** The sizes of the drive, from the motor on, in any length format. */
export function DriveFields({ state, errors, onSize }: Props) {
  return sizesOf[state.drive].map((name) => (
    <LengthField
      key={name}
      name={name}
      label={`${sizeName(name)}${isThickness(name) ? "" : ", diameter"}`}
      text={state.sizes[name] ?? ""}
      unit={state.unit}
      onText={(text) => onSize(name, text)}
      error={errors[name]}
      hint={hints[name]}
      optional={name === "idlerDiameter"}
    />
  ));
}
