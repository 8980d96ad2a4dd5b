import { lazy, type ReactNode, Suspense, useState } from "react";
import { isBelt } from "../../lib/needParams";
import { MeasuringHelp } from "./MeasuringHelp";
import type { Strip } from "./useStrip";

// What these work out is not needed until something is written; fetched apart, they leave the first page lighter.
const AsNewLine = lazy(async () => ({ default: (await import("./AsNewLine")).AsNewLine }));
const BeltSampleLine = lazy(async () => ({ default: (await import("./BeltSampleLine")).BeltSampleLine }));
const NoSampleLine = lazy(async () => ({ default: (await import("./NoSampleLine")).NoSampleLine }));

/** Below the sentence: what follows from it as it is written, and what helps to write it. */
export function StripNotes({ strip: { values, shown, isMeasured } }: { strip: Strip }) {
  const notes = {
    noSample: !isMeasured,
    asNew: shown.some((name) => values.lengths[name]),
    beltSample: isMeasured && isBelt(values.kind),
  };
  const [first] = useState(notes);
  return (
    <>
      {notes.noSample && (
        <Lazily isAwaited={first.noSample}>
          <NoSampleLine values={values} />
        </Lazily>
      )}
      {notes.asNew && (
        <Lazily isAwaited={first.asNew}>
          <AsNewLine values={values} shown={shown} />
        </Lazily>
      )}
      {isMeasured && !notes.asNew && (
        <p className="text-soft">
          Write sizes as you read them: 44.1, 44,1 mm, 1.736 in, 1-47/64, 750 thou. Wear is reckoned in for you.
        </p>
      )}
      {notes.beltSample && (
        <Lazily isAwaited={first.beltSample}>
          <BeltSampleLine values={values} />
        </Lazily>
      )}
      {isMeasured && <MeasuringHelp kind={values.kind} shown={shown} />}
    </>
  );
}

/**
 * Keeps the height of a line while it is fetched. What belongs to the strip from the start is waited for by all of it, so
 * that nothing moves; what comes later must not hide the field that is being written into.
 */
function Lazily({ isAwaited, children }: { isAwaited: boolean; children: ReactNode }) {
  return <div className="min-h-7">{isAwaited ? children : <Suspense fallback={null}>{children}</Suspense>}</div>;
}
