import { useMemo } from "react";
import { useLastGood } from "../useLastGood";
import { type ReadDrive, readDrive } from "./readDrive";
import { examples, type SpeedState } from "./speedState";

type Worked = Extract<ReadDrive, { ok: true }>;
type Errors = Readonly<Record<string, string>>;
const none: Errors = {};

/** What the drive comes to; while something is wrong with it, what it last came to, and the words for each field. */
export function useDrive(state: SpeedState): { shown: Worked; errors: Errors; isStale: boolean } {
  const read = useMemo(() => readDrive(state), [state]);
  const { good, isStale } = useLastGood(read.ok ? read : null);
  // The last of another drive would be a picture of something else: the example of this one stands in for it.
  const shown = good?.input.drive === state.drive ? good : exampleOf(state.drive);
  return { shown, errors: read.ok ? none : read.errors, isStale };
}

function exampleOf(drive: SpeedState["drive"]): Worked {
  const read = readDrive(examples[drive]);
  if (!read.ok) throw new Error(`The example of ${drive} does not work out.`);
  return read;
}
