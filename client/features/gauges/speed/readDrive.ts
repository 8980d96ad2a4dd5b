import { DomainError } from "#shared/domain/DomainError";
import type { SpeedInput } from "#shared/domain/driveTrain";
import { parseLength } from "#shared/domain/length";
import { motorSpeed, slipOfMotor } from "#shared/domain/motorSpeed";
import { type SpeedResult, solveSpeed } from "#shared/domain/speed";
import { readPlainNumber } from "../readPlainNumber";
import { type SpeedState, sizesOf } from "./speedState";

/** What a drive comes to, or the words for each field that keeps it from being worked out, by its path. */
export type ReadDrive =
  | { ok: true; input: SpeedInput; result: SpeedResult }
  | { ok: false; errors: Readonly<Record<string, string>> };

class Reader {
  readonly errors: Record<string, string> = {};
  constructor(readonly unit: SpeedState["unit"]) {}

  number(field: string, text: string, missing: string): number {
    const value = readPlainNumber(text);
    if (value === null) this.errors[field] = text.trim() ? "Write a number, like 3.5." : missing;
    return value ?? 0;
  }

  length(field: string, text: string, missing: string): number {
    const read = text.trim() ? parseLength(text, this.unit) : undefined;
    if (!read) this.errors[field] = missing;
    else if (!read.ok) this.errors[field] = read.problem;
    return read?.ok ? read.mm : 0;
  }

  /** A thickness may be nothing, which is no length. */
  thickness(field: string, text: string): number {
    return readPlainNumber(text.replace(/\s*(?:mm|in)$/, "")) === 0
      ? 0
      : this.length(field, text, "Measure it and write it here; next to a small pulley it counts.");
  }
}

const missingSize = "Measure it and write it here, like 44.1 mm.";

type ReadMotor = { mainsHz: number; poles: number } & ({ slipPercent: number } | { motorRpm: number });

function motorOf({ motor }: SpeedState, reader: Reader): ReadMotor {
  const mainsHz =
    motor.mains === "other" ? reader.number("mainsHz", motor.mainsHz, "Which frequency, in Hz?") : Number(motor.mains);
  const poles = reader.number("poles", motor.poles, "How many poles has the motor?");
  if (motor.by === "slip") {
    return {
      mainsHz,
      poles,
      slipPercent: reader.number("slipPercent", motor.slipPercent, "Write 0 if it keeps step."),
    };
  }
  const motorRpm = reader.number("motorRpm", motor.motorRpm, "What did the motor run at?");
  return { mainsHz, poles, motorRpm };
}

function sizesRead({ drive, sizes, stages }: SpeedState, reader: Reader): object {
  const read = sizesOf[drive].flatMap((name) => {
    const text = sizes[name] ?? "";
    if (name === "idlerDiameter" && !text.trim()) return [];
    if (name === "beltThickness") return [[name, reader.thickness(name, text)] as const];
    return [[name, reader.length(name, text, missingSize)] as const];
  });
  if (drive !== "capstan") return Object.fromEntries(read);
  return {
    ...Object.fromEntries(read),
    stages: stages.map(({ driver, driven, beltThickness }, i) => ({
      driver: reader.length(`stages/${i}/driver`, driver, missingSize),
      driven: reader.length(`stages/${i}/driven`, driven, missingSize),
      // No belt: the wheels touch.
      beltThickness: beltThickness.trim() ? reader.thickness(`stages/${i}/beltThickness`, beltThickness) : 0,
    })),
  };
}

const slipOf = (motor: ReadMotor) => ("motorRpm" in motor ? slipOfMotor(motor) : motor.slipPercent);

/** The words of a refusal by their field; nothing where there is none. */
function refusalOf(work: () => unknown): Record<string, string> {
  try {
    work();
    return {};
  } catch (error) {
    if (error instanceof DomainError) return { [error.field]: error.words };
    throw error;
  }
}

/** Reads what was written and works it out. */
export function readDrive(state: SpeedState): ReadDrive {
  const reader = new Reader(state.unit);
  const motor = motorOf(state, reader);
  const sizes = sizesRead(state, reader);
  // What is wrong with the motor is said though sizes are wrong as well.
  if (!["mainsHz", "poles", "slipPercent", "motorRpm"].some((field) => field in reader.errors)) {
    Object.assign(
      reader.errors,
      refusalOf(() => motorSpeed({ ...motor, slipPercent: slipOf(motor) })),
    );
  }
  if (Object.keys(reader.errors).length > 0) return { ok: false, errors: reader.errors };
  try {
    const { mainsHz, poles } = motor;
    const slipPercent = slipOf(motor);
    const target = state.target || undefined;
    // The names of the sizes are those of the drive, so together they are its input.
    const input = { drive: state.drive, mainsHz, poles, slipPercent, target, ...sizes } as SpeedInput;
    return { ok: true, input, result: solveSpeed(input) };
  } catch (error) {
    if (error instanceof DomainError) return { ok: false, errors: { [error.field]: error.words } };
    throw error;
  }
}
