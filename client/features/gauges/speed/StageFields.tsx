import { speedBounds } from "#shared/domain/speedBounds";
import type { SizeUnit } from "../../../lib/formatSize";
import { Button } from "../../../ui/Button";
import { LengthField } from "../LengthField";
import { sizeName } from "./sizeNames";
import type { StageTexts } from "./speedState";

type Props = {
  stages: readonly StageTexts[];
  unit: SizeUnit;
  errors: Readonly<Record<string, string>>;
  onStages: (stages: readonly StageTexts[]) => void;
};

const parts = ["driver", "driven", "beltThickness"] as const;
const hints = {
  driver: "Without the belt",
  driven: "Without the belt",
  beltThickness: "Leave it empty where the wheels touch",
} as const;

/** The stages between motor and capstan, one line each; they can be added and taken away. */
export function StageFields({ stages, unit, errors, onStages }: Props) {
  // A stage has no identity but its place in the drive.
  const rows = stages.map((stage, i) => ({ name: `Stage ${i + 1}`, stage, i }));
  return (
    <div className="grid gap-6">
      {rows.map(({ name, stage, i }) => (
        <fieldset key={name} className="grid gap-3">
          <legend className="font-semibold">{stages.length > 1 ? name : "From the motor to the capstan"}</legend>
          <div className="grid items-start gap-x-6 gap-y-4 sm:grid-cols-3">
            {parts.map((part) => (
              <LengthField
                key={part}
                name={`stages-${i}-${part}`}
                label={`${sizeName(`stages/${i}/${part}`, stages.length).replace(/, stage \d$/, "")}${part === "beltThickness" ? "" : ", diameter"}`}
                text={stage[part]}
                unit={unit}
                onText={(text) => onStages(stages.map((one, at) => (at === i ? { ...one, [part]: text } : one)))}
                error={errors[`stages/${i}/${part}`]}
                hint={hints[part]}
              />
            ))}
          </div>
          {stages.length > 1 && (
            <Button
              look="quiet"
              className="justify-self-start"
              onClick={() => onStages(stages.filter((_, at) => at !== i))}
            >
              Take stage {i + 1} away
            </Button>
          )}
        </fieldset>
      ))}
      {stages.length < speedBounds.stages[1] && (
        <Button
          className="justify-self-start"
          onClick={() => onStages([...stages, { driver: "20", driven: "20", beltThickness: "" }])}
        >
          Add a stage
        </Button>
      )}
    </div>
  );
}
