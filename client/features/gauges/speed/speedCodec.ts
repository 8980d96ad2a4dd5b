import { speedBounds } from "#shared/domain/speedBounds";
import { storedUnit } from "../../../lib/preferences";
import {
  drives,
  examples,
  mainsChoices,
  type SpeedState,
  type StageTexts,
  sizesOf,
  targetsOf,
  withUnit,
} from "./speedState";

const longestText = 60;
const oneOf = <T extends string>(all: readonly T[], text: string | null, otherwise: T): T =>
  all.find((one) => one === text) ?? otherwise;

/** A stage as "driver;driven;thickness": lengths contain blanks, commas and points, but no semicolon. */
function readStage(text: string): StageTexts | null {
  const parts = text.split(";");
  const [driver = "", driven = "", beltThickness = ""] = parts;
  if (parts.length > 3 || parts.length < 2 || text.length > 3 * longestText) return null;
  return { driver, driven, beltThickness };
}
const writeStage = ({ driver, driven, beltThickness }: StageTexts) =>
  [driver, driven, beltThickness].map((text) => text.replaceAll(";", "")).join(";");

/** The drive from its address. What is missing or no drive could have is the worked example's; lengths stay as written. */
export function readSpeed(params: URLSearchParams): SpeedState {
  if (params.size === 0) return withUnit(examples.rim, storedUnit());
  const drive = oneOf(drives, params.get("drive"), "rim");
  const example = examples[drive];
  const text = (name: string, otherwise: string) => {
    const written = params.get(name);
    return written === null || written.length > longestText ? otherwise : written;
  };
  const { motor } = example;
  const stages = params.getAll("stage").map(readStage);
  const areStages = stages.length >= speedBounds.stages[0] && stages.length <= speedBounds.stages[1];
  return {
    drive,
    unit: oneOf(["mm", "in"], params.get("unit"), "mm"),
    motor: {
      mains: oneOf(mainsChoices, params.get("mains"), motor.mains),
      mainsHz: text("mainsHz", motor.mainsHz),
      poles: text("poles", motor.poles),
      by: params.has("motorRpm") ? "rpm" : "slip",
      slipPercent: text("slipPercent", motor.slipPercent),
      motorRpm: text("motorRpm", motor.motorRpm),
    },
    sizes: Object.fromEntries(sizesOf[drive].map((name) => [name, text(name, example.sizes[name] ?? "")])),
    stages: areStages && stages.every((stage) => stage !== null) ? stages : example.stages,
    target:
      params.get("target") === "" ? "" : oneOf(targetsOf(drive), params.get("target"), example.target || "33 1/3"),
  };
}

/** A link without a unit is in millimetres, whatever its reader prefers. */
export function writeSpeed({ drive, unit, motor, sizes, stages, target }: SpeedState): URLSearchParams {
  const params = new URLSearchParams({ drive, mains: motor.mains });
  if (motor.mains === "other") params.set("mainsHz", motor.mainsHz);
  params.set("poles", motor.poles);
  if (motor.by === "rpm") params.set("motorRpm", motor.motorRpm);
  else params.set("slipPercent", motor.slipPercent);
  if (drive === "capstan") for (const stage of stages) params.append("stage", writeStage(stage));
  for (const name of sizesOf[drive]) params.set(name, sizes[name] ?? "");
  params.set("target", target);
  if (unit !== "mm") params.set("unit", unit);
  return params;
}

export const speedCodec = { read: readSpeed, write: writeSpeed };
