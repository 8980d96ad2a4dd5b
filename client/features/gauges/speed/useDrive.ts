import { useMemo, useRef } from "react";
import { type ReadDrive, readDrive } from "./readDrive";
import { examples, type SpeedState } from "./speedState";

type Worked = Extract<ReadDrive, { ok: true }>;
const none: Readonly<Record<string, string>> = {};

/** What the drive comes to; while something is wrong with it, what it last came to, and the words for each field. */
export function useDrive(state: SpeedState): {
  shown: Worked;
  errors: Readonly<Record<string, string>>;
  isStale: boolean;
} {
  const read = useMemo(() => readDrive(state), [state]);
  const last = useRef<Worked | null>(null);
  if (read.ok) last.current = read;
  // The last of another drive would be a picture of something else: the example of this one stands in for it.
  const fitting = last.current?.input.drive === state.drive ? last.current : null;
  const shown = fitting ?? exampleOf(state.drive);
  return { shown, errors: read.ok ? none : read.errors, isStale: !read.ok };
}

function exampleOf(drive: SpeedState["drive"]): Worked {
  const read = readDrive(examples[drive]);
  if (!read.ok) throw new Error(`The example of ${drive} does not work out.`);
  return read;
}
